import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';
import { sumMinor } from '#shared/money/sum-minor';

/** Codes of tax categories as EN 16931 admits them (UNCL 5305, its rule BR-CL-17). */
export const taxCodes = ['S', 'Z', 'E', 'AE', 'K', 'G', 'O', 'L', 'M', 'B'] as const;
export type TaxCode = (typeof taxCodes)[number];

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

const untaxed: ReadonlySet<TaxCode> = new Set(['Z', 'E', 'AE', 'K', 'G', 'O']);

/** The rate as it is written: nothing where the category charges no tax, whatever was entered (EN 16931, BR-AE-05 and its like). */
export const ratePercent = (tax: TaxRate): DecimalText => (untaxed.has(tax.code) ? '0' : tax.percent);

/** Two rates are one category when code and rate agree, however the rate is written (25, 25.0); null where a rate plays no part. */
export const taxKey = (tax: TaxRate): string =>
  untaxed.has(tax.code) ? tax.code : `${tax.code} ${new D(tax.percent).toString()}`;

/** Tax on the sum of one category, half up to the minor unit; 0 for Z, E, AE, K, G, O (EN 16931, BR-CO-17, BR-Z/E/AE/IC/G/O-09). */
export const taxOn = (net_minor: MinorUnits, tax: TaxRate): MinorUnits =>
  untaxed.has(tax.code) ? 0 : roundMinor(new D(net_minor).times(tax.percent).div(100));

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
