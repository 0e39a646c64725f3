import { createHash } from 'node:crypto';
import { Store, type SessionData } from 'express-session';
import type { Clock } from '../clock/clock';
import type { Database } from '../database/database';
import './session-data';

/**
 * Half an hour without a request, twelve hours in all (NIST SP 800-63B-4, AAL2); marked as used at most once a minute. A stranger who
 * only looks at the sign-in page may take two hours over it.
 */
export const sessionLife = { idle_minutes: 30, stranger_minutes: 120, whole_minutes: 720, mark_minutes: 1 } as const;

interface SessionRow {
  readonly content: SessionData;
  readonly createdAt: Date;
  readonly seenAt: Date;
}

type Done = (error?: unknown) => void;
type Reading = (error: unknown, session?: SessionData | null) => void;

const hashOf = (id: string): string => createHash('sha256').update(id).digest('hex');
const minutesBefore = (now: Date, minutes: number): Date => new Date(now.getTime() - minutes * 60_000);
const settle = (work: Promise<unknown>, done: Done = () => undefined): void => void work.then(() => done(), done);

/** Says of a session's request that nobody's hand made it; not written down with the session. */
export const markUnattended = (session: object): object =>
  Object.defineProperty(session, 'unattended', { value: true, enumerable: false });

/** Not written down with the session, so that it does not look changed by it. */
const markWritten = (session: object): object =>
  Object.defineProperty(session, 'isWritten', { value: true, enumerable: false, configurable: true });

const beginning = `INSERT INTO sessions (id_hash, id, account_id, membership_id, content, created_at, seen_at)
  VALUES (:hash, :handle, :accountId, :membershipId, :content, :begun, :now)`;
const changing = `UPDATE sessions SET account_id = :accountId, membership_id = :membershipId, content = :content
  WHERE id_hash = :hash`;

/** Sessions in the database: only the SHA-256 of an id is kept, and both ends of a session are checked when it is read. */
export class SessionStore extends Store {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
  ) {
    super();
  }

  override get(id: string, done: Reading): void {
    this.read(id).then((session) => done(null, session), done);
  }

  override set(id: string, session: SessionData, done?: Done): void {
    settle(this.write(id, session), done);
  }

  override touch(id: string, session: SessionData, done?: Done): void {
    const marked = session.seenAt > minutesBefore(this.clock.now(), sessionLife.mark_minutes).getTime();
    settle(session.unattended || marked ? Promise.resolve() : this.mark(id), done);
  }

  override destroy(id: string, done?: Done): void {
    settle(this.end(id), done);
  }

  /** Whether there was such a session to end. */
  async end(id: string): Promise<boolean> {
    return (await this.database.execute('DELETE FROM sessions WHERE id_hash = :hash', { hash: hashOf(id) })) > 0;
  }

  endOfHandle(handle: string): Promise<number> {
    return this.database.execute('DELETE FROM sessions WHERE id = :handle', { handle });
  }

  /** Deletes the sessions that have ended; answers how many. */
  sweep(): Promise<number> {
    return this.database.execute(
      'DELETE FROM sessions WHERE seen_at <= IF(account_id IS NULL, :stranger, :idle) OR created_at <= :whole',
      this.ends(),
    );
  }

  private ends() {
    const now = this.clock.now();
    return {
      idle: minutesBefore(now, sessionLife.idle_minutes),
      stranger: minutesBefore(now, sessionLife.stranger_minutes),
      whole: minutesBefore(now, sessionLife.whole_minutes),
    };
  }

  private async read(id: string): Promise<SessionData | null> {
    const [row] = await this.database.select<SessionRow>(
      `SELECT content, created_at AS createdAt, seen_at AS seenAt FROM sessions
       WHERE id_hash = :hash AND seen_at > IF(account_id IS NULL, :stranger, :idle) AND created_at > :whole`,
      { hash: hashOf(id), ...this.ends() },
    );
    return row ? { ...row.content, begunAt: row.createdAt.getTime(), seenAt: row.seenAt.getTime() } : null;
  }

  /** A session that was written or read before is only changed: one that has ended meanwhile does not come back. */
  private async write(id: string, session: SessionData): Promise<void> {
    const user = session.passport?.user;
    const now = this.clock.now();
    const isKnown = session.seenAt !== undefined || session.isWritten === true;
    await this.database.execute(isKnown ? changing : beginning, {
      hash: hashOf(id),
      handle: session.handle,
      accountId: user?.accountId ?? null,
      membershipId: user?.membershipId ?? null,
      content: JSON.stringify(session),
      ...(isKnown ? {} : { begun: new Date(session.begunAt ?? now), now }),
    });
    markWritten(session);
  }

  private mark(id: string): Promise<number> {
    return this.database.execute('UPDATE sessions SET seen_at = :now WHERE id_hash = :hash', {
      hash: hashOf(id),
      now: this.clock.now(),
    });
  }
}
