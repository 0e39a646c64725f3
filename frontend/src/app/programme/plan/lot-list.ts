import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  computed,
  effect,
  inject,
  input,
  model,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Formats } from '../../core/formats/formats';
import { LotForm } from './lot-form';
import { ProgrammeStore } from './programme-store';
import { workedLots, type WorkedLot } from './worked-lots';

/** The lots that are coated, each with how it is worked, to be changed one at a time. */
@Component({
  selector: 'app-lot-list',
  imports: [LotForm, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <details #all [open]="isOpen()">
      <summary>
        <h3 i18n>How the lots are worked</h3>
        &ngsp;
        <span class="muted">{{ entered() }}</span>
      </summary>
      <ul class="plain">
        @for (lot of lots(); track lot.lotId) {
          <li>
            <span class="name">
              {{ lot.name }}
              <span class="muted">{{ about(lot) }}</span>
            </span>
            @if (mayEdit() && lot.lotId !== changed()) {
              <button matButton type="button" [attr.aria-label]="changeOf(lot)" (click)="changed.set(lot.lotId)" i18n>
                Change
              </button>
            }
            @if (mayEdit() && lot.lotId === changed()) {
              <app-lot-form [lot]="lot" (closed)="changed.set(undefined)" />
            }
          </li>
        }
      </ul>
    </details>
  `,
  styleUrl: './folded-list.scss',
  styles: `
    app-lot-form {
      flex-basis: 100%;
    }
  `,
})
export class LotList {
  private readonly store = inject(ProgrammeStore);
  private readonly formats = inject(Formats);
  private readonly details = viewChild.required<ElementRef<HTMLDetailsElement>>('all');

  readonly mayEdit = input.required<boolean>();
  /** The lot whose form is open. */
  readonly changed = model<string>();

  protected readonly lots = computed<readonly WorkedLot[]>(() => {
    const answer = this.store.answer();
    return answer ? workedLots(answer) : [];
  });
  protected readonly isOpen = computed(() => this.changed() !== undefined);
  protected readonly entered = computed(() => {
    const count = this.lots().filter(({ input }) => input !== null).length;
    return count === 0 ? $localize`as proposed` : $localize`${this.formats.number(count, 0)}:count: as entered here`;
  });

  constructor() {
    effect(() => {
      if (this.changed()) this.details().nativeElement.scrollIntoView?.({ block: 'nearest' });
    });
  }

  /** “in 3 portions, 2 people at once, shared by up to 3, 2 places of the long rack”. */
  protected about({ portions, crew, mostPeople, places, rack }: WorkedLot): string {
    const [parts, hands, most, held] = [portions, crew, mostPeople, places].map((one) => this.formats.number(one, 0));
    return [
      ...(portions > 1 ? [$localize`in ${parts}:portions: portions`] : []),
      crew > 1 ? $localize`${hands}:people: people at once` : $localize`one person at a time`,
      ...(mostPeople > crew ? [$localize`shared by up to ${most}:people:`] : []),
      ...(rack && places > 0 ? [$localize`${rack.name}:rack:: ${held}:places: of its places`] : []),
    ].join(', ');
  }

  protected changeOf({ name }: WorkedLot): string {
    return $localize`Change how ${name}:lot: is worked`;
  }
}
