import { Injectable, computed, inject, resource } from '@angular/core';
import { firstValueFrom } from 'rxjs';
import type { Figures } from '#shared/estimates/figures';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import { listRateCards, readRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { Api } from '../../core/api/api';
import { EstimateStore } from '../estimate-store';
import { RISK_STARTER } from '../figures/risk-starter';
import { workedBy } from './alternative-totals';

/** What taking the card in force would make of the estimate: both workings of the base, and how many lines of the cards differ. */
export interface CardChange {
  readonly before: Figures;
  readonly after: Figures;
  readonly cardLines: number;
}

/** The card the estimate is worked on, the one in force, and what would change from one to the other. */
@Injectable()
export class CardsInUse {
  private readonly api = inject(Api);
  private readonly store = inject(EstimateStore);
  private readonly startRisk = inject(RISK_STARTER);
  private readonly listed = resource({
    params: () => (this.store.mayEdit() ? this.store.head()?.rateCardId : undefined),
    loader: ({ abortSignal }) => this.api.call(listRateCards, { query: { limit: 100 }, signal: abortSignal }),
  });
  private readonly cards = computed(() => (this.listed.hasValue() ? this.listed.value().items : []));

  readonly used = computed(() => this.cards().find(({ id }) => id === this.store.head()?.rateCardId));
  readonly inForce = computed(() => this.cards().find(({ state }) => state === 'in-force'));
  /** The card in force where the estimate is worked on another. */
  readonly newer = computed(() => {
    const [used, inForce] = [this.used(), this.inForce()];
    return used && inForce && used.id !== inForce.id ? inForce : undefined;
  });

  /** Works the base on both cards; nothing is changed by it. */
  async change(rateCardId: string): Promise<CardChange | undefined> {
    const [draft, before, currency] = [this.store.draft(), this.store.card(), this.store.head()?.currency];
    if (!draft || !before || !currency) return undefined;
    const { content: after } = await this.api.call(readRateCard, { params: { rateCardId } });
    const worked = (card: RateCard) => firstValueFrom(workedBy(this.startRisk, { draft, choice: [], card, currency }));
    const [one, other] = [await worked(before), await worked(after)];
    return { before: one, after: other, cardLines: cardDifferences(before, after).length };
  }
}
