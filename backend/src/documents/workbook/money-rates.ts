import type { PriceTax } from '#shared/estimates/price/price';
import { textOf } from '#shared/money/text-of';
import type { RatesSheet } from './rates-sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The names of the figures that turn hours and goods into a price. */
export interface MoneyRates {
  readonly grades: readonly string[];
  readonly overhead: string;
  readonly consumables: string;
  /** Percent of direct cost, or the amount the risk trials found. */
  readonly contingency: string;
  /** Margin or mark-up, in percent; under a lump sum what lines are weighed by. */
  readonly share: string;
  /** The lump sum, in the currency; null where there is none. */
  readonly lumpSum: string | null;
  readonly discount: string | null;
  readonly taxes: readonly string[];
}

function gradeRates(rates: RatesSheet, { grades, words, snapshot }: WorkbookFacts): string[] {
  rates.part(words.say('sheet-rates-labour'));
  const unit = words.say('sheet-unit-an-hour', { currency: snapshot.workshop.currency });
  return grades.map((grade) =>
    rates.rate({ label: grade.name, value: Number(grade.costPerHour), unit, name: ['rate', grade.id] }),
  );
}

function overheadRate(rates: RatesSheet, { words, price, snapshot }: WorkbookFacts): string {
  const { overhead } = price.card;
  const label = words.say('sheet-overhead');
  if (overhead.way === 'per-hour') {
    const unit = words.say('sheet-unit-an-hour', { currency: snapshot.workshop.currency });
    return rates.rate({ label, value: Number(overhead.perHour), unit, name: ['overhead_per_hour'] });
  }
  const unit = words.say('sheet-unit-of-labour');
  return rates.rate({ label, value: Number(overhead.percent), unit, name: ['overhead_percent'] });
}

/** Contingency from risk stands as an amount, beside what it was drawn with: no sheet draws 4,000 trials. */
function contingencyRate(rates: RatesSheet, { words, price, settings, snapshot }: WorkbookFacts): string {
  const { contingency, digits } = price;
  const label = words.say('sheet-contingency');
  if (contingency.way === 'share') {
    const unit = words.say('sheet-unit-of-direct');
    return rates.rate({ label, value: Number(contingency.percent), unit, name: ['contingency_percent'] });
  }
  const { percentile } = snapshot.card.money.contingency;
  const value = Number(textOf(contingency.amount_minor, digits));
  const unit = words.say('sheet-unit-from-risk', { currency: snapshot.workshop.currency, percentile });
  const name = rates.rate({ label, value, unit, name: ['contingency_from_risk'] });
  rates.rate({ label: words.say('sheet-risk-seed'), value: settings.seed, unit: '', name: ['risk_seed'] });
  return name;
}

function profitRate(rates: RatesSheet, { words, price }: WorkbookFacts): string {
  const { way, percent } = price.profit;
  const isMargin = way === 'margin';
  return rates.rate({
    label: words.say(isMargin ? 'sheet-margin' : 'sheet-mark-up'),
    value: Number(percent),
    unit: words.say(isMargin ? 'sheet-unit-of-price' : 'sheet-unit-of-cost'),
    name: [isMargin ? 'margin_percent' : 'mark_up_percent'],
  });
}

function lumpSumRate(rates: RatesSheet, { words, price, snapshot }: WorkbookFacts): string | null {
  if (!price.lumpSum) return null;
  const at = { label: words.say('sheet-lump-sum'), unit: snapshot.workshop.currency };
  return rates.rate({ ...at, value: Number(price.lumpSum), name: ['lump_sum'] });
}

function discountRate(rates: RatesSheet, { words, price, snapshot }: WorkbookFacts): string | null {
  const { discount } = price;
  if (!discount) return null;
  const isPercent = discount.way === 'percent';
  return rates.rate({
    label: words.say('sheet-discount'),
    value: Number(discount.amount),
    unit: isPercent ? words.say('sheet-unit-of-lines') : snapshot.workshop.currency,
    name: [isPercent ? 'discount_percent' : 'discount_amount'],
  });
}

function taxRate(rates: RatesSheet, { taxCategoryId, tax }: PriceTax, { snapshot, words }: WorkbookFacts): string {
  const category = snapshot.card.money.taxCategories.find(({ id }) => id === taxCategoryId);
  const label = words.say('sheet-tax', { name: category?.name ?? tax.code });
  return rates.rate({ label, value: Number(tax.percent), unit: '%', name: ['tax', taxCategoryId, 'percent'] });
}

/** Writes the money part of the card, as far as the issue uses it. */
export function moneyRates(rates: RatesSheet, facts: WorkbookFacts): MoneyRates {
  const { words, price, snapshot } = facts;
  const grades = gradeRates(rates, facts);
  rates.part(words.say('sheet-rates-price'));
  const consumables = Number(price.card.consumables_percent);
  return {
    grades,
    consumables: rates.rate({
      label: words.say('sheet-consumables'),
      value: consumables,
      unit: words.say('sheet-unit-of-labour'),
      name: ['consumables_percent'],
    }),
    overhead: overheadRate(rates, facts),
    contingency: contingencyRate(rates, facts),
    share: profitRate(rates, facts),
    lumpSum: lumpSumRate(rates, facts),
    discount: discountRate(rates, facts),
    taxes: snapshot.figures.price.taxes.map((tax) => taxRate(rates, tax, facts)),
  };
}
