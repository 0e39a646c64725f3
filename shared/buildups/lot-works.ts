import type { BuildUp, BuildUpStep, StepKind, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { setUpDays } from '#shared/buildups/set-up-days';
import type { StepHours } from '#shared/buildups/step-hours';
import { systemRank } from '#shared/buildups/system-order';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { zoneHandsOn, type ZoneHandsOn } from '#shared/buildups/zone-hands-on';
import { groupedBy } from '#shared/units/grouped-by';
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

/** A zone with its hands-on work already worked. */
export interface ZoneOfLot {
  readonly facts: ZoneFacts;
  readonly handsOn: Pick<ZoneHandsOn, 'steps'>;
}

function lotStep(step: BuildUpStep, parts: readonly StepHours[], card: BuildUpCard): LotStep[] {
  if (parts.length === 0) return [];
  const hours = parts.reduce((sum, part) => sum + part.hours.likely, 0);
  const coats = Math.max(...parts.map((part) => part.coats));
  const days = setUpDays(step, { hours, coats }, card);
  const setUp_hours = days * card.setUp_hours;
  const values = { step: step.name, rate_hours: card.setUp_hours, days };
  const reason: Reason = { code: 'buildup-hours-set-up', values, figure: setUp_hours, unit: 'hours', house: step.name };
  const { id: stepId, kind, name, gradeId } = step;
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

function lotOf(buildUp: BuildUp, zones: readonly ZoneOfLot[], card: BuildUpCard): LotWork {
  const parts = groupedBy(
    zones.flatMap((zone) => zone.handsOn.steps),
    (part) => part.stepId,
  );
  const steps = buildUp.steps.flatMap((step) => lotStep(step, parts.get(step.id) ?? [], card));
  const pieceId = zones[0]?.facts.pieceId ?? '';
  return {
    id: `${pieceId}/${buildUp.id}`,
    pieceId,
    buildUpId: buildUp.id,
    system: buildUp.system,
    zoneIds: zones.map((zone) => zone.facts.id),
    steps,
    setUp_hours: steps.reduce((sum, step) => sum + step.setUp_hours, 0),
  };
}

const keyOf = ({ facts }: ZoneOfLot): string => JSON.stringify([facts.pieceId, facts.buildUpId]);

/**
 * The lots of an estimate with their hours: zones of one piece and one build-up together, pieces in the order given, within a piece water first,
 * oil after it. Zones whose build-up the card does not hold are left out (`zoneHandsOn` says so).
 */
export function lotsOfZones(zones: readonly ZoneOfLot[], card: BuildUpCard): LotWork[] {
  const lots = [...groupedBy(zones, keyOf).values()].flatMap((group) => {
    const buildUp = card.buildUps.find((known) => known.id === group[0]?.facts.buildUpId);
    return buildUp ? [lotOf(buildUp, group, card)] : [];
  });
  const pieces = new Set(zones.map(({ facts }) => facts.pieceId));
  const byPiece = groupedBy(lots, (lot) => lot.pieceId);
  return [...pieces].flatMap((pieceId) =>
    (byPiece.get(pieceId) ?? []).sort((one, other) => systemRank(one.system) - systemRank(other.system)),
  );
}

/** The same from what is known of the zones alone: their hands-on work is worked first. */
export const lotWorks = (zones: readonly ZoneFacts[], card: BuildUpCard): LotWork[] =>
  lotsOfZones(
    zones.map((facts) => ({ facts, handsOn: zoneHandsOn(facts, card) })),
    card,
  );
