import { directCost } from '#shared/estimates/price/direct-cost';
import { extraLines } from '#shared/estimates/price/extra-lines';
import { linePrices } from '#shared/estimates/price/line-prices';
import type { PriceContingency, PriceInput } from '#shared/estimates/price/price-input';
import { workedLines } from '#shared/estimates/price/worked-lines';
import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import { sumMinor } from '#shared/money/sum-minor';
import { textOf } from '#shared/money/text-of';

/** Contingency as a share, so that both sides of a difference carry the same; one from risk by what it is of the direct cost. */
function asShare(input: PriceInput): PriceContingency {
  const { contingency } = input;
  if (contingency.way === 'share') return contingency;
  const { direct_minor } = directCost(input);
  const share = direct_minor === 0 ? new D(0) : new D(contingency.amount_minor).div(direct_minor);
  return { way: 'share', percent: share.times(100).toFixed() };
}

function worked(input: PriceInput, contingency: PriceContingency): MinorUnits {
  const free = { ...input, lumpSum: null, contingency };
  const { lines } = linePrices([...workedLines(free), ...extraLines(free)], free);
  return sumMinor(lines.map((line) => line.price_minor));
}

/**
 * A lump sum with alternatives chosen: it was agreed for the base, so what the chosen work is worked at more or less is added to it. A
 * decimal amount of the currency, never below nothing. Own rule; common practice of adding and deducting, no source.
 */
export function agreedSum(lumpSum: DecimalText, chosen: PriceInput, base: PriceInput): DecimalText {
  const contingency = asShare(chosen);
  const difference_minor = sumMinor([worked(chosen, contingency), -worked(base, contingency)]);
  const agreed_minor = sumMinor([minorOf(lumpSum, chosen.digits), difference_minor]);
  return textOf(Math.max(0, agreed_minor), chosen.digits);
}
