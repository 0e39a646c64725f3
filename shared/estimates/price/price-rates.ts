import type { PriceInput } from '#shared/estimates/price/price-input';
import { D } from '#shared/money/decimal';
import { exactMinor } from '#shared/money/minor-of';

/** What an hour of a grade costs, in unrounded minor units. */
export interface GradeRate {
  readonly name: string;
  readonly perHour: D;
}

/** Rates of a price as decimals, read from their texts once for all lines; amounts in unrounded minor units. */
export interface PriceRates {
  readonly grades: ReadonlyMap<string, GradeRate>;
  readonly consumables_percent: D;
  /** Per direct hour, or in percent of labour cost. */
  readonly overhead: { readonly way: 'per-hour' | 'share-of-labour'; readonly rate: D };
}

/** The rates of one price. */
export function priceRates({ card, digits }: Pick<PriceInput, 'card' | 'digits'>): PriceRates {
  const { overhead, consumables_percent } = card;
  const rate = overhead.way === 'per-hour' ? exactMinor(overhead.perHour, digits) : new D(overhead.percent);
  return {
    grades: new Map(
      card.grades.map(({ id, name, costPerHour }) => [id, { name, perHour: exactMinor(costPerHour, digits) }]),
    ),
    consumables_percent: new D(consumables_percent),
    overhead: { way: overhead.way, rate },
  };
}
