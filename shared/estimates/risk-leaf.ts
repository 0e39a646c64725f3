import type { EstimateWork } from '#shared/estimates/estimate-work';
import type { HourCost } from '#shared/estimates/hour-costs';
import type { RiskDraw, RiskLeaf, RiskLeafUse } from '#shared/estimates/risk/risk-input';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import { bookletsFor } from '#shared/leaf/booklets-for';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { bookletPrices } from '#shared/leaf/leaf-purchase';
import type { LeafTotal } from '#shared/leaf/leaf-totals';
import type { ZoneLeaf } from '#shared/leaf/laying';
import { minorOf } from '#shared/money/minor-of';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { mapTriple, type Triple } from '#shared/units/triple';

/** The spread of hands-on gilding, which laying shares with all other gilding steps. */
const spreadKey = 'spread/gilding';

interface LeafRisk {
  readonly draws: readonly RiskDraw[];
  readonly products: readonly RiskLeaf[];
  readonly likelyHours: number;
  readonly likelyCost_minor: number;
}

interface Priced {
  readonly cost: HourCost;
  readonly digits: number;
}

const lossKeys = ({ way }: ZoneLeaf) => ({ breakageKey: `breakage/${way}`, faultingKey: `faulting/${way}` });

// What is burnished and what is matte hangs on a triple each, whatever the shares of a zone.
const secondsOf = ({ way, losses }: ZoneLeaf) =>
  losses.secondLayings
    .filter(({ share }) => share > 0)
    .map(({ finish, share, percent }) => ({ key: `second/${finish}/${way}`, share, percent }));

const fraction = (percent: Triple): Triple => mapTriple(percent, (figure) => figure / 100);

function lossDraws(leaf: ZoneLeaf): RiskDraw[] {
  const keys = lossKeys(leaf);
  return [
    { key: keys.breakageKey, triple: fraction(leaf.losses.breakage_percent) },
    { key: keys.faultingKey, triple: fraction(leaf.losses.faulting_percent) },
    ...secondsOf(leaf).map(({ key, percent }) => ({ key, triple: fraction(percent) })),
  ];
}

function useOf(zone: WorkedZone, leaf: ZoneLeaf, cost: HourCost): RiskLeafUse {
  const laying = zone.handsOn.steps.filter((step) => step.perLaid_hours !== null);
  const hours = laying.reduce((sum, step) => sum + step.hours.likely, 0);
  const cost_minor = laying.reduce((sum, step) => sum + step.hours.likely * cost(step.gradeId), 0);
  const leaves = leaf.grossLeaves.likely;
  const perLeaf =
    leaves > 0
      ? { hoursPerLeaf: hours / leaves, costPerLeaf_minor: cost_minor / leaves }
      : { hoursPerLeaf: 0, costPerLeaf_minor: 0 };
  const secondLayings = secondsOf(leaf).map(({ key, share }) => ({ key, share }));
  return { netLeaves: leaf.netLeaves, ...lossKeys(leaf), secondLayings, ...perLeaf, spreadKey };
}

/** What 0, 1, 2 … booklets cost, well past the most that could be needed. */
function bookletCosts(product: LeafProduct, total: LeafTotal, digits: number): number[] {
  const most = Math.min(2_000, Math.max(1, Math.ceil(bookletsFor(product, total.grossLeaves.high) * 1.1)));
  return bookletPrices(product, most).map((price) => minorOf(price, digits));
}

function productRisk(total: LeafTotal, work: EstimateWork, at: { card: RateCard; priced: Priced }): RiskLeaf[] {
  const product = at.card.leaf.products.find((known) => known.id === total.productId);
  if (!product) return [];
  const uses = work.zones.flatMap((zone) =>
    zone.leaf?.productId === product.id ? [useOf(zone, zone.leaf, at.priced.cost)] : [],
  );
  const { leavesPerBooklet } = product;
  return [
    {
      productId: product.id,
      leavesPerBooklet,
      bookletCosts_minor: bookletCosts(product, total, at.priced.digits),
      uses,
    },
  ];
}

/** The leaf of an estimate as risk sees it: one draw for each triple of a loss, whole booklets, laying that follows the leaves. */
export function riskLeaf(work: EstimateWork, card: RateCard, priced: Priced): LeafRisk {
  const laid = work.zones.flatMap((zone) => (zone.leaf ? [zone.leaf] : []));
  const losses = new Map(laid.flatMap(lossDraws).map((draw) => [draw.key, draw]));
  const products = work.leaf.flatMap((total) => productRisk(total, work, { card, priced }));
  const uses = products.flatMap((product) => product.uses);
  const leaves = new Map(work.leaf.map((total) => [total.productId, total.booklets]));
  const booklets_minor = products.reduce(
    (sum, one) => sum + (one.bookletCosts_minor[leaves.get(one.productId) ?? 0] ?? 0),
    0,
  );
  const laying = work.zones.flatMap((zone) => zone.handsOn.steps).filter((step) => step.perLaid_hours !== null);
  return {
    draws: uses.length > 0 ? [...losses.values(), { key: spreadKey, triple: card.buildUps.spread }] : [],
    products,
    likelyHours: laying.reduce((sum, step) => sum + step.hours.likely, 0),
    likelyCost_minor:
      booklets_minor + laying.reduce((sum, step) => sum + step.hours.likely * priced.cost(step.gradeId), 0),
  };
}
