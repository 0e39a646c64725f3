import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import { busyWith } from '#shared/drying/free-span';
import { leastPortions } from '#shared/drying/least-portions';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import { placedBlock, type PlacedCoat } from '#shared/drying/placed-block';
import type { StepBlock } from '#shared/drying/step-blocks';
import { type BusyGrades, type Placing, timedSteps } from '#shared/drying/timed-step';
import type { Finding } from '#shared/words/finding';

/** One stretch of work on one lot: a coat of a step, or of a portion of it. */
export interface PlacedTask extends PlacedCoat {
  readonly lotId: string;
  readonly portion: number;
}

/** A block of one lot, from when it may start. */
export interface BlockAt {
  readonly lotId: string;
  readonly from_minutes: number;
  readonly placing: Omit<Placing, 'portions'>;
}

/** The stretches of work of a block, and when each grade is busy with them too. */
interface Placed {
  readonly tasks: readonly PlacedTask[];
  readonly busy: BusyGrades;
}

/** Starts are tried at every quarter of an hour of work; more than 60 portions are no plan any more. */
const tryEvery_minutes = 15;
const week_minutes = 7 * dayLength_minutes;
const mostPortions = 60;
/** Smaller portions may find room sooner between other work: up to four more than needed are tried, and taken where they save two days. */
const finerBy = 4;
const worth_minutes = 2 * dayLength_minutes;

/** The earliest start up to a moment from which a block keeps its limits; whatever starts at the same time is tried once. */
function firstFit(
  block: StepBlock,
  span: { from: number; to: number },
  placing: Placing,
): readonly PlacedCoat[] | null {
  const steps = timedSteps(block.steps, placing);
  const rules = { time: placing.time, keepsLimits: true };
  let start = nextWorkingMinute(span.from, placing.time);
  while (start <= span.to) {
    const { coats, isWhole } = placedBlock(steps, start, rules);
    if (isWhole) return coats;
    const tried = coats[0]?.start_minutes ?? start;
    start = nextWorkingMinute(tried + tryEvery_minutes, placing.time);
  }
  return null;
}

/** Whether hands with nothing else to do could keep the limits of one portion, on whatever day of the week they start. */
function isPossible(block: StepBlock, portions: number, { time }: BlockAt['placing']): boolean {
  const placing: Placing = { time, busy: new Map(), notBefore_minutes: new Map(), portions };
  return firstFit(block, { from: 0, to: week_minutes }, placing) !== null;
}

function fewestPortions(block: StepBlock, { placing }: BlockAt): number | null {
  const most = block.inPortions ? mostPortions : 1;
  for (let portions = leastPortions(block.steps, placing.time); portions <= most; portions += 1)
    if (isPossible(block, portions, placing)) return portions;
  return null;
}

const withTasks = (busy: BusyGrades, tasks: readonly PlacedCoat[]): BusyGrades => {
  const grades = new Map(busy);
  for (const task of tasks) grades.set(task.step.gradeId, busyWith(grades.get(task.step.gradeId) ?? [], task));
  return grades;
};

/** By when everybody is free again and nothing is waited for. */
function freeFrom(block: StepBlock, from_minutes: number, { busy, notBefore_minutes }: BlockAt['placing']): number {
  const ends = block.steps.map(({ gradeId }) => busy.get(gradeId)?.at(-1)?.end_minutes ?? 0);
  return Math.max(from_minutes, ...ends, ...notBefore_minutes.values());
}

const endOf = (tasks: readonly PlacedCoat[]): number =>
  tasks.reduce((latest, task) => Math.max(latest, task.end_minutes), 0);

interface Asked {
  readonly portions: number;
  readonly by_minutes: number;
}

/** Each portion keeps clear of those before it, whoever does them, and waits for free hands as long as it takes; null once it ends too late. */
function allPortions(block: StepBlock, at: BlockAt, { portions, by_minutes }: Asked): Placed | null {
  const tasks: PlacedTask[] = [];
  let { busy } = at.placing;
  let { from_minutes } = at;
  for (let portion = 1; portion <= portions; portion += 1) {
    const placing: Placing = { ...at.placing, busy, portions };
    const span = { from: from_minutes, to: freeFrom(block, from_minutes, placing) + week_minutes };
    const coats = firstFit(block, span, placing);
    if (!coats || endOf(coats) > by_minutes) return null;
    for (const coat of coats) tasks.push({ ...coat, lotId: at.lotId, portion });
    busy = withTasks(busy, coats);
    from_minutes = coats[0]?.start_minutes ?? from_minutes;
  }
  return { tasks, busy };
}

const nameOf = (block: StepBlock): string => block.steps[0]?.name ?? '';

function overTime(block: StepBlock, { lotId, from_minutes, placing }: BlockAt): Placed & { findings: Finding[] } {
  const steps = timedSteps(block.steps, { ...placing, portions: 1 });
  const { coats } = placedBlock(steps, from_minutes, { time: placing.time, keepsLimits: false });
  const finding: Finding = { kind: 'warn', code: 'drying-no-window', values: { step: nameOf(block) }, about: lotId };
  const tasks = coats.map((coat) => ({ ...coat, lotId, portion: 1 }));
  return { tasks, busy: withTasks(placing.busy, coats), findings: [finding] };
}

/** The fewest portions, or a few more where that saves enough; null where no number of them keeps the limits. */
function soonest(block: StepBlock, at: BlockAt): (Placed & { portions: number }) | null {
  const fewest = fewestPortions(block, at);
  if (fewest === null) return null;
  const most = block.inPortions ? fewest + finerBy : fewest;
  let best: (Placed & { portions: number }) | null = null;
  let by_minutes = Infinity;
  for (let portions = fewest; portions <= most && by_minutes > at.from_minutes; portions += 1) {
    const placed = allPortions(block, at, { portions, by_minutes });
    if (!placed) continue;
    best = { ...placed, portions };
    by_minutes = endOf(placed.tasks) - worth_minutes;
  }
  return best;
}

/** Lays a block into the week in few portions that keep its limits, and says so when they are several, or when none keeps them. */
export function placedInPortions(block: StepBlock, at: BlockAt): Placed & { readonly findings: readonly Finding[] } {
  const placed = soonest(block, at);
  if (!placed) return overTime(block, at);
  const { tasks, busy, portions } = placed;
  if (portions === 1) return { tasks, busy, findings: [] };
  const values = { step: nameOf(block), portions };
  return { tasks, busy, findings: [{ kind: 'note', code: 'drying-portions', values, about: at.lotId }] };
}
