import type { BuildUpStep, StepKind, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { lotIdOf } from '#shared/buildups/lot-id';
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

/** What is coated together: zones of one piece with the same build-up, all of them or those whose members name the same lot. */
export interface LotWork {
  readonly id: string;
  /** As its members name it; empty where it is the proposed one. */
  readonly name: string;
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

function lotOf(zones: readonly ZoneOfLot[], card: BuildUpCard): LotWork[] {
  const [first] = zones;
  const buildUp = card.buildUps.find((known) => known.id === first?.facts.buildUpId);
  if (!first || !buildUp) return [];
  const parts = groupedBy(
    zones.flatMap((zone) => zone.handsOn.steps),
    (part) => part.stepId,
  );
  const steps = buildUp.steps.flatMap((step) => lotStep(step, parts.get(step.id) ?? [], card));
  const { pieceId, lot: name } = first.facts;
  const { id: buildUpId, system } = buildUp;
  const lot = {
    ...{ id: lotIdOf(first.facts), name, pieceId, buildUpId, system },
    zoneIds: zones.map((zone) => zone.facts.id),
    steps,
    setUp_hours: steps.reduce((sum, step) => sum + step.setUp_hours, 0),
  };
  return [lot];
}

/**
 * The lots of an estimate with their hours: zones of one piece, one build-up and one name of a lot together, pieces in the order given, within a
 * piece all water first, oil after it. Zones whose build-up the card does not hold are left out (`zoneHandsOn` says so).
 */
export function lotsOfZones(zones: readonly ZoneOfLot[], card: BuildUpCard): LotWork[] {
  const lots = [...groupedBy(zones, ({ facts }) => lotIdOf(facts)).values()].flatMap((group) => lotOf(group, card));
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
