import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { isRated } from '#shared/money/is-rated';
import { roundMinor } from '#shared/money/round-minor';
import { sumMinor } from '#shared/money/sum-minor';
import type { TaxCode } from '#shared/money/tax-codes';

/** What decides the tax of an amount: the category's code and its rate in percent. */
export interface TaxRate {
  readonly code: TaxCode;
  readonly percent: DecimalText;
}

/** An amount without tax, and the tax it falls under. */
export interface TaxableAmount {
  readonly tax: TaxRate;
  readonly net_minor: MinorUnits;
}

/** One category and rate: its amounts summed, and the tax on that sum. */
export interface TaxedNet {
  readonly tax: TaxRate;
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
}

export interface TaxBreakdown {
  readonly categories: readonly TaxedNet[];
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
}

/** The rate as it is written: nothing where the category charges no tax, whatever was entered (EN 16931, BR-AE-05 and its like). */
export const ratePercent = (tax: TaxRate): DecimalText => (isRated(tax.code) ? tax.percent : '0');

/** Two rates are one category when code and rate agree, however the rate is written (25, 25.0); null where a rate plays no part. */
export const taxKey = (tax: TaxRate): string =>
  isRated(tax.code) ? `${tax.code} ${new D(tax.percent).toString()}` : tax.code;

/** Tax on the sum of one category, half up to the minor unit; 0 for Z, E, AE, K, G, O (EN 16931, BR-CO-17, BR-Z/E/AE/IC/G/O-09). */
export const taxOn = (net_minor: MinorUnits, tax: TaxRate): MinorUnits =>
  isRated(tax.code) ? roundMinor(new D(net_minor).times(tax.percent).div(100)) : 0;

/**
 * Sums first, then taxes once per category and rate, in order of first appearance; whole minor units, RangeError beyond safe
 * integers (EN 16931, BR-S-08, BR-CO-14, BR-CO-15, BR-CO-17).
 */
export function taxByCategory(amounts: readonly TaxableAmount[]): TaxBreakdown {
  const sums = new Map<string, TaxableAmount>();
  for (const { tax, net_minor } of amounts) {
    const before = sums.get(taxKey(tax));
    sums.set(taxKey(tax), { tax: before?.tax ?? tax, net_minor: sumMinor([before?.net_minor ?? 0, net_minor]) });
  }
  const categories = [...sums.values()].map((sum) => ({ ...sum, tax_minor: taxOn(sum.net_minor, sum.tax) }));
  const net_minor = sumMinor(categories.map((category) => category.net_minor));
  const tax_minor = sumMinor(categories.map((category) => category.tax_minor));
  return { categories, net_minor, tax_minor, gross_minor: sumMinor([net_minor, tax_minor]) };
}
