import type { WordValues } from '#shared/words/word-code';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

export interface AuditRow extends WorkshopRow {
  readonly at: Date;
  readonly accountId: string | null;
  /** The name as it was then. */
  readonly name: string;
  readonly subjectKind: string;
  readonly subjectId: string;
  readonly jobId: string | null;
  readonly code: string;
  readonly values: WordValues;
  readonly before: unknown;
  readonly after: unknown;
}

export const auditTable = (database: Database) =>
  database.table<AuditRow>('audit', {
    workshopId: column.workshopId,
    id: column.id,
    at: column.instant,
    accountId: column.reference,
    name: column.word,
    subjectKind: column.word,
    subjectId: column.reference,
    jobId: column.reference,
    code: column.word,
    values: column.json,
    before: column.json,
    after: column.json,
  });
