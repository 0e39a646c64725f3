import type { Triple } from '#shared/units/triple';

/**
 * The figure a triangular distribution stays below in the given share of cases (0…1), in the unit of the triple. Closed form of the
 * inverse distribution; a triple of one point is that point.
 */
export function triangularPercentile(triple: Triple, share: number): number {
  const { low, likely, high } = triple;
  const width = high - low;
  if (width <= 0) return likely;
  if (share * width <= likely - low) return low + Math.sqrt(share * width * (likely - low));
  return high - Math.sqrt((1 - share) * width * (high - likely));
}
