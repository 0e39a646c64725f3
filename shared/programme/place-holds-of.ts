import type { PlannedLot } from '#shared/programme/planned-lot';
import { pooledPlaces } from '#shared/programme/pooled-places';
import type { PlaceHold, ProgrammeTask } from '#shared/programme/programme-request';
import type { Shop } from '#shared/programme/shop';

function lotHolds(placeId: string, { lot, blocks }: PlannedLot): PlaceHold[] {
  const tasks = blocks.flatMap(({ portions }) => portions.flat()).flatMap((step) => step.tasks);
  const [first, last] = [tasks[0], tasks.at(-1)];
  const amount = lot.input?.places ?? 1;
  if (!first || !last || amount === 0) return [];
  return [{ placeId, amount, fromTaskId: first.task.id, untilTaskId: last.task.id }];
}

const benchHold = (placeId: string, { id }: ProgrammeTask): PlaceHold => ({
  ...{ placeId, amount: 1, fromTaskId: id, untilTaskId: id },
});

/**
 * A lot stands on a rack, one place of it or as many as entered, from its first coat to the end of its last work; whatever is carved keeps a bench
 * while it is carved, overnight too. Without racks or without benches nothing of them is held.
 */
export function placeHoldsOf(
  work: { readonly lots: readonly PlannedLot[]; readonly carving: readonly ProgrammeTask[] },
  shop: Pick<Shop, 'places'>,
): PlaceHold[] {
  const pools = pooledPlaces(shop);
  const idOf = (kind: string): string | undefined => pools.find((pool) => pool.kind === kind)?.id;
  const [rackId, benchId] = [idOf('rack'), idOf('bench')];
  return [
    ...(rackId ? work.lots.flatMap((lot) => lotHolds(rackId, lot)) : []),
    ...(benchId ? work.carving.filter(({ crew }) => crew > 0).map((task) => benchHold(benchId, task)) : []),
  ];
}
