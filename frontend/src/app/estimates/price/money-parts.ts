import type { PriceCost, PriceHead } from '#shared/estimates/price/price';
import { costHeads, type CostHead } from '#shared/estimates/price/work-kind';
import { D } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** Where money goes: a head of cost, or what is laid over the direct cost to make the price. */
export type MoneyPartKey = CostHead | 'overhead' | 'contingency' | 'profit';

/** One part of the net price, and what stands in it. */
export interface MoneyPart {
  readonly key: MoneyPartKey;
  readonly amount_minor: number;
  /** Grades with their hours, leaf and materials by name. */
  readonly items: readonly PriceHead[];
}

function headParts(heads: readonly PriceHead[]): MoneyPart[] {
  return costHeads.flatMap((key) => {
    const items = heads.filter(({ head }) => head === key);
    const amount_minor = sumMinor(items.map(({ cost_minor }) => cost_minor));
    return amount_minor === 0 ? [] : [{ key, amount_minor, items: items.filter(({ name }) => name !== '') }];
  });
}

/** The net price in its parts, in the order they are drawn; together they are the net price to the last minor unit. */
export function moneyParts(cost: PriceCost): MoneyPart[] {
  const over: readonly [MoneyPartKey, number][] = [
    ['overhead', cost.overhead_minor],
    ['contingency', cost.contingency_minor],
    ['profit', cost.profit_minor],
  ];
  return [
    ...headParts(cost.heads),
    ...over.filter(([, amount]) => amount !== 0).map(([key, amount_minor]) => ({ key, amount_minor, items: [] })),
  ];
}

/** One drawn part: where it begins and how long it is, in thousandths of the whole. */
export interface MoneyStretch {
  readonly key: MoneyPartKey;
  readonly start: number;
  readonly length: number;
}

/** The parts laid end to end over a length of 1,000; a loss is no stretch, the cost alone is drawn. */
export function moneyStretches(parts: readonly MoneyPart[]): MoneyStretch[] {
  const drawn = parts.filter(({ amount_minor }) => amount_minor > 0);
  const whole = sumMinor(drawn.map(({ amount_minor }) => amount_minor));
  let start = 0;
  return drawn.map(({ key, amount_minor }) => {
    const stretch = { key, start, length: new D(amount_minor).div(whole).times(1000).toNumber() };
    start += stretch.length;
    return stretch;
  });
}
