import type { NetworkHold, NetworkPlace, Position } from '#shared/programme/task-network';

/** Room taken from one moment to another. */
export interface Stretch {
  readonly start: number;
  readonly end: number;
  readonly amount: number;
}

/** How long a hold lasts whose last task has no place yet; without an end where nothing is known. */
export type HoldLengths = ReadonlyMap<NetworkHold, number>;

/** The stretch of a hold as far as it is known; null while nothing of it has its place. */
export function holdStretch(
  hold: NetworkHold,
  positions: readonly (Position | null)[],
  lengths: HoldLengths,
): Stretch | null {
  const from = positions[hold.from];
  if (!from) return null;
  const end = positions[hold.until]?.end ?? from.start + (lengths.get(hold) ?? Infinity);
  return { start: from.start, end, amount: hold.amount };
}

/** What is held of a place now by others. */
const stretches = ({ taken, holds }: NetworkPlace, but: NetworkHold, { positions, lengths }: HoldState): Stretch[] => [
  ...taken,
  ...holds.flatMap((hold) => (hold === but ? [] : (holdStretch(hold, positions, lengths) ?? []))),
];

/** Where tasks stand, and what is known of holds that are open still. */
export interface HoldState {
  readonly positions: readonly (Position | null)[];
  readonly lengths: HoldLengths;
}

/**
 * From when a place has room for a hold that begins at a moment or later and ends as `endOf` says (Infinity where that is not known): the moment
 * itself, a later one, or Infinity while somebody holds it without an end.
 */
export function placeRoomFrom(
  place: NetworkPlace,
  hold: NetworkHold,
  at: HoldState & { readonly start: number; readonly endOf: (start: number) => number },
): number {
  if (hold.amount > place.capacity) return Infinity;
  const others = stretches(place, hold, at).filter((one) => one.end > at.start);
  const used = (moment: number): number =>
    others.reduce((sum, one) => (one.start <= moment && moment < one.end ? sum + one.amount : sum), 0);
  let start = at.start;
  for (;;) {
    const end = at.endOf(start);
    const moments = [start, ...others.map((one) => one.start).filter((moment) => moment > start && moment < end)];
    const full = moments.find((moment) => used(moment) + hold.amount > place.capacity);
    if (full === undefined) return start;
    start = Math.min(...others.filter((one) => one.start <= full && one.end > full).map((one) => one.end));
    if (start === Infinity) return Infinity;
  }
}
