import { countUp } from '#shared/money/settled';

/** The ⌈pn⌉-th smallest of figures in rising order (any unit), p in percent; RangeError outside 0 < p ≤ 100 or for no figures. */
export function percentileOf(rising: Float64Array, percentile: number): number {
  if (!(percentile > 0 && percentile <= 100) || rising.length === 0)
    throw new RangeError('a percentile is above 0 and at most 100');
  return rising[countUp((percentile * rising.length) / 100) - 1];
}
