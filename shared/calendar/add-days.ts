import { type Day, dayFrom, dayNumber, dayOfNumber, daysInMonth, partsOfDay } from '#shared/calendar/day';

/** The day so many calendar days later (earlier when negative); RangeError for what is no day or leaves the years 0001 to 9999. */
export const addDays = (day: Day, days: number): Day => dayOfNumber(dayNumber(day) + days);

/** Calendar days from one day to another, negative when the other is earlier. */
export const daysBetween = (from: Day, to: Day): number => dayNumber(to) - dayNumber(from);

/** The same day so many months later, or the last of that month where it is shorter (31 January + 1 is 28 or 29 February). */
export function addMonths(day: Day, months: number): Day {
  const [year, month, dayOfMonth] = partsOfDay(day);
  const count = year * 12 + (month - 1) + months;
  const [newYear, newMonth] = [Math.floor(count / 12), (((count % 12) + 12) % 12) + 1];
  return dayFrom(newYear, newMonth, Math.min(dayOfMonth, daysInMonth(newYear, newMonth)));
}

/** The last day an offer made on a day holds when it holds so many calendar days. */
export const validityEnd = (issued: Day, validity_days: number): Day => addDays(issued, validity_days);

/** Order of two days: negative when the first is earlier, 0 when they are one. */
export const compareDays = (one: Day, other: Day): number => dayNumber(one) - dayNumber(other);
