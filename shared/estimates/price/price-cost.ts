import { costReasons } from '#shared/estimates/price/cost-reasons';
import { lineReasons } from '#shared/estimates/price/line-reasons';
import { type CostItem, sumOf } from '#shared/estimates/price/line-work';
import type { PriceCost, PriceHead, PriceLineCost } from '#shared/estimates/price/price';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { priceRates } from '#shared/estimates/price/price-rates';
import type { PricedWork, Pricing } from '#shared/estimates/price/priced-work';
import { costHeads } from '#shared/estimates/price/work-kind';
import { D, type MinorUnits } from '#shared/money/decimal';
import { marginOfMarkUp, priceFactor } from '#shared/money/margin';
import { roundMinor } from '#shared/money/round-minor';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { sumMinor } from '#shared/money/sum-minor';

/** An exact sum rounded once, and its parts made to agree with it. */
function roundedParts(exact: readonly D[]): { total_minor: MinorUnits; parts: MinorUnits[] } {
  const total_minor = roundMinor(sumOf(exact));
  return { total_minor, parts: splitByLargestRemainder(total_minor, exact) };
}

function headsOf(items: readonly CostItem[]): PriceHead[] {
  const groups = new Map<string, CostItem>();
  for (const item of items) {
    const key = `${item.head} ${item.itemId ?? ''}`;
    const before = groups.get(key);
    groups.set(
      key,
      before ? { ...before, hours: before.hours.plus(item.hours), cost: before.cost.plus(item.cost) } : item,
    );
  }
  const heads = [...groups.values()].sort((one, other) => costHeads.indexOf(one.head) - costHeads.indexOf(other.head));
  const { parts } = roundedParts(heads.map((head) => head.cost));
  return heads.map(({ head, itemId, name, hours }, place) => ({
    head,
    itemId,
    name,
    hours: hours.toNumber(),
    cost_minor: parts[place],
  }));
}

interface Sums {
  readonly lines: readonly PriceLineCost[];
  readonly direct_minor: MinorUnits;
  readonly overhead_minor: MinorUnits;
  readonly contingency_minor: MinorUnits;
  readonly cost_minor: MinorUnits;
}

function sumsOf(priced: readonly PricedWork[], pricing: Pricing): Sums {
  const direct = roundedParts(priced.map((line) => line.direct));
  const overhead = roundedParts(priced.map((line) => line.overhead));
  const contingency = roundedParts(priced.map((line) => line.contingency));
  const lines = priced.map((line, place) => ({
    lineId: line.work.id,
    hours: line.hours.toNumber(),
    direct_minor: direct.parts[place],
    overhead_minor: overhead.parts[place],
    contingency_minor: contingency.parts[place],
    cost_minor: sumMinor([direct.parts[place], overhead.parts[place], contingency.parts[place]]),
    reasons: lineReasons(line, pricing),
  }));
  const totals = [direct.total_minor, overhead.total_minor, contingency.total_minor] as const;
  const [direct_minor, overhead_minor, contingency_minor] = totals;
  return { lines, direct_minor, overhead_minor, contingency_minor, cost_minor: sumMinor(totals) };
}

/** A share only of what there is: of nothing, or of less than nothing, there is none. */
const percentOfWhole = (part: number, whole: number): number | null =>
  whole <= 0 ? null : new D(part).div(whole).times(100).toDecimalPlaces(4).toNumber();

/** The workshop's side of priced lines, with what is left of a net price after discount; whole minor units. */
export function priceCost(priced: readonly PricedWork[], net_minor: MinorUnits, input: PriceInput): PriceCost {
  const pricing = { input, rates: priceRates(input) };
  const sums = sumsOf(priced, pricing);
  const markUp = priceFactor(input.profit).minus(1).times(100);
  const profit_minor = sumMinor([net_minor, -sums.cost_minor]);
  const own = priced.filter((line) => line.work.price_minor !== null).map((line) => line.price_minor);
  const cost: Omit<PriceCost, 'reasons'> = {
    heads: headsOf(priced.flatMap((line) => line.work.items)),
    ...sums,
    hours: sumOf(priced.map((line) => line.hours)).toNumber(),
    priced_minor: sumMinor(own),
    margin_percent: marginOfMarkUp(markUp).toDecimalPlaces(4).toNumber(),
    markUp_percent: markUp.toDecimalPlaces(4).toNumber(),
    profit_minor,
    marginLeft_percent: percentOfWhole(profit_minor, net_minor),
    markUpLeft_percent: percentOfWhole(profit_minor, sums.cost_minor),
  };
  return { ...cost, reasons: costReasons(cost, pricing) };
}
