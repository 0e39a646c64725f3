import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** Where a task of a programme really stands. */
export interface MarkRow extends WorkshopRow {
  readonly programmeId: string;
  readonly taskId: string;
  readonly startedAt: Date;
  readonly endedAt: Date | null;
  readonly leftMinutes: number;
  /** When that was left; null: at its start. */
  readonly leftAt: Date | null;
  readonly personIds: readonly string[];
}

export const markTable = (database: Database) =>
  database.table<MarkRow>('task_marks', {
    workshopId: column.workshopId,
    id: column.id,
    programmeId: column.reference,
    taskId: column.word,
    startedAt: column.instant,
    endedAt: column.instant,
    leftMinutes: column.whole,
    leftAt: column.instant,
    personIds: column.json,
  });
