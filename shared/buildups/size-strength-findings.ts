import type { BuildUp, BuildUpStep } from '#shared/buildups/buildup';
import type { BuildUpCard, Recipe } from '#shared/buildups/buildup-card';
import { sizeStrength } from '#shared/buildups/size-strength';
import type { Finding } from '#shared/words/finding';

interface SizedLayer {
  readonly step: BuildUpStep;
  readonly recipe: Recipe;
  readonly strength: number;
}

/** Consolidating feeds an old ground and is no layer of the new one. */
function sizedLayers(buildUp: BuildUp, card: BuildUpCard): SizedLayer[] {
  return buildUp.steps
    .filter((step) => step.kind !== 'consolidate')
    .flatMap((step) =>
      step.uses.flatMap((use) => {
        const recipe = use.of === 'recipe' ? card.recipes.find((known) => known.id === use.itemId) : undefined;
        const strength = recipe ? sizeStrength(recipe) : null;
        return recipe && strength !== null ? [{ step, recipe, strength }] : [];
      }),
    );
}

/** Refuses a build-up in which a layer is bound with stronger size than the sized layer before it (Rivers & Umney: strength falls outwards). */
export function sizeStrengthFindings(buildUp: BuildUp, card: BuildUpCard): Finding[] {
  const layers = sizedLayers(buildUp, card);
  return layers.flatMap((layer, at): Finding[] => {
    const before = layers[at - 1];
    if (!before || layer.strength <= before.strength + 1e-12) return [];
    const values = { step: layer.step.name, recipe: layer.recipe.name, before: before.recipe.name };
    return [{ kind: 'refuse', code: 'buildup-size-rises', values, about: buildUp.id }];
  });
}
