import { migration } from '../src/platform/database/migration';

/** Counts of failed sign-ins, shared by all servers; a mark is a hash, so that no address or name stands here. */
export const loginAttempts = migration('0004-login-attempts', [
  `CREATE TABLE IF NOT EXISTS login_attempts (
    mark CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    failures INT NOT NULL,
    last_at DATETIME(3) NOT NULL,
    is_trust BOOLEAN NOT NULL,
    KEY attempts_by_age (is_trust, last_at)
  ) ENGINE=InnoDB`,
]);
