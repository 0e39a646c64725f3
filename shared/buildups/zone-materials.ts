import { areaShare } from '#shared/buildups/area-share';
import { partVolume_litres, partsTogether } from '#shared/buildups/batch-recipe';
import type { BuildUp, BuildUpStep, MaterialUse } from '#shared/buildups/buildup';
import type { BuildUpCard, Material } from '#shared/buildups/buildup-card';
import { coatsOf } from '#shared/buildups/coats-of';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Finding } from '#shared/words/finding';

/** How much of a material one step takes on one zone, in the material's own unit, loss included. */
export interface MaterialNeed {
  readonly materialId: string;
  readonly stepId: string;
  readonly zoneId: string;
  readonly quantity: number;
}

/** What a zone takes of materials; `findings` name what the card does not hold. */
export interface ZoneMaterials {
  readonly needs: readonly MaterialNeed[];
  readonly findings: readonly Finding[];
}

/** What one step uses on one zone. */
export interface UseOnZone {
  readonly use: MaterialUse;
  readonly step: BuildUpStep;
  readonly facts: ZoneFacts;
  readonly card: BuildUpCard;
}

interface Taken {
  readonly materialId: string;
  readonly mass_kg?: number;
  readonly volume_litres?: number;
}

/** What a zone takes, as it is gathered step by step. */
interface Gathered {
  readonly needs: MaterialNeed[];
  readonly findings: Finding[];
}

const miss = (into: Gathered, on: UseOnZone, { code, values }: Pick<Finding, 'code' | 'values'>): void =>
  void into.findings.push({ kind: 'missing', code, values: { step: on.step.name, ...values }, about: on.facts.id });

const servedArea_mm2 = ({ step, facts, card }: UseOnZone): number => facts.true_mm2 * areaShare(step, facts, card);

/** Kilograms or litres a use takes: grams multiply, coverage divides; loss is the share that never stays on the work, so the need is net ÷ (1 − loss). */
export function amountTaken(on: UseOnZone): number {
  const { use, step, facts } = on;
  const area_m2 = (servedArea_mm2(on) / 1e6) * coatsOf(step, facts) * use.share;
  const kept = 1 - use.loss_percent / 100;
  if (use.way === 'grams') return (area_m2 * use.grams_m2) / 1000 / kept;
  return (use.way === 'coverage' ? area_m2 / use.coverage_m2_L : area_m2 * use.litres_m2) / kept;
}

/** A quantity in the unit the material is bought in; null where only its bulk weight would tell. */
function inUnit(material: Material, { mass_kg, volume_litres }: Taken): number | null {
  const given = material.unit === 'kg' ? mass_kg : volume_litres;
  if (given !== undefined) return given;
  if (material.bulk_kg_L === null) return null;
  return material.unit === 'kg' ? (volume_litres ?? 0) * material.bulk_kg_L : (mass_kg ?? 0) / material.bulk_kg_L;
}

function addNeed(into: Gathered, on: UseOnZone, taken: Taken): void {
  const material = on.card.materials.find((known) => known.id === taken.materialId);
  if (!material) return miss(into, on, { code: 'buildup-material-unknown', values: { material: taken.materialId } });
  const quantity = inUnit(material, taken);
  if (quantity === null) return miss(into, on, { code: 'buildup-bulk-unknown', values: { material: material.name } });
  into.needs.push({ materialId: material.id, stepId: on.step.id, zoneId: on.facts.id, quantity });
}

/** A recipe is taken apart into what is bought. */
function addRecipe(into: Gathered, on: UseOnZone, amount_litres: number): void {
  const recipe = on.card.recipes.find((known) => known.id === on.use.itemId);
  if (!recipe) return miss(into, on, { code: 'buildup-recipe-unknown', values: { recipe: on.use.itemId } });
  const together = partsTogether(recipe);
  for (const { materialId, parts } of recipe.parts)
    if (materialId !== null)
      addNeed(into, on, { materialId, volume_litres: partVolume_litres(parts, together, amount_litres) });
}

function addUse(into: Gathered, on: UseOnZone): void {
  const amount = amountTaken(on);
  const { of, way, itemId: materialId } = on.use;
  if (of === 'recipe') addRecipe(into, on, amount);
  else addNeed(into, on, way === 'grams' ? { materialId, mass_kg: amount } : { materialId, volume_litres: amount });
}

/** Materials of one zone by step, from its true area in mm², coats, consumption and loss; recipes are taken apart into what is bought. */
export function zoneMaterials(buildUp: BuildUp, facts: ZoneFacts, card: BuildUpCard): ZoneMaterials {
  if (!(facts.true_mm2 >= 0)) throw new RangeError('an area is never negative');
  const gathered: Gathered = { needs: [], findings: [] };
  for (const step of stepsDone(buildUp, facts))
    for (const use of step.uses) addUse(gathered, { use, step, facts, card });
  return gathered;
}
