interface Placed {
  readonly place: number;
}

const step = 1024;

/** A place in order after one item and before the next; either may be missing. Places are never renumbered, so only what moved is saved. */
export function placeBetween(before: Placed | undefined, after: Placed | undefined): number {
  if (before && after) return (before.place + after.place) / 2;
  if (before) return before.place + step;
  return after ? after.place - step : 0;
}

/** The place at an index among others, counted without what is put there. */
export const placeAt = (others: readonly Placed[], index: number): number =>
  placeBetween(index > 0 ? others.at(index - 1) : undefined, others.at(index));
