import { migration } from '../src/platform/database/migration';
import { hash, id, instant, tableSettings } from './table-parts';

/** Sessions, tasks, keys of requests, and files. */
export const platform = migration('0001-platform', [
  `CREATE TABLE IF NOT EXISTS sessions (
    id_hash ${hash} NOT NULL PRIMARY KEY,
    id ${id} NOT NULL UNIQUE,
    account_id ${id} NULL,
    membership_id ${id} NULL,
    content JSON NOT NULL,
    created_at ${instant} NOT NULL,
    seen_at ${instant} NOT NULL,
    KEY sessions_of_account (account_id),
    KEY sessions_by_age (seen_at)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS tasks (
    id ${id} NOT NULL PRIMARY KEY,
    workshop_id ${id} NULL,
    kind VARCHAR(60) NOT NULL,
    content JSON NOT NULL,
    attempts INT NOT NULL,
    run_after ${instant} NOT NULL,
    created_at ${instant} NOT NULL,
    failed_at ${instant} NULL,
    last_error VARCHAR(500) NULL,
    KEY tasks_due (failed_at, run_after, id)
  ) ${tableSettings}`,
  `CREATE TABLE IF NOT EXISTS idempotency_keys (
    scope_hash ${hash} NOT NULL,
    key_hash ${hash} NOT NULL,
    content_hash ${hash} NOT NULL,
    answer JSON NULL,
    created_at ${instant} NOT NULL,
    PRIMARY KEY (scope_hash, key_hash),
    KEY keys_by_age (created_at)
  ) ${tableSettings}`,
]);
