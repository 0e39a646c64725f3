import type { LeafMetal, LeafProduct } from '#shared/leaf/leaf-product';

/** Leaf of one metal, as one chooses it. */
export interface LeafGroup {
  readonly name: string;
  readonly products: readonly LeafProduct[];
}

const metalNames: Readonly<Record<LeafMetal, string>> = {
  gold: $localize`Gold`,
  palladium: $localize`Palladium`,
  silver: $localize`Silver`,
  composition: $localize`Composition`,
  aluminium: $localize`Aluminium`,
};

/** Leaf of the card by metal, in the card's order. */
export function leafGroups(products: readonly LeafProduct[]): LeafGroup[] {
  const metals = [...new Set(products.map(({ metal }) => metal))];
  return metals.map((metal) => ({
    name: metalNames[metal],
    products: products.filter((product) => product.metal === metal),
  }));
}
