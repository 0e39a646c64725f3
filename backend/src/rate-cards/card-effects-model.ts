import type { CardEffect } from '#shared/rate-cards/card-effects';
import type { CardEffectsState } from '#shared/rate-cards/card-effects-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** What a card would do to the open estimates, as it was worked out last. The id is the card's. */
export interface CardEffectsRow extends WorkshopRow {
  /** Which asking this answers: what an older task brings is thrown away. */
  readonly runId: string;
  /** The version of the card it was worked out from. */
  readonly cardVersion: number;
  readonly state: Exclude<CardEffectsState, 'none'>;
  readonly worked: number;
  readonly total: number;
  readonly workedAt: Date | null;
  readonly effects: readonly CardEffect[];
}

export const cardEffectsTable = (database: Database) =>
  database.table<CardEffectsRow>('card_effects', {
    workshopId: column.workshopId,
    id: column.id,
    runId: column.reference,
    cardVersion: column.whole,
    state: column.word,
    worked: column.whole,
    total: column.whole,
    workedAt: column.instant,
    effects: column.json,
  });
