import type { RateCard } from '#shared/rate-cards/rate-card';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** A rate card without its content, for lists. */
export interface RateCardHead extends VersionedRow {
  readonly name: string;
  /** The first day it is worked with; null while it is a draft. */
  readonly inForceFrom: string | null;
  /** The dated card it was copied from, or whose copy it was copied from. */
  readonly basedOnId: string | null;
  readonly changedAt: Date;
}

export interface RateCardRow extends RateCardHead {
  readonly content: RateCard;
}

export const rateCardTable = (database: Database) =>
  database.table<RateCardRow>('rate_cards', {
    workshopId: column.workshopId,
    id: column.id,
    version: column.whole,
    name: column.word,
    inForceFrom: column.day,
    basedOnId: column.reference,
    content: column.json,
    changedAt: column.instant,
  });
