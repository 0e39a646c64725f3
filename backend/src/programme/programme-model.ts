import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** The programme of an estimate, whose id it bears. Minutes of what is kept are counted from the first day noted in it. */
export interface ProgrammeRow extends VersionedRow {
  /** Nothing of the programme lies before it. */
  readonly firstDay: string;
  readonly inputs: ProgrammeInputs;
  /** The plan with what it was made from (`kept-plan.ts`), gzipped; null before the first. */
  readonly kept: Buffer | null;
  /** The issue a slot is held for, to the last day of its validity. */
  readonly holdIssueId: string | null;
  readonly holdUntil: string | null;
  readonly changedAt: Date;
}

export const programmeTable = (database: Database) =>
  database.table<ProgrammeRow>('programmes', {
    workshopId: column.workshopId,
    id: column.id,
    version: column.whole,
    firstDay: column.day,
    inputs: column.json,
    kept: column.bytes,
    holdIssueId: column.reference,
    holdUntil: column.day,
    changedAt: column.instant,
  });
