import type { LeafProduct } from '#shared/leaf/leaf-product';
import { countUp } from '#shared/money/settled';

/** Whole booklets (rolls of ribbon) that hold so many leaves; an exact fit stays one. */
export const bookletsFor = (product: LeafProduct, leaves: number): number => countUp(leaves / product.leavesPerBooklet);
