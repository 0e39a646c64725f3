import { calendarDays, exceptionsByDay, hoursOf, momentsOf } from '#shared/programme/calendar-days';
import type { MomentSpan, ShopCalendar } from '#shared/programme/shop-calendar';

/** When a workshop is open, from the first day of its calendar for so many days. */
export function openSpans(calendar: ShopCalendar, days: number): MomentSpan[] {
  const exceptions = exceptionsByDay(calendar.exceptions);
  return calendarDays(calendar, days).flatMap((day) => momentsOf(hoursOf(day.day, calendar.week, exceptions), day));
}
