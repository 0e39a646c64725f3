import { dayOfInstant } from '#shared/calendar/day-of-instant';

const hour_milliseconds = 3_600_000;

/** The first instant after a day in a zone, to the millisecond; zones lie within a day of UTC on either side. */
export function instantAfterDay(day: string, timeZone: string): Date {
  const midnight = Date.parse(`${day}T00:00:00Z`);
  let [inside, after] = [midnight - 15 * hour_milliseconds, midnight + 40 * hour_milliseconds];
  while (after - inside > 1) {
    const middle = Math.floor((inside + after) / 2);
    if (dayOfInstant(middle, timeZone) > day) after = middle;
    else inside = middle;
  }
  return new Date(after);
}
