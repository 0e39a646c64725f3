/**
 * A distribution as a table of its cumulative probabilities at equally spaced places. Both ways through it are straight lines between the
 * entries, so that one undoes the other. Made and read with + − × ÷ alone.
 */
export interface QuantileTable {
  readonly low: number;
  readonly step: number;
  /** Rising from 0 to 1. */
  readonly cumulative: Float64Array;
  /** For each of equal steps of probability, the last entry that is not above its start. */
  readonly guide: Uint16Array;
}

/** A table of quantiles from rising cumulative sums of any scale and unit, at places low, low + step, …; its quantiles bear the unit of the places. */
export function quantileTable(low: number, step: number, sums: Float64Array): QuantileTable {
  const last = sums.length - 1;
  const cumulative = sums.map((sum) => sum / sums[last]);
  const guide = new Uint16Array(last);
  let entry = 0;
  for (let start = 0; start < last; start += 1) {
    while (entry < last - 1 && cumulative[entry + 1] <= start / last) entry += 1;
    guide[start] = entry;
  }
  return { low, step, cumulative, guide };
}

/** The place a share of cases (0…1) stays below. */
export function quantile(table: QuantileTable, share: number): number {
  const { low, step, cumulative, guide } = table;
  const last = cumulative.length - 1;
  if (share <= 0) return low;
  if (share >= 1) return low + step * last;
  let entry = guide[Math.floor(share * last)];
  while (cumulative[entry + 1] <= share) entry += 1;
  const width = cumulative[entry + 1] - cumulative[entry];
  return low + step * (entry + (share - cumulative[entry]) / width);
}

/** The share of cases (0…1) below a place. */
export function shareBelow(table: QuantileTable, place: number): number {
  const { low, step, cumulative } = table;
  const last = cumulative.length - 1;
  const at = (place - low) / step;
  if (at <= 0) return 0;
  if (at >= last) return 1;
  const entry = Math.floor(at);
  return cumulative[entry] + (cumulative[entry + 1] - cumulative[entry]) * (at - entry);
}
