import {
  noProfitEntries,
  profitEntriesOf,
  profitFormSchema,
  profitSaidAs,
  profitSettingsOf,
} from './profit-form-schema';

const entries = { ...noProfitEntries, taxCategoryId: 'standard' };
const paths = (given: object) =>
  profitFormSchema.safeParse({ ...entries, ...given }).error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('profitFormSchema', () => {
  it.each([
    ['everything from the card', {}],
    ['a margin below the whole', { profit: 'margin', profit_percent: '99.99' }],
    ['a mark-up of any size', { profit: 'mark-up', profit_percent: '250' }],
    ['figures not asked for, whatever they are', { profit_percent: '? x', discountAmount: '? y' }],
    ['a discount in money above a hundred', { discount: 'amount', discountAmount: '2500' }],
  ])('takes %s', (_, given) => {
    expect(paths(given)).toEqual([]);
  });

  it.each([
    ['a margin of all of the price', { profit: 'margin', profit_percent: '100' }, 'profit_percent'],
    ['a margin nobody entered', { profit: 'margin', profit_percent: '' }, 'profit_percent'],
    ['a text that is no number', { profit: 'mark-up', profit_percent: '? 1O' }, 'profit_percent'],
    ['a contingency over the whole', { contingency: 'share', contingency_percent: '101' }, 'contingency_percent'],
    ['a discount over the whole', { discount: 'percent', discountAmount: '101' }, 'discountAmount'],
  ])('refuses %s at its entry', (_, given, path) => {
    expect(paths(given)).toEqual([path]);
  });
});

describe('profitSettingsOf', () => {
  it.each([
    { profit: null, contingency: null, discount: null },
    { profit: { way: 'margin', percent: '18' }, contingency: { way: 'share', percent: '5' }, discount: null },
    { profit: { way: 'mark-up', percent: '30' }, contingency: null, discount: { way: 'amount', amount: '250' } },
    { profit: null, contingency: { way: 'risk', percent: '0' }, discount: { way: 'percent', amount: '5' } },
  ] as const)('gives back what was read from the settings: %j', (given) => {
    const settings = { ...given, taxCategoryId: 'standard' };
    const shown = profitFormSchema.parse(profitEntriesOf(settings));
    expect(profitSettingsOf(shown)).toEqual(settings);
  });
});

describe('profitSaidAs', () => {
  it.each([
    ['a margin of 20 % is a mark-up of 25 %', 'mark-up', { way: 'margin', percent: '20' }, '25'],
    ['a mark-up of 100 % is a margin of 50 %', 'margin', { way: 'mark-up', percent: '100' }, '50'],
    ['a third is said to two decimals', 'margin', { way: 'mark-up', percent: '50' }, '33.33'],
    ['the same way stays as it was', 'margin', { way: 'margin', percent: '18' }, '18'],
  ] as const)('%s', (_, way, from, percent) => {
    expect(profitSaidAs(way, from)).toBe(percent);
  });
});
