import { startTaxCategory } from '#shared/accounts/start-tax-category';

test.each([
  ['AT', 'S'],
  ['GB', 'S'],
  ['US', 'O'],
  ['HK', 'O'],
])('a workshop in %s begins with the tax category %s', (country, code) => {
  expect(startTaxCategory(country)).toBe(code);
});
