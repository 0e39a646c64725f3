import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';

/** A person, whichever workshops they belong to. */
export interface AccountRow {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly passwordHash: string;
  readonly createdAt: Date;
}

export const accountTable = (database: Database) =>
  database.table<AccountRow>('accounts', {
    id: column.id,
    email: column.word,
    name: column.word,
    passwordHash: column.word,
    createdAt: column.instant,
  });
