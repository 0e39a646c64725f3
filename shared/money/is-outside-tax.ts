import type { TaxRate } from './tax-by-category';

/** Whether all of a price lies outside the scope of tax (EN 16931 category O), so that net and total are one sum; not where nothing is priced. */
export const isOutsideTax = (taxes: readonly Pick<TaxRate, 'code'>[]): boolean =>
  taxes.length > 0 && taxes.every(({ code }) => code === 'O');

/** Why a price outside the scope of tax is not taxed, each reason once; empty where there may be tax, or nothing says why. */
export const reasonOutsideTax = (
  taxes: readonly (Pick<TaxRate, 'code'> & { readonly exemptionReason: string })[],
): string => {
  const reasons = isOutsideTax(taxes) ? taxes.map(({ exemptionReason }) => exemptionReason) : [];
  return [...new Set(reasons)].filter((reason) => reason !== '').join('; ');
};
