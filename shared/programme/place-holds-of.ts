import type { PlannedLot } from '#shared/programme/planned-lot';
import type { PlaceHold } from '#shared/programme/programme-request';
import type { Shop } from '#shared/programme/shop';

/** A lot stands on the first kind of rack entered, one place of it or as many as entered, from its first coat to the end of its last work; without racks nothing is held. */
export function placeHoldsOf(lots: readonly PlannedLot[], { places }: Shop): PlaceHold[] {
  const rack = places.find(({ kind }) => kind === 'rack');
  if (!rack) return [];
  return lots.flatMap(({ lot, blocks }) => {
    const tasks = blocks.flatMap(({ portions }) => portions.flat()).flatMap((step) => step.tasks);
    const [first, last] = [tasks[0], tasks.at(-1)];
    const amount = lot.input?.places ?? 1;
    if (!first || !last || amount === 0) return [];
    return [{ placeId: rack.id, amount, fromTaskId: first.task.id, untilTaskId: last.task.id }];
  });
}
