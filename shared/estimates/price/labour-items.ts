import { boughtItem, type CostItem, sumOf } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { exactFigure } from '#shared/money/exact-figure';
import { exactMinor } from '#shared/money/minor-of';

/** Hours of one grade. */
export interface GradeHours {
  readonly gradeId: string;
  readonly hours: number;
}

function gradeItem({ gradeId, hours }: GradeHours, { card, digits }: PriceInput): CostItem {
  if (hours < 0) throw new RangeError('hours must not be negative');
  const grade = card.grades.find((each) => each.id === gradeId);
  const exact = exactFigure(hours);
  const cost = exact.times(exactMinor(grade?.costPerHour ?? '0', digits));
  return { head: 'labour', itemId: gradeId, name: grade?.name ?? gradeId, hours: exact, cost };
}

/** Entries of one grade joined, in order of first appearance. */
function joined(labour: readonly GradeHours[]): GradeHours[] {
  const hours = new Map<string, number>();
  for (const entry of labour) hours.set(entry.gradeId, (hours.get(entry.gradeId) ?? 0) + entry.hours);
  return [...hours].map(([gradeId, sum]) => ({ gradeId, hours: sum }));
}

/** Labour of one line by grade, and the consumables that go with it as a share of its cost; unrounded minor units. */
export function labourItems(labour: readonly GradeHours[], input: PriceInput): CostItem[] {
  const items = joined(labour).map((entry) => gradeItem(entry, input));
  const consumables = sumOf(items.map((item) => item.cost))
    .times(input.card.consumables_percent)
    .div(100);
  return consumables.isZero() ? items : [...items, boughtItem('consumables', consumables)];
}
