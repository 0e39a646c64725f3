import type { BuildUp, StepKind, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { setUpDays } from '#shared/buildups/set-up-days';
import type { StepHours } from '#shared/buildups/step-hours';
import { systemRank } from '#shared/buildups/system-order';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { zoneHandsOn } from '#shared/buildups/zone-hands-on';
import type { Reason } from '#shared/words/reason';

/** One step over a whole lot: likely hands-on hours of its zones, the most coats any of them gets, and set-up on the days it is worked. */
export interface LotStep {
  readonly stepId: string;
  readonly kind: StepKind;
  readonly name: string;
  readonly gradeId: string;
  readonly coats: number;
  readonly hours: number;
  readonly setUpDays: number;
  readonly setUp_hours: number;
  /** Hours counted with the carving, not with the gilding. */
  readonly isCarving: boolean;
  readonly reasons: readonly Reason[];
}

/** What is coated together: the zones of one piece with the same build-up. Its id is the piece's and the build-up's. */
export interface LotWork {
  readonly id: string;
  readonly pieceId: string;
  readonly buildUpId: string;
  readonly system: System;
  readonly zoneIds: readonly string[];
  readonly steps: readonly LotStep[];
  readonly setUp_hours: number;
}

interface ZoneSteps {
  readonly zoneId: string;
  readonly steps: readonly StepHours[];
}

function lotStep(buildUp: BuildUp, stepId: string, at: { zones: readonly ZoneSteps[]; card: BuildUpCard }): LotStep[] {
  const step = buildUp.steps.find((one) => one.id === stepId);
  const parts = at.zones.flatMap((zone) => zone.steps.filter((one) => one.stepId === stepId));
  const [first] = parts;
  if (!step || !first) return [];
  const hours = parts.reduce((sum, part) => sum + part.hours.likely, 0);
  const coats = Math.max(...parts.map((part) => part.coats));
  const days = setUpDays(step, { hours, coats }, at.card);
  const setUp_hours = days * at.card.setUp_hours;
  const values = { step: step.name, rate_hours: at.card.setUp_hours, days };
  const reason: Reason = { code: 'buildup-hours-set-up', values, figure: setUp_hours, unit: 'hours', house: step.name };
  const { kind, name, gradeId } = step;
  const isCarving = step.work.way === 'recutting';
  return [
    {
      stepId,
      kind,
      name,
      gradeId,
      coats,
      hours,
      setUpDays: days,
      setUp_hours,
      isCarving,
      reasons: days > 0 ? [reason] : [],
    },
  ];
}

function lotOf(buildUp: BuildUp, zones: readonly ZoneFacts[], card: BuildUpCard): LotWork {
  const worked = zones.map((zone) => ({ zoneId: zone.id, steps: zoneHandsOn(zone, card).steps }));
  const steps = buildUp.steps.flatMap((step) => lotStep(buildUp, step.id, { zones: worked, card }));
  const pieceId = zones[0]?.pieceId ?? '';
  return {
    id: `${pieceId}/${buildUp.id}`,
    pieceId,
    buildUpId: buildUp.id,
    system: buildUp.system,
    zoneIds: zones.map((zone) => zone.id),
    steps,
    setUp_hours: steps.reduce((sum, step) => sum + step.setUp_hours, 0),
  };
}

function grouped(zones: readonly ZoneFacts[]): ZoneFacts[][] {
  const groups = new Map<string, ZoneFacts[]>();
  for (const zone of zones) {
    const key = JSON.stringify([zone.pieceId, zone.buildUpId]);
    groups.set(key, [...(groups.get(key) ?? []), zone]);
  }
  return [...groups.values()];
}

/**
 * The lots of an estimate with their hours: zones of one piece and one build-up together, pieces in the order given, within a piece water first,
 * oil after it. Zones whose build-up the card does not hold are left out (`zoneHandsOn` says so).
 */
export function lotWorks(zones: readonly ZoneFacts[], card: BuildUpCard): LotWork[] {
  const pieces = [...new Set(zones.map((zone) => zone.pieceId))];
  const lots = grouped(zones).flatMap((group) => {
    const buildUp = card.buildUps.find((known) => known.id === group[0]?.buildUpId);
    return buildUp ? [lotOf(buildUp, group, card)] : [];
  });
  return pieces.flatMap((pieceId) =>
    lots
      .filter((lot) => lot.pieceId === pieceId)
      .sort((one, other) => systemRank(one.system) - systemRank(other.system)),
  );
}
