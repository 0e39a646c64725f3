import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import { weekdayOf } from '#shared/calendar/working-days';
import { minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { DrawnPart } from './laid-tasks';
import type { Stretch } from './stretch';
import { pixelOf, type RibbonScale } from './ribbon-scale';

/** What a mark at the head of the ribbon says: a day, a week by its Monday, a month by its first, or an hour. */
export interface RibbonMark {
  readonly x: number;
  readonly kind: 'hour' | 'day' | 'week' | 'month';
  readonly day: Day;
  readonly hour: number;
}

/** A day is named from so many pixels on; a week below it, else the month. */
const namedDay_px = 64;
const namedWeek_px = 84;
const hourLine_px = 14;
/** Days thinner than this would be more night than day: only whole closed days are shaded. */
const shadedNight_px = 56;

const hoursOf = (day_px: number): readonly number[] =>
  day_px / 24 < hourLine_px ? [] : day_px / 24 < 44 ? [6, 12, 18] : [3, 6, 9, 12, 15, 18, 21];

const isNamed = (day: Day, day_px: number): boolean => {
  if (day_px >= namedDay_px) return true;
  return day_px * 7 >= namedWeek_px ? weekdayOf(day) === 1 : day.endsWith('-01');
};

const kindOf = (day_px: number): RibbonMark['kind'] =>
  day_px >= namedDay_px ? 'day' : day_px * 7 >= namedWeek_px ? 'week' : 'month';

/** When days begin, found out once for each frame: the clocks of a zone take long to read. */
const knownStarts = new WeakMap<ProgrammeFrame, Map<Day, number>>();

function startOf(day: Day, frame: ProgrammeFrame): number {
  const known = knownStarts.get(frame) ?? new Map<Day, number>();
  knownStarts.set(frame, known);
  const start = known.get(day) ?? minutesOfDay(day, frame);
  known.set(day, start);
  return start;
}

/** The days that begin within a part of the sheet. */
function daysIn(part: DrawnPart, scale: RibbonScale, frame: ProgrammeFrame): readonly { day: Day; x: number }[] {
  const from = Math.floor((scale.first_minutes + (part.left * 60) / scale.hour_px) / 1440) - 2;
  const count = Math.ceil(((part.right - part.left) * 60) / scale.hour_px / 1440) + 5;
  return Array.from({ length: count }, (_, at) => {
    const day = addDays(frame.firstDay, from + at);
    return { day, x: pixelOf(startOf(day, frame), scale) };
  });
}

/** The marks at the head and down the sheet that lie in the part that is drawn; every day has its line as long as there is room for lines. */
export function ribbonMarks(part: DrawnPart, scale: RibbonScale, frame: ProgrammeFrame): RibbonMark[] {
  const day_px = scale.hour_px * 24;
  const hours = hoursOf(day_px);
  return daysIn(part, scale, frame).flatMap(({ day, x }) => [
    ...(isNamed(day, day_px) ? [{ x, kind: kindOf(day_px), day, hour: 0 }] : []),
    ...hours.map((hour) => ({ x: x + hour * scale.hour_px, kind: 'hour' as const, day, hour })),
  ]);
}

/** Nights and closed days in the part that is drawn: what lies between the spans somebody works; whole closed days alone where nights are too thin. */
export function closedStretches(
  open: readonly MomentSpan[],
  { part, scale }: { readonly part: DrawnPart; readonly scale: RibbonScale },
): Stretch[] {
  const least_minutes = scale.hour_px * 24 < shadedNight_px ? 24 * 60 : 0;
  const found: Stretch[] = [];
  let from = scale.first_minutes;
  const take = (until: number): void => {
    const [x, end] = [pixelOf(from, scale), pixelOf(until, scale)];
    // A pause at noon is no night.
    const isLong = until - from > Math.max(90, least_minutes);
    if (isLong && end > part.left && x < part.right) found.push({ x, width: end - x });
  };
  for (const { start_minutes, end_minutes } of open) {
    if (start_minutes > from) take(start_minutes);
    from = Math.max(from, end_minutes);
  }
  if (scale.last_minutes > from) take(scale.last_minutes);
  return found;
}
