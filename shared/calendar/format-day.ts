import { type Day, dayNumber } from '#shared/calendar/day';

const millisecondsPerDay = 86_400_000;
const day1970 = dayNumber('1970-01-01');

/** A day written in full (3 March 2026) or short (03/03/2026), in a locale's own order and words. */
export function formatDay(day: Day, locale: string, style: 'long' | 'short' = 'long'): string {
  const month = style === 'long' ? 'long' : '2-digit';
  const dayOfMonth = style === 'long' ? 'numeric' : '2-digit';
  const format = new Intl.DateTimeFormat(locale, {
    timeZone: 'UTC',
    calendar: 'gregory',
    numberingSystem: 'latn',
    year: 'numeric',
    month,
    day: dayOfMonth,
  });
  return format.format((dayNumber(day) - day1970) * millisecondsPerDay);
}
