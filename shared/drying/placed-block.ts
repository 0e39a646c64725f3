import { type BusySpans, freeSpan, type Span } from '#shared/drying/free-span';
import type { SequenceStep } from '#shared/drying/lot-sequence';
import type { WorkingTime } from '#shared/drying/working-time';
import { countUp } from '#shared/money/settled';

/** One coat of a step (or of a portion of it) laid into the week. */
export interface PlacedCoat extends Span {
  readonly step: SequenceStep;
  readonly coat: number;
  readonly handsOn_minutes: number;
}

/** When each grade is busy. */
export type BusyGrades = ReadonlyMap<string, BusySpans>;

/** What placing needs to know: where each grade is busy, how early each step may start, and into how many portions the work is split. */
export interface Placing {
  readonly time: WorkingTime;
  readonly busy: BusyGrades;
  readonly notBefore: (step: SequenceStep) => number;
  readonly portions: number;
  /** False lays the work down although a limit is passed. */
  readonly keepsLimits: boolean;
}

/** The coats of a block as far as they were laid, and whether all of them are, inside their limits. */
export interface PlacedBlock {
  readonly coats: readonly PlacedCoat[];
  readonly isWhole: boolean;
}

const clockMinutes = (handsOn_minutes: number, { productiveShare_percent }: WorkingTime): number =>
  countUp((handsOn_minutes * 100) / productiveShare_percent);

interface Limits {
  readonly from_minutes: number;
  readonly startBy_minutes: number;
  readonly endBy_minutes: number;
}

/** From when to when the first coat of a step may be done, given the coats before it. */
function firstCoatLimits(step: SequenceStep, placed: readonly PlacedCoat[], from_minutes: number): Limits {
  const before = placed[placed.length - 1];
  const earliest = before
    ? Math.max(from_minutes, before.end_minutes + before.step.opens_minutes, lagsUntil(step, placed))
    : from_minutes;
  const closes = before?.step.closes_minutes ?? null;
  if (!before || closes === null) return { from_minutes: earliest, startBy_minutes: Infinity, endBy_minutes: Infinity };
  const shut = before.end_minutes + closes;
  return { from_minutes: earliest, startBy_minutes: shut, endBy_minutes: before.step.endsInWindow ? shut : Infinity };
}

function lagsUntil(step: SequenceStep, placed: readonly PlacedCoat[]): number {
  const ends = placed.flatMap((one) =>
    one.step.lags
      .filter((lag) => lag.toStepId === step.stepId)
      .map((lag) => one.end_minutes + (lag.least_minutes ?? 0)),
  );
  return Math.max(0, ...ends);
}

/** The latest end of a step by limits that run from the start of an earlier one, or of itself. */
function finishBy(step: SequenceStep, placed: readonly PlacedCoat[]): number {
  const own = placed.find((one) => one.step.stepId === step.stepId);
  const whole = own && step.wholeWithin_minutes !== null ? own.start_minutes + step.wholeWithin_minutes : Infinity;
  const lagged = placed.flatMap((one) =>
    one.step.lags
      .filter((lag) => lag.toStepId === step.stepId && one.coat === 1)
      .map((lag) => one.start_minutes + (lag.finishedWithin_minutes ?? Infinity)),
  );
  return Math.min(whole, ...lagged);
}

function limitsOf(
  step: SequenceStep,
  coat: number,
  at: { placed: readonly PlacedCoat[]; from_minutes: number },
): Limits {
  if (coat === 1) return firstCoatLimits(step, at.placed, at.from_minutes);
  const last = at.placed[at.placed.length - 1]?.end_minutes ?? at.from_minutes;
  const startBy_minutes = last + (step.latestCoat_minutes ?? Infinity);
  return { from_minutes: last + step.betweenCoats_minutes, startBy_minutes, endBy_minutes: Infinity };
}

function placedCoat(step: SequenceStep, coat: number, at: { limits: Limits; placing: Placing }): PlacedCoat {
  const { limits, placing } = at;
  const handsOn_minutes = countUp(step.handsOn_minutes / step.coats / placing.portions);
  const wanted = { from_minutes: limits.from_minutes, work_minutes: clockMinutes(handsOn_minutes, placing.time) };
  return { step, coat, handsOn_minutes, ...freeSpan(placing.busy.get(step.gradeId) ?? [], wanted, placing.time) };
}

const keeps = (one: PlacedCoat, limits: Limits, finish: number): boolean =>
  one.start_minutes <= limits.startBy_minutes && one.end_minutes <= Math.min(limits.endBy_minutes, finish);

/** Lays the coats of a block into the week from a moment on, one after another as early as they may, up to the first that passes a limit. */
export function placedBlock(steps: readonly SequenceStep[], from_minutes: number, placing: Placing): PlacedBlock {
  const coats: PlacedCoat[] = [];
  for (const step of steps) {
    const notBefore_minutes = Math.max(from_minutes, placing.notBefore(step));
    for (let coat = 1; coat <= step.coats; coat += 1) {
      const limits = limitsOf(step, coat, { placed: coats, from_minutes: notBefore_minutes });
      const one = placedCoat(step, coat, { limits, placing });
      coats.push(one);
      if (placing.keepsLimits && !keeps(one, limits, finishBy(step, coats))) return { coats, isWhole: false };
    }
  }
  return { coats, isWhole: true };
}
