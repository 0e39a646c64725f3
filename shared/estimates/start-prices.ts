import { startLeaf } from '#shared/leaf/start-leaf';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCurrency, startMoney } from '#shared/rate-cards/start-money';
import type { Finding } from '#shared/words/finding';

interface Priced {
  readonly id: string;
  readonly price: string;
}

/** Whether every price of the start card that is still there stands as it began. */
function isUntouched(prices: readonly Priced[], start: readonly Priced[]): boolean {
  const began = new Map(start.map(({ id, price }) => [id, price]));
  const still = prices.filter(({ id }) => began.has(id));
  return still.length > 0 && still.every(({ id, price }) => began.get(id) === price);
}

/** Prices a workshop starts from are in one currency; in any other they are figures nobody has looked at. */
export function startPrices({ card, currency }: { readonly card: RateCard; readonly currency: string }): Finding[] {
  if (currency === startCurrency) return [];
  const rates = (grades: typeof card.money.grades) => grades.map(({ id, costPerHour }) => ({ id, price: costPerHour }));
  const leaf = (products: typeof card.leaf.products) => products.map(({ id, price }) => ({ id, price }));
  const untouched = [
    ...(isUntouched(rates(card.money.grades), rates(startMoney.grades)) ? (['hours'] as const) : []),
    ...(isUntouched(leaf(card.leaf.products), leaf(startLeaf.products)) ? (['leaf'] as const) : []),
  ];
  return untouched.map((of) => ({
    ...{ kind: 'warn', code: 'card-start-prices', values: { of, currency, start: startCurrency } },
  }));
}
