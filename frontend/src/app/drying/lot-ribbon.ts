import type { SequenceStep } from '#shared/drying/sequence-step';
import type { WorkingTime } from '#shared/drying/working-time';
import type { WorkedLot, WorkedTask } from './worked-lot';
import { type Stretch, workingParts } from './working-parts';

/** What is drawn of a lot: when hands are on it, when it dries, when the next step may be done. */
export interface LotRibbon {
  readonly work: readonly (Stretch & { readonly label: string })[];
  readonly drying: readonly Stretch[];
  readonly windows: readonly (Stretch & { readonly label: string })[];
}

interface Done {
  readonly task: WorkedTask;
  readonly step: SequenceStep;
}

const doneOf = ({ tasks, steps }: WorkedLot): Done[] =>
  tasks.flatMap((task) => {
    const step = steps.find(({ stepId }) => stepId === task.stepId);
    return step ? [{ task, step }] : [];
  });

/** A step is named where its first coat begins. */
const labelOf = ({ task, step }: Done): string => (task.coat === 1 ? step.name : '');

const dryingOf = ({ task, step }: Done): Stretch => ({
  from_minutes: task.end_minutes,
  to_minutes: task.end_minutes + (task.coat < step.coats ? step.betweenCoats_minutes : step.opens_minutes),
});

/** The next step may start from when this one has dried until its window shuts. */
function ownWindow({ task, step }: Done): (Stretch & { label: string })[] {
  if (step.closes_minutes === null || task.coat < step.coats) return [];
  const { end_minutes } = task;
  return [
    {
      from_minutes: end_minutes + step.opens_minutes,
      to_minutes: end_minutes + step.closes_minutes,
      label: step.name,
    },
  ];
}

/** A step that has to be finished within a time of the start of an earlier one: its window opens when what stands before it has dried. */
function laggedWindows(done: Done, all: readonly Done[]): (Stretch & { label: string })[] {
  if (done.task.coat > 1) return [];
  const portion = all.filter(({ task }) => task.portion === done.task.portion);
  return done.step.lags.flatMap(({ toStepId, finishedWithin_minutes }) => {
    const at = portion.findIndex(({ step }) => step.stepId === toStepId);
    const before = at > 0 ? portion.at(at - 1) : undefined;
    if (finishedWithin_minutes === null || !before) return [];
    const from_minutes = before.task.end_minutes + before.step.opens_minutes;
    const to_minutes = done.task.start_minutes + finishedWithin_minutes;
    return to_minutes > from_minutes ? [{ from_minutes, to_minutes, label: portion[at]?.step.name ?? '' }] : [];
  });
}

/** The ribbon of one lot, hands-on work cut to working hours. */
export function lotRibbon(lot: WorkedLot, time: WorkingTime): LotRibbon {
  const done = doneOf(lot);
  return {
    work: done.flatMap((one) => {
      const { start_minutes, end_minutes } = one.task;
      const parts = workingParts({ from_minutes: start_minutes, to_minutes: end_minutes }, time);
      return parts.map((part, index) => ({ ...part, label: index === 0 ? labelOf(one) : '' }));
    }),
    drying: done.map(dryingOf).filter(({ from_minutes, to_minutes }) => to_minutes > from_minutes),
    windows: done.flatMap((one) => [...ownWindow(one), ...laggedWindows(one, done)]),
  };
}
