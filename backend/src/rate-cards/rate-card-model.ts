import type { RateCard } from '#shared/rate-cards/rate-card';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

export interface RateCardRow extends VersionedRow {
  readonly name: string;
  /** The first day it is worked with; null while it is a draft. */
  readonly inForceFrom: string | null;
  readonly basedOnId: string | null;
  readonly content: RateCard;
  readonly changedAt: Date;
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
