import { migration } from '../src/platform/database/migration';

/** A stage may be reached on a day, whether one was planned for it or not. */
export const reachedStages = migration('0057-reached-stages', [
  `ALTER TABLE stage_days MODIFY COLUMN planned_on DATE NULL, ADD COLUMN IF NOT EXISTS reached_on DATE NULL`,
]);
