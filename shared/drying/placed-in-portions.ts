import { placedBlock, type PlacedCoat, type Placing } from '#shared/drying/placed-block';
import type { StepBlock } from '#shared/drying/step-blocks';
import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
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
  readonly placing: Omit<Placing, 'portions' | 'keepsLimits'>;
}

interface Placed {
  readonly tasks: readonly PlacedTask[];
  readonly findings: readonly Finding[];
}

/** Starts are tried at every quarter of an hour of work for three weeks; more than 60 portions are no plan any more. */
const tryEvery_minutes = 15;
const tryFor_minutes = 21 * dayLength_minutes;
const mostPortions = 60;

function firstFit(block: StepBlock, from_minutes: number, placing: Placing): PlacedCoat[] | null {
  let start = nextWorkingMinute(from_minutes, placing.time);
  while (start <= from_minutes + tryFor_minutes) {
    const placed = placedBlock(block.steps, start, placing);
    if (placed) return placed;
    start = nextWorkingMinute(start + tryEvery_minutes, placing.time);
  }
  return null;
}

/** Each portion keeps clear of those before it, whoever does them. */
function allPortions(block: StepBlock, at: BlockAt, portions: number): PlacedTask[] | null {
  const tasks: PlacedTask[] = [];
  let from_minutes = at.from_minutes;
  for (let portion = 1; portion <= portions; portion += 1) {
    const taken = (gradeId: string) => [
      ...at.placing.taken(gradeId),
      ...tasks.filter((task) => task.step.gradeId === gradeId),
    ];
    const placed = firstFit(block, from_minutes, { ...at.placing, taken, portions, keepsLimits: true });
    if (!placed) return null;
    tasks.push(...placed.map((coat) => ({ ...coat, lotId: at.lotId, portion })));
    from_minutes = placed[0]?.start_minutes ?? from_minutes;
  }
  return tasks;
}

const nameOf = (block: StepBlock): string => block.steps[0]?.name ?? '';

function overTime(block: StepBlock, at: BlockAt): Placed {
  const placed = placedBlock(block.steps, at.from_minutes, { ...at.placing, portions: 1, keepsLimits: false }) ?? [];
  const finding: Finding = { kind: 'warn', code: 'drying-no-window', values: { step: nameOf(block) }, about: at.lotId };
  return { tasks: placed.map((coat) => ({ ...coat, lotId: at.lotId, portion: 1 })), findings: [finding] };
}

/** Lays a block into the week in the fewest portions that keep its limits, and says so when they are several, or when none keeps them. */
export function placedInPortions(block: StepBlock, at: BlockAt): Placed {
  for (let portions = 1; portions <= (block.inPortions ? mostPortions : 1); portions += 1) {
    const tasks = allPortions(block, at, portions);
    if (!tasks) continue;
    if (portions === 1) return { tasks, findings: [] };
    return {
      tasks,
      findings: [{ kind: 'note', code: 'drying-portions', values: { step: nameOf(block), portions }, about: at.lotId }],
    };
  }
  return overTime(block, at);
}
