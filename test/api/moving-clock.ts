import type { Clock } from '../../backend/src/platform/clock/clock';

/** A clock that goes as time does, and further when told. */
export class MovingClock implements Clock {
  private ahead_milliseconds = 0;

  now(): Date {
    return new Date(Date.now() + this.ahead_milliseconds);
  }

  move(by: { minutes?: number; seconds?: number }): void {
    this.ahead_milliseconds += (by.minutes ?? 0) * 60_000 + (by.seconds ?? 0) * 1_000;
  }
}
