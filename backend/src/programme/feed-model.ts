import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** A calendar other programs read; only the hash of its secret is kept. */
export interface FeedRow extends WorkshopRow {
  readonly name: string;
  /** Whose work is in it; null: everybody's. */
  readonly personId: string | null;
  readonly secretHash: string;
  readonly madeBy: string;
  /** Whose access it stands and falls with where it shows everybody's work. */
  readonly membershipId: string;
  readonly madeAt: Date;
  readonly revokedAt: Date | null;
  readonly readAt: Date | null;
}

export const feedTable = (database: Database) =>
  database.table<FeedRow>('calendar_feeds', {
    workshopId: column.workshopId,
    id: column.id,
    name: column.word,
    personId: column.reference,
    secretHash: column.hash,
    madeBy: column.word,
    membershipId: column.reference,
    madeAt: column.instant,
    revokedAt: column.instant,
    readAt: column.instant,
  });
