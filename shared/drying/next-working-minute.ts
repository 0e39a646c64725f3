import { dayLength_minutes, dayOf } from '#shared/drying/day-length-minutes';
import type { WorkingTime } from '#shared/drying/working-time';

/** The first moment of work at or after a moment, in clock minutes. */
export function nextWorkingMinute(at_minutes: number, { day_minutes, days }: WorkingTime): number {
  const day = dayOf(at_minutes);
  if (day % 7 < days && at_minutes - day * dayLength_minutes < day_minutes) return at_minutes;
  const tomorrow = day + 1;
  const next = tomorrow % 7 < days ? tomorrow : Math.ceil(tomorrow / 7) * 7;
  return next * dayLength_minutes;
}
