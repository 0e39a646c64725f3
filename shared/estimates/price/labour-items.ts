import { boughtItem, type CostItem, sumOf } from '#shared/estimates/price/line-work';
import type { PriceRates } from '#shared/estimates/price/price-rates';
import { D } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';

/** Hours of one grade. */
export interface GradeHours {
  readonly gradeId: string;
  readonly hours: number;
}

const nothing = new D(0);

function gradeItem({ gradeId, hours }: GradeHours, { grades }: PriceRates): CostItem {
  if (hours < 0) throw new RangeError('hours must not be negative');
  const grade = grades.get(gradeId);
  const exact = exactFigure(hours);
  const cost = exact.times(grade?.perHour ?? nothing);
  return { head: 'labour', itemId: gradeId, name: grade?.name ?? gradeId, hours: exact, cost };
}

/** Entries of one grade joined, in order of first appearance. */
function joined(labour: readonly GradeHours[]): GradeHours[] {
  const hours = new Map<string, number>();
  for (const entry of labour) hours.set(entry.gradeId, (hours.get(entry.gradeId) ?? 0) + entry.hours);
  return [...hours].map(([gradeId, sum]) => ({ gradeId, hours: sum }));
}

/** Labour of one line by grade, and the consumables that go with it as a share of its cost; unrounded minor units. */
export function labourItems(labour: readonly GradeHours[], rates: PriceRates): CostItem[] {
  const items = joined(labour).map((entry) => gradeItem(entry, rates));
  const consumables = sumOf(items.map((item) => item.cost))
    .times(rates.consumables_percent)
    .div(100);
  return consumables.isZero() ? items : [...items, boughtItem('consumables', consumables)];
}
