import { addMonths } from '#shared/calendar/add-days';
import { type Day, dayFrom, partsOfDay } from '#shared/calendar/day';
import type { ClimateModel } from '#shared/buildups/buildup';
import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { dryingFactor } from '#shared/drying/drying-factor';
import { calendarLength_days } from '#shared/programme/shop-calendar-of';
import { minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { Pace } from '#shared/programme/programme-request';
import type { Finding } from '#shared/words/finding';

/** The air a programme is planned in: one throughout, or twelve by month from January on. */
export type ProgrammeAir = Climate | readonly Climate[];

const isByMonth = (air: ProgrammeAir): air is readonly Climate[] => Array.isArray(air);

interface Stretch {
  readonly from_minutes: number;
  readonly day: Day;
  readonly climate: Climate;
}

function stretchesOf(air: ProgrammeAir, frame: ProgrammeFrame): Stretch[] {
  if (!isByMonth(air)) return [{ from_minutes: 0, day: frame.firstDay, climate: air }];
  const [year, month] = partsOfDay(frame.firstDay);
  const months = Math.ceil(calendarLength_days / 28);
  return Array.from({ length: months }, (_, at) => {
    const first = addMonths(dayFrom(year, month, 1), at);
    const day = at === 0 ? frame.firstDay : first;
    return { from_minutes: minutesOfDay(day, frame), day, climate: air[(month - 1 + at) % 12] };
  });
}

/** Spirit goes off at its own pace, so it needs none. */
const pacedModels = ['water', 'oil'] as const satisfies readonly ClimateModel[];

/** Air in which nothing dries stops the drying for as long as it lasts. */
const standstill = 1e6;

const joined = (stretches: Pace['stretches']): Pace['stretches'] =>
  stretches.filter(({ factor }, at) => at === 0 || stretches[at - 1].factor !== factor);

function paceOf(model: ClimateModel, stretches: readonly Stretch[], card: DryingCard) {
  const worked = stretches.map(({ from_minutes, climate }) => ({
    from_minutes,
    air: dryingFactor(model, climate, card),
  }));
  return {
    pace: {
      id: model,
      stretches: joined(worked.map(({ from_minutes, air }) => ({ from_minutes, factor: air.factor ?? standstill }))),
    },
    findings: worked.flatMap(({ air }) => air.findings),
  };
}

/** Each finding once; a month in which nothing dries is no reason to refuse the rest of the year. */
function toldOnce(findings: readonly Finding[], byMonth: boolean): Finding[] {
  const told = new Map(findings.map((finding) => [JSON.stringify(finding), finding]));
  return [...told.values()].map((one) => (one.kind === 'refuse' && byMonth ? { ...one, kind: 'warn' } : one));
}

/**
 * How fast water-borne and oil coats dry through the year against 20 °C and 50 % RH (`dryingFactor`: VPD for water, a doubling by 10 °C for oil), by
 * model. Air in which nothing dries soundly is refused where it is the same throughout; by month it stops the drying and is told.
 */
export function dryingPaces(
  air: ProgrammeAir,
  frame: ProgrammeFrame,
  card: DryingCard,
): { readonly paces: Pace[]; readonly findings: Finding[] } {
  const stretches = stretchesOf(air, frame);
  const worked = pacedModels.map((model) => paceOf(model, stretches, card));
  const findings = worked.flatMap((one) => one.findings);
  return { paces: worked.map(({ pace }) => pace), findings: toldOnce(findings, isByMonth(air)) };
}

/** The pace of a model of drying; null for spirit. */
export const paceOfModel = (model: ClimateModel): string | null => (model === 'spirit' ? null : model);
