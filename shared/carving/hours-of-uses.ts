import type { CarvingCard } from '#shared/carving/carving-card';
import type { UseHours } from '#shared/carving/carving-result';
import type { CarvedUse } from '#shared/carving/carving-work';
import { type LearntPieces, learntPieces } from '#shared/carving/learnt-pieces';
import type { CarvingItem, Ornament } from '#shared/carving/ornament';
import { itemHours, ornamentHours } from '#shared/carving/ornament-hours';
import { type UseQuantity, useQuantity } from '#shared/carving/use-quantity';
import type { Finding } from '#shared/words/finding';

type Catalogued = { readonly carved: CarvedUse; readonly counted: UseQuantity } & (
  { readonly ornament: Ornament } | { readonly item: CarvingItem }
);

type Repeated = Extract<Catalogued, { ornament: Ornament }>;

function catalogued(carved: CarvedUse, card: CarvingCard): Catalogued[] {
  const ornament = card.ornaments.find((known) => known.id === carved.use.ornamentId);
  if (ornament) return [{ carved, ornament, counted: useQuantity(carved, ornament) }];
  const item = card.items.find((known) => known.id === carved.use.ornamentId);
  return item ? [{ carved, item, counted: useQuantity(carved, item) }] : [];
}

const isLearnt = (known: Catalogued): known is Repeated => 'ornament' in known && known.ornament.way === 'piece';

// Work by length or area has no learning, and neither has an item.
function learningOf(uses: readonly Catalogued[], card: CarvingCard): Map<Catalogued, LearntPieces> {
  const learnt = uses.filter(isLearnt);
  const shares = learntPieces(
    learnt.map(({ carved, ornament, counted }) => ({
      use: carved.use,
      timberId: carved.timberId,
      size_mm: carved.use.size_mm ?? ornament.reference_mm,
      isRunning: ornament.isRunning,
      pieces: counted.quantity,
    })),
    card.learning,
  );
  return new Map(learnt.map((use, index) => [use, shares[index]]));
}

/** Hours of every use the card knows, in their order, learning counted over all of them together. */
export function hoursOfUses(uses: readonly CarvedUse[], card: CarvingCard): UseHours[] {
  const known = uses.flatMap((carved) => catalogued(carved, card));
  const learning = learningOf(known, card);
  return known.map((use) =>
    'ornament' in use
      ? ornamentHours(use.carved, { ...use, learning: learning.get(use) ?? null }, card)
      : itemHours(use.carved, use.item, { counted: use.counted, card }),
  );
}

/** A missing fact for every use whose ornament is in no list of the card. */
export function unknownOrnaments(uses: readonly CarvedUse[], card: CarvingCard): Finding[] {
  const known = new Set([...card.ornaments, ...card.items].map(({ id }) => id));
  return uses
    .filter(({ use }) => !known.has(use.ornamentId))
    .map(({ use }) => ({
      kind: 'missing',
      code: 'carving-ornament-unknown',
      values: { ornament: use.ornamentId },
      about: use.id,
    }));
}
