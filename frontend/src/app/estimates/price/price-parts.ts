import { Injectable, computed, inject } from '@angular/core';
import { Router, type UrlTree } from '@angular/router';
import { Formats } from '../../core/formats/formats';
import { EstimateStore } from '../estimate-store';
import type { Part } from '../parts/part';
import { CardsInUse } from './cards-in-use';

/** The parts of the price, in the order one thinks them through. */
export const pricePartKeys = ['lines', 'profit', 'extras', 'stages', 'alternatives', 'card'] as const;
export type PricePartKey = (typeof pricePartKeys)[number];

/** The list of the parts of the price with what each comes to; the office sees those without cost. */
@Injectable()
export class PriceParts {
  private readonly store = inject(EstimateStore);
  private readonly cards = inject(CardsInUse);
  private readonly formats = inject(Formats);
  private readonly router = inject(Router);

  readonly listRoute = computed(() => this.route());
  readonly parts = computed<readonly Part[]>(() => {
    const mine = [this.lines(), this.profit(), this.extras(), this.stages(), this.alternatives(), this.card()];
    return mine.filter((part) => part !== undefined);
  });

  /** The address of a part; of the list without one. */
  route(part?: PricePartKey): UrlTree {
    const opened = this.store.ids();
    const path = ['/jobs', opened?.jobId, 'estimates', opened?.estimateId, 'price'];
    return this.router.createUrlTree(path, part ? { queryParams: { part } } : {});
  }

  private part(key: PricePartKey, name: string, shown: { about: string; amount: string }): Part {
    return { key, name, ...shown, route: this.route(key) };
  }

  private lines(): Part {
    const net_minor = this.store.priced()?.price.net_minor;
    const isByMember = this.store.settings()?.presentation !== 'kinds';
    return this.part('lines', $localize`Lines`, {
      about: isByMember ? $localize`by member` : $localize`by kind of work`,
      amount: net_minor === undefined ? '' : this.formats.wholeMoney(net_minor),
    });
  }

  private profit(): Part | undefined {
    const cost = this.store.costed()?.cost.price;
    if (!cost) return undefined;
    const margin = cost.marginLeft_percent ?? cost.margin_percent;
    return this.part('profit', $localize`Profit and risk`, {
      about: $localize`margin, contingency, discount, tax`,
      amount: this.formats.figure('percent', Math.round(margin * 10) / 10),
    });
  }

  private extras(): Part | undefined {
    const extras = this.store.settings()?.extras;
    return (
      extras &&
      this.part('extras', $localize`Further lines`, {
        about: $localize`making, packing, transport, fitting`,
        amount: extras.length === 0 ? '' : String(extras.length),
      })
    );
  }

  private stages(): Part {
    const { parts = [], deposit_percent = 0 } = this.store.settings()?.stages ?? {};
    const deposit = this.formats.figure('percent', deposit_percent);
    if ((this.store.priced()?.price.gross_minor ?? 0) < 0)
      return this.part('stages', $localize`Stages of payment`, { about: $localize`none, it is credited`, amount: '' });
    return this.part('stages', $localize`Stages of payment`, {
      about: deposit_percent > 0 ? $localize`deposit of ${deposit}:percent:` : $localize`no deposit`,
      amount: parts.length === 0 ? '' : String(parts.length),
    });
  }

  private alternatives(): Part {
    const count = this.store.settings()?.alternatives.length ?? 0;
    return this.part('alternatives', $localize`Alternatives`, {
      about: $localize`other ways, at their own price`,
      amount: count === 0 ? '' : String(count),
    });
  }

  private card(): Part | undefined {
    if (!this.store.mayEdit()) return undefined;
    return this.part('card', $localize`Rate card`, {
      about: this.cards.used()?.name ?? '',
      amount: this.cards.newer() ? $localize`newer in force` : '',
    });
  }
}
