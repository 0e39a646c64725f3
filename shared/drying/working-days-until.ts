import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import type { WorkingTime } from '#shared/drying/working-time';

/** Working days touched from the start of the first day to a moment. */
export function workingDaysUntil(at_minutes: number, { days }: WorkingTime): number {
  const whole = Math.ceil(at_minutes / dayLength_minutes);
  return Math.floor(whole / 7) * days + Math.min(days, whole % 7);
}
