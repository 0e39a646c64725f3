import { D, type DecimalText } from '#shared/money/decimal';

/** Profit as a share of price or of cost, in percent. Both start from the same two figures and are never taken for one another. */

const hundred = new D(100);

/** Margin (of price) that a mark-up (on cost) amounts to, percent in and out: k ÷ (1 + k). RangeError at −100 % and below. */
export function marginOfMarkUp(markUp_percent: DecimalText | D): D {
  const markUp = new D(markUp_percent);
  if (markUp.lessThanOrEqualTo(-100)) throw new RangeError('a mark-up must be above −100 %');
  return markUp.div(hundred.plus(markUp)).times(100);
}

/** Mark-up (on cost) that a margin (of price) amounts to, percent in and out: m ÷ (1 − m). RangeError from 100 % on. */
export function markUpOfMargin(margin_percent: DecimalText | D): D {
  const margin = new D(margin_percent);
  if (margin.greaterThanOrEqualTo(100)) throw new RangeError('a margin must be below 100 %');
  return margin.div(hundred.minus(margin)).times(100);
}

/** What cost is multiplied with to give the price: 1 ÷ (1 − margin), or 1 + mark-up. RangeError as above. */
export function priceFactor(profit: { readonly way: 'margin' | 'mark-up'; readonly percent: DecimalText }): D {
  const markUp = profit.way === 'margin' ? markUpOfMargin(profit.percent) : new D(profit.percent);
  return markUp.div(100).plus(1);
}

/**
 * The price of a cost: cost ÷ (1 − margin), or cost × (1 + mark-up), any unit. The margin divides last: a factor cut off at 40 digits
 * would leave an exact half a hair below itself, and round it down. RangeError as above.
 */
export function priceOfCost(cost: D, profit: { readonly way: 'margin' | 'mark-up'; readonly percent: DecimalText }): D {
  if (profit.way === 'mark-up') return cost.times(priceFactor(profit));
  const kept = hundred.minus(profit.percent);
  if (kept.lessThanOrEqualTo(0)) throw new RangeError('a margin must be below 100 %');
  return cost.times(100).div(kept);
}
