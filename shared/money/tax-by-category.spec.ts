import fc from 'fast-check';
import { taxByCategory } from '#shared/money/tax-by-category';
import type { TaxCode } from '#shared/money/tax-codes';

const taxed = (code: TaxCode, percent: string, net_minor: number) => ({ tax: { code, percent }, net_minor });

describe('tax by category', () => {
  it('sums first and taxes once: ten lines of 0.02 at 20 % owe 0.04, not ten times 0.00', () => {
    const lines = Array.from({ length: 10 }, () => taxed('S', '20', 2));
    expect(taxByCategory(lines)).toMatchObject({ net_minor: 20, tax_minor: 4, gross_minor: 24 });
  });

  it('takes a rate for the same however it is written', () => {
    expect(taxByCategory([taxed('S', '25', 100), taxed('S', '25.0', 100)]).categories).toHaveLength(1);
    expect(taxByCategory([taxed('S', '25', 100), taxed('S', '12', 100)]).categories).toHaveLength(2);
  });

  it.each(['Z', 'E', 'AE', 'K', 'G', 'O'] as const)(
    'owes nothing in category %s, whatever rate stands beside it',
    (code) => {
      expect(taxByCategory([taxed(code, '25', 100_00)])).toMatchObject({ tax_minor: 0, gross_minor: 100_00 });
    },
  );

  it('rounds a half cent away from zero on both sides', () => {
    expect(taxByCategory([taxed('S', '25', 2)]).tax_minor).toBe(1);
    expect(taxByCategory([taxed('S', '25', -2)]).tax_minor).toBe(-1);
  });

  it('is nothing for nothing', () => {
    expect(taxByCategory([])).toEqual({ categories: [], net_minor: 0, tax_minor: 0, gross_minor: 0 });
  });

  it('does not depend on how lines of one category are cut', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: -1e9, max: 1e9 }), (one, other) => {
        const cut = taxByCategory([taxed('S', '19', one), taxed('S', '19', other)]);
        expect(cut.gross_minor).toBe(taxByCategory([taxed('S', '19', one + other)]).gross_minor);
      }),
    );
  });
});
