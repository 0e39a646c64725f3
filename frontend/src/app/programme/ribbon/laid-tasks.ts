import type { MomentSpan } from '#shared/programme/shop-calendar';
import { ribbonBar } from './ribbon-bar';
import type { RibbonLot, RibbonTask } from './ribbon-lot';
import { pixelOf, type RibbonScale } from './ribbon-scale';
import type { Stretch } from './stretch';

/** A task in pixels. */
export interface DrawnTask {
  readonly task: RibbonTask;
  readonly work: readonly Stretch[];
  readonly drying: Stretch | null;
  readonly window: Stretch | null;
  /** What is pressed, pointed at and dragged: never too small for a finger or a pointer. */
  readonly touch: Stretch;
  /** Its work, or the moment it is, as one path. */
  readonly path: string;
  readonly label: { readonly x: number; readonly text: string } | null;
}

/** A line of the ribbon in pixels. */
export interface DrawnLot {
  readonly lot: RibbonLot;
  readonly index: number;
  readonly y: number;
  readonly tasks: readonly DrawnTask[];
}

/** The part of the sheet that is drawn, in pixels. */
export interface DrawnPart {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Shorter work is still to be seen. */
const leastBar_px = 4;
/** WCAG 2.2, 2.5.8: what is pressed measures 24 by 24 pixels at least. */
const leastTouch_px = 24;
const letter_px = 6.4;
const gap_px = 8;
const workBar = { y: 14, height: 26, radius: 3 };

const stretch = ({ start_minutes, end_minutes }: MomentSpan, scale: RibbonScale, least = 0): Stretch => {
  const x = pixelOf(start_minutes, scale);
  return { x, width: Math.max(least, pixelOf(end_minutes, scale) - x) };
};

/** Work parted by a night that is too thin to be seen is one bar. */
function joined(stretches: readonly Stretch[]): Stretch[] {
  const whole: Stretch[] = [];
  for (const one of stretches) {
    const last = whole.at(-1);
    if (last && one.x - last.x - last.width < 1.5)
      whole[whole.length - 1] = { x: last.x, width: one.x + one.width - last.x };
    else whole.push(one);
  }
  return whole;
}

/** Until when a task has anything to show. */
const lastOf = ({ end_minutes, dryUntil_minutes, window }: RibbonTask): number =>
  Math.max(end_minutes, dryUntil_minutes ?? 0, window?.end_minutes ?? 0);

function touchOf(work: readonly Stretch[], x: number): Stretch {
  const end = Math.max(x, ...work.map((one) => one.x + one.width));
  const width = Math.max(leastTouch_px, end - x);
  return { x: x - Math.max(0, leastTouch_px - (end - x)) / 2, width };
}

/** What takes no time is a mark at its moment. */
const pathOf = (work: readonly Stretch[], x: number): string =>
  work.length === 0 ? `M${x - 6} 27l6 -7l6 7l-6 7z` : work.map((one) => ribbonBar(one, workBar)).join('');

function drawn(task: RibbonTask, scale: RibbonScale): Omit<DrawnTask, 'label'> {
  const work = joined(task.spans.map((span) => stretch(span, scale, leastBar_px)));
  const { end_minutes, dryUntil_minutes, window } = task;
  const isDrying = dryUntil_minutes !== null && dryUntil_minutes > end_minutes;
  const x = pixelOf(task.start_minutes, scale);
  return {
    task,
    work,
    drying: isDrying ? stretch({ start_minutes: end_minutes, end_minutes: dryUntil_minutes }, scale) : null,
    window: window && stretch(window, scale, leastBar_px),
    touch: touchOf(work, x),
    path: pathOf(work, x),
  };
}

/** Names where there is room for them, none over another. */
function labelled(tasks: readonly Omit<DrawnTask, 'label'>[]): DrawnTask[] {
  let free_px = -Infinity;
  return tasks.map((one) => {
    const { label: text } = one.task;
    const { x } = one.work.at(0) ?? one.touch;
    if (text === '' || x < free_px) return { ...one, label: null };
    free_px = x + text.length * letter_px + gap_px;
    return { ...one, label: { x, text } };
  });
}

/** All of a line in pixels. Its labels are laid out over the whole of it, so that none comes or goes as one scrolls along it. */
export const laidTasks = ({ tasks }: RibbonLot, scale: RibbonScale): DrawnTask[] =>
  labelled(tasks.map((task) => drawn(task, scale)));

/** What of a line lies between two pixels. */
export function seenTasks(
  all: readonly DrawnTask[],
  scale: RibbonScale,
  { left, right }: Pick<DrawnPart, 'left' | 'right'>,
): DrawnTask[] {
  return all.filter(({ task, touch, label }) => {
    const end = Math.max(touch.x + touch.width, pixelOf(lastOf(task), scale), label ? label.x + 240 : 0);
    return end >= left && touch.x <= right;
  });
}
