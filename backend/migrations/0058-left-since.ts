import { migration } from '../src/platform/database/migration';

/** A mark says when what is left of its work was said; until now nobody had said so after the start (null). */
export const leftSince = migration('0058-left-since', [
  `ALTER TABLE task_marks ADD COLUMN IF NOT EXISTS left_at DATETIME(3) NULL`,
]);
