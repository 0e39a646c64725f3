import { type CostItem, hoursOf, labourOf } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { PricedWork } from '#shared/estimates/price/priced-work';
import type { CostHead } from '#shared/estimates/price/work-kind';
import type { D } from '#shared/money/decimal';
import { exactMinor } from '#shared/money/minor-of';
import type { Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

const minor = (code: WordCode, figure: D | number, values: WordValues = {}): Reason => ({
  code,
  values,
  figure: Number(figure),
  unit: 'minor',
});

const codeOfHead: Readonly<Record<CostHead, WordCode>> = {
  labour: 'cost-labour',
  leaf: 'cost-leaf',
  materials: 'cost-materials',
  consumables: 'cost-consumables',
  timber: 'cost-timber',
  'bought-in': 'cost-bought-in',
  insurance: 'cost-insurance',
};

function itemReason(item: CostItem, { card, digits }: PriceInput): Reason {
  if (item.head === 'consumables') {
    const values = { share_percent: Number(card.consumables_percent) };
    return { ...minor('cost-consumables', item.cost, values), house: 'consumables_percent' };
  }
  if (item.head !== 'labour') return minor(codeOfHead[item.head], item.cost, { item: item.name });
  const rate = card.grades.find((grade) => grade.id === item.itemId)?.costPerHour ?? '0';
  const values = {
    grade: item.name,
    worked_hours: item.hours.toNumber(),
    rate_minor: exactMinor(rate, digits).toNumber(),
  };
  return { ...minor('cost-labour', item.cost, values), house: item.name };
}

/** How overhead arises on so many hours or so much labour cost (unrounded minor units). */
export function overheadReason(
  overhead: D | number,
  on: { hours: D | number; labour: D | number },
  input: PriceInput,
): Reason {
  const { card, digits } = input;
  if (card.overhead.way === 'per-hour') {
    const rate_minor = exactMinor(card.overhead.perHour, digits).toNumber();
    const values = { worked_hours: Number(on.hours), rate_minor };
    return { ...minor('cost-overhead-hours', overhead, values), house: 'overhead' };
  }
  const values = { share_percent: Number(card.overhead.percent), labour_minor: Number(on.labour) };
  return { ...minor('cost-overhead-share', overhead, values), house: 'overhead' };
}

/** How contingency arises on a direct cost (unrounded minor units). */
export function contingencyReason(contingency: D | number, direct: D | number, input: PriceInput): Reason {
  if (input.contingency.way === 'risk') return minor('cost-contingency-risk', contingency);
  const values = { share_percent: Number(input.contingency.percent), direct_minor: Number(direct) };
  return { ...minor('cost-contingency-share', contingency, values), house: 'contingency' };
}

/** How a price arises from a cost (unrounded minor units). */
export function profitReason(price: D | number, cost: D | number, { profit }: PriceInput): Reason {
  const values = { share_percent: Number(profit.percent), cost_minor: Number(cost) };
  const code = profit.way === 'margin' ? 'price-by-margin' : 'price-by-mark-up';
  return { ...minor(code, price, values), house: 'profit' };
}

/** How the price of one line came about, step by step; figures in minor units, not yet rounded but for the last. */
export function lineReasons(line: PricedWork, input: PriceInput): Reason[] {
  const { work, direct, overhead, contingency, unrounded, price_minor } = line;
  if (work.price_minor !== null) return [minor('price-own', price_minor)];
  const cost = direct.plus(overhead).plus(contingency);
  return [
    ...work.items.map((item) => itemReason(item, input)),
    overheadReason(overhead, { hours: hoursOf(work), labour: labourOf(work) }, input),
    contingencyReason(contingency, direct, input),
    profitReason(unrounded, cost, input),
    minor(input.lumpSum ? 'price-part-of-lump-sum' : 'price-rounded', price_minor),
  ];
}
