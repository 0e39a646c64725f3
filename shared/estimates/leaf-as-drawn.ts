import type { LeafFigures, WorkFigures } from '#shared/estimates/figures';
import type { Risk } from '#shared/estimates/risk/risk';

function rangeDrawn(leaf: LeafFigures, risk: Risk): LeafFigures {
  const drawn = risk.leaf.find(({ productId }) => productId === leaf.productId)?.leaves;
  return drawn ? { ...leaf, grossLeaves_p10: drawn.p10, grossLeaves_p90: drawn.p90 } : leaf;
}

/** Gives leaves and booklets the P10 and P90 of the job's own trials; without trials both stay at the likely need. */
export function leafAsDrawn({ tally, leaf, ...rest }: WorkFigures, risk: Risk | null): WorkFigures {
  if (!risk?.booklets) return { ...rest, tally, leaf };
  const { p10: booklets_p10, p90: booklets_p90 } = risk.booklets;
  return {
    ...rest,
    tally: { ...tally, booklets_p10, booklets_p90 },
    leaf: leaf.map((product) => rangeDrawn(product, risk)),
  };
}
