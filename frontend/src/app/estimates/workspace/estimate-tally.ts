import { Injectable, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router } from '@angular/router';
import { filter, map, startWith } from 'rxjs';
import type { Triple } from '#shared/units/triple';
import { Formats } from '../../core/formats/formats';
import type { TallyCell } from '../../ui/page/tally-cell';
import { elapsedWords } from '../elapsed-words';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';
import { ReadyDay } from './ready-day';

type Place = 'measure' | 'carve' | 'gild' | 'dry' | 'price' | 'issue';

/** Places that show one member at a time, and keep the one chosen as one goes from one to the other. */
const memberPlaces: readonly Place[] = ['measure', 'carve', 'gild'];

/** The live figures under the places of an estimate. */
@Injectable()
export class EstimateTally {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly formats = inject(Formats);
  private readonly ready = inject(ReadyDay);
  private readonly router = inject(Router);
  private readonly address = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map((event) => event.urlAfterRedirects),
      startWith(this.router.url),
    ),
    { requireSync: true },
  );

  readonly issueRoute = computed(() => this.route('issue'));
  readonly isOnIssue = computed(() => this.isOn('issue'));
  readonly cells = computed<readonly TallyCell[]>(() => [
    ...this.workCells(),
    ...this.priceCell(),
    ...this.issueCell(),
  ]);

  private workCells(): TallyCell[] {
    const tally = this.store.figures()?.tally;
    if (!tally) return [];
    const elapsed = elapsedWords(this.formats, tally);
    return [
      {
        name: $localize`Measure`,
        figure: this.formats.area(tally.true_mm2),
        minor: tally.members === 1 ? $localize`one member` : $localize`${tally.members}:count: members`,
        route: this.route('measure'),
      },
      {
        name: $localize`Carve`,
        figure: $localize`${this.formats.number(tally.carving_hours.likely, 1, 1)}:hours: h`,
        minor: this.spread(tally.carving_hours),
        minorName: $localize`at least and at most`,
        route: this.route('carve'),
      },
      {
        name: $localize`Gild`,
        figure: this.formats.figure('booklets', tally.booklets),
        minor: this.between(tally.booklets_p10, tally.booklets_p90),
        minorName: $localize`eight times in ten`,
        route: this.route('gild'),
      },
      {
        name: $localize`Dry`,
        figure: elapsed.weeks,
        minor: this.readyBy() ?? elapsed.days,
        route: this.route('dry'),
      },
    ];
  }

  private priceCell(): TallyCell[] {
    const priced = this.store.priced();
    if (!priced) return [];
    const cost = this.store.costed()?.cost.price;
    const margin = cost && (cost.marginLeft_percent ?? cost.margin_percent);
    return [
      {
        name: $localize`Price`,
        figure: this.formats.wholeMoney(priced.price.net_minor),
        minor: margin === undefined ? '' : $localize`${this.formats.percent(margin, 1)}:margin: margin`,
        route: this.route('price'),
        isPending: this.store.isPricePending(),
      },
    ];
  }

  private issueCell(): TallyCell[] {
    const priced = this.store.priced();
    if (!priced) return [];
    const newest = this.store.issues().at(0);
    const route = this.route('issue');
    if (!newest) return [{ name: $localize`Issue`, figure: $localize`none yet`, route, isMuted: true }];
    const difference_minor = priced.price.net_minor - newest.net_minor;
    return [
      {
        name: $localize`Issue ${newest.letter}:letter:`,
        figure: this.formats.wholeMoney(newest.net_minor),
        minor: this.difference(difference_minor),
        route,
        isMuted: true,
        isPending: this.store.isPricePending(),
      },
    ];
  }

  private difference(difference_minor: number): string {
    if (difference_minor === 0) return $localize`unchanged`;
    return this.formats.signed(difference_minor, (size_minor) => this.formats.wholeMoney(size_minor));
  }

  /** A programme that is kept counts with the people there are, and says more than a count of days. */
  private readyBy(): string | undefined {
    const day = this.ready.day();
    return day && $localize`planned, by ${this.formats.day(day, 'short')}:day:`;
  }

  private spread({ low, high }: Triple): string {
    return this.between(Math.round(low), Math.round(high));
  }

  private between(low: number, high: number): string {
    if (low === high) return '';
    return $localize`${this.formats.number(low, 0)}:low: to ${this.formats.number(high, 0)}:high:`;
  }

  private isOn(place: Place): boolean {
    return this.address().split('?')[0].split('/').includes(place);
  }

  /** The place’s own link leads to its list; the others keep the member one is at. */
  private route(place: Place): TallyCell['route'] {
    const opened = this.store.ids();
    const path = ['/jobs', opened?.jobId, 'estimates', opened?.estimateId, place];
    const member = memberPlaces.includes(place) && !this.isOn(place) ? this.selection.member()?.id : undefined;
    return member ? this.router.createUrlTree(path, { queryParams: { member } }) : path;
  }
}
