import type { Alloy } from '#shared/leaf/leaf-product';

/** Weight of all parts of an alloy, in the unit of the parts; throws a RangeError where there are none. */
export function alloyWeight(alloy: Alloy): number {
  const weight = Object.values(alloy).reduce((sum, part) => sum + part, 0);
  if (weight <= 0) throw new RangeError('an alloy must have parts');
  return weight;
}

/** Carat of an alloy: parts of gold in twenty-four by weight. */
export const caratOf = (alloy: Alloy): number => (24 * (alloy.gold ?? 0)) / alloyWeight(alloy);
