import type { LeafNeed } from '#shared/documents/leaf-needs';
import type { LeafCard } from '#shared/leaf/leaf-card';
import { leafOrder } from '#shared/leaf/leaf-order';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { LeafPurchase } from '#shared/leaf/leaf-purchase';
import type { MinorUnits } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import { countUp } from '#shared/money/settled';

/** One product to order: whole leaves (rolls of ribbon), how it is bought, and what that costs in whole minor units. */
export interface LeafOrderLine {
  readonly product: LeafProduct;
  readonly needLeaves: number;
  readonly spareLeaves: number;
  readonly purchase: LeafPurchase;
  readonly price_minor: MinorUnits;
}

function orderLine(product: LeafProduct, need: number, at: { card: LeafCard; digits: number }): LeafOrderLine {
  const { needLeaves, orderLeaves, purchase } = leafOrder(product, need, at.card);
  const whole = countUp(needLeaves);
  return {
    product,
    needLeaves: whole,
    spareLeaves: countUp(orderLeaves) - whole,
    purchase,
    price_minor: minorOf(purchase.price, at.digits),
  };
}

/** The leaf to order, product by product in the order of the card; nothing for a product no leaf is needed of. */
export const leafOrderLines = (
  needs: readonly LeafNeed[],
  at: { readonly card: LeafCard; readonly digits: number },
): LeafOrderLine[] =>
  at.card.products.flatMap((product) => {
    const leaves = needs.find((need) => need.productId === product.id)?.leaves ?? 0;
    return leaves > 0 ? [orderLine(product, leaves, at)] : [];
  });
