import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** What an access is good for: the papers of one job, or (signed in by a mailed link) those of all jobs of a client. */
export type AccessPurpose = 'link' | 'sign-in';

/** A client's way in; only the hash of its secret is kept. */
export interface ClientAccessRow extends WorkshopRow {
  readonly clientId: string;
  readonly jobId: string | null;
  readonly purpose: AccessPurpose;
  readonly tokenHash: string;
  readonly createdAt: Date;
  readonly createdBy: string;
  readonly endsAt: Date;
  readonly revokedAt: Date | null;
  readonly openedAt: Date | null;
}

export const clientAccessTable = (database: Database) =>
  database.table<ClientAccessRow>('client_accesses', {
    workshopId: column.workshopId,
    id: column.id,
    clientId: column.reference,
    jobId: column.reference,
    purpose: column.word,
    tokenHash: column.hash,
    createdAt: column.instant,
    createdBy: column.word,
    endsAt: column.instant,
    revokedAt: column.instant,
    openedAt: column.instant,
  });
