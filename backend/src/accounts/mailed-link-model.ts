import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';

/** What a mailed link is good for. */
export type LinkPurpose = 'reset' | 'foundation';

export interface MailedLinkRow {
  readonly tokenHash: string;
  readonly purpose: LinkPurpose;
  /** The e-mail address it went to. */
  readonly about: string;
  readonly content: unknown;
  readonly endsAt: Date;
  readonly usedAt: Date | null;
  readonly createdAt: Date;
}

export const mailedLinkTable = (database: Database) =>
  database.table<MailedLinkRow>('mailed_links', {
    tokenHash: { ...column.hash, primaryKey: true },
    purpose: column.word,
    about: column.word,
    content: column.json,
    endsAt: column.instant,
    usedAt: column.instant,
    createdAt: column.instant,
  });
