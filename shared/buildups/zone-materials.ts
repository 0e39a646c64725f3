import { areaShare } from '#shared/buildups/area-share';
import { batchRecipe } from '#shared/buildups/batch-recipe';
import type { BuildUp, BuildUpStep, MaterialUse } from '#shared/buildups/buildup';
import type { BuildUpCard, Material } from '#shared/buildups/buildup-card';
import { coatsOf } from '#shared/buildups/coats-of';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** How much of a material one step takes on one zone, in the material's own unit, loss included. */
export interface MaterialNeed {
  readonly materialId: string;
  readonly stepId: string;
  readonly zoneId: string;
  readonly quantity: number;
  readonly reason: Reason;
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

const missing = (on: UseOnZone, code: Finding['code'], values: Finding['values']): ZoneMaterials => ({
  needs: [],
  findings: [{ kind: 'missing', code, values: { step: on.step.name, ...values }, about: on.facts.id }],
});

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

function need(on: UseOnZone, part: Taken): ZoneMaterials {
  const material = on.card.materials.find((known) => known.id === part.materialId);
  if (!material) return missing(on, 'buildup-material-unknown', { material: part.materialId });
  const quantity = inUnit(material, part);
  if (quantity === null) return missing(on, 'buildup-bulk-unknown', { material: material.name });
  const values = {
    step: on.step.name,
    area_mm2: servedArea_mm2(on),
    coats: coatsOf(on.step, on.facts) * on.use.share,
    loss_percent: on.use.loss_percent,
    need: quantity,
    unit: material.unit,
    material: material.name,
  };
  const reason: Reason = {
    code: 'buildup-material-used',
    values,
    figure: quantity,
    unit: 'number',
    house: on.step.name,
  };
  return {
    needs: [{ materialId: material.id, stepId: on.step.id, zoneId: on.facts.id, quantity, reason }],
    findings: [],
  };
}

function needsOfUse(on: UseOnZone): ZoneMaterials[] {
  const { use, card } = on;
  const amount = amountTaken(on);
  if (use.of === 'material')
    return [need(on, { materialId: use.itemId, [use.way === 'grams' ? 'mass_kg' : 'volume_litres']: amount })];
  const recipe = card.recipes.find((known) => known.id === use.itemId);
  if (!recipe) return [missing(on, 'buildup-recipe-unknown', { recipe: use.itemId })];
  return batchRecipe(recipe, amount).flatMap(({ materialId, volume_litres }) =>
    materialId === null ? [] : [need(on, { materialId, volume_litres })],
  );
}

/** Materials of one zone by step, from its true area in mm², coats, consumption and loss; recipes are taken apart into what is bought. */
export function zoneMaterials(buildUp: BuildUp, facts: ZoneFacts, card: BuildUpCard): ZoneMaterials {
  if (!(facts.true_mm2 >= 0)) throw new RangeError('an area is never negative');
  const all = stepsDone(buildUp, facts).flatMap((step) =>
    step.uses.flatMap((use) => needsOfUse({ use, step, facts, card })),
  );
  return { needs: all.flatMap((one) => one.needs), findings: all.flatMap((one) => one.findings) };
}
