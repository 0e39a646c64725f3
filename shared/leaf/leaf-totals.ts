import { bookletsFor } from '#shared/leaf/booklets-for';
import type { LeafCard } from '#shared/leaf/leaf-card';
import { type LeafCoverage, leafCoverage } from '#shared/leaf/leaf-coverage';
import { type LeafPurchase, leafPurchase } from '#shared/leaf/leaf-purchase';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { thicknessFindings } from '#shared/leaf/implied-thickness';
import type { ZoneLeaf } from '#shared/leaf/laying';
import { D, type DecimalText } from '#shared/money/decimal';
import { settled } from '#shared/money/settled';
import type { Triple } from '#shared/units/triple';
import { tripleSum } from '#shared/units/triple-sum';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** All leaf of one product over an estimate; leaves are not rounded, the price is in the workshop's currency and not rounded. */
export interface LeafTotal {
  readonly productId: string;
  readonly trueArea_mm2: number;
  readonly netLeaves: number;
  readonly grossLeaves: Triple;
  /** Whole booklets of the likely need, and how they are bought. */
  readonly booklets: number;
  readonly purchase: LeafPurchase;
  /** What the price carries: the purchase, or the likely leaves at list. */
  readonly price: DecimalText;
  readonly coverage: LeafCoverage;
  /** Metal on the likely leaves. */
  readonly mass_grams: number;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}

/** Price of leaves charged one by one at list, in the workshop's currency, not rounded. */
export const priceByTheLeaf = (product: LeafProduct, leaves: number): DecimalText =>
  new D(product.price)
    .times(String(settled(leaves)))
    .div(product.leavesPerBooklet)
    .toString();

const reasonsOf = (
  product: LeafProduct,
  net: number,
  drawn: { readonly leaves: number; readonly booklets: number },
): Reason[] => [
  { code: 'leaf-total-net', values: {}, figure: net, unit: 'leaves' },
  { code: 'leaf-total-gross', values: {}, figure: drawn.leaves, unit: 'leaves' },
  {
    code: 'leaf-total-booklets',
    values: { leaves: product.leavesPerBooklet },
    figure: drawn.booklets,
    unit: 'booklets',
  },
];

const oneBatch = ({ id, name }: LeafProduct): Finding => ({
  kind: 'note',
  code: 'leaf-one-batch',
  values: { leaf: name },
  about: id,
});

function leafTotal(product: LeafProduct, zones: readonly ZoneLeaf[], card: LeafCard): LeafTotal {
  const sum = (pick: (zone: ZoneLeaf) => number) => zones.reduce((total, zone) => total + pick(zone), 0);
  const netLeaves = sum((zone) => zone.netLeaves);
  const trueArea_mm2 = sum((zone) => zone.trueArea_mm2);
  const grossLeaves = tripleSum(zones.map((zone) => zone.grossLeaves));
  const leaves = grossLeaves.likely;
  const booklets = bookletsFor(product, leaves);
  const purchase = leafPurchase(product, booklets);
  return {
    productId: product.id,
    trueArea_mm2,
    netLeaves,
    grossLeaves,
    booklets,
    purchase,
    price: card.charge === 'booklets' ? purchase.price : priceByTheLeaf(product, leaves),
    coverage: leafCoverage(product, leaves, trueArea_mm2),
    mass_grams: (leaves * product.gramsPerThousand) / 1000,
    reasons: reasonsOf(product, netLeaves, { leaves, booklets }),
    findings: [...(leaves > 0 ? [oneBatch(product)] : []), ...thicknessFindings(product)],
  };
}

/** Adds up the exact leaves of all zones for each product of the card that is used, in the order of the card. House rules. */
export function leafTotals(zones: readonly ZoneLeaf[], card: LeafCard): LeafTotal[] {
  return card.products.flatMap((product) => {
    const own = zones.filter((zone) => zone.productId === product.id);
    return own.length > 0 ? [leafTotal(product, own, card)] : [];
  });
}
