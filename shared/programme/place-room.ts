import type { NetworkHold, NetworkPlace, Position } from '#shared/programme/task-network';

interface Stretch {
  readonly start: number;
  readonly end: number;
  readonly amount: number;
}

/** What is held of a place now; a hold whose last task has no place yet goes on without an end. */
function stretches(
  { taken, holds }: NetworkPlace,
  positions: readonly (Position | null)[],
  but: NetworkHold,
): Stretch[] {
  const held = holds.flatMap((hold): Stretch[] => {
    const from = hold === but ? null : positions[hold.from];
    return from ? [{ start: from.start, end: positions[hold.until]?.end ?? Infinity, amount: hold.amount }] : [];
  });
  return [...taken, ...held];
}

/**
 * From when a place has room for a hold that begins at a moment or later and lasts as long as `length` (Infinity where its end is not known): the moment
 * itself, a later one, or Infinity while somebody holds it without an end.
 */
export function roomFrom(
  place: NetworkPlace,
  hold: NetworkHold,
  at: { readonly start: number; readonly length: number; readonly positions: readonly (Position | null)[] },
): number {
  if (hold.amount > place.capacity) return Infinity;
  const others = stretches(place, at.positions, hold).filter((one) => one.end > at.start);
  const used = (moment: number): number =>
    others.reduce((sum, one) => (one.start <= moment && moment < one.end ? sum + one.amount : sum), 0);
  let start = at.start;
  for (;;) {
    const end = start + at.length;
    const moments = [start, ...others.map((one) => one.start).filter((moment) => moment > start && moment < end)];
    const full = moments.find((moment) => used(moment) + hold.amount > place.capacity);
    if (full === undefined) return start;
    start = Math.min(...others.filter((one) => one.start <= full && one.end > full).map((one) => one.end));
    if (start === Infinity) return Infinity;
  }
}
