import { dayLength_minutes, dayOf } from '#shared/drying/day-length-minutes';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import type { WorkingTime } from '#shared/drying/working-time';

/** The moment work of so many clock minutes ends that starts at a moment of work; it is laid down at the end of each day. */
export function endOfWork(start_minutes: number, work_minutes: number, time: WorkingTime): number {
  let at = start_minutes;
  let left = work_minutes;
  while (left > 0) {
    at = nextWorkingMinute(at, time);
    const untilEvening = dayOf(at) * dayLength_minutes + time.day_minutes - at;
    const done = Math.min(left, untilEvening);
    at += done;
    left -= done;
  }
  return at;
}
