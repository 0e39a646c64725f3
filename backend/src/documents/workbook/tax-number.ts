import { taxKey, type TaxRate } from '#shared/money/tax-by-category';
import type { WorkbookFacts } from './workbook-facts';

/** The number of the tax a category falls under, from 1 on: categories of one code and rate are taxed together. */
export function taxNumber({ snapshot }: WorkbookFacts, taxCategoryId: string): number {
  const { taxCategories } = snapshot.card.money;
  const category = taxCategories.find(({ id }) => id === taxCategoryId);
  const rate: TaxRate = { code: category?.code ?? 'S', percent: category?.percent ?? '0' };
  return snapshot.figures.price.taxes.findIndex(({ tax }) => taxKey(tax) === taxKey(rate)) + 1;
}
