import type { Day } from '#shared/calendar/day';
import type { Weekday } from '#shared/calendar/working-days';

/** A span of moments, in minutes from the start of the first day of the calendar; its end is not in it. */
export interface MomentSpan {
  readonly start_minutes: number;
  readonly end_minutes: number;
}

/** Hours of one day in minutes of the wall clock from midnight, 0 to 1440, in order and apart. */
export type DayHours = readonly MomentSpan[];

/** Hours by the day of the week; a day that is not named is not worked. */
export type WeekHours = Readonly<Partial<Record<Weekday, DayHours>>>;

/** A single day that is worked otherwise than its weekday: no hours close it. */
export interface DayException {
  readonly day: Day;
  readonly hours: DayHours;
}

/**
 * When a workshop works. Every moment of a programme is a whole minute from the start of `firstDay`; only days of another length (the clocks change)
 * are named, and on those the clocks change before work begins. Hands-on work takes `productiveShare_percent` of the hours there are.
 */
export interface ShopCalendar {
  readonly firstDay: Day;
  readonly week: WeekHours;
  readonly exceptions: readonly DayException[];
  readonly productiveShare_percent: number;
  readonly oddDays: readonly { readonly day: Day; readonly length_minutes: number }[];
}

/** Somebody who works: the grades they can do, their own hours (null: the workshop's), and when they are away or promised elsewhere. */
export interface Person {
  readonly id: string;
  readonly gradeIds: readonly string[];
  readonly week: WeekHours | null;
  readonly exceptions: readonly DayException[];
  readonly away: readonly MomentSpan[];
}
