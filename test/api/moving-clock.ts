import type { Clock } from '../../backend/src/platform/clock/clock';

/** A clock that goes as time does, further when told, and stands where it is told to. */
export class MovingClock implements Clock {
  private ahead_milliseconds = 0;

  private stands_milliseconds: number | undefined;

  now(): Date {
    return new Date((this.stands_milliseconds ?? Date.now()) + this.ahead_milliseconds);
  }

  /** From here on no time goes by but what it is moved. */
  stand(at = this.now()): void {
    this.stands_milliseconds = at.getTime();
    this.ahead_milliseconds = 0;
  }

  move(by: { minutes?: number; seconds?: number }): void {
    this.ahead_milliseconds += (by.minutes ?? 0) * 60_000 + (by.seconds ?? 0) * 1_000;
  }
}
