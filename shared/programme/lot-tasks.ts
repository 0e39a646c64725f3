import type { BuildUp, StepKind } from '#shared/buildups/buildup';
import type { LotSequence } from '#shared/drying/lot-sequence';
import { placedInPortions } from '#shared/drying/placed-in-portions';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { type StepBlock, stepBlocks } from '#shared/drying/step-blocks';
import type { WorkingTime } from '#shared/drying/working-time';
import { countUp } from '#shared/money/settled';
import type { ItemTask } from '#shared/programme/lot-programme';
import type { LotInput } from '#shared/programme/programme-inputs';
import { coatTaskId, stepWorkId } from '#shared/programme/task-id';

/** A lot to be turned into tasks: its steps at the reference air, its people as entered, and the longest day of the workshop. */
export interface LotToPlan {
  readonly sequence: LotSequence;
  readonly buildUp: BuildUp;
  readonly name: string;
  readonly piece: string;
  /** What the lot is called beside one of its tasks. */
  readonly shortName: string;
  readonly memberIds: readonly string[];
  /** Identical pieces of its members together: so many people may be at it at most. */
  readonly pieces: number;
  readonly input: LotInput | null;
  /** Hands a step takes at once, where that was entered for it. */
  readonly handsOf: (workId: string) => number | null;
  readonly time: WorkingTime;
  readonly gradeName: (gradeId: string) => string;
}

/** A step in one portion of its block, with its tasks coat by coat. */
export interface PortionStep {
  readonly step: SequenceStep;
  readonly portion: number;
  readonly tasks: readonly ItemTask[];
}

/** A block of a lot: for each portion its steps. */
export interface PlannedBlock {
  readonly portions: readonly (readonly PortionStep[])[];
}

/** Dry work that may be left overnight and taken up again; a coat is put on in one go, and leaf laid in one (common practice). */
const dryWork: readonly StepKind[] = [
  'clean',
  'consolidate',
  'recut',
  'smooth',
  'polish-bole',
  'skew-off',
  'fault',
  'second-laying',
  'burnish',
  'transfer-drawing',
  'protect-edge',
  'leave',
];
/** Work several people may divide among them; a coat is one hand's. */
const sharedWork: readonly StepKind[] = [
  'clean',
  'recut',
  'smooth',
  'lay',
  'skew-off',
  'second-laying',
  'burnish',
  'fault',
];

const clockMinutes = (handsOn_minutes: number, { productiveShare_percent }: WorkingTime): number =>
  countUp((handsOn_minutes * 100) / productiveShare_percent);

const portionWork = (step: SequenceStep, portions: number): number =>
  countUp(step.handsOn_minutes / step.coats / portions);

/** Fewer portions than these leave a stretch of the block that has to be done in one go longer than a day. */
function portionsByDay({ steps, inPortions }: StepBlock, time: WorkingTime): number {
  if (!inPortions) return 1;
  const needed = steps
    .filter(({ kind }) => !dryWork.includes(kind))
    .map((step) => Math.ceil(clockMinutes(portionWork(step, 1), time) / time.day_minutes));
  return Math.max(1, ...needed);
}

/** As many portions as the estimate's own sequence of the lot would take in this week. */
function proposedPortions(block: StepBlock, { sequence, time }: LotToPlan): number {
  const placing = { time, busy: new Map(), notBefore_minutes: new Map() };
  const { tasks } = placedInPortions(block, { lotId: sequence.lotId, from_minutes: 0, placing });
  return Math.max(portionsByDay(block, time), ...tasks.map(({ portion }) => portion));
}

const portionsOf = (block: StepBlock, lot: LotToPlan): number =>
  block.inPortions ? (lot.input?.portions ?? proposedPortions(block, lot)) : 1;

interface At {
  readonly portion: number;
  readonly portions: number;
  readonly isTied: boolean;
}

function handsOf(step: SequenceStep, lot: LotToPlan): { crew: number; mostPeople: number } {
  if (step.handsOn_minutes === 0) return { crew: 0, mostPeople: 0 };
  const crew = lot.handsOf(stepWorkId(lot.sequence.lotId, step.stepId)) ?? lot.input?.crew ?? 1;
  const most = lot.input?.mostPeople ?? Math.min(2, lot.pieces);
  return { crew, mostPeople: Math.max(crew, sharedWork.includes(step.kind) ? most : crew) };
}

function coatTask(step: SequenceStep, coat: number, { lot, at }: { lot: LotToPlan; at: At }): ItemTask {
  const { lotId } = lot.sequence;
  const { stepId, kind, gradeId, coats, name } = step;
  const handsOn_minutes = portionWork(step, at.portions);
  const fitsDay = clockMinutes(handsOn_minutes, lot.time) <= lot.time.day_minutes;
  const id = coatTaskId(lotId, { stepId, portion: at.portion, coat });
  const task = {
    ...{ id, lotId, gradeId, handsOn_minutes },
    name: `${coats > 1 ? `${name} ${coat}/${coats}` : name} (${lot.shortName})`,
    ...handsOf(step, lot),
    isBreakable: dryWork.includes(kind) || (!at.isTied && !fitsDay),
    ...{ release_minutes: 0, pinned_minutes: null, happened: null },
  };
  const whole = { lot: lot.name, pieceId: lot.sequence.pieceId, piece: lot.piece, memberIds: lot.memberIds };
  const { portion, portions } = at;
  const which = { kind, stepId, name, coat, coats, portion, portions, gradeId, grade: lot.gradeName(gradeId) };
  return { task, item: { taskId: id, lotId, ...whole, ...which, handsOn_minutes } };
}

function plannedBlock(block: StepBlock, lot: LotToPlan): PlannedBlock {
  const portions = portionsOf(block, lot);
  const isTied = block.inPortions;
  return {
    portions: Array.from({ length: portions }, (_, index) =>
      block.steps.map((step) => ({
        step,
        portion: index + 1,
        tasks: Array.from({ length: step.coats }, (_coat, coat) =>
          coatTask(step, coat + 1, { lot, at: { portion: index + 1, portions, isTied } }),
        ),
      })),
    ),
  };
}

/** The tasks of a lot in working order: coats of steps, in portions where a window would not hold all of a step at once; hands-on minutes rounded up. */
export const lotTasks = (lot: LotToPlan): PlannedBlock[] =>
  stepBlocks(lot.sequence.steps).map((block) => plannedBlock(block, lot));
