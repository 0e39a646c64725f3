import type { CostItem } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { PricedWork, Pricing } from '#shared/estimates/price/priced-work';
import type { PriceRates } from '#shared/estimates/price/price-rates';
import type { CostHead } from '#shared/estimates/price/work-kind';
import type { D } from '#shared/money/decimal';
import type { Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

const minor = (code: WordCode, figure: D | number, values: WordValues = {}): Reason => ({
  code,
  values,
  figure: Number(figure),
  unit: 'minor',
});

/** A figure that follows from a house value. */
const fromHouse = (
  code: WordCode,
  figure: D | number,
  { values, house }: Required<Pick<Reason, 'values' | 'house'>>,
): Reason => ({ code, values, figure: Number(figure), unit: 'minor', house });

const codeOfHead: Readonly<Record<CostHead, WordCode>> = {
  labour: 'cost-labour',
  leaf: 'cost-leaf',
  materials: 'cost-materials',
  consumables: 'cost-consumables',
  timber: 'cost-timber',
  'bought-in': 'cost-bought-in',
  insurance: 'cost-insurance',
};

function itemReason(item: CostItem, { rates }: Pricing): Reason {
  if (item.head === 'consumables') {
    const values = { share_percent: rates.consumables_percent.toNumber() };
    return fromHouse('cost-consumables', item.cost, { values, house: 'consumables_percent' });
  }
  if (item.head !== 'labour') return minor(codeOfHead[item.head], item.cost, { item: item.name });
  const values = {
    grade: item.name,
    worked_hours: item.hours.toNumber(),
    rate_minor: rates.grades.get(item.itemId ?? '')?.perHour.toNumber() ?? 0,
  };
  return fromHouse('cost-labour', item.cost, { values, house: item.name });
}

/** How overhead arises on so many hours or so much labour cost (unrounded minor units). */
export function overheadReason(
  overhead: D | number,
  on: { hours: D | number; labour: D | number },
  rates: PriceRates,
): Reason {
  const rate = rates.overhead.rate.toNumber();
  if (rates.overhead.way === 'per-hour') {
    const values = { worked_hours: Number(on.hours), rate_minor: rate };
    return fromHouse('cost-overhead-hours', overhead, { values, house: 'overhead' });
  }
  const values = { share_percent: rate, labour_minor: Number(on.labour) };
  return fromHouse('cost-overhead-share', overhead, { values, house: 'overhead' });
}

/** How contingency arises on a direct cost (unrounded minor units). */
export function contingencyReason(contingency: D | number, direct: D | number, input: PriceInput): Reason {
  if (input.contingency.way === 'risk') return minor('cost-contingency-risk', contingency);
  const values = { share_percent: Number(input.contingency.percent), direct_minor: Number(direct) };
  return fromHouse('cost-contingency-share', contingency, { values, house: 'contingency' });
}

/** How a price arises from a cost (unrounded minor units). */
export function profitReason(price: D | number, cost: D | number, { profit }: PriceInput): Reason {
  const values = { share_percent: Number(profit.percent), cost_minor: Number(cost) };
  const code = profit.way === 'margin' ? 'price-by-margin' : 'price-by-mark-up';
  return fromHouse(code, price, { values, house: 'profit' });
}

/** How the price of one line came about, step by step; figures in minor units, not yet rounded but for the last. */
export function lineReasons(line: PricedWork, pricing: Pricing): Reason[] {
  const { work, hours, labour, direct, overhead, contingency, unrounded, price_minor } = line;
  const { input, rates } = pricing;
  const part = input.lumpSum ? [minor('price-part-of-lump-sum', price_minor)] : [];
  if (work.price_minor !== null) return [minor('price-own', work.price_minor), ...part];
  const cost = direct.plus(overhead).plus(contingency);
  return [
    ...work.items.map((item) => itemReason(item, pricing)),
    overheadReason(overhead, { hours, labour }, rates),
    contingencyReason(contingency, direct, input),
    profitReason(unrounded, cost, input),
    ...(input.lumpSum ? part : [minor('price-rounded', price_minor)]),
  ];
}
