import type { WorkingTime } from '#shared/drying/working-time';

/** Minutes of a day of 24 hours. Minute 0 is the start of work on the first day of a week. */
export const dayLength_minutes = 1440;

const dayOf = (at_minutes: number): number => Math.floor(at_minutes / dayLength_minutes);

/** The first moment of work at or after a moment, in clock minutes. */
export function nextWorkingMinute(at_minutes: number, { day_minutes, days }: WorkingTime): number {
  const day = dayOf(at_minutes);
  if (day % 7 < days && at_minutes - day * dayLength_minutes < day_minutes) return at_minutes;
  const tomorrow = day + 1;
  const next = tomorrow % 7 < days ? tomorrow : Math.ceil(tomorrow / 7) * 7;
  return next * dayLength_minutes;
}

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

/** Working days touched from the start of the first day to a moment. */
export function workingDaysUntil(at_minutes: number, { days }: WorkingTime): number {
  const whole = Math.ceil(at_minutes / dayLength_minutes);
  return Math.floor(whole / 7) * days + Math.min(days, whole % 7);
}
