import type { LeafProduct } from '#shared/leaf/leaf-product';
import { D, type DecimalText } from '#shared/money/decimal';
import { TooLarge } from '#shared/money/too-large';

/** So many whole packs of a size in booklets. */
export interface BoughtPack {
  readonly booklets: number;
  readonly count: number;
}

/** The cheapest mix of whole packs and single booklets that covers a need; the price in the workshop's currency, not rounded. */
export interface LeafPurchase {
  readonly booklets: number;
  readonly packs: readonly BoughtPack[];
  readonly singles: number;
  readonly price: DecimalText;
}

interface Offer {
  readonly booklets: number;
  readonly cost: D;
}

interface Cheapest {
  readonly cost: D;
  readonly booklets: number;
  /** The offer taken last, and the need that was left before it. */
  readonly last: Offer | null;
  readonly before: number;
}

// Packs first: of mixes with equal price and equal leaf the one with packs is kept.
const offersOf = (product: LeafProduct): Offer[] => {
  const packs = product.breaks.map(({ booklets, off_percent }) => ({
    booklets,
    cost: new D(product.price).times(booklets).times(new D(100).minus(off_percent)).div(100),
  }));
  return [...packs, { booklets: 1, cost: new D(product.price) }];
};

function isBetter(one: Cheapest, other: Cheapest | null): boolean {
  if (!other) return true;
  const byCost = one.cost.comparedTo(other.cost);
  return byCost < 0 || (byCost === 0 && one.booklets > other.booklets);
}

/** The cheapest way to cover every need from none to `most` booklets, each built on a smaller one. */
function cheapestUpTo(product: LeafProduct, most: number): Cheapest[] {
  const offers = offersOf(product);
  const table: Cheapest[] = [{ cost: new D(0), booklets: 0, last: null, before: 0 }];
  for (let need = 1; need <= most; need += 1) {
    let best: Cheapest | null = null;
    for (const last of offers) {
      const before = Math.max(0, need - last.booklets);
      const rest = table[before];
      const next = { cost: rest.cost.plus(last.cost), booklets: rest.booklets + last.booklets, last, before };
      if (isBetter(next, best)) best = next;
    }
    table.push(best as Cheapest);
  }
  return table;
}

const mostBooklets = 20_000;

function refuseUnlessCountable(booklets: number): void {
  if (booklets > mostBooklets) throw new TooLarge('booklets are at most 20,000');
  if (!Number.isInteger(booklets) || booklets < 0) throw new RangeError('booklets are whole and not negative');
}

/**
 * The cheapest mix of packs (at their break) and single booklets (at list) that covers a need of whole booklets, ties to more leaf.
 * Throws a RangeError unless the need is a whole number, TooLarge (one, too) above 20,000.
 */
export function leafPurchase(product: LeafProduct, booklets: number): LeafPurchase {
  refuseUnlessCountable(booklets);
  const table = cheapestUpTo(product, booklets);
  const counts = new Map<number, number>();
  for (let step = table[booklets]; step.last; step = table[step.before]) {
    counts.set(step.last.booklets, (counts.get(step.last.booklets) ?? 0) + 1);
  }
  const { cost, booklets: bought } = table[booklets];
  const packs = [...counts].filter(([size]) => size > 1).map(([size, count]) => ({ booklets: size, count }));
  return {
    booklets: bought,
    packs: packs.sort((a, b) => b.booklets - a.booklets),
    singles: counts.get(1) ?? 0,
    price: cost.toString(),
  };
}

/** The price of the cheapest mix for every need from none to `most` booklets, in the workshop's currency: one table for many trials. */
export function bookletPrices(product: LeafProduct, most: number): DecimalText[] {
  refuseUnlessCountable(most);
  return cheapestUpTo(product, most).map(({ cost }) => cost.toString());
}
