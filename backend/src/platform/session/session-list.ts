import type { Database } from '../database/database';
import { sessionLife } from './session-store';

/** A session of a person, as they may see it. */
export interface ListedSession {
  readonly id: string;
  readonly agent: string;
  readonly createdAt: Date;
  readonly seenAt: Date;
}

/** The sessions people have, for those who want to see or end them. */
export class SessionList {
  constructor(private readonly database: Database) {}

  of(accountId: string, now: Date): Promise<ListedSession[]> {
    return this.database.select<ListedSession>(
      `SELECT id, JSON_VALUE(content, '$.agent') AS agent, created_at AS createdAt, seen_at AS seenAt FROM sessions
       WHERE account_id = :accountId AND seen_at > :idle AND created_at > :whole ORDER BY seen_at DESC LIMIT 100`,
      {
        accountId,
        idle: minutesBefore(now, sessionLife.idle_minutes),
        whole: minutesBefore(now, sessionLife.whole_minutes),
      },
    );
  }

  async end(accountId: string, id: string): Promise<boolean> {
    return (
      (await this.database.execute('DELETE FROM sessions WHERE account_id = :accountId AND id = :id', {
        accountId,
        id,
      })) > 0
    );
  }

  endOthers(accountId: string, keptId = ''): Promise<number> {
    return this.database.execute('DELETE FROM sessions WHERE account_id = :accountId AND id <> :keptId', {
      accountId,
      keptId,
    });
  }

  endMembership(membershipId: string): Promise<number> {
    return this.database.execute('DELETE FROM sessions WHERE membership_id = :membershipId', { membershipId });
  }
}

const minutesBefore = (now: Date, minutes: number): Date => new Date(now.getTime() - minutes * 60_000);
