import { addDays, compareDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import type { Weekday } from '#shared/calendar/working-days';
import type { ProgrammeFrame } from '#shared/programme/programme-frame';
import type { Shop, ShopDays } from '#shared/programme/shop';
import type { DayException, DayHours, ShopCalendar, WeekHours } from '#shared/programme/shop-calendar';
import { oddDays } from '#shared/programme/odd-days';

/** How far ahead a calendar is laid out: six years and a half, in days. */
export const calendarLength_days = 2400;

/** Hours from Monday to Sunday by the day of the week; days without hours are left out. */
export const weekHours = (hours: readonly DayHours[]): WeekHours =>
  Object.fromEntries(hours.flatMap((day, at) => (day.length > 0 ? [[(at + 1) as Weekday, day]] : [])));

/** The single days of stretches that are worked otherwise, within the calendar; where stretches meet the later entry holds. */
export function dayExceptions(stretches: readonly ShopDays[], firstDay: Day): DayException[] {
  const lastDay = addDays(firstDay, calendarLength_days - 1);
  const days = new Map<Day, DayHours>();
  for (const stretch of stretches) {
    const end = compareDays(stretch.lastDay, lastDay) < 0 ? stretch.lastDay : lastDay;
    let day = compareDays(stretch.firstDay, firstDay) > 0 ? stretch.firstDay : firstDay;
    for (; compareDays(day, end) <= 0; day = addDays(day, 1)) days.set(day, stretch.hours);
  }
  return [...days].map(([day, hours]) => ({ day, hours })).sort((one, other) => compareDays(one.day, other.day));
}

/** The calendar of a workshop from the first day of a frame on, with the days on which the clocks of its zone change. */
export const shopCalendarOf = (shop: Shop, { firstDay, timeZone }: ProgrammeFrame): ShopCalendar => ({
  firstDay,
  week: weekHours(shop.hours),
  exceptions: dayExceptions(shop.days, firstDay),
  productiveShare_percent: shop.productiveShare_percent,
  oddDays: oddDays(firstDay, calendarLength_days, timeZone),
});
