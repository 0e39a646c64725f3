/** A three-point figure; low ≤ likely ≤ high, all of one unit. */
export interface Triple {
  readonly low: number;
  readonly likely: number;
  readonly high: number;
}

/** The same operation on all three points of a triple. */
export const mapTriple = (triple: Triple, change: (figure: number) => number): Triple => ({
  low: change(triple.low),
  likely: change(triple.likely),
  high: change(triple.high),
});
