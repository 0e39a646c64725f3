import { migration } from '../src/platform/database/migration';

/** Whether an estimate is the job's own, or varies what was agreed on it. */
export const variations = migration('0031-variations', [
  `ALTER TABLE estimates ADD COLUMN IF NOT EXISTS kind VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'estimate' AFTER job_id`,
]);
