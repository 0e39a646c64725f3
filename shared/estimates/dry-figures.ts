import type { EstimateWork } from '#shared/estimates/estimate-work';
import type { EstimateSettings } from '#shared/estimates/settings';
import { jobSequence, type JobSequence, type LotSpan, type PlacedHold } from '#shared/drying/job-sequence';
import { lotSequence, type LotSequence } from '#shared/drying/lot-sequence';
import { endOfWork } from '#shared/drying/end-of-work';
import { woodMovement, type WoodMovement } from '#shared/drying/wood-movement';
import { workingTime, type WorkingTime } from '#shared/drying/working-time';
import { countUp } from '#shared/money/settled';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

/** One stretch of hands-on work of a coat, in elapsed minutes from the start of the job. */
export interface DryTask {
  readonly lotId: string;
  readonly stepId: string;
  readonly coat: number;
  readonly portion: number;
  readonly start_minutes: number;
  readonly end_minutes: number;
  readonly handsOn_minutes: number;
}

/** A lot with its steps and when it is in work. */
export interface DryLot extends Omit<LotSequence, 'findings' | 'system'>, Omit<LotSpan, 'lotId' | 'handsOn_minutes'> {
  readonly buildUp: string;
}

/** Hands-on and waiting time of the job as a sequence by lots; elapsed time, no dates. */
export interface DryFigures extends Omit<JobSequence, 'tasks' | 'lots' | 'holds' | 'findings'> {
  readonly lots: readonly DryLot[];
  readonly tasks: readonly DryTask[];
  /** Approvals that are waited for. */
  readonly holds: readonly PlacedHold[];
  /** Carving before the first lot can be sized, one carver at work. */
  readonly carving_minutes: number;
  /** The week the work is laid into. */
  readonly time: WorkingTime;
  /** Moisture wood comes to rest at in the shop and where the piece will stand. */
  readonly shopMoisture_percent: number;
  readonly siteMoisture_percent: number;
}

/** Carving of each member before it is sized; recutting comes later, as a step of its lot. */
function carvingByMember({ labour, zones }: EstimateWork): Map<string, number> {
  const hours = new Map<string, number>();
  const add = (memberId: string, more: number) => hours.set(memberId, (hours.get(memberId) ?? 0) + more);
  for (const entry of labour) if (entry.memberId && entry.kind === 'carving') add(entry.memberId, entry.hours);
  for (const { memberId, facts } of zones) add(memberId, -facts.recutting_hours);
  return hours;
}

/** One carver works through the members in the order of the lots; a lot is ready when all its members are carved. */
function readyTimes(work: EstimateWork, time: WorkingTime): Record<string, number> {
  const toCarve = carvingByMember(work);
  const memberOf = new Map(work.zones.map(({ facts, memberId }) => [facts.id, memberId]));
  let hours = 0;
  const ready: Record<string, number> = {};
  for (const lot of work.lots) {
    for (const zoneId of lot.zoneIds) {
      const memberId = memberOf.get(zoneId) ?? '';
      hours += toCarve.get(memberId) ?? 0;
      toCarve.delete(memberId);
    }
    const clock = countUp((hours * 60 * 100) / time.productiveShare_percent);
    ready[lot.id] = clock === 0 ? 0 : endOfWork(0, clock, time);
  }
  return ready;
}

function dryLot(sequence: LotSequence, span: LotSpan, { buildUps }: RateCard): DryLot {
  const { lotId, pieceId, buildUpId, steps, handsOn_minutes, drying_minutes } = sequence;
  const { start_minutes, end_minutes, waiting_minutes } = span;
  return {
    ...{ lotId, pieceId, buildUpId, steps, handsOn_minutes, drying_minutes },
    buildUp: buildUps.buildUps.find((known) => known.id === buildUpId)?.name ?? buildUpId,
    ...{ start_minutes, end_minutes, waiting_minutes },
  };
}

/** The wood itself between shop and site, no width of it in particular. */
const woodAtRest = ({ shop, site }: EstimateSettings, card: RateCard): WoodMovement =>
  woodMovement({ width_mm: 0, coefficient: 0, from: shop, to: site, isGessoedJoint: false }, card.drying);

/** Lays a job's lots into the workshop's week in the shop's air: minutes rounded up, one worker of each grade, holds waited for. */
export function dryFigures(
  work: EstimateWork,
  settings: EstimateSettings,
  card: RateCard,
): { dry: DryFigures; findings: Finding[] } {
  const time = workingTime(card.buildUps, card.drying);
  const sequences = work.lots.map((lot) => lotSequence(lot, settings.shop, card));
  const ready_minutes = readyTimes(work, time);
  const job = jobSequence({ lots: sequences, ready_minutes, holds_days: card.drying.holds_days, time });
  const { elapsed_minutes, elapsed_workingDays, elapsed_weeks } = job;
  const wood = woodAtRest(settings, card);
  const dry = {
    ...{ elapsed_minutes, elapsed_workingDays, elapsed_weeks },
    carving_minutes: Math.max(0, ...Object.values(ready_minutes)),
    time,
    shopMoisture_percent: wood.from_percent,
    siteMoisture_percent: wood.to_percent,
    lots: sequences.map((sequence, place) => dryLot(sequence, job.lots[place], card)),
    tasks: job.tasks.map(({ lotId, step, coat, portion, start_minutes, end_minutes, handsOn_minutes }) => ({
      ...{ lotId, stepId: step.stepId, coat, portion, start_minutes, end_minutes, handsOn_minutes },
    })),
    holds: job.holds,
  };
  return { dry, findings: [...sequences.flatMap((sequence) => sequence.findings), ...job.findings, ...wood.findings] };
}
