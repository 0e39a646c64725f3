import type { MoneyCard } from '#shared/rate-cards/money-card';

/** What an hour of a grade costs with its consumables, in minor units, not rounded; 0 for a grade the card does not hold. */
export type HourCost = (gradeId: string) => number;

/** Direct cost of hours by grade, consumables included, in minor units of a currency with so many digits. */
export function hourCosts(card: Pick<MoneyCard, 'grades' | 'consumables_percent'>, digits: number): HourCost {
  const consumables = 1 + Number(card.consumables_percent) / 100;
  const costs = new Map(card.grades.map((grade) => [grade.id, Number(grade.costPerHour) * consumables * 10 ** digits]));
  return (gradeId) => costs.get(gradeId) ?? 0;
}
