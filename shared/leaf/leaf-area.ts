import type { LeafProduct } from '#shared/leaf/leaf-product';

/** Area of one leaf in mm²; of ribbon, of one roll. */
export const leafArea = (product: LeafProduct): number => product.side_mm * (product.ribbon_mm ?? product.side_mm);
