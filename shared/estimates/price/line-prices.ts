import { insuredValue, insuredWork } from '#shared/estimates/price/insured-work';
import { directOf, type LineWork, sumOf } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { priceRates } from '#shared/estimates/price/price-rates';
import { type PricedWork, pricedWork } from '#shared/estimates/price/priced-work';
import { D } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { sumMinor } from '#shared/money/sum-minor';
import type { Finding } from '#shared/words/finding';

/** All lines with their prices of record, and what is to be told about them. */
export interface LinePrices {
  readonly lines: readonly PricedWork[];
  readonly findings: readonly Finding[];
}

/** Contingency of each line: its own share, or its part of what the risk calculation found. */
function contingencies(directs: readonly D[], { contingency }: PriceInput): D[] {
  if (contingency.way === 'share') return directs.map((direct) => direct.times(contingency.percent).div(100));
  if (sumOf(directs).isZero()) return directs.map(() => new D(0));
  return splitByLargestRemainder(contingency.amount_minor, directs).map((part) => new D(part));
}

/** Spreads an agreed total over the lines in proportion to their worked prices. */
function spread({ lines, findings }: LinePrices, { lumpSum, digits }: PriceInput): LinePrices {
  const weights = lines.map((line) => line.unrounded);
  if (!lumpSum) return { lines, findings };
  if (sumOf(weights).isZero()) {
    return { lines, findings: [...findings, { kind: 'refuse', code: 'price-lump-sum-nowhere', values: {} }] };
  }
  const prices = splitByLargestRemainder(minorOf(lumpSum, digits), weights);
  return { lines: lines.map((line, place) => ({ ...line, price_minor: prices[place] })), findings };
}

/** Prices every line, those that insure the price last, in the order given; RangeError for a margin of 100 % or more. */
export function linePrices(works: readonly LineWork[], input: PriceInput): LinePrices {
  const insured = works.filter((work) => work.insured_percent !== null);
  const others = works.filter((work) => work.insured_percent === null);
  const parts = contingencies(others.map(directOf), input);
  const pricing = { input, rates: priceRates(input) };
  const priced = new Map(others.map((work, place) => [work, pricedWork(work, parts[place], pricing)]));
  const value = insuredValue(sumMinor([...priced.values()].map((line) => line.price_minor)), insured, input);
  for (const work of insured) priced.set(work, insuredWork(work, value ?? new D(0), pricing));
  const lines = works.map((work) => priced.get(work)).filter((line) => line !== undefined);
  const findings: Finding[] = value === null ? [{ kind: 'refuse', code: 'price-insurance-over', values: {} }] : [];
  return spread({ lines, findings }, input);
}
