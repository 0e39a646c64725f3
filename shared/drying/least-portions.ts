import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import type { SequenceStep } from '#shared/drying/sequence-step';
import type { WorkingTime } from '#shared/drying/working-time';
import { countUp } from '#shared/money/settled';

/** The most minutes of work that fall into a stretch of so many clock minutes, wherever it starts. */
const mostWork = (clock_minutes: number, { day_minutes }: WorkingTime): number =>
  Math.floor(clock_minutes / dayLength_minutes) * day_minutes +
  Math.min(clock_minutes % dayLength_minutes, day_minutes);

/** Steps that have to be done inside a stretch of so many clock minutes. */
interface Tied {
  readonly steps: readonly SequenceStep[];
  readonly within_minutes: number;
}

function tiedFrom(steps: readonly SequenceStep[], at: number): Tied[] {
  const step = steps[at];
  const next = steps[at + 1];
  const lagged = step.lags.flatMap(({ toStepId, finishedWithin_minutes }) => {
    const to = steps.findIndex((one) => one.stepId === toStepId);
    if (finishedWithin_minutes === null || to < 0) return [];
    return [{ steps: steps.slice(at, to + 1), within_minutes: finishedWithin_minutes }];
  });
  const whole = step.wholeWithin_minutes === null ? [] : [{ steps: [step], within_minutes: step.wholeWithin_minutes }];
  if (!next || step.closes_minutes === null || !step.endsInWindow) return [...lagged, ...whole];
  return [...lagged, ...whole, { steps: [next], within_minutes: step.closes_minutes - step.opens_minutes }];
}

/** Fewer portions than these cannot keep the limits of a block, however free the hands are: its work would not fit into them. At least 1. */
export function leastPortions(steps: readonly SequenceStep[], time: WorkingTime): number {
  const portions = steps.flatMap((_, at) =>
    tiedFrom(steps, at).map(({ steps: tied, within_minutes }) => {
      const handsOn = tied.reduce((sum, step) => sum + step.handsOn_minutes, 0);
      const room = mostWork(within_minutes, time);
      return room > 0 ? countUp((handsOn * 100) / time.productiveShare_percent / room) : 1;
    }),
  );
  return Math.max(1, ...portions);
}
