import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** One entry of the thread of a job, about one of its issues. */
export interface QuestionRow extends WorkshopRow {
  readonly jobId: string;
  readonly issueId: string;
  readonly author: 'client' | 'workshop';
  readonly name: string;
  readonly accountId: string | null;
  readonly text: string;
  readonly at: Date;
}

export const questionTable = (database: Database) =>
  database.table<QuestionRow>('questions', {
    workshopId: column.workshopId,
    id: column.id,
    jobId: column.reference,
    issueId: column.reference,
    author: column.word,
    name: column.word,
    accountId: column.reference,
    text: column.text,
    at: column.instant,
  });
