import { startCardUnder } from '#shared/rate-cards/start-card-under';

test.each([
  ['S', 'standard'],
  ['O', 'outside-scope'],
  ['B', 'standard'],
])('under the tax category %s estimates begin with “%s”', (code, id) => {
  expect(startCardUnder(code).money.defaultTaxCategoryId).toBe(id);
});
