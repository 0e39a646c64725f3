import type { BuildUpCard, Material } from '#shared/buildups/buildup-card';
import { cheapestPacks, type PackCount } from '#shared/buildups/cheapest-packs';
import type { MaterialNeed } from '#shared/buildups/zone-materials';
import { D, type DecimalText } from '#shared/money/decimal';
import { settled } from '#shared/money/settled';
import { groupedBy } from '#shared/units/grouped-by';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** What a job buys of one material: need and purchase in its own unit, cost in the workshop's currency, unrounded. */
export interface MaterialBought {
  readonly materialId: string;
  readonly name: string;
  readonly unit: 'kg' | 'L';
  readonly need: DecimalText;
  readonly bought: DecimalText;
  readonly packs: readonly PackCount[];
  readonly cost: DecimalText;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}

function proRata(material: Material, need: D, findings: Finding[]): MaterialBought {
  const { id, name, unit } = material;
  const cost = need.times(material.pricePerUnit).toString();
  const values = { material: name, need: need.toNumber(), unit };
  const reason: Reason = {
    code: 'buildup-material-pro-rata',
    values,
    figure: need.toString(),
    unit: 'number',
    house: name,
  };
  return {
    materialId: id,
    name,
    unit,
    need: need.toString(),
    bought: need.toString(),
    packs: [],
    cost,
    reasons: [reason],
    findings,
  };
}

function inPacks(material: Material, need: D): MaterialBought {
  const { id, name, unit } = material;
  const choice = cheapestPacks(need, material.packs);
  if (!choice)
    return proRata(material, need, [
      { kind: 'note', code: 'buildup-material-no-pack', values: { material: name }, about: id },
    ]);
  const values = { material: name, need: need.toNumber(), unit, bought: choice.size.toNumber(), packs: choice.count };
  const reason: Reason = {
    code: 'buildup-material-bought',
    values,
    figure: choice.size.toString(),
    unit: 'number',
    house: name,
  };
  const bought = {
    need: need.toString(),
    bought: choice.size.toString(),
    packs: choice.packs,
    cost: choice.cost.toString(),
  };
  return { materialId: id, name, unit, ...bought, reasons: [reason], findings: [] };
}

function totalNeed(needs: readonly MaterialNeed[]): D {
  const quantity = needs.reduce((sum, one) => sum + one.quantity, 0);
  return new D(String(settled(quantity))).toDecimalPlaces(6, D.ROUND_UP);
}

/** What a job buys, one entry for each material needed, in the card's order: whole packs in the cheapest mix, or pro rata, as the card says. */
export function materialsBought(needs: readonly MaterialNeed[], card: BuildUpCard): MaterialBought[] {
  const byMaterial = groupedBy(needs, (need) => need.materialId);
  return card.materials.flatMap((material) => {
    const need = totalNeed(byMaterial.get(material.id) ?? []);
    if (need.isZero()) return [];
    return [card.buying === 'pro-rata' ? proRata(material, need, []) : inPacks(material, need)];
  });
}
