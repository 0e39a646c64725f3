import type { HoldLengths } from '#shared/programme/place-room';
import type { Position, TaskNetwork } from '#shared/programme/task-network';

/** How long each hold of a network lasts where its tasks stand so; minutes. */
export const holdLengthsOf = (
  { places }: TaskNetwork,
  positions: readonly Pick<Position, 'start' | 'end'>[],
): HoldLengths =>
  new Map(
    places
      .flatMap(({ holds }) => holds)
      .map((hold) => [hold, positions[hold.until].end - positions[hold.from].start] as const),
  );

/** Whether room that is wanted is promised elsewhere too: then a hold whose length is not known fits in only after all of that. */
export const isRoomPromised = ({ places }: TaskNetwork): boolean =>
  places.some(({ taken, holds }) => taken.length > 0 && holds.length > 0);
