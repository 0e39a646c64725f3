import { Injectable, inject } from '@angular/core';
import type { CardDifference } from '#shared/rate-cards/card-differences';
import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import {
  copyRateCard,
  exportRateCard,
  importRateCard,
  keepRateCard,
  listRateCards,
  putRateCardInForce,
  readCardDifferences,
  readCardEffects,
  readRateCard,
  removeRateCard,
  takeRateCardBack,
  workCardEffects,
  type WholeRateCard,
} from '#shared/rate-cards/rate-cards-endpoints';
import { Api } from '../core/api/api';
import type { ListPage } from '../core/lists/paged-list';

/** A card as somebody saw it. */
export interface SeenCard {
  readonly id: string;
  readonly version: number;
}

/** What is kept of a draft. */
export interface CardEntries {
  readonly name: string;
  readonly content: RateCard;
}

/** Two cards line by line. */
export interface ComparedCards {
  readonly against: RateCardSummary;
  readonly differences: readonly CardDifference[];
}

const at = ({ id, version }: SeenCard) => ({ params: { rateCardId: id }, version });
const of = (rateCardId: string) => ({ params: { rateCardId } });

/** The calls about rate cards. */
@Injectable({ providedIn: 'root' })
export class RateCardCalls {
  private readonly api = inject(Api);

  list(cursor: string | undefined, signal: AbortSignal): Promise<ListPage<RateCardSummary>> {
    return this.api.call(listRateCards, { query: { cursor }, signal });
  }

  read(id: string, signal?: AbortSignal): Promise<WholeRateCard> {
    return this.api.call(readRateCard, { ...of(id), ...(signal ? { signal } : {}) });
  }

  copy(fromId: string, draft: { readonly id: string; readonly name: string }): Promise<RateCardSummary> {
    return this.api.call(copyRateCard, { ...of(fromId), body: draft });
  }

  keep(seen: SeenCard, { name, content }: CardEntries): Promise<RateCardSummary> {
    // The schema's own types are those of plain JSON; the card's are the same and cannot be written to.
    return this.api.call(keepRateCard, { ...at(seen), body: { name, content: content as WholeRateCard['content'] } });
  }

  async remove(seen: SeenCard): Promise<void> {
    await this.api.call(removeRateCard, at(seen));
  }

  /** A draft is compared as if it began on a day. */
  differences(id: string, from: string, signal: AbortSignal): Promise<ComparedCards> {
    return this.api.call(readCardDifferences, { ...of(id), query: { from }, signal });
  }

  workEffects(id: string): Promise<CardEffectsAnswer> {
    return this.api.call(workCardEffects, of(id));
  }

  /** Asked again and again by the page itself, so it does not prolong the session. */
  effects(id: string, signal: AbortSignal): Promise<CardEffectsAnswer> {
    return this.api.call(readCardEffects, { ...of(id), signal, unattended: true });
  }

  putInForce(seen: SeenCard, from: string): Promise<RateCardSummary> {
    return this.api.call(putRateCardInForce, { ...at(seen), body: { from } });
  }

  takeBack(seen: SeenCard): Promise<RateCardSummary> {
    return this.api.call(takeRateCardBack, at(seen));
  }

  workbook(id: string): Promise<Blob> {
    return this.api.call(exportRateCard, of(id));
  }

  fill(seen: SeenCard, file: File): Promise<RateCardSummary> {
    return this.api.call(importRateCard, { ...at(seen), file });
  }
}
