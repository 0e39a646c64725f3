import type { SequenceStep } from '#shared/drying/sequence-step';

/** Steps of a lot that upper limits tie together: they are started only when all of them can be done inside their times. */
export interface StepBlock {
  readonly steps: readonly SequenceStep[];
  /** May be done in portions, since its limits run from the start of a portion. */
  readonly inPortions: boolean;
}

function reach(steps: readonly SequenceStep[], at: number): number {
  const step = steps[at];
  if (!step) return at;
  const ends = step.lags
    .filter((lag) => lag.finishedWithin_minutes !== null)
    .map((lag) => steps.findIndex((one) => one.stepId === lag.toStepId));
  return Math.max(at, step.closes_minutes === null ? at : at + 1, ...ends);
}

const isPortioned = (steps: readonly SequenceStep[]): boolean =>
  steps.some(
    (step) =>
      step.wholeWithin_minutes !== null ||
      step.endsInWindow ||
      step.lags.some((lag) => lag.finishedWithin_minutes !== null),
  );

/** The steps of a lot in blocks, in working order: a window ties the next step to its step, a limit from start to finish all steps up to the one it names. */
export function stepBlocks(steps: readonly SequenceStep[]): StepBlock[] {
  const blocks: StepBlock[] = [];
  for (let start = 0; start < steps.length;) {
    let end = start;
    for (let at = start; at <= end; at += 1) end = Math.min(steps.length - 1, Math.max(end, reach(steps, at)));
    const tied = steps.slice(start, end + 1);
    blocks.push({ steps: tied, inPortions: isPortioned(tied) });
    start = end + 1;
  }
  return blocks;
}
