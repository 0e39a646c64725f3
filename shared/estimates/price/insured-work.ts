import { boughtItem, type LineWork, sumOf } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { type PricedWork, pricedWork, type Pricing } from '#shared/estimates/price/priced-work';
import { D, type MinorUnits } from '#shared/money/decimal';
import { priceFactor } from '#shared/money/margin';
import { exactMinor } from '#shared/money/minor-of';

/** Contingency on insurance: its share; contingency from risk knows nothing of insurance. */
const contingencyShare = ({ contingency }: PriceInput): D =>
  contingency.way === 'share' ? new D(contingency.percent).div(100) : new D(0);

const insuredShare = (line: LineWork): D => (line.insured_percent ?? new D(0)).div(100);

/** What a line insuring the price adds to it, as a share of the price: insurance × (1 + contingency) × factor. */
const loadOf = (line: LineWork, input: PriceInput): D =>
  insuredShare(line).times(contingencyShare(input).plus(1)).times(priceFactor(input.profit));

/**
 * The value that lines insuring the price insure: the whole price, insurance included. V = S + load × V, so V = S ÷ (1 − load), with S the
 * other lines' prices, in unrounded minor units; null when insurance would eat the price up. An agreed lump sum is the value at once.
 */
export function insuredValue(others_minor: MinorUnits, insured: readonly LineWork[], input: PriceInput): D | null {
  if (input.lumpSum) return exactMinor(input.lumpSum, input.digits);
  const left = new D(1).minus(sumOf(insured.map((line) => loadOf(line, input))));
  return left.lessThanOrEqualTo(0) ? null : new D(others_minor).div(left);
}

/** A line insuring the price, once the value is known (unrounded minor units). */
export function insuredWork(line: LineWork, value: D, pricing: Pricing): PricedWork {
  const cost = value.times(insuredShare(line));
  const contingency = cost.times(contingencyShare(pricing.input));
  return pricedWork({ ...line, items: [boughtItem('insurance', cost)] }, contingency, pricing);
}
