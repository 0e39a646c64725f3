import { labourItems } from '#shared/estimates/price/labour-items';
import { boughtItem, type LineWork } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { type PriceRates, priceRates } from '#shared/estimates/price/price-rates';
import type { ExtraLine } from '#shared/estimates/settings';
import { D } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';
import { lineAmount } from '#shared/money/line-amount';
import { exactMinor, minorOf } from '#shared/money/minor-of';

type Timber = Extract<ExtraLine, { kind: 'timber' }>;

/** Timber as it is bought: volume in the piece × (1 + waste) × price. */
const timberCost = (timber: Timber, digits: number): D =>
  exactFigure(timber.volume_dm3)
    .times(exactFigure(timber.waste_percent).div(100).plus(1))
    .times(exactMinor(timber.price_per_dm3, digits));

/** What an extra line adds to the plain frame of a line. */
function workOf(
  extra: ExtraLine,
  { digits }: PriceInput,
  rates: PriceRates,
): Partial<LineWork> & Pick<LineWork, 'kind'> {
  switch (extra.kind) {
    case 'labour':
      return { kind: extra.work, items: labourItems([extra], rates) };
    case 'bought-in':
      return { kind: 'bought-in', items: [boughtItem('bought-in', exactMinor(extra.cost, digits))] };
    case 'timber':
      return { kind: 'making', items: [boughtItem('timber', timberCost(extra, digits))] };
    case 'paid-quantity':
      return { kind: 'paid-quantity', price_minor: lineAmount(extra, digits) };
    case 'price':
      return { kind: 'other', price_minor: minorOf(extra.price, digits) };
    case 'insurance':
      if (extra.value === null) return { kind: 'insurance', insured_percent: new D(extra.percent) };
      return {
        kind: 'insurance',
        items: [boughtItem('insurance', exactMinor(extra.value, digits).times(extra.percent).div(100))],
      };
  }
}

/** Each extra line as a line of its own, in the order they were entered. */
export function extraLines(input: PriceInput): LineWork[] {
  const rates = priceRates(input);
  return input.extras.map((extra) => ({
    id: extra.id,
    memberId: extra.memberId,
    name: extra.name,
    taxCategoryId: extra.taxCategoryId,
    items: [],
    price_minor: null,
    insured_percent: null,
    ...workOf(extra, input, rates),
  }));
}
