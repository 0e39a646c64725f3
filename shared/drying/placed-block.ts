import { freeSpan, type Span } from '#shared/drying/free-span';
import type { SequenceStep } from '#shared/drying/sequence-step';
import type { TimedStep } from '#shared/drying/timed-step';
import type { WorkingTime } from '#shared/drying/working-time';

/** One coat of a step (or of a portion of it) laid into the week. */
export interface PlacedCoat extends Span {
  readonly step: SequenceStep;
  readonly coat: number;
  readonly handsOn_minutes: number;
}

/** The week, and whether work is laid down although a limit is passed. */
export interface BlockRules {
  readonly time: WorkingTime;
  readonly keepsLimits: boolean;
}

/** The coats of a block as far as they were laid, and whether all of them are, inside their limits. */
export interface PlacedBlock {
  readonly coats: readonly PlacedCoat[];
  readonly isWhole: boolean;
}

interface Limits {
  readonly from_minutes: number;
  readonly startBy_minutes: number;
  readonly endBy_minutes: number;
}

type Coats = readonly PlacedCoat[];

function lagsUntil({ lags }: TimedStep, placed: Coats): number {
  let until = 0;
  for (const { fromStepId, least_minutes } of lags)
    for (const one of placed)
      if (one.step.stepId === fromStepId) until = Math.max(until, one.end_minutes + least_minutes);
  return until;
}

/** From when to when the first coat of a step may be done, given the coats before it. */
function firstCoatLimits(timed: TimedStep, placed: Coats, from_minutes: number): Limits {
  const before = placed.at(-1);
  if (!before) return { from_minutes, startBy_minutes: Infinity, endBy_minutes: Infinity };
  const { opens_minutes, closes_minutes, endsInWindow } = before.step;
  const earliest = Math.max(from_minutes, before.end_minutes + opens_minutes, lagsUntil(timed, placed));
  const shut = closes_minutes === null ? Infinity : before.end_minutes + closes_minutes;
  return { from_minutes: earliest, startBy_minutes: shut, endBy_minutes: endsInWindow ? shut : Infinity };
}

function nextCoatLimits({ step }: TimedStep, last_minutes: number): Limits {
  const startBy_minutes = last_minutes + (step.latestCoat_minutes ?? Infinity);
  return { from_minutes: last_minutes + step.betweenCoats_minutes, startBy_minutes, endBy_minutes: Infinity };
}

/** The latest end of a step by limits that run from the start of an earlier one, or of its own first coat. */
function finishBy({ step, lags }: TimedStep, placed: Coats, first: PlacedCoat): number {
  let latest = step.wholeWithin_minutes === null ? Infinity : first.start_minutes + step.wholeWithin_minutes;
  for (const { fromStepId, finishedWithin_minutes } of lags)
    for (const one of placed)
      if (one.coat === 1 && one.step.stepId === fromStepId)
        latest = Math.min(latest, one.start_minutes + finishedWithin_minutes);
  return latest;
}

function placedCoat(timed: TimedStep, coat: number, at: { from_minutes: number; time: WorkingTime }): PlacedCoat {
  const { step, handsOn_minutes, work_minutes, busy } = timed;
  const { start_minutes, end_minutes } = freeSpan(busy, { from_minutes: at.from_minutes, work_minutes }, at.time);
  return { step, coat, handsOn_minutes, start_minutes, end_minutes };
}

/** Lays the coats of one step after those placed before it; false where a limit is passed. */
function placeStep(timed: TimedStep, coats: PlacedCoat[], at: BlockRules & { from_minutes: number }): boolean {
  const from_minutes = Math.max(at.from_minutes, timed.notBefore_minutes);
  let limits = firstCoatLimits(timed, coats, from_minutes);
  let first: PlacedCoat | null = null;
  for (let coat = 1; coat <= timed.step.coats; coat += 1) {
    const one = placedCoat(timed, coat, { from_minutes: limits.from_minutes, time: at.time });
    first ??= one;
    coats.push(one);
    const endBy_minutes = Math.min(limits.endBy_minutes, finishBy(timed, coats, first));
    if (at.keepsLimits && (one.start_minutes > limits.startBy_minutes || one.end_minutes > endBy_minutes)) return false;
    limits = nextCoatLimits(timed, one.end_minutes);
  }
  return true;
}

/** Lays the coats of a block into the week from a moment on, one after another as early as they may, up to the first that passes a limit. */
export function placedBlock(steps: readonly TimedStep[], from_minutes: number, rules: BlockRules): PlacedBlock {
  const coats: PlacedCoat[] = [];
  const isWhole = steps.every((timed) => placeStep(timed, coats, { ...rules, from_minutes }));
  return { coats, isWhole };
}
