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

/** Prices of the start card are in one currency, those entered since in the one the workshop had; in any other they are figures nobody has looked at. */
export function pricesOfOtherCurrency({
  card,
  currency,
}: {
  readonly card: RateCard;
  readonly currency: string;
}): Finding[] {
  const rates = (grades: typeof card.money.grades) => grades.map(({ id, costPerHour }) => ({ id, price: costPerHour }));
  const leaf = (products: typeof card.leaf.products) => products.map(({ id, price }) => ({ id, price }));
  const isAsBegun = {
    hours: isUntouched(rates(card.money.grades), rates(startMoney.grades)),
    leaf: isUntouched(leaf(card.leaf.products), leaf(startLeaf.products)),
  };
  return (['hours', 'leaf'] as const).flatMap((of): Finding[] => {
    const meant = isAsBegun[of] ? startCurrency : (card.money.currency ?? currency);
    if (meant === currency) return [];
    const code = isAsBegun[of] ? 'card-start-prices' : 'card-other-currency';
    return [{ kind: 'warn', code, values: { of, currency, start: meant } }];
  });
}
