import type { BusySpans } from '#shared/drying/free-span';
import type { SequenceStep } from '#shared/drying/sequence-step';
import type { WorkingTime } from '#shared/drying/working-time';
import { countUp } from '#shared/money/settled';

/** When each grade is busy. */
export type BusyGrades = ReadonlyMap<string, BusySpans>;

/** What placing needs to know: where each grade is busy, how early each step may start, and into how many portions the work is split. */
export interface Placing {
  readonly time: WorkingTime;
  readonly busy: BusyGrades;
  /** How early each step may start, by its id; one that is not named may start at once. */
  readonly notBefore_minutes: ReadonlyMap<string, number>;
  readonly portions: number;
}

/** A limit an earlier step of the block sets to a later one. */
export interface LagTo {
  readonly fromStepId: string;
  readonly least_minutes: number;
  readonly finishedWithin_minutes: number;
}

/** A step of a block with the work of one coat of one portion, and what its start has to mind. */
export interface TimedStep {
  readonly step: SequenceStep;
  readonly handsOn_minutes: number;
  readonly work_minutes: number;
  readonly notBefore_minutes: number;
  readonly busy: BusySpans;
  readonly lags: readonly LagTo[];
}

function lagsTo(step: SequenceStep, steps: readonly SequenceStep[]): LagTo[] {
  return steps.flatMap((from) =>
    from.lags
      .filter((lag) => lag.toStepId === step.stepId)
      .map(({ least_minutes, finishedWithin_minutes }) => ({
        fromStepId: from.stepId,
        least_minutes: least_minutes ?? 0,
        finishedWithin_minutes: finishedWithin_minutes ?? Infinity,
      })),
  );
}

/** The steps of a block made ready to be placed again and again: minutes rounded up for one coat of one portion. */
export function timedSteps(
  steps: readonly SequenceStep[],
  { time, busy, notBefore_minutes, portions }: Placing,
): TimedStep[] {
  return steps.map((step) => {
    const handsOn_minutes = countUp(step.handsOn_minutes / step.coats / portions);
    return {
      step,
      handsOn_minutes,
      work_minutes: countUp((handsOn_minutes * 100) / time.productiveShare_percent),
      notBefore_minutes: notBefore_minutes.get(step.stepId) ?? 0,
      busy: busy.get(step.gradeId) ?? [],
      lags: lagsTo(step, steps),
    };
  });
}
