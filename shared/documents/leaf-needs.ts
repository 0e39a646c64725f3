import { prepareEstimate } from '#shared/estimates/estimate-figures';
import { percentileOf } from '#shared/estimates/risk/percentile-of';
import type { Percentiles } from '#shared/estimates/risk/risk';
import { riskColumns } from '#shared/estimates/risk/risk-columns';
import { riskOutcomes } from '#shared/estimates/risk/risk-outcomes';
import type { Snapshot } from '#shared/estimates/snapshot';
import { settled } from '#shared/money/settled';

/** Leaves of one product that suffice at the card's percentile, not rounded. */
export interface LeafNeed {
  readonly productId: string;
  readonly leaves: number;
}

type Issue = Pick<Snapshot, 'draft' | 'choice' | 'card' | 'workshop' | 'figures'>;

const trials = 4000;
const kept: Readonly<Record<number, keyof Percentiles>> = { 50: 'p50', 80: 'p80', 90: 'p90' };

/** The trials of the issue drawn once more: the same seed gives the same trials, at any percentile. */
function drawnNeeds({ draft, choice, card, workshop }: Issue): LeafNeed[] {
  const { risk } = prepareEstimate({ draft, choice, card, currency: workshop.currency });
  const { leaf } = riskOutcomes(risk, riskColumns(risk, trials), trials);
  return leaf.map(({ productId, leaves }) => ({
    productId,
    leaves: settled(percentileOf(leaves.toSorted(), card.leaf.orderPercentile)),
  }));
}

/** What to order for: the leaves of each product at the card's percentile of the issue's own trials. */
export function leafNeeds(issue: Issue): LeafNeed[] {
  const percentile = kept[issue.card.leaf.orderPercentile];
  const { risk } = issue.figures.cost;
  if (!risk || !percentile) return drawnNeeds(issue);
  return risk.leaf.map(({ productId, leaves }) => ({ productId, leaves: leaves[percentile] }));
}
