import { addDays } from '#shared/calendar/add-days';
import { type Day, dayNumber } from '#shared/calendar/day';
import { Remembered } from '#shared/units/remembered';

const day_ms = 86_400_000;
const minute_ms = 60_000;
const day1970 = dayNumber('1970-01-01');

/** Making a format is slow and asking it is quick: one for each zone is kept. */
const formats = new Map<string, Intl.DateTimeFormat>();

function formatOf(timeZone: string): Intl.DateTimeFormat {
  const known = formats.get(timeZone);
  if (known) return known;
  const numeric = 'numeric' as const;
  const parts = { year: numeric, month: numeric, day: numeric, hour: numeric, minute: numeric, second: numeric };
  const calendar = { calendar: 'gregory', numberingSystem: 'latn', hourCycle: 'h23' as const };
  const format = new Intl.DateTimeFormat('en-GB', { timeZone, ...calendar, ...parts });
  formats.set(timeZone, format);
  return format;
}

/** How far the clock on the wall is ahead of UTC at an instant, in milliseconds. */
function ahead_ms(instant_ms: number, timeZone: string): number {
  const parts = new Map(
    formatOf(timeZone)
      .formatToParts(instant_ms)
      .map(({ type, value }) => [type, Number(value)]),
  );
  const part = (name: Intl.DateTimeFormatPartTypes) => parts.get(name) ?? 0;
  const days = dayNumber(
    [part('year'), part('month'), part('day')]
      .map((figure, at) => String(figure).padStart(at === 0 ? 4 : 2, '0'))
      .join('-'),
  );
  const time_ms = ((part('hour') * 60 + part('minute')) * 60 + part('second')) * 1000;
  return (days - day1970) * day_ms + time_ms - instant_ms;
}

/** The first instant of a day in an IANA zone, in milliseconds since 1970 UTC, also where the clocks change at midnight; RangeError for a zone that is not known. */
export function startOfDay_ms(day: Day, timeZone: string): number {
  const wall_ms = (dayNumber(day) - day1970) * day_ms;
  const isOn = (instant_ms: number) => instant_ms + ahead_ms(instant_ms, timeZone) >= wall_ms;
  const guess_ms = wall_ms - ahead_ms(wall_ms, timeZone);
  if (isOn(guess_ms) && !isOn(guess_ms - minute_ms)) return guess_ms;
  // The clocks change near this midnight: the first minute that bears the day is looked for by halving.
  let [before_ms, on_ms] = [wall_ms - day_ms, wall_ms + day_ms];
  while (on_ms - before_ms > minute_ms) {
    const middle_ms = before_ms + Math.floor((on_ms - before_ms) / 2 / minute_ms) * minute_ms;
    if (isOn(middle_ms)) on_ms = middle_ms;
    else before_ms = middle_ms;
  }
  return on_ms;
}

interface OddDay {
  readonly day: Day;
  readonly length_minutes: number;
}

/** Asked for every plan of a day anew, and always the same: what was found last is kept. */
const found = new Remembered<readonly OddDay[]>(64);

/** The days of another length than 24 hours among so many from a first one on, because the clocks change; lengths in minutes. */
export const oddDays = (firstDay: Day, days: number, timeZone: string): readonly OddDay[] =>
  found.of(`${firstDay} ${days} ${timeZone}`, () => oddDaysLookedUp(firstDay, days, timeZone));

function oddDaysLookedUp(firstDay: Day, days: number, timeZone: string): OddDay[] {
  const odd: OddDay[] = [];
  let start_ms = startOfDay_ms(firstDay, timeZone);
  for (let at = 0; at < days; at += 1) {
    const next_ms = start_ms + day_ms;
    const end_ms = isMidnight(next_ms, timeZone) ? next_ms : startOfDay_ms(addDays(firstDay, at + 1), timeZone);
    const length_minutes = Math.round((end_ms - start_ms) / minute_ms);
    if (length_minutes !== 1440) odd.push({ day: addDays(firstDay, at), length_minutes });
    start_ms = end_ms;
  }
  return odd;
}

const isMidnight = (instant_ms: number, timeZone: string): boolean =>
  (instant_ms + ahead_ms(instant_ms, timeZone)) % day_ms === 0;
