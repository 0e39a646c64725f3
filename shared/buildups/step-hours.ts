import { areaShare } from '#shared/buildups/area-share';
import type { BuildUpStep, StepKind, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { minutesPerLaid } from '#shared/buildups/minutes-per-laid';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { mapTriple, type Triple } from '#shared/units/triple';
import type { Reason } from '#shared/words/reason';

/** Which triple of the card spreads the hours of a step; one draw for all steps of a pattern. */
export type SpreadPattern = 'gilding' | 'painting' | 'consolidating' | 'cleaning' | 'recutting';

/** Hands-on hours of one step on one zone. `perLaid_hours` is set for laying, where hours follow the leaves, pieces or metres laid. */
export interface StepHours {
  readonly stepId: string;
  readonly kind: StepKind;
  readonly name: string;
  readonly gradeId: string;
  readonly coats: number;
  readonly pattern: SpreadPattern;
  readonly hours: Triple;
  readonly perLaid_hours: number | null;
  readonly reasons: readonly Reason[];
}

/** A step on a zone, with the coats it gets there. */
export interface StepOnZone {
  readonly step: BuildUpStep;
  readonly facts: ZoneFacts;
  readonly system: System;
  readonly coats: number;
}

type Worked = Pick<StepHours, 'pattern' | 'hours' | 'perLaid_hours' | 'reasons'>;

const squareMetres = (area_mm2: number): number => area_mm2 / 1e6;

const add = (a: Triple, b: Triple): Triple => ({
  low: a.low + b.low,
  likely: a.likely + b.likely,
  high: a.high + b.high,
});

const worked = (pattern: SpreadPattern, hours: Triple, reasons: Reason[]): Worked => ({
  pattern,
  hours,
  perLaid_hours: null,
  reasons,
});

/** Plan area × share × coats × hours per m² × finish factor; ornament painted in glazes is taken out and goes by the dm². */
function byArea(on: StepOnZone, hours_m2: number, card: BuildUpCard): Worked {
  const { step, facts, coats } = on;
  const painted_mm2 = step.kind === 'glaze' ? Math.min(facts.paintedOrnament_mm2, facts.plan_mm2) : 0;
  const area_mm2 = (facts.plan_mm2 - painted_mm2) * areaShare(step, facts, card);
  const factor = finishFactor(on, card);
  const likely = squareMetres(area_mm2) * coats * hours_m2 * factor;
  const plain = mapTriple(card.spread, (spread) => spread * likely);
  const values = { step: step.name, area_mm2, coats, rate_hours: hours_m2, factor };
  const reason: Reason = { code: 'buildup-hours-by-area', values, figure: likely, unit: 'hours', house: step.name };
  if (painted_mm2 === 0) return worked('gilding', plain, [reason]);
  return withPaintedOrnament(worked('painting', plain, [reason]), painted_mm2, { on, card });
}

function withPaintedOrnament(plain: Worked, painted_mm2: number, at: { on: StepOnZone; card: BuildUpCard }): Worked {
  const dm2 = painted_mm2 / 1e4;
  const painted = mapTriple(at.card.paintedOrnament_hours_dm2, (rate) => rate * dm2 * at.on.coats);
  const values = {
    step: at.on.step.name,
    area_mm2: painted_mm2,
    coats: at.on.coats,
    rate_hours: at.card.paintedOrnament_hours_dm2.likely,
  };
  const reason: Reason = {
    code: 'buildup-hours-painted',
    values,
    figure: painted.likely,
    unit: 'hours',
    house: at.on.step.name,
  };
  return worked('painting', add(plain.hours, painted), [...plain.reasons, reason]);
}

function finishFactor({ step, facts }: StepOnZone, card: BuildUpCard): number {
  if (step.work.way !== 'area' || step.work.factors === 'none') return 1;
  return (step.work.factors === 'finish' ? card.finishFactors : card.smoothingFactors)[facts.finish];
}

function byLaying(on: StepOnZone, part: 'first' | 'faulting' | 'second', card: BuildUpCard): Worked {
  const minutes = minutesPerLaid(on.facts, on.system, card.laying);
  const laid = on.facts.laying?.counts[part] ?? 0;
  const likely = (minutes * laid) / 60;
  const values = { step: on.step.name, laid, rate: minutes, way: on.facts.laying?.way ?? 'none' };
  const reason: Reason = {
    code: 'buildup-hours-by-laying',
    values,
    figure: likely,
    unit: 'hours',
    house: on.step.name,
  };
  const hours = mapTriple(card.spread, (spread) => spread * likely);
  return { pattern: 'gilding', hours, perLaid_hours: minutes / 60, reasons: [reason] };
}

function byEdge({ step, facts }: StepOnZone, card: BuildUpCard): Worked {
  const likely = (facts.protectedEdge_mm / 1000) * card.protectingEdge_hours_m;
  const values = { step: step.name, edge_mm: facts.protectedEdge_mm, rate_hours: card.protectingEdge_hours_m };
  const reason: Reason = { code: 'buildup-hours-by-edge', values, figure: likely, unit: 'hours', house: step.name };
  return worked(
    'gilding',
    mapTriple(card.spread, (spread) => spread * likely),
    [reason],
  );
}

function byOwnTriple({ step, facts }: StepOnZone, pattern: 'consolidating' | 'cleaning', card: BuildUpCard): Worked {
  const rate = pattern === 'cleaning' ? card.cleaning_hours_m2 : card.consolidating_hours_m2;
  const hours = mapTriple(rate, (hours_m2) => hours_m2 * squareMetres(facts.plan_mm2));
  const values = { step: step.name, area_mm2: facts.plan_mm2, rate_hours: rate.likely };
  return worked(pattern, hours, [
    { code: 'buildup-hours-restoring', values, figure: hours.likely, unit: 'hours', house: step.name },
  ]);
}

function byRecutting({ step, facts }: StepOnZone): Worked {
  const hours = { low: facts.recutting_hours, likely: facts.recutting_hours, high: facts.recutting_hours };
  const reason: Reason = {
    code: 'buildup-hours-recutting',
    values: { step: step.name },
    figure: hours.likely,
    unit: 'hours',
  };
  return worked('recutting', hours, [reason]);
}

function work(on: StepOnZone, card: BuildUpCard): Worked {
  const how = on.step.work;
  switch (how.way) {
    case 'area':
      return byArea(on, how.hours_m2, card);
    case 'laying':
      return byLaying(on, how.part, card);
    case 'edge':
      return byEdge(on, card);
    case 'recutting':
      return byRecutting(on);
    case 'consolidating':
    case 'cleaning':
      return byOwnTriple(on, how.way, card);
    case 'waiting':
      return worked('gilding', { low: 0, likely: 0, high: 0 }, []);
  }
}

/** Hands-on hours of one step on one zone, low, likely and high, set-up left out. House values throughout. */
export function stepHours(on: StepOnZone, card: BuildUpCard): StepHours {
  const { id, kind, name, gradeId } = on.step;
  const { pattern, hours, perLaid_hours, reasons } = work(on, card);
  return { stepId: id, kind, name, gradeId, coats: on.coats, pattern, hours, perLaid_hours, reasons };
}
