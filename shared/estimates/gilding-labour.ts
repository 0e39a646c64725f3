import type { LotWork } from '#shared/buildups/lot-works';
import type { StepHours } from '#shared/buildups/step-hours';
import type { PriceLabour } from '#shared/estimates/price/price-input';
import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import { groupedBy } from '#shared/units/grouped-by';

/** Hours of one kind of work by one grade. */
type Hand = Pick<PriceLabour, 'kind' | 'gradeId' | 'hours'>;

/** Hours of the same kind and grade added up. */
function hands(steps: readonly (Pick<StepHours, 'kind' | 'gradeId'> & { readonly hours: number })[]): Hand[] {
  const together = new Map<string, Hand>();
  for (const { kind: stepKind, gradeId, hours } of steps) {
    const kind = stepWorkKind[stepKind];
    const key = `${kind} ${gradeId}`;
    together.set(key, { kind, gradeId, hours: (together.get(key)?.hours ?? 0) + hours });
  }
  return [...together.values()];
}

const zoneLabour = ({ memberId, handsOn }: WorkedZone): PriceLabour[] =>
  hands(
    handsOn.steps
      .filter((step) => step.pattern !== 'recutting')
      .map(({ kind, gradeId, hours }) => ({ kind, gradeId, hours: hours.likely })),
  ).map(({ kind, gradeId, hours }) => ({ memberId, kind, gradeId, hours }));

/** Set-up of a lot is shared among its zones by the surface each brings. */
function setUpLabour(lot: LotWork, zones: ReadonlyMap<string, readonly WorkedZone[]>): PriceLabour[] {
  const own = lot.zoneIds.flatMap((id) => zones.get(id) ?? []);
  const whole_mm2 = own.reduce((sum, zone) => sum + zone.area.plan_mm2, 0);
  const shareOf = (zone: WorkedZone) => (whole_mm2 > 0 ? zone.area.plan_mm2 / whole_mm2 : 1 / own.length);
  const setUp = hands(
    lot.steps
      .filter((step) => step.setUp_hours > 0)
      .map(({ kind, gradeId, setUp_hours }) => ({ kind, gradeId, hours: setUp_hours })),
  );
  return own.flatMap((zone) => {
    const share = shareOf(zone);
    return setUp.map(({ kind, gradeId, hours }) => ({ memberId: zone.memberId, kind, gradeId, hours: hours * share }));
  });
}

/** Likely hours of ground, gilding and finishing by member, kind of work and grade, set-up included. */
export function gildingLabour(zones: readonly WorkedZone[], lots: readonly LotWork[]): PriceLabour[] {
  const byId = groupedBy(zones, ({ zone }) => zone.id);
  return [...zones.flatMap(zoneLabour), ...lots.flatMap((lot) => setUpLabour(lot, byId))];
}
