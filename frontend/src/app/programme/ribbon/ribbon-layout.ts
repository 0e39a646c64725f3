import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { RibbonLot, RibbonTask } from './ribbon-lot';
import { pixelOf, type RibbonScale } from './ribbon-scale';

/** A stretch along a line, in pixels. */
export interface Stretch {
  readonly x: number;
  readonly width: number;
}

/** A task in pixels. */
export interface DrawnTask {
  readonly task: RibbonTask;
  readonly work: readonly Stretch[];
  readonly drying: Stretch | null;
  readonly window: Stretch | null;
  /** What is pressed, pointed at and dragged: never too small for a finger or a pointer. */
  readonly touch: Stretch;
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
const leastTouch_px = 12;
const letter_px = 6.4;
const gap_px = 8;

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

function drawn(task: RibbonTask, scale: RibbonScale): Omit<DrawnTask, 'label'> {
  const work = joined(task.spans.map((span) => stretch(span, scale, leastBar_px)));
  const { end_minutes, dryUntil_minutes, window } = task;
  const isDrying = dryUntil_minutes !== null && dryUntil_minutes > end_minutes;
  return {
    task,
    work,
    drying: isDrying ? stretch({ start_minutes: end_minutes, end_minutes: dryUntil_minutes }, scale) : null,
    window: window && stretch(window, scale, leastBar_px),
    touch: touchOf(work, pixelOf(task.start_minutes, scale)),
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

/**
 * The lines and tasks that lie in the part that is drawn, in pixels. Labels are laid out over the whole line, so that none comes or goes as one scrolls
 * along it.
 */
export function ribbonLayout(
  lots: readonly RibbonLot[],
  { scale, part, row_px }: { readonly scale: RibbonScale; readonly part: DrawnPart; readonly row_px: number },
): DrawnLot[] {
  const first = Math.max(0, Math.floor(part.top / row_px));
  return lots.slice(first, Math.ceil(part.bottom / row_px)).map((lot, at) => {
    const index = first + at;
    const all = labelled(lot.tasks.map((task) => drawn(task, scale)));
    const isSeen = ({ task, touch, label }: DrawnTask): boolean => {
      const right = Math.max(touch.x + touch.width, pixelOf(lastOf(task), scale), label ? label.x + 240 : 0);
      return right >= part.left && touch.x <= part.right;
    };
    return { lot, index, y: index * row_px, tasks: all.filter(isSeen) };
  });
}
