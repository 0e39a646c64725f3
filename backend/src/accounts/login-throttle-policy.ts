import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';

interface Count {
  readonly failures: number;
  readonly lastAt: number;
}

/** How many failures are free, before waits of 1, 2, 4 … seconds begin. */
const free = { pair: 5, address: 30, account: 60 } as const;
const longestWait_milliseconds = 15 * 60_000;
const memory_milliseconds = 60 * 60_000;
const mostCounts = 50_000;

type Scope = keyof typeof free;

const wait_milliseconds = (scope: Scope, failures: number): number =>
  failures < free[scope] ? 0 : Math.min(1_000 * 2 ** Math.min(failures - free[scope], 20), longestWait_milliseconds);

/**
 * Holds off guessing by doubling waits. Mainly by account and address together, so that a stranger's failures do not shut the owner
 * out at another address; by address alone against many accounts; by account alone against many addresses (at most 100 failures in
 * a row, NIST SP 800-63B-4, are reached only after days), not counted against addresses from which that person has signed in.
 * Kept in memory: a restart forgives, the waits begin anew.
 */
export class LoginThrottlePolicy {
  private readonly counts = new Map<string, Count>();
  private readonly trusted = new Set<string>();

  constructor(private readonly clock: Clock) {}

  /** Counts an attempt before it is tried, so that many at once are no way around; refuses one that comes too soon. */
  begin(email: string, address: string): void {
    const keys = this.keysOf(email, address);
    const now = this.clock.now().getTime();
    const until = Math.max(...keys.map(([scope, key]) => this.freeAt(scope, key, now)));
    if (until > now) {
      const retryAfter_seconds = Math.ceil((until - now) / 1_000);
      throw new Rejection('too-many', 'sign-in-too-often', {
        values: { seconds: retryAfter_seconds },
        retryAfter_seconds,
      });
    }
    for (const [scope, key] of keys) this.add(`${scope} ${key}`, now);
  }

  /** The attempt was right: the person's own counts are cleared, the address only gets this one back. */
  succeeded(email: string, address: string): void {
    this.counts.delete(`pair ${email} ${address}`);
    this.counts.delete(`account ${email}`);
    const count = this.counts.get(`address ${address}`);
    if (count) this.counts.set(`address ${address}`, { ...count, failures: count.failures - 1 });
    this.trusted.add(`${email} ${address}`);
  }

  private keysOf(email: string, address: string): [Scope, string][] {
    const own: [Scope, string][] = [
      ['pair', `${email} ${address}`],
      ['address', address],
    ];
    return this.trusted.has(`${email} ${address}`) ? own : [...own, ['account', email]];
  }

  private freeAt(scope: Scope, key: string, now: number): number {
    const count = this.counts.get(`${scope} ${key}`);
    if (!count || now - count.lastAt > memory_milliseconds) return 0;
    const wait = wait_milliseconds(scope, count.failures);
    return wait === 0 ? 0 : count.lastAt + wait;
  }

  private add(key: string, now: number): void {
    const known = this.counts.get(key);
    const failures = known && now - known.lastAt <= memory_milliseconds ? known.failures + 1 : 1;
    if (this.counts.size >= mostCounts) this.forget(now);
    this.counts.set(key, { failures, lastAt: now });
  }

  private forget(now: number): void {
    for (const [key, { lastAt }] of this.counts) if (now - lastAt > memory_milliseconds) this.counts.delete(key);
    const oldest = [...this.counts.keys()].slice(0, Math.max(0, this.counts.size - mostCounts / 2));
    for (const key of oldest) this.counts.delete(key);
  }
}
