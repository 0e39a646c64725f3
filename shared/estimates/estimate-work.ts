import { lotsOfZones, type LotWork } from '#shared/buildups/lot-works';
import { materialsBought, type MaterialBought } from '#shared/buildups/materials-bought';
import { carvingHours } from '#shared/carving/carving-hours';
import type { CarvingResult } from '#shared/carving/carving-result';
import type { RecutZone } from '#shared/carving/carving-work';
import { recutZonesById } from '#shared/carving/recut-hours';
import { carvingLabour } from '#shared/estimates/carving-labour';
import type { Draft } from '#shared/estimates/draft';
import { gildingLabour } from '#shared/estimates/gilding-labour';
import { handlingCautions } from '#shared/estimates/handling-cautions';
import { goodsUsed } from '#shared/estimates/goods-used';
import { measuredMember, type MeasuredMember } from '#shared/estimates/measured-member';
import type { PriceGoods, PriceLabour } from '#shared/estimates/price/price-input';
import { workedZone, type WorkedZone } from '#shared/estimates/worked-zone';
import { leafTotals, type LeafTotal } from '#shared/leaf/leaf-totals';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

/** The work of a whole estimate, before money: surface, leaf, hours, materials and lots, with what is to be told about each. */
export interface EstimateWork {
  readonly members: readonly MeasuredMember[];
  readonly zones: readonly WorkedZone[];
  readonly carving: CarvingResult;
  readonly lots: readonly LotWork[];
  readonly leaf: readonly LeafTotal[];
  readonly materials: readonly MaterialBought[];
  readonly labour: readonly PriceLabour[];
  readonly goods: readonly PriceGoods[];
  readonly findings: readonly Finding[];
}

const recutZones = (members: readonly MeasuredMember[]): RecutZone[] =>
  members.flatMap(({ zones }) =>
    zones.flatMap(({ zone, area }) =>
      zone.recutting ? [{ zoneId: zone.id, manner: zone.recutting, planArea_mm2: area.plan_mm2 }] : [],
    ),
  );

function carvingOf(members: readonly MeasuredMember[], recut: readonly RecutZone[], card: RateCard): CarvingResult {
  const uses = members.flatMap(({ member }) =>
    member.ornaments.map((use) => ({ use, members: member.count, timberId: member.timberId })),
  );
  return carvingHours({ uses, recut }, card.carving);
}

function zonesOf(
  members: readonly MeasuredMember[],
  carving: CarvingResult,
  at: { draft: Draft; card: RateCard },
): WorkedZone[] {
  const recutting = new Map(carving.recut.map((zone) => [zone.zoneId, zone.hours.likely]));
  return members.flatMap((measured) =>
    measured.zones.map((zone) =>
      workedZone(zone, {
        measured,
        settings: at.draft.settings,
        card: at.card,
        recutting_hours: recutting.get(zone.zone.id) ?? 0,
      }),
    ),
  );
}

function memberOf(members: readonly MeasuredMember[]): (id: string) => string | null {
  const known = new Map(
    members.flatMap(({ member }) =>
      [...member.ornaments, ...member.zones].map((item) => [item.id, member.id] as const),
    ),
  );
  return (id) => known.get(id) ?? null;
}

/**
 * Works a draft (one choice of alternatives already made) through measuring, carving, leaf, build-ups and materials. Areas mm², hours
 * decimal, leaves not rounded, costs decimal text; what cannot be worked is told as a finding.
 */
export function estimateWork(draft: Draft, card: RateCard): EstimateWork {
  const members = draft.members.map((member) => measuredMember(member, card.measure));
  const recut = recutZones(members);
  const carving = carvingOf(members, recut, card);
  const zones = zonesOf(members, carving, { draft, card });
  const lots = lotsOfZones(zones, card.buildUps);
  const leaf = leafTotals(
    zones.flatMap((zone) => (zone.leaf ? [zone.leaf] : [])),
    card.leaf,
  );
  const materials = materialsBought(
    zones.flatMap((zone) => zone.materials.needs),
    card.buildUps,
  );
  const carved = { result: carving, recut: recutZonesById(recut), card, memberOf: memberOf(members) };
  return {
    members,
    zones,
    carving,
    lots,
    leaf,
    materials,
    labour: [...carvingLabour(carved), ...gildingLabour(zones, lots)],
    goods: goodsUsed({ leaf, materials, zones }, card.leaf),
    findings: [
      ...members.flatMap((member) => member.findings),
      ...carving.findings,
      ...zones.flatMap((zone) => zone.findings),
      ...leaf.flatMap((total) => total.findings),
      ...materials.flatMap((bought) => bought.findings),
      ...handlingCautions(draft, members, card),
    ],
  };
}
