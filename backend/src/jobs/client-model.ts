import type { ClientContent } from '#shared/jobs/client-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

export interface ClientRow extends VersionedRow, Readonly<ClientContent> {
  /** How many jobs name this client. */
  readonly jobs: number;
  readonly createdAt: Date;
}

export const clientTable = (database: Database) =>
  database.table<ClientRow>('clients', {
    workshopId: column.workshopId,
    id: column.id,
    name: column.word,
    kind: column.word,
    contact: column.word,
    email: column.word,
    telephone: column.word,
    address: column.text,
    website: column.text,
    taxRegistration: column.word,
    note: column.text,
    jobs: column.whole,
    version: column.whole,
    createdAt: column.instant,
  });
