import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import type { WorkingTime } from '#shared/drying/working-time';
import type { LotRibbon } from './lot-ribbon';
import type { WorkedHold } from './worked-hold';
import { closedTimes, type Stretch } from './working-parts';

/** A bar of the ribbon, in px from the left. */
export interface RibbonBar {
  readonly x: number;
  readonly width: number;
}

/** A name under a bar, where there is room for it. */
export interface RibbonLabel {
  readonly x: number;
  readonly text: string;
}

/** How many px a day takes, and all of it. */
export interface RibbonScale {
  readonly day_px: number;
  readonly width_px: number;
}

/** One lot as it is drawn. */
export interface RibbonRow {
  readonly work: readonly RibbonBar[];
  readonly drying: readonly RibbonBar[];
  readonly windows: readonly RibbonBar[];
  /** Waits for somebody. */
  readonly holds: readonly RibbonBar[];
  readonly labels: readonly RibbonLabel[];
}

/** A mark of the scale: a day, or the first day of a week. */
export interface RibbonTick {
  readonly x: number;
  readonly day: number;
  readonly isWeek: boolean;
}

const slimmest_px = 1.5;
const letter_px = 7;
const gap_px = 10;

const pixels = (minutes: number, day_px: number): number => (minutes * day_px) / dayLength_minutes;

const barOf = ({ from_minutes, to_minutes }: Stretch, day_px: number): RibbonBar => ({
  x: pixels(from_minutes, day_px),
  width: Math.max(slimmest_px, pixels(to_minutes - from_minutes, day_px)),
});

/** Names from left to right, each only where the one before leaves room; at the right edge they are set back, so that none is cut off. */
function labelsOf(work: LotRibbon['work'], { day_px, width_px }: RibbonScale): RibbonLabel[] {
  let free = 0;
  return work.flatMap(({ label, from_minutes }) => {
    const length_px = label.length * letter_px;
    const x = Math.min(pixels(from_minutes, day_px), width_px - length_px);
    if (label === '' || x < free) return [];
    free = x + length_px + gap_px;
    return [{ x, text: label }];
  });
}

/** A lot's ribbon to a scale. */
export const ribbonRow = (ribbon: LotRibbon, { day_px, width_px }: RibbonScale): RibbonRow => ({
  holds: [],
  work: ribbon.work.map((part) => barOf(part, day_px)),
  drying: ribbon.drying.map((part) => barOf(part, day_px)),
  windows: ribbon.windows.map((part) => barOf(part, day_px)),
  labels: labelsOf(ribbon.work, { day_px, width_px }),
});

/** Waits for one kind of approval, each from when somebody can be asked until they have usually answered. */
export const holdRow = (holds: readonly WorkedHold[], { day_px }: RibbonScale): RibbonRow => ({
  ...{ work: [], drying: [], windows: [], labels: [] },
  holds: holds.map(({ from_minutes, to_minutes }) => barOf({ from_minutes, to_minutes }, day_px)),
});

/** Nights and closed days; nights alone are left out where they would be thinner than the eye can part. */
export const closedBars = (days: number, time: WorkingTime, day_px: number): RibbonBar[] =>
  closedTimes(days * dayLength_minutes, time)
    .filter(({ from_minutes, to_minutes }) => day_px >= 24 || to_minutes - from_minutes > dayLength_minutes)
    .map((closed) => barOf(closed, day_px));

/** Marks of the scale: every day where there is room for its number, else the first of each week. */
export const ribbonTicks = (days: number, day_px: number): RibbonTick[] =>
  Array.from({ length: days }, (_, index) => ({ x: index * day_px, day: index + 1, isWeek: index % 7 === 0 })).filter(
    ({ x, isWeek }) => (isWeek || day_px >= 56) && x + 40 < days * day_px,
  );
