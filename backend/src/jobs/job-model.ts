import type { JobContent, JobState, ReachedState } from '#shared/jobs/job-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

export interface JobRow extends VersionedRow, Readonly<JobContent> {
  /** Its number in the year it was opened in. */
  readonly year: number;
  readonly ordinal: number;
  readonly state: JobState;
  /** Where its issues have brought it, also while it is finished. */
  readonly reached: ReachedState;
  readonly changedAt: Date;
  readonly createdAt: Date;
}

/** A job with what its client is called. */
export interface NamedJobRow extends JobRow {
  readonly clientName: string;
}

export const jobTable = (database: Database) =>
  database.table<JobRow>('jobs', {
    workshopId: column.workshopId,
    id: column.id,
    clientId: column.reference,
    year: column.whole,
    ordinal: column.whole,
    title: column.word,
    kind: column.word,
    reference: column.word,
    site: column.word,
    note: column.text,
    state: column.word,
    reached: column.word,
    version: column.whole,
    changedAt: column.instant,
    createdAt: column.instant,
  });
