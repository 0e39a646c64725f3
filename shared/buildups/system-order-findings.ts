import type { System } from '#shared/buildups/buildup';
import type { Finding } from '#shared/words/finding';

/** A lot by its piece and system. */
interface Served {
  readonly pieceId: string;
  readonly system: System;
}

const onSize: readonly System[] = ['oil', 'water-borne-size'];

/** Tells, once for each piece gilded both in water and on size, which of the two comes first. */
export function systemOrderFindings(lots: readonly Served[]): Finding[] {
  const pieces = [...new Set(lots.map(({ pieceId }) => pieceId))];
  const has = (pieceId: string, systems: readonly System[]): boolean =>
    lots.some((lot) => lot.pieceId === pieceId && systems.includes(lot.system));
  const mixed = pieces.filter((pieceId) => has(pieceId, ['water']) && has(pieceId, onSize));
  return mixed.map((about) => ({ kind: 'note', code: 'buildup-order-of-systems', values: {}, about }));
}
