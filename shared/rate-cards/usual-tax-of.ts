import type { MoneyCard } from '#shared/rate-cards/money-card';

/**
 * The tax a workshop's estimates begin with, as the id of a category of its card: the card's usual one where that is of the code (UNCL 5305)
 * the workshop usually works under, else the first that is; where the card has none of it, the card's usual one.
 */
export function usualTaxOf({ taxCategories, defaultTaxCategoryId }: MoneyCard, code: string): string {
  const ofCode = taxCategories.filter((category) => category.code === code).map(({ id }) => id);
  return ofCode.includes(defaultTaxCategoryId) ? defaultTaxCategoryId : (ofCode[0] ?? defaultTaxCategoryId);
}
