import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { percentOf } from '#shared/money/percent-of';

/**
 * What falls due at each of several valuations: the differences of the rounded cumulative amounts, in whole minor units, so that
 * valuations ending at 100 % sum to the whole. Percentages are cumulative (30, 60, 100).
 */
export function cumulativeParts(
  total_minor: MinorUnits,
  cumulative_percents: readonly (DecimalText | D)[],
): MinorUnits[] {
  const reached = cumulative_percents.map((percent) => percentOf(total_minor, percent));
  return reached.map((amount, place) => amount - (place === 0 ? 0 : reached[place - 1]) + 0);
}

/** Single shares in percent added up, one after the other, as decimals. */
export function cumulativePercents(shares_percent: readonly (DecimalText | number)[]): D[] {
  let reached = new D(0);
  return shares_percent.map((share) => (reached = reached.plus(String(share))));
}
