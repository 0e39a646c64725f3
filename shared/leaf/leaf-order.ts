import { bookletsFor } from '#shared/leaf/booklets-for';
import type { LeafCard } from '#shared/leaf/leaf-card';
import { type LeafPurchase, leafPurchase } from '#shared/leaf/leaf-purchase';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** What to order of one leaf, all of one batch. */
export interface LeafOrder {
  readonly productId: string;
  /** Leaves needed at the card's percentile, and with the spare ones. */
  readonly needLeaves: number;
  readonly orderLeaves: number;
  readonly booklets: number;
  readonly purchase: LeafPurchase;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}

/** The leaf order: the need at the card's percentile (leaves, from the risk) plus spare leaves, in whole booklets and the cheapest packs. */
export function leafOrder(product: LeafProduct, needLeaves: number, card: LeafCard): LeafOrder {
  const orderLeaves = needLeaves * (1 + card.spare_percent / 100);
  const booklets = bookletsFor(product, orderLeaves);
  const { leavesPerBooklet, id, name } = product;
  return {
    productId: id,
    needLeaves,
    orderLeaves,
    booklets,
    purchase: leafPurchase(product, booklets),
    reasons: [
      {
        code: 'leaf-order-need',
        values: { percentile: card.orderPercentile },
        figure: needLeaves,
        unit: 'leaves',
        house: 'leaf.orderPercentile',
      },
      {
        code: 'leaf-order-spare',
        values: {},
        figure: card.spare_percent,
        unit: 'percent',
        house: 'leaf.spare_percent',
      },
      { code: 'leaf-total-booklets', values: { leaves: leavesPerBooklet }, figure: booklets, unit: 'booklets' },
    ],
    findings: booklets > 0 ? [{ kind: 'note', code: 'leaf-one-batch', values: { leaf: name }, about: id }] : [],
  };
}
