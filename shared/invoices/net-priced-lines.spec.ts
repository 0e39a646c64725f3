import fc from 'fast-check';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { invoiceTotals } from '#shared/invoices/invoice-totals';
import { netPricedLines } from '#shared/invoices/net-priced-lines';
import { workedInvoice } from '#shared/invoices/worked-invoice';
import { lineAmount } from '#shared/money/line-amount';
import { sumMinor } from '#shared/money/sum-minor';

const line = (id: string, price: string, more: Partial<InvoiceLine> = {}): InvoiceLine => ({
  ...{ id, name: id, description: '', quantity: '1', unit: 'C62', price, baseQuantity: '1', allowancesCharges: [] },
  tax: { code: 'S', percent: '20' },
  ...more,
});

const worked = (lines: readonly InvoiceLine[], roundsToCash = false, currency = 'EUR') =>
  workedInvoice({ pricesHold: 'gross', lines, allowancesCharges: [], roundsToCash }, currency);

describe('prices with tax', () => {
  it('become prices without, the tax brings the entered sum back', () => {
    const { totals, rounding_minor } = worked([line('a', '120.00'), line('b', '0.99', { quantity: '3' })]);
    expect(totals).toMatchObject({ net_minor: 102_48, tax_minor: 20_50, gross_minor: 122_98 });
    expect(rounding_minor).toBe(-1);
    expect(totals.due_minor).toBe(122_97);
  });

  it('that no net gives back are rounded openly: 0.03 at 20 %', () => {
    expect(worked([line('a', '0.03')])).toMatchObject({ totals: { due_minor: 3 } });
    expect(Math.abs(worked([line('a', '0.03')]).rounding_minor)).toBe(1);
  });

  it('stay what they are where nothing is charged', () => {
    const exempt = line('a', '19.99', { tax: { code: 'E', percent: '0' } });
    expect(worked([exempt]).totals).toMatchObject({ net_minor: 19_99, tax_minor: 0, due_minor: 19_99 });
  });

  it('keep quantity and sign of a line: what is given back stays below nothing', () => {
    const [back] = netPricedLines([line('a', '12.00', { quantity: '-2' })], 2).lines;
    expect(back).toMatchObject({ quantity: '-2', price: '20.00', baseQuantity: '2' });
    expect(lineAmount(back, 2)).toBe(-20_00);
  });

  it('in whatever lines: what is due is the sum of what was entered, and every line is a whole amount', () => {
    const price = fc
      .integer({ min: 0, max: 5_000_000 })
      .map((minor) => `${Math.floor(minor / 100)}.${String(minor % 100).padStart(2, '0')}`);
    const tax = fc.constantFrom('20', '10', '25', '5.5').map((percent) => ({ code: 'S' as const, percent }));
    const entered = fc.array(fc.record({ price, tax, quantity: fc.integer({ min: 1, max: 40 }).map(String) }), {
      minLength: 1,
      maxLength: 8,
    });
    fc.assert(
      fc.property(entered, (records) => {
        const lines = records.map(({ price: own, ...more }, place) => line(`line-${place}`, own, more));
        const { totals, lines: converted, rounding_minor } = worked(lines);
        expect(totals.due_minor).toBe(sumMinor(lines.map((one) => lineAmount(one, 2))));
        expect(Math.abs(rounding_minor)).toBeLessThanOrEqual(4);
        expect(totals.lineNets_minor).toEqual(converted.map((one) => lineAmount(one, 2)));
      }),
    );
  });
});

describe('cash', () => {
  it.each([
    ['CHF', '16.97', 16_95],
    ['CHF', '16.98', 17_00],
    ['SEK', '999.99', 1000_00],
    ['EUR', '16.97', 16_97],
  ])('in %s: %s is paid as %d, and only what is due is rounded', (currency, price, due_minor) => {
    const exempt = line('a', price, { tax: { code: 'E', percent: '0' } });
    const entered = { pricesHold: 'net' as const, lines: [exempt], allowancesCharges: [], roundsToCash: true };
    const { totals, rounding_minor } = workedInvoice(entered, currency);
    expect(totals.due_minor).toBe(due_minor);
    expect(totals.gross_minor + rounding_minor).toBe(due_minor);
    expect(totals.net_minor).toBe(invoiceTotals({ ...entered, prepaid_minor: 0, rounding_minor: 0 }, 2).net_minor);
  });
});
