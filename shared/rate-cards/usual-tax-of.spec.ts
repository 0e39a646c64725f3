import { startMoney } from '#shared/rate-cards/start-money';
import { usualTaxOf } from '#shared/rate-cards/usual-tax-of';

const money = { ...startMoney, defaultTaxCategoryId: 'reduced' };

test.each([
  ['the card says which of several of its code', 'S', 'reduced'],
  ['another code has its first category', 'O', 'outside-scope'],
  ['a code the card does not have leaves the card its own', 'B', 'reduced'],
])('%s', (_, code, id) => {
  expect(usualTaxOf(money, code)).toBe(id);
});
