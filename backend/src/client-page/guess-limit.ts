import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';

interface Count {
  readonly failures: number;
  readonly lastAt: number;
}

const free = 10;
const longestWait_milliseconds = 15 * 60_000;
const memory_milliseconds = 60 * 60_000;
const mostCounts = 20_000;

const wait_milliseconds = (failures: number): number =>
  failures < free ? 0 : Math.min(1_000 * 2 ** Math.min(failures - free, 20), longestWait_milliseconds);

/**
 * Holds off the guessing of links by doubling waits after ten wrong ones from one address within an hour. A link of 256 bits cannot be
 * guessed anyway; this keeps the trying cheap for us. Kept in memory: a restart forgives.
 */
export class GuessLimit {
  private readonly counts = new Map<string, Count>();

  constructor(private readonly clock: Clock) {}

  /** Counts an attempt before it is tried, so that many at once are no way around; refuses one that comes too soon. */
  begin(address: string): void {
    const now = this.clock.now().getTime();
    const known = this.counts.get(address);
    const count = known && now - known.lastAt <= memory_milliseconds ? known : { failures: 0, lastAt: now };
    const until = count.lastAt + wait_milliseconds(count.failures);
    if (until > now) {
      const retryAfter_seconds = Math.ceil((until - now) / 1_000);
      throw new Rejection('too-many', 'visit-too-often', {
        values: { seconds: retryAfter_seconds },
        retryAfter_seconds,
      });
    }
    if (this.counts.size >= mostCounts) this.counts.clear();
    this.counts.set(address, { failures: count.failures + 1, lastAt: now });
  }

  /** The attempt was right: it is not counted. */
  succeeded(address: string): void {
    const count = this.counts.get(address);
    if (count) this.counts.set(address, { ...count, failures: count.failures - 1 });
  }
}
