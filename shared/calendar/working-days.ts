import { addDays } from '#shared/calendar/add-days';
import { type Day, dayNumber } from '#shared/calendar/day';

/** A day of the week as ISO 8601 numbers it: Monday is 1, Sunday 7. */
export type Weekday = 1 | 2 | 3 | 4 | 5 | 6 | 7;

/** The days of the week a workshop works, and the single days it is closed all the same. */
export interface WorkingWeek {
  readonly weekdays: readonly Weekday[];
  readonly closed: readonly Day[];
}

/** The weekday of a day; 0001-01-01 was a Monday of the Gregorian calendar. */
export const weekdayOf = (day: Day): Weekday => ((dayNumber(day) % 7) + 1) as Weekday;

/** Whether the workshop works on a day. */
export const isWorkingDay = (day: Day, week: WorkingWeek): boolean =>
  week.weekdays.includes(weekdayOf(day)) && !week.closed.includes(day);

function nextWorkingDay(day: Day, week: WorkingWeek, step: 1 | -1): Day {
  let next = addDays(day, step);
  // Two years without a working day are no workshop's calendar: the bound keeps a wrong one from running on for ever.
  for (let tried = 0; tried < 732; tried += 1) {
    if (isWorkingDay(next, week)) return next;
    next = addDays(next, step);
  }
  throw new RangeError('a working week needs a working day');
}

/**
 * The day so many working days after a day (before it, when negative), the day itself not counted; 0 gives the day itself when it is
 * worked, else the next that is. RangeError when the week has no working day or the number is not whole.
 */
export function addWorkingDays(day: Day, workingDays: number, week: WorkingWeek): Day {
  if (!Number.isInteger(workingDays)) throw new RangeError('working days are counted whole');
  if (workingDays === 0) return isWorkingDay(day, week) ? day : nextWorkingDay(day, week, 1);
  let reached = day;
  for (let count = Math.abs(workingDays); count > 0; count -= 1) {
    reached = nextWorkingDay(reached, week, workingDays > 0 ? 1 : -1);
  }
  return reached;
}
