import { extraLines } from '#shared/estimates/price/extra-lines';
import { linePrices } from '#shared/estimates/price/line-prices';
import type { Price } from '#shared/estimates/price/price';
import { priceCost } from '#shared/estimates/price/price-cost';
import { priceFindings } from '#shared/estimates/price/price-findings';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { priceLines } from '#shared/estimates/price/price-lines';
import { workedLines } from '#shared/estimates/price/worked-lines';

/**
 * Works the price of an estimate in whole minor units of its currency, hours decimal: rounded lines are the record, net is their sum less
 * the discount, tax once per category, gross. RangeError for negative hours, a margin of 100 % or more, and beyond safe integers.
 */
export function priceOf(input: PriceInput): Price {
  const { lines, findings } = linePrices([...workedLines(input), ...extraLines(input)], input);
  const client = priceLines(lines, input);
  const cost = priceCost(lines, client.net_minor, input);
  return { client, cost, findings: [...findings, ...priceFindings(client, cost.profit_minor, input)] };
}
