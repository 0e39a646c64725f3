import type { Triple } from '#shared/units/triple';

/** Adds triples point by point, in their own unit; nothing adds up to zero. */
export const tripleSum = (triples: readonly Triple[]): Triple =>
  triples.reduce(
    (sum, next) => ({ low: sum.low + next.low, likely: sum.likely + next.likely, high: sum.high + next.high }),
    { low: 0, likely: 0, high: 0 },
  );
