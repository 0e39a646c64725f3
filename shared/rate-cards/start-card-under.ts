import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';

/**
 * The rate card a workshop starts from that usually works under a tax category (a code of UNCL 5305): estimates begin with the first tax of that
 * code, or with the standard rate where the start card has none of it.
 */
export function startCardUnder(code: string): RateCard {
  const { money } = startCard;
  const usual = money.taxCategories.find((category) => category.code === code);
  return usual ? { ...startCard, money: { ...money, defaultTaxCategoryId: usual.id } } : startCard;
}
