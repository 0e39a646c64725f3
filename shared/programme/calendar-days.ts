import { addDays } from '#shared/calendar/add-days';
import { type Day, dayNumber, dayOfNumber } from '#shared/calendar/day';
import { type Weekday, weekdayOf } from '#shared/calendar/working-days';
import type { DayException, DayHours, MomentSpan, ShopCalendar, WeekHours } from '#shared/programme/shop-calendar';

const dayLength_minutes = 1440;

/** One day of a calendar: when it starts, and by how much the clock is ahead of the minutes gone by once work begins. */
export interface CalendarDay {
  readonly day: Day;
  readonly weekday: Weekday;
  readonly start_minutes: number;
  readonly length_minutes: number;
}

/** The first days of a calendar, so many, with their starts in minutes from the start of the first. */
export function calendarDays({ firstDay, oddDays }: ShopCalendar, count: number): CalendarDay[] {
  const lengths = new Map(oddDays.map((odd) => [odd.day, odd.length_minutes]));
  const [days, first, weekday]: [CalendarDay[], number, number] = [[], dayNumber(firstDay), weekdayOf(firstDay)];
  let start_minutes = 0;
  for (let at = 0; at < count; at += 1) {
    const day = dayOfNumber(first + at);
    const length_minutes = lengths.get(day) ?? dayLength_minutes;
    days.push({ day, weekday: (((weekday - 1 + at) % 7) + 1) as Weekday, start_minutes, length_minutes });
    start_minutes += length_minutes;
  }
  return days;
}

/** The hours of a day of a calendar by the wall clock. */
export const hoursOn = (
  { day, weekday }: Pick<CalendarDay, 'day' | 'weekday'>,
  week: WeekHours,
  exceptions: ReadonlyMap<Day, DayHours>,
): DayHours => exceptions.get(day) ?? week[weekday] ?? [];

/** The hours of any day by the wall clock. */
export const hoursOf = (day: Day, week: WeekHours, exceptions: ReadonlyMap<Day, DayHours>): DayHours =>
  hoursOn({ day, weekday: weekdayOf(day) }, week, exceptions);

/** Hours that differ from those of the weekday, by their day. */
export const exceptionsByDay = (exceptions: readonly DayException[]): ReadonlyMap<Day, DayHours> =>
  new Map(exceptions.map(({ day, hours }) => [day, hours]));

/** Hours of the wall clock as moments of the calendar; where a day is longer or shorter than others its clocks have changed before work begins. */
export const momentsOf = (hours: DayHours, { start_minutes, length_minutes }: CalendarDay): MomentSpan[] => {
  const ahead = start_minutes + length_minutes - dayLength_minutes;
  return hours.map((span) => ({
    start_minutes: Math.max(start_minutes, ahead + span.start_minutes),
    end_minutes: ahead + span.end_minutes,
  }));
};

/** The day a moment falls on and the time by the wall clock, HH:MM; a moment before the first day or long after counts days of 24 hours. */
export function clockOf(moment_minutes: number, calendar: ShopCalendar): { readonly day: Day; readonly time: string } {
  const odd = [...calendar.oddDays].sort((a, b) => dayNumber(a.day) - dayNumber(b.day));
  let [firstDay, from_minutes] = [calendar.firstDay, 0];
  for (const { day, length_minutes } of odd) {
    const start_minutes = from_minutes + (dayNumber(day) - dayNumber(firstDay)) * dayLength_minutes;
    if (start_minutes < from_minutes || moment_minutes < start_minutes) continue;
    const ahead = start_minutes + length_minutes - dayLength_minutes;
    // On the day itself the wall clock is told as after the change.
    if (moment_minutes < start_minutes + length_minutes) return onDay(day, Math.max(0, moment_minutes - ahead));
    [firstDay, from_minutes] = [addDays(day, 1), start_minutes + length_minutes];
  }
  const days = Math.floor((moment_minutes - from_minutes) / dayLength_minutes);
  return onDay(addDays(firstDay, days), moment_minutes - from_minutes - days * dayLength_minutes);
}

function onDay(day: Day, minute: number): { readonly day: Day; readonly time: string } {
  const [hours, minutes] = [Math.floor(minute / 60), minute % 60];
  return { day, time: `${String(hours).padStart(2, '0')}:${String(minutes).padStart(2, '0')}` };
}
