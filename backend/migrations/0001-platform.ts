import { migration } from '../src/platform/database/migration';

/** Sessions, tasks, keys of requests, and files. */
export const platform = migration('0001-platform', [
  'ALTER DATABASE CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci',
  `CREATE TABLE IF NOT EXISTS sessions (
    id_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL UNIQUE,
    account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    membership_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    content JSON NOT NULL,
    created_at DATETIME(3) NOT NULL,
    seen_at DATETIME(3) NOT NULL,
    KEY sessions_of_account (account_id),
    KEY sessions_by_age (seen_at)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS tasks (
    id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
    kind VARCHAR(60) NOT NULL,
    content JSON NOT NULL,
    attempts INT NOT NULL,
    run_after DATETIME(3) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    failed_at DATETIME(3) NULL,
    last_error VARCHAR(500) NULL,
    KEY tasks_due (failed_at, run_after, id)
  ) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS idempotency_keys (
    scope_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    content_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    answer JSON NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (scope_hash, key_hash),
    KEY keys_by_age (created_at)
  ) ENGINE=InnoDB`,
]);
