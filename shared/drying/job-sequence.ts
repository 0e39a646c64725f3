import type { HoldPoint } from '#shared/buildups/buildup';
import { systemOrderFindings } from '#shared/buildups/system-order-findings';
import type { Span } from '#shared/drying/free-span';
import type { LotSequence } from '#shared/drying/lot-sequence';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { placedInPortions, type PlacedTask } from '#shared/drying/placed-in-portions';
import type { PlacedCoat } from '#shared/drying/placed-block';
import type { BusyGrades } from '#shared/drying/timed-step';
import { stepBlocks } from '#shared/drying/step-blocks';
import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import { endOfWork } from '#shared/drying/end-of-work';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import { workingDaysUntil } from '#shared/drying/working-days-until';
import type { WorkingTime } from '#shared/drying/working-time';
import type { Finding } from '#shared/words/finding';

/** What a job is laid out from: its lots in the order they are to be served, and when each is ready for its first step (0 where not said). */
export interface JobRequest {
  readonly lots: readonly LotSequence[];
  readonly ready_minutes: Readonly<Record<string, number>>;
  readonly holds_days: Readonly<Record<HoldPoint, number>>;
  readonly time: WorkingTime;
}

/** When a lot is in work, and how much of that is hands-on and how much waiting, in clock minutes. */
export interface LotSpan extends Span {
  readonly lotId: string;
  readonly handsOn_minutes: number;
  readonly waiting_minutes: number;
}

/** A wait for somebody: from when they can be asked until they have usually answered, before a step of a lot. */
export interface PlacedHold {
  readonly lotId: string;
  readonly stepId: string;
  readonly hold: HoldPoint;
  readonly from_minutes: number;
  readonly to_minutes: number;
  readonly usual_days: number;
}

/** A job in elapsed minutes from the start of work on the first day of a week; no dates. */
export interface JobSequence {
  readonly tasks: readonly PlacedTask[];
  readonly lots: readonly LotSpan[];
  readonly holds: readonly PlacedHold[];
  readonly elapsed_minutes: number;
  readonly elapsed_workingDays: number;
  readonly elapsed_weeks: number;
  readonly findings: readonly Finding[];
}

interface Plan {
  busy: BusyGrades;
  /** When gilding in water is done and protected, by piece: oily size waits for it. */
  readonly waterDone: Map<string, number>;
  readonly tasks: PlacedTask[];
  readonly findings: Finding[];
}

/** A hold asked for at a moment is over after so many working days: a sample from the start of the job, the rest when the lot is ready. */
function holdOf(hold: HoldPoint, ready_minutes: number, { holds_days, time }: JobRequest) {
  const usual_days = holds_days[hold];
  const from_minutes = nextWorkingMinute(hold === 'sample-approved' ? 0 : ready_minutes, time);
  return { hold, from_minutes, to_minutes: endOfWork(from_minutes, usual_days * time.day_minutes, time), usual_days };
}

/** What the steps of a lot wait for; a step that waits for nobody, or for no time, is left out. */
function holdsOf({ lotId, steps }: LotSequence, request: JobRequest): PlacedHold[] {
  const ready = request.ready_minutes[lotId] ?? 0;
  return steps.flatMap(({ stepId, holds }) =>
    holds
      .map((hold) => ({ lotId, stepId, ...holdOf(hold, ready, request) }))
      .filter(({ usual_days }) => usual_days > 0),
  );
}

function earliest(lot: LotSequence, at: { request: JobRequest; plan: Plan; placed: readonly PlacedCoat[] }) {
  const waits = holdsOf(lot, at.request);
  const ready = at.request.ready_minutes[lot.lotId] ?? 0;
  return (step: SequenceStep): number => {
    const holds = waits.filter(({ stepId }) => stepId === step.stepId).map(({ to_minutes }) => to_minutes);
    const lags = at.placed.flatMap((one) =>
      one.step.lags
        .filter((lag) => lag.toStepId === step.stepId)
        .map((lag) => one.end_minutes + (lag.least_minutes ?? 0)),
    );
    const water = step.kind === 'oil-size' ? (at.plan.waterDone.get(lot.pieceId) ?? 0) : 0;
    return Math.max(ready, water, ...holds, ...lags);
  };
}

const endOf = (placed: readonly PlacedCoat[]): number =>
  Math.max(0, ...placed.map((one) => one.end_minutes + one.step.opens_minutes));

/** The steps after which nothing of gilding in water is left to do. */
const waterSteps = ['lay', 'fault', 'second-laying', 'burnish', 'matte-size', 'protect-edge'];

function placeLot(lot: LotSequence, request: JobRequest, plan: Plan): LotSpan {
  const placed: PlacedTask[] = [];
  for (const block of stepBlocks(lot.steps)) {
    const earliestOf = earliest(lot, { request, plan, placed });
    const notBefore_minutes = new Map(block.steps.map((step) => [step.stepId, earliestOf(step)]));
    const placing = { time: request.time, busy: plan.busy, notBefore_minutes };
    const from_minutes = Math.max(endOf(placed), request.ready_minutes[lot.lotId] ?? 0);
    const { tasks, busy, findings } = placedInPortions(block, { lotId: lot.lotId, from_minutes, placing });
    placed.push(...tasks);
    plan.tasks.push(...tasks);
    plan.busy = busy;
    plan.findings.push(...findings);
  }
  if (lot.system === 'water') waterIsDone(lot.pieceId, placed, plan);
  return lotSpan(lot, placed, request.time);
}

function waterIsDone(pieceId: string, placed: readonly PlacedTask[], plan: Plan): void {
  const ends = placed.filter((task) => waterSteps.includes(task.step.kind)).map((task) => task.end_minutes);
  plan.waterDone.set(pieceId, Math.max(plan.waterDone.get(pieceId) ?? 0, ...ends));
}

function lotSpan(
  { lotId }: LotSequence,
  placed: readonly PlacedTask[],
  { productiveShare_percent }: WorkingTime,
): LotSpan {
  const handsOn_minutes = placed.reduce((sum, task) => sum + task.handsOn_minutes, 0);
  const start_minutes = placed.length > 0 ? Math.min(...placed.map((task) => task.start_minutes)) : 0;
  const end_minutes = endOf(placed);
  const worked = (handsOn_minutes * 100) / productiveShare_percent;
  return {
    lotId,
    start_minutes,
    end_minutes,
    handsOn_minutes,
    waiting_minutes: Math.max(0, end_minutes - start_minutes - worked),
  };
}

/**
 * Lays the lots of a job one after another into a simple week: one worker of each grade, hands-on in working hours, drying day and night and
 * overlapped by other lots' work, holds waited for, windows kept by choosing the start or working in portions. Elapsed minutes, working days and weeks.
 */
export function jobSequence(request: JobRequest): JobSequence {
  const plan: Plan = { busy: new Map(), waterDone: new Map(), tasks: [], findings: systemOrderFindings(request.lots) };
  const lots = request.lots.map((lot) => placeLot(lot, request, plan));
  const elapsed_minutes = Math.max(0, ...lots.map((lot) => lot.end_minutes));
  return {
    tasks: plan.tasks,
    lots,
    holds: request.lots.flatMap((lot) => holdsOf(lot, request)),
    elapsed_minutes,
    elapsed_workingDays: workingDaysUntil(elapsed_minutes, request.time),
    elapsed_weeks: elapsed_minutes / (7 * dayLength_minutes),
    findings: plan.findings,
  };
}
