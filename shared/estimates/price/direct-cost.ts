import { extraLines } from '#shared/estimates/price/extra-lines';
import { linePrices } from '#shared/estimates/price/line-prices';
import { sumOf } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { workedLines } from '#shared/estimates/price/worked-lines';
import type { MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';

/** Direct hours and direct cost (whole minor units) of an estimate, as its price has them, without the price itself. */
export function directCost(input: PriceInput): { readonly hours: number; readonly direct_minor: MinorUnits } {
  const { lines } = linePrices([...workedLines(input), ...extraLines(input)], input);
  return {
    hours: sumOf(lines.map((line) => line.hours)).toNumber(),
    direct_minor: roundMinor(sumOf(lines.map((line) => line.direct))),
  };
}
