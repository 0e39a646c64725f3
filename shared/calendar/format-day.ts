import { type Day, dayNumber } from '#shared/calendar/day';

const millisecondsPerDay = 86_400_000;
const day1970 = dayNumber('1970-01-01');

/** A day as pages, papers and letters write it (3 Mar 2026), in a locale's own order and words; RangeError for what is no day. */
export function formatDay(day: Day, locale: string): string {
  const format = new Intl.DateTimeFormat(locale, {
    timeZone: 'UTC',
    calendar: 'gregory',
    numberingSystem: 'latn',
    year: 'numeric',
    month: 'short',
    day: 'numeric',
  });
  return format.format((dayNumber(day) - day1970) * millisecondsPerDay);
}
