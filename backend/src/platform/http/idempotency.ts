import { createHash } from 'node:crypto';
import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../clock/clock';
import type { Database } from '../database/database';
import { errorNumber } from '../database/failure';

interface KeyRow {
  readonly contentHash: string;
  readonly answer: unknown;
}

/** What a key is bound to: who uses it, and what they asked with it. */
export interface KeyedRequest {
  readonly scope: string;
  readonly key: string;
  readonly content: string;
}

const published = /^[\x21-\x7e]{16,80}$/;
const hashOf = (text: string): string => createHash('sha256').update(text).digest('hex');
const [duplicate, lockTaken] = [1062, 1205];

/** The Idempotency-Key of a request; refuses one that is missing or not 16 to 80 printable characters. */
export function keyOf(header: string | undefined): string {
  const key = header?.replace(/^"(.*)"$/, '$1') ?? '';
  if (!published.test(key)) throw new Rejection('invalid', 'problem-no-key');
  return key;
}

/**
 * Runs work once for each key, in the caller's transaction (draft-ietf-httpapi-idempotency-key-header-07): done before → the first
 * answer again, with other content → 422, still running → 409. Keys are kept for a day.
 */
export class IdempotencyKeys {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
  ) {}

  async once(request: KeyedRequest, work: () => Promise<unknown>): Promise<unknown> {
    const known = await this.claim(request);
    if (known) return known.answer ?? undefined;
    const answer = await work();
    await this.database.execute(
      'UPDATE idempotency_keys SET answer = :answer WHERE scope_hash = :scope AND key_hash = :key',
      {
        ...this.names(request),
        answer: JSON.stringify(answer ?? null),
      },
    );
    return answer;
  }

  sweep(): Promise<number> {
    const dayAgo = new Date(this.clock.now().getTime() - 86_400_000);
    return this.database.execute('DELETE FROM idempotency_keys WHERE created_at < :dayAgo', { dayAgo });
  }

  private names(request: KeyedRequest) {
    return { scope: hashOf(request.scope), key: hashOf(request.key), content: hashOf(request.content) };
  }

  private async claim(request: KeyedRequest): Promise<KeyRow | undefined> {
    try {
      await this.database.execute(
        `SET STATEMENT innodb_lock_wait_timeout = 0 FOR
         INSERT INTO idempotency_keys (scope_hash, key_hash, content_hash, created_at) VALUES (:scope, :key, :content, :now)`,
        { ...this.names(request), now: this.clock.now() },
      );
      return undefined;
    } catch (error) {
      const number = errorNumber(error);
      if (number === lockTaken) throw new Rejection('conflict', 'problem-key-running', { retryAfter_seconds: 1 });
      if (number !== duplicate) throw error;
      return this.done(request);
    }
  }

  private async done(request: KeyedRequest): Promise<KeyRow> {
    const { scope, key, content } = this.names(request);
    const [row] = await this.database.select<KeyRow>(
      'SELECT content_hash AS contentHash, answer FROM idempotency_keys WHERE scope_hash = :scope AND key_hash = :key',
      { scope, key },
    );
    if (!row) throw new Rejection('conflict', 'problem-key-running', { retryAfter_seconds: 1 });
    if (row.contentHash !== content) throw new Rejection('unprocessable', 'problem-key-reused');
    return row;
  }
}
