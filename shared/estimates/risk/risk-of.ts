import { percentileOf } from '#shared/estimates/risk/percentile-of';
import type { LeafPercentiles, Percentiles, Risk } from '#shared/estimates/risk/risk';
import { likelyColumns, riskColumns } from '#shared/estimates/risk/risk-columns';
import type { RiskInput } from '#shared/estimates/risk/risk-input';
import { type LeafOutcomes, type RiskOutcomes, riskOutcomes } from '#shared/estimates/risk/risk-outcomes';
import { D, type MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';
import { settled } from '#shared/money/settled';
import { sumMinor } from '#shared/money/sum-minor';
import type { Reason } from '#shared/words/reason';

const generator = 'xoshiro128**';
const trials = 4000;

const rising = (figures: Float64Array): Float64Array => Float64Array.from(figures).sort();

type Finish = (figure: number) => number;

const wholeMinor = (amount: number): MinorUnits => roundMinor(new D(String(settled(amount))));

function percentilesOf(figures: Float64Array, atLikely: number, finish: Finish): Percentiles {
  const at = (percentile: number) => finish(percentileOf(figures, percentile));
  return { atLikely: finish(atLikely), p10: at(10), p50: at(50), p80: at(80), p90: at(90) };
}

const allBooklets = ({ hours, leaf }: RiskOutcomes): Float64Array =>
  hours.map((_, trial) => leaf.reduce((sum, { booklets }) => sum + booklets[trial], 0));

function leafPercentiles(drawn: LeafOutcomes, likely: LeafOutcomes): LeafPercentiles {
  const of = (figures: Float64Array, atLikely: number) => percentilesOf(rising(figures), atLikely, settled);
  return {
    productId: drawn.productId,
    leaves: of(drawn.leaves, likely.leaves[0]),
    booklets: of(drawn.booklets, likely.booklets[0]),
  };
}

function reasonsOf(risk: Omit<Risk, 'reasons'>, percentile: number): Reason[] {
  const { atPercentile_minor, contingency_minor, seed } = risk;
  return [
    { code: 'risk-trials', values: { trials, generator, seed: String(seed) }, figure: trials, unit: 'number' },
    { code: 'risk-at-likely', values: {}, figure: risk.direct_minor.atLikely, unit: 'minor' },
    { code: 'risk-at-percentile', values: { share_percent: percentile }, figure: atPercentile_minor, unit: 'minor' },
    { code: 'risk-contingency', values: {}, figure: contingency_minor, unit: 'minor' },
  ];
}

/**
 * Works 4,000 trials of a job from a seed with + − × ÷ √ alone, so that equal input gives equal figures on every machine: hours, direct cost
 * in whole minor units, leaves and booklets at the likely values and at P10, P50, P80, P90, and the contingency max(0, percentile − direct
 * cost at the likely values). RangeError for input a schema should have stopped.
 */
export function riskOf(input: RiskInput): Risk {
  const drawn = riskOutcomes(input, riskColumns(input, trials), trials);
  const likely = riskOutcomes(input, likelyColumns(input.draws), 1);
  const direct = rising(drawn.direct);
  const direct_minor = percentilesOf(direct, likely.direct[0], wholeMinor);
  const atPercentile_minor = wholeMinor(percentileOf(direct, input.percentile));
  const risk: Omit<Risk, 'reasons'> = {
    generator,
    trials,
    seed: input.seed,
    hours: percentilesOf(rising(drawn.hours), likely.hours[0], settled),
    direct_minor,
    leaf: drawn.leaf.map((leaf, place) => leafPercentiles(leaf, likely.leaf[place])),
    booklets: percentilesOf(rising(allBooklets(drawn)), allBooklets(likely)[0], settled),
    atPercentile_minor,
    contingency_minor: Math.max(0, sumMinor([atPercentile_minor, -direct_minor.atLikely])),
  };
  return { ...risk, reasons: reasonsOf(risk, input.percentile) };
}
