import type { Recipe } from '#shared/buildups/buildup-card';

const partsOf = (recipe: Recipe, role: 'glue' | 'water'): number =>
  recipe.parts.filter((part) => part.role === role).reduce((total, part) => total + part.parts, 0);

/** Parts of dry glue to one part of water by volume; null for a recipe that is no size. */
export function sizeStrength(recipe: Recipe): number | null {
  const water = partsOf(recipe, 'water');
  return water > 0 && partsOf(recipe, 'glue') > 0 ? partsOf(recipe, 'glue') / water : null;
}
