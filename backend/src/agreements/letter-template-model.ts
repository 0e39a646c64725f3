import type { LetterKind } from '#shared/agreements/letter-kinds';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** The words of a kind of letter, where a workshop has its own. */
export interface LetterTemplateRow extends VersionedRow {
  readonly kind: LetterKind;
  readonly subject: string;
  readonly text: string;
}

export const letterTemplateTable = (database: Database) =>
  database.table<LetterTemplateRow>('letter_templates', {
    workshopId: column.workshopId,
    id: column.id,
    kind: column.word,
    version: column.whole,
    subject: column.word,
    text: column.text,
  });
