import type { Database } from '../platform/database/database';
import { outsideTransaction } from '../platform/database/is-in-transaction';
import type { LoginCount } from './login-throttle-policy';

interface CountRow extends LoginCount {
  readonly mark: string;
}

/** Counts of failed sign-ins by mark, and the marks that are trusted. They stand even where the request they came with is rolled back. */
export class LoginAttemptRepository {
  private readonly database: Database;

  constructor(database: Database) {
    this.database = database.aside;
  }

  /** Runs work apart from the request's transaction, in one of its own. */
  apart<T>(work: () => Promise<T>): Promise<T> {
    return outsideTransaction(() => this.database.transaction(work));
  }

  async isTrusted(mark: string): Promise<boolean> {
    const sql = 'SELECT mark FROM login_attempts WHERE mark = :mark AND is_trust';
    return (await this.database.select(sql, { mark })).length > 0;
  }

  trust(mark: string, at: Date): Promise<number> {
    return this.database.execute(
      `INSERT INTO login_attempts (mark, failures, last_at, is_trust) VALUES (:mark, 0, :at, TRUE)
       ON DUPLICATE KEY UPDATE last_at = :at`,
      { mark, at },
    );
  }

  /** The counts of these marks, held until the transaction ends: always in one order, so that two who ask never wait for each other. */
  async hold(marks: readonly string[], at: Date): Promise<ReadonlyMap<string, LoginCount>> {
    const inOrder = marks.toSorted();
    for (const mark of inOrder)
      await this.database.execute(
        'INSERT IGNORE INTO login_attempts (mark, failures, last_at, is_trust) VALUES (:mark, 0, :at, FALSE)',
        { mark, at },
      );
    const rows = await this.database.select<CountRow>(
      'SELECT mark, failures, last_at AS lastAt FROM login_attempts WHERE mark IN (:marks) ORDER BY mark FOR UPDATE',
      { marks: inOrder },
    );
    return new Map(rows.map((row) => [row.mark, row]));
  }

  write(mark: string, { failures, lastAt }: LoginCount): Promise<number> {
    const sql = 'UPDATE login_attempts SET failures = :failures, last_at = :lastAt WHERE mark = :mark';
    return this.database.execute(sql, { mark, failures, lastAt });
  }

  giveBack(mark: string): Promise<number> {
    const sql = 'UPDATE login_attempts SET failures = GREATEST(failures - 1, 0) WHERE mark = :mark';
    return this.database.execute(sql, { mark });
  }

  clear(mark: string): Promise<number> {
    return this.database.execute('UPDATE login_attempts SET failures = 0 WHERE mark = :mark', { mark });
  }

  /** Forgets what is older; the counts and the trust separately. */
  async sweep(before: { readonly counts: Date; readonly trust: Date }): Promise<void> {
    await this.database.execute(
      `DELETE FROM login_attempts WHERE (NOT is_trust AND last_at < :counts) OR (is_trust AND last_at < :trust)`,
      before,
    );
  }
}
