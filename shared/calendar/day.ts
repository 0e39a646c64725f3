/** A plain date, YYYY-MM-DD, of the years 0001 to 9999: a day in the workshop's own zone, without a time. */
export type Day = string;

const isLeapYear = (year: number): boolean => (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;

/** Days of a month (1…12). */
export const daysInMonth = (year: number, month: number): number =>
  month === 2 ? (isLeapYear(year) ? 29 : 28) : [4, 6, 9, 11].includes(month) ? 30 : 31;

/** Whether a text is a day there is: 2024-02-29 is, 2023-02-29 is not. */
export function isDay(text: string): boolean {
  const found = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  if (!found) return false;
  const [year, month, day] = found.slice(1).map(Number);
  return year >= 1 && month >= 1 && month <= 12 && day >= 1 && day <= daysInMonth(year, month);
}

/** Year, month and day as numbers; RangeError for what is no day. */
export function partsOfDay(day: Day): readonly [number, number, number] {
  if (!isDay(day)) throw new RangeError(`${day} is not a day`);
  return [Number(day.slice(0, 4)), Number(day.slice(5, 7)), Number(day.slice(8, 10))];
}

const padded = (figure: number, length: number): string => String(figure).padStart(length, '0');

/** A day of its year, month and day of the month; RangeError when there is none. */
export function dayFrom(year: number, month: number, dayOfMonth: number): Day {
  const day = `${padded(year, 4)}-${padded(month, 2)}-${padded(dayOfMonth, 2)}`;
  if (!isDay(day)) throw new RangeError(`${day} is not a day`);
  return day;
}

/** Days from 0001-01-01 to the first of January of a year of the Gregorian calendar. */
function startOfYear(year: number): number {
  const before = year - 1;
  return before * 365 + Math.floor(before / 4) - Math.floor(before / 100) + Math.floor(before / 400);
}

/** Days counted from 0001-01-01, which is 0; RangeError for what is no day. */
export function dayNumber(day: Day): number {
  const [year, month, dayOfMonth] = partsOfDay(day);
  let count = startOfYear(year) + dayOfMonth - 1;
  for (let earlier = 1; earlier < month; earlier += 1) count += daysInMonth(year, earlier);
  return count;
}

/** The day of a count from 0001-01-01; RangeError outside the years 0001 to 9999. */
export function dayOfNumber(count: number): Day {
  if (!Number.isInteger(count)) throw new RangeError('days are counted whole');
  let year = Math.floor(count / 366) + 1;
  while (startOfYear(year + 1) <= count) year += 1;
  let rest = count - startOfYear(year);
  let month = 1;
  while (rest >= daysInMonth(year, month)) {
    rest -= daysInMonth(year, month);
    month += 1;
  }
  return dayFrom(year, month, rest + 1);
}
