import type { BuildUp } from '#shared/buildups/buildup';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { paceOfModel } from '#shared/programme/drying-paces';
import type { ItemTask } from '#shared/programme/lot-programme';
import type { PlannedBlock, PortionStep } from '#shared/programme/lot-tasks';
import type { ProgrammeLag, TaskPoint } from '#shared/programme/programme-request';

/** From which point of which task to which point of which other. */
interface Between {
  readonly from: ItemTask;
  readonly fromPoint: TaskPoint;
  readonly to: ItemTask;
  readonly toPoint: TaskPoint;
}

/** A lag whose id says what it is, so that the same lag of another size can stand in its place. */
function lag(
  why: string,
  { from, fromPoint, to, toPoint }: Between,
  time: { least: number; most: number | null; paceId: string | null },
): ProgrammeLag {
  const [fromTaskId, toTaskId] = [from.task.id, to.task.id];
  return { id: `${fromTaskId}>${toTaskId}:${why}`, fromTaskId, fromPoint, toTaskId, toPoint, ...time, time: 'clock' };
}

const firstOf = ({ tasks }: PortionStep): ItemTask => tasks[0];
const lastOf = ({ tasks }: PortionStep): ItemTask => tasks[tasks.length - 1];

type PaceOf = (step: SequenceStep) => string | null;

/** From coat to coat, and all coats of a step within their time, which no climate stretches. */
function coatLags({ step, tasks }: PortionStep, paceOf: PaceOf): ProgrammeLag[] {
  const times = { least: step.betweenCoats_minutes, most: step.latestCoat_minutes, paceId: paceOf(step) };
  const coats = tasks
    .slice(1)
    .map((to, at) => lag('coat', { from: tasks[at], fromPoint: 'end', to, toPoint: 'start' }, times));
  if (step.wholeWithin_minutes === null) return coats;
  const [from, to] = [tasks[0], tasks[tasks.length - 1]];
  const whole = { least: 0, most: step.wholeWithin_minutes, paceId: null };
  return [...coats, lag('whole', { from, fromPoint: 'start', to, toPoint: 'end' }, whole)];
}

/** From a step to the next: it opens, and where it closes the next starts, or has ended, by then. */
function nextLags(from: PortionStep, to: PortionStep, paceOf: PaceOf): ProgrammeLag[] {
  const { opens_minutes: least, closes_minutes: closes, endsInWindow } = from.step;
  const paceId = paceOf(from.step);
  const start = { from: lastOf(from), fromPoint: 'end', to: firstOf(to), toPoint: 'start' } as const;
  const opening = lag('dry', start, { least, most: endsInWindow ? null : closes, paceId });
  if (closes === null || !endsInWindow) return [opening];
  const end = { from: lastOf(from), fromPoint: 'end', to: lastOf(to), toPoint: 'end' } as const;
  return [opening, lag('window', end, { least: 0, most: closes, paceId })];
}

/** To a step further on: not before it has dried so long, and finished within so long of its own start. */
function furtherLags(from: PortionStep, all: readonly PortionStep[], paceOf: PaceOf): ProgrammeLag[] {
  return from.step.lags.flatMap(({ toStepId, least_minutes, finishedWithin_minutes }) =>
    all
      .filter((to) => to.step.stepId === toStepId)
      .flatMap((to) => {
        const starts = { from: lastOf(from), fromPoint: 'end', to: firstOf(to), toPoint: 'start' } as const;
        const ends = { from: firstOf(from), fromPoint: 'start', to: lastOf(to), toPoint: 'end' } as const;
        const least = { least: least_minutes ?? 0, most: null, paceId: paceOf(from.step) };
        const isOwn = to.portion === from.portion;
        const within = finishedWithin_minutes !== null && isOwn;
        return [
          ...(least_minutes === null ? [] : [lag('further', starts, least)]),
          ...(within ? [lag('within', ends, { least: 0, most: finishedWithin_minutes, paceId: null })] : []),
        ];
      }),
  );
}

/** Portions are begun one after the other: which of them is first makes no difference to anybody. */
function portionLags({ portions }: PlannedBlock): ProgrammeLag[] {
  return portions.slice(1).map((portion, at) => {
    const between = {
      from: firstOf(portions[at][0]),
      fromPoint: 'start',
      to: firstOf(portion[0]),
      toPoint: 'start',
    } as const;
    return lag('portion', between, { least: 0, most: null, paceId: null });
  });
}

/** What is tied together in one portion of a block. */
const inPortion = (steps: readonly PortionStep[], paceOf: PaceOf): ProgrammeLag[] =>
  steps.flatMap((step, at) => [
    ...coatLags(step, paceOf),
    ...(at + 1 < steps.length ? nextLags(step, steps[at + 1], paceOf) : []),
  ]);

/** A block is begun when every portion of the one before is dry. */
function betweenBlocks(before: PlannedBlock, after: PlannedBlock, paceOf: PaceOf): ProgrammeLag[] {
  return before.portions.flatMap((steps) =>
    after.portions.flatMap((next) => nextLags(steps[steps.length - 1], next[0], paceOf)),
  );
}

/**
 * The lags of a lot, in minutes at 20 °C and 50 % RH with the pace their coat dries at: between coats, from step to step with the window in which
 * the next has to start or to be done, to steps further on, and the limits `within`, which run by the clock whatever the air.
 */
export function lotLags(blocks: readonly PlannedBlock[], buildUp: BuildUp): ProgrammeLag[] {
  const models = new Map(buildUp.steps.map((step) => [step.id, step.drying.model]));
  const paceOf: PaceOf = ({ stepId }) => paceOfModel(models.get(stepId) ?? 'spirit');
  const all = blocks.flatMap(({ portions }) => portions.flat());
  return [
    ...blocks.flatMap((block) => [
      ...block.portions.flatMap((steps) => inPortion(steps, paceOf)),
      ...portionLags(block),
    ]),
    ...blocks.slice(1).flatMap((block, at) => betweenBlocks(blocks[at], block, paceOf)),
    ...all.flatMap((step) => furtherLags(step, all, paceOf)),
  ];
}
