import { batchRecipe, type BatchPart } from '#shared/buildups/batch-recipe';
import type { BuildUp } from '#shared/buildups/buildup';
import type { BuildUpCard, Recipe } from '#shared/buildups/buildup-card';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { amountTaken } from '#shared/buildups/zone-materials';
import { groupedBy } from '#shared/units/grouped-by';

/** One part of a batch, in litres, and in grams where the card says what a litre of it weighs. */
export interface RecipeBatchPart extends Omit<BatchPart, 'materialId'> {
  readonly mass_grams: number | null;
}

/** All that one piece takes of one recipe, mixed at once so that the ground is of one strength. */
export interface RecipeBatch {
  readonly pieceId: string;
  readonly recipeId: string;
  readonly name: string;
  readonly volume_litres: number;
  readonly parts: readonly RecipeBatchPart[];
}

/** A zone with its build-up; null where the card does not hold it. */
export interface ZoneOfBatch {
  readonly buildUp: BuildUp | null;
  readonly facts: ZoneFacts;
}

type Litres = Map<string, number>;

const pour = (into: Litres, recipeId: string, litres: number): void =>
  void into.set(recipeId, (into.get(recipeId) ?? 0) + litres);

/** Litres of each recipe on one zone. */
function litresOn({ buildUp, facts }: ZoneOfBatch, card: BuildUpCard): Litres {
  const litres: Litres = new Map();
  for (const step of buildUp ? stepsDone(buildUp, facts) : [])
    for (const use of step.uses)
      if (use.of === 'recipe') pour(litres, use.itemId, amountTaken({ use, step, facts, card }));
  return litres;
}

function litresOf(zones: readonly ZoneOfBatch[], card: BuildUpCard): Litres {
  const litres: Litres = new Map();
  for (const zone of zones) for (const [recipeId, more] of litresOn(zone, card)) pour(litres, recipeId, more);
  return litres;
}

function partsOf(recipe: Recipe, volume_litres: number, card: BuildUpCard): RecipeBatchPart[] {
  return batchRecipe(recipe, volume_litres).map(({ materialId, ...part }) => {
    const bulk_kg_L = card.materials.find((material) => material.id === materialId)?.bulk_kg_L ?? null;
    return { ...part, mass_grams: bulk_kg_L === null ? null : part.volume_litres * bulk_kg_L * 1000 };
  });
}

/** What to mix of each recipe for each piece, loss included, in litres: pieces in the order of their zones, recipes in the card's. */
export function recipeBatches(zones: readonly ZoneOfBatch[], card: BuildUpCard): RecipeBatch[] {
  return [...groupedBy(zones, ({ facts }) => facts.pieceId)].flatMap(([pieceId, own]) => {
    const litres = litresOf(own, card);
    return card.recipes.flatMap((recipe) => {
      const volume_litres = litres.get(recipe.id) ?? 0;
      if (volume_litres === 0) return [];
      const { id: recipeId, name } = recipe;
      return [{ pieceId, recipeId, name, volume_litres, parts: partsOf(recipe, volume_litres, card) }];
    });
  });
}
