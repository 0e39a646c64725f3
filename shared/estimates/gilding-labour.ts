import type { LotWork } from '#shared/buildups/lot-works';
import type { PriceLabour } from '#shared/estimates/price/price-input';
import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import { groupedBy } from '#shared/units/grouped-by';

const zoneLabour = (zone: WorkedZone): PriceLabour[] =>
  zone.handsOn.steps
    .filter((step) => step.pattern !== 'recutting')
    .map((step) => ({
      memberId: zone.memberId,
      kind: stepWorkKind[step.kind],
      gradeId: step.gradeId,
      hours: step.hours.likely,
    }));

/** Set-up of a lot is shared among its zones by the surface each brings. */
function setUpLabour(lot: LotWork, zones: ReadonlyMap<string, readonly WorkedZone[]>): PriceLabour[] {
  const own = lot.zoneIds.flatMap((id) => zones.get(id) ?? []);
  const whole_mm2 = own.reduce((sum, zone) => sum + zone.area.plan_mm2, 0);
  const shareOf = (zone: WorkedZone) => (whole_mm2 > 0 ? zone.area.plan_mm2 / whole_mm2 : 1 / own.length);
  return lot.steps
    .filter((step) => step.setUp_hours > 0)
    .flatMap((step) =>
      own.map((zone) => ({
        memberId: zone.memberId,
        kind: stepWorkKind[step.kind],
        gradeId: step.gradeId,
        hours: step.setUp_hours * shareOf(zone),
      })),
    );
}

/** Likely hours of ground, gilding and finishing by member, kind of work and grade, set-up included. */
export function gildingLabour(zones: readonly WorkedZone[], lots: readonly LotWork[]): PriceLabour[] {
  const byId = groupedBy(zones, ({ zone }) => zone.id);
  return [...zones.flatMap(zoneLabour), ...lots.flatMap((lot) => setUpLabour(lot, byId))];
}
