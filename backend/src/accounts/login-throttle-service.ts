import { createHash } from 'node:crypto';
import type { ClientActor } from '#shared/actor/client-actor';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode } from '#shared/words/word-code';
import type { Clock } from '../platform/clock/clock';
import type { LoginAttemptRepository } from './login-attempt-repository';
import { loginThrottlePolicy, type LoginCount, type LoginScope } from './login-throttle-policy';

const trust_milliseconds = 180 * 24 * 60 * 60_000;

const markOf = (...parts: readonly string[]): string => createHash('sha256').update(parts.join('\n')).digest('hex');

/**
 * Holds off guessing by doubling waits. Mainly by account and address together, so that a stranger's failures do not shut the owner
 * out at another address; by address alone against many accounts; by account alone against many addresses (at most 100 failures in
 * a row, NIST SP 800-63B-4, are reached only after days), not counted against addresses from which that person has signed in.
 * Kept in the database, so that all servers count together and a restart forgives nothing.
 */
export class LoginThrottleService {
  constructor(
    private readonly attempts: LoginAttemptRepository,
    private readonly clock: Clock,
  ) {}

  /** Counts an attempt before it is tried, so that many at once are no way around; refuses one that comes too soon. */
  async begin(email: string, address: string): Promise<void> {
    await this.count('sign-in-too-often', () => this.scopesOf(email, address));
  }

  /** The same for the opening of a client's link, by address alone: a link that fits nothing is a guess. */
  async beginLink(address: string): Promise<void> {
    const scopes = new Map<string, LoginScope>([[markOf('link', address), 'link']]);
    await this.count('visit-too-often', () => Promise.resolve(scopes));
  }

  /** The same for letters with a link to sign in by, known address or not: nobody is flooded with mail, and none learns who is known. */
  async beginLetter(email: string, address: string): Promise<void> {
    const scopes = new Map<string, LoginScope>([
      [markOf('letter', email.toLowerCase()), 'letter'],
      [markOf('letter-address', address), 'letter-address'],
    ]);
    await this.count('sign-in-letter-too-often', () => Promise.resolve(scopes));
  }

  /** The same for what a client asks the workshop, each question being a mail to it. */
  async beginQuestion({ workshopId, clientId }: ClientActor, address: string): Promise<void> {
    const scopes = new Map<string, LoginScope>([
      [markOf('question', workshopId, clientId), 'question'],
      [markOf('question-address', address), 'question-address'],
    ]);
    await this.count('question-too-often', () => Promise.resolve(scopes));
  }

  /** The link opened something: it is not counted. */
  async linkOpened(address: string): Promise<void> {
    await this.attempts.apart(() => this.attempts.giveBack(markOf('link', address)));
  }

  /** The attempt was right: the person's own counts are cleared, the address only gets this one back. */
  async succeeded(email: string, address: string): Promise<void> {
    const now = this.clock.now();
    await this.attempts.apart(async () => {
      for (const mark of [markOf('pair', email, address), markOf('account', email)].toSorted())
        await this.attempts.clear(mark);
      await this.attempts.giveBack(markOf('address', address));
      await this.attempts.trust(markOf('trust', email, address), now);
    });
  }

  async sweep(): Promise<void> {
    const now = this.clock.now().getTime();
    const before = (age: number) => new Date(now - age);
    await this.attempts.sweep({
      counts: before(loginThrottlePolicy.memory_milliseconds),
      trust: before(trust_milliseconds),
    });
  }

  private async count(code: WordCode, scopesOf: () => Promise<Map<string, LoginScope>>): Promise<void> {
    const now = this.clock.now();
    const wait_milliseconds = await this.attempts.apart(async () => this.counted(await scopesOf(), now));
    if (wait_milliseconds === 0) return;
    const retryAfter_seconds = Math.ceil(wait_milliseconds / 1_000);
    throw new Rejection('too-many', code, { values: { seconds: retryAfter_seconds }, retryAfter_seconds });
  }

  /** How long is still to be waited; where nothing is, the attempt is counted. */
  private async counted(scopes: ReadonlyMap<string, LoginScope>, now: Date): Promise<number> {
    const counts = await this.attempts.hold([...scopes.keys()], now);
    const known = [...scopes].map(([mark, scope]) => ({ mark, scope, count: counts.get(mark) as LoginCount }));
    const wait = Math.max(
      ...known.map(({ scope, count }) => loginThrottlePolicy.leftToWait_milliseconds(scope, count, now)),
    );
    if (wait > 0) return wait;
    for (const { mark, count } of known)
      await this.attempts.write(mark, { failures: loginThrottlePolicy.failuresWith(count, now), lastAt: now });
    return 0;
  }

  private async scopesOf(email: string, address: string): Promise<Map<string, LoginScope>> {
    const scopes = new Map<string, LoginScope>([
      [markOf('pair', email, address), 'pair'],
      [markOf('address', address), 'address'],
    ]);
    if (!(await this.attempts.isTrusted(markOf('trust', email, address))))
      scopes.set(markOf('account', email), 'account');
    return scopes;
  }
}
