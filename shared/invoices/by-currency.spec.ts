import * as fc from 'fast-check';
import { byCurrency } from '#shared/invoices/by-currency';

const currenciesOf = (rows: readonly { currency: string }[], own: string) =>
  byCurrency(rows, own).map(({ currency, rows: inside }) => [currency, inside.length]);

describe('rows by currency', () => {
  it.each([
    [
      'the own currency first, the others by their letters',
      ['SEK', 'EUR', 'DKK', 'EUR'],
      [
        ['EUR', 2],
        ['DKK', 1],
        ['SEK', 1],
      ],
    ],
    ['only those there is something in', ['SEK'], [['SEK', 1]]],
    ['the own one alone where there is nothing', [], [['EUR', 0]]],
  ])('has %s', (_says, currencies, expected) => {
    expect(
      currenciesOf(
        currencies.map((currency) => ({ currency })),
        'EUR',
      ),
    ).toEqual(expected);
  });

  it('loses no row, doubles none, and keeps their order', () => {
    const row = fc.record({ currency: fc.constantFrom('EUR', 'SEK', 'CHF'), id: fc.nat() });
    fc.assert(
      fc.property(fc.array(row), fc.constantFrom('EUR', 'GBP'), (rows, own) => {
        const groups = byCurrency(rows, own);
        expect(groups.reduce((sum, group) => sum + group.rows.length, 0)).toBe(rows.length);
        for (const { currency, rows: inside } of groups)
          expect(inside).toEqual(rows.filter((one) => one.currency === currency));
      }),
    );
  });
});
