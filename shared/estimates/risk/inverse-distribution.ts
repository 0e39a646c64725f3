import { pertPlace, pertTable } from '#shared/estimates/risk/pert-table';
import { quantile } from '#shared/estimates/risk/quantile-table';
import { triangularPercentile } from '#shared/units/triangular-percentile';
import type { Triple } from '#shared/units/triple';

/** The figure a share of cases (0…1) stays below, in the unit of its triple. */
export type InverseDistribution = (share: number) => number;

function pert({ low, likely, high }: Triple): InverseDistribution {
  const width = high - low;
  const table = pertTable((likely - low) / width);
  return (share) => low + width * pertPlace(quantile(table, share));
}

/** The inverse of the distribution of a triple, triangular in closed form or PERT by table; a triple of one point is that point. */
export function inverseDistribution(triple: Triple, shape: 'triangular' | 'pert'): InverseDistribution {
  if (!(triple.low <= triple.likely && triple.likely <= triple.high))
    throw new RangeError('a triple must rise from low to high');
  if (triple.high === triple.low) return () => triple.likely;
  return shape === 'pert' ? pert(triple) : (share) => triangularPercentile(triple, share);
}
