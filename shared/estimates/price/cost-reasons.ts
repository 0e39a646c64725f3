import { contingencyReason, overheadReason } from '#shared/estimates/price/line-reasons';
import type { PriceCost } from '#shared/estimates/price/price';
import type { Pricing } from '#shared/estimates/price/priced-work';
import { sumMinor } from '#shared/money/sum-minor';
import type { Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

const minor = (code: WordCode, figure: number, values: WordValues = {}): Reason => ({
  code,
  values,
  figure,
  unit: 'minor',
});

const percent = (code: WordCode, figure: number): Reason => ({ code, values: {}, figure, unit: 'percent' });

/** How the cost of the whole and what is left of the price came about; figures in whole minor units and percent. */
export function costReasons(cost: Omit<PriceCost, 'reasons'>, { input, rates }: Pricing): Reason[] {
  const labour = sumMinor(cost.heads.filter((head) => head.head === 'labour').map((head) => head.cost_minor));
  return [
    minor('cost-direct', cost.direct_minor, { count: cost.heads.length }),
    overheadReason(cost.overhead_minor, { hours: cost.hours, labour }, rates),
    contingencyReason(cost.contingency_minor, cost.direct_minor, input),
    minor('cost-total', cost.cost_minor),
    percent('price-margin-asked', cost.margin_percent),
    percent('price-mark-up-asked', cost.markUp_percent),
    minor('price-profit-left', cost.profit_minor),
    ...(cost.marginLeft_percent === null ? [] : [percent('price-margin-left', cost.marginLeft_percent)]),
    ...(cost.markUpLeft_percent === null ? [] : [percent('price-mark-up-left', cost.markUpLeft_percent)]),
  ];
}
