import { isBelowHalf } from '#shared/leaf/is-below-half';
import type { MouldingRun } from '#shared/leaf/lays-laying';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';

/**
 * The piece of leaf a small flat face without a run is cut from (disc, roundel, lozenge; mm), where it has others like it and is below half a leaf
 * both ways; null for every other, which is counted by its area. House rule of laying.
 */
export function smallFace(
  { surface, partKeys, members }: Pick<ZoneLeafInput, 'surface' | 'partKeys' | 'members'>,
  side_mm: number,
): MouldingRun | null {
  const { bounds_mm } = surface;
  if (!bounds_mm || partKeys || members < 2) return null;
  const { length, height } = bounds_mm;
  if (!isBelowHalf(length, side_mm) || !isBelowHalf(height, side_mm)) return null;
  return { girth_mm: Math.min(length, height), run_mm: Math.max(length, height), closedRun: false };
}
