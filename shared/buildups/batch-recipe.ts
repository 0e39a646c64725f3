import type { Recipe } from '#shared/buildups/buildup-card';
import type { Reason } from '#shared/words/reason';

/** What one part of a recipe comes to in a batch, in litres. */
export interface BatchPart {
  readonly partId: string;
  readonly name: string;
  readonly materialId: string | null;
  readonly volume_litres: number;
  readonly reason: Reason;
}

/** Parts of a recipe together. */
export const partsTogether = ({ parts }: Recipe): number => parts.reduce((sum, part) => sum + part.parts, 0);

/** Litres of one part in a batch: its share of the parts together. */
export const partVolume_litres = (parts: number, together: number, batch_litres: number): number =>
  (batch_litres * parts) / together;

/** Scales a recipe to a batch in litres: each part its share of the sum of parts. Throws a RangeError for a negative batch. */
export function batchRecipe(recipe: Recipe, batch_litres: number): BatchPart[] {
  if (!(batch_litres >= 0)) throw new RangeError('a batch is never negative');
  const total = partsTogether(recipe);
  return recipe.parts.map(({ id, name, materialId, parts }) => {
    const volume_litres = partVolume_litres(parts, total, batch_litres);
    const values = { part: name, parts, total, batch_litres };
    const reason: Reason = {
      code: 'buildup-batch-part',
      values,
      figure: volume_litres,
      unit: 'litres',
      house: recipe.name,
    };
    return { partId: id, name, materialId, volume_litres, reason };
  });
}
