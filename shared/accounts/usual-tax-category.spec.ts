import { usualTaxCategory } from '#shared/accounts/usual-tax-category';

test.each([
  ['AT', 'S'],
  ['GB', 'S'],
  ['US', 'O'],
  ['HK', 'O'],
])('a workshop in %s begins with the tax category %s', (country, code) => {
  expect(usualTaxCategory(country)).toBe(code);
});
