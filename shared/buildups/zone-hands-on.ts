import type { BuildUp } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { coatsOf } from '#shared/buildups/coats-of';
import { stepHours, type StepHours } from '#shared/buildups/step-hours';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';

/** Hours that fall to one grade. */
export interface GradeTriple {
  readonly gradeId: string;
  readonly hours: Triple;
}

/** Hands-on hours of a zone by step and by grade; recutting stands among the steps but not in the sums, since carving counts it. */
export interface ZoneHandsOn {
  readonly zoneId: string;
  readonly steps: readonly StepHours[];
  readonly grades: readonly GradeTriple[];
  readonly hours: Triple;
  readonly findings: readonly Finding[];
}

const nothing: Triple = { low: 0, likely: 0, high: 0 };

const sum = (a: Triple, b: Triple): Triple => ({
  low: a.low + b.low,
  likely: a.likely + b.likely,
  high: a.high + b.high,
});

function byGrade(steps: readonly StepHours[]): GradeTriple[] {
  const grades = new Map<string, Triple>();
  for (const step of steps) grades.set(step.gradeId, sum(grades.get(step.gradeId) ?? nothing, step.hours));
  return [...grades].map(([gradeId, hours]) => ({ gradeId, hours }));
}

function refuseNegative(facts: ZoneFacts): void {
  const given = [
    facts.plan_mm2,
    facts.true_mm2,
    facts.paintedOrnament_mm2,
    facts.protectedEdge_mm,
    facts.recutting_hours,
  ];
  if (given.some((figure) => !(figure >= 0)))
    throw new RangeError('areas, lengths and hours of a zone are never negative');
}

/**
 * Hands-on hours of one zone in decimal hours: plan area × coats × rate × finish factor, leaf by the pieces laid, painted ornament by the dm²,
 * edges by the metre; set-up is counted by the lot. Throws a RangeError for a negative figure. House values.
 */
export function zoneHandsOn(facts: ZoneFacts, card: BuildUpCard): ZoneHandsOn {
  refuseNegative(facts);
  const buildUp = card.buildUps.find((known) => known.id === facts.buildUpId);
  if (!buildUp) return { zoneId: facts.id, steps: [], grades: [], hours: nothing, findings: [unknownBuildUp(facts)] };
  const steps = stepsDone(buildUp, facts).map((step) =>
    stepHours({ step, facts, system: buildUp.system, coats: coatsOf(step, facts) }, card),
  );
  const counted = steps.filter((step) => step.pattern !== 'recutting');
  const hours = counted.reduce((total, step) => sum(total, step.hours), nothing);
  return { zoneId: facts.id, steps, grades: byGrade(counted), hours, findings: edgeFindings(buildUp, facts) };
}

const unknownBuildUp = (facts: ZoneFacts): Finding => ({
  kind: 'missing',
  code: 'buildup-unknown',
  values: { buildup: facts.buildUpId },
  about: facts.id,
});

function edgeFindings(buildUp: BuildUp, facts: ZoneFacts): Finding[] {
  if (facts.protectedEdge_mm === 0 || buildUp.steps.some((step) => step.work.way === 'edge')) return [];
  const values = { buildup: buildUp.name, edge_mm: facts.protectedEdge_mm };
  return [{ kind: 'missing', code: 'buildup-edge-not-in-steps', values, about: facts.id }];
}
