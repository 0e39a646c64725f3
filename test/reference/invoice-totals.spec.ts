/**
 * Official example invoices, recomputed. Each entry of invoice-examples.json names the file its numbers come from: the examples and test
 * files of ConnectingEurope/eInvoicing-EN16931, OpenPEPPOL/peppol-bis-invoice-3 and others it names.
 */
import { exampleAmounts, invoiceExamples } from './invoice-example';
import { invoiceTotals } from '#shared/invoices/invoice-totals';
import { currencyDigits } from '#shared/money/currency-digits';
import { exactMinor, minorOf } from '#shared/money/minor-of';
import { roundMinor } from '#shared/money/round-minor';

describe('official example invoices', () => {
  it('are eighteen, each with its source', () => {
    expect(invoiceExamples).toHaveLength(18);
    expect(invoiceExamples.every(({ source, file }) => source !== '' && file !== '')).toBe(true);
  });

  it.each(invoiceExamples.map((example) => [example.id, example.source, example.file, example] as const))(
    '%s (%s, %s) recomputes to the cent',
    (_id, _source, _file, example) => {
      const digits = currencyDigits(example.currency);
      const minor = (text: string) => minorOf(text, digits);
      const totals = invoiceTotals(exampleAmounts(example, digits), digits);
      const { expected } = example;
      expect(totals.lineNets_minor).toEqual(example.lines.map(({ net }) => minor(net)));
      expect(totals.lineSum_minor).toBe(minor(expected['sumLines']));
      expect(totals.allowances_minor).toBe(minor(expected['allowances'] ?? '0'));
      expect(totals.charges_minor).toBe(minor(expected['charges'] ?? '0'));
      expect(totals.net_minor).toBe(minor(expected['taxExclusive']));
      expect(totals.tax_minor).toBe(minor(expected['taxTotal']));
      expect(totals.gross_minor).toBe(minor(expected['taxInclusive']));
      expect(totals.due_minor).toBe(minor(expected['payable']));
      const found = totals.categories.map(({ tax, net_minor, tax_minor }) => [tax.code, net_minor, tax_minor]);
      const wanted = expected.breakdown.map(({ cat, taxable, tax }) => [cat, minor(taxable), minor(tax)]);
      expect(found.sort()).toEqual(wanted.sort());
    },
  );

  it.each([
    ['1.005', 2, 101],
    ['-2.005', 2, -201],
    ['-156435.885', 2, -15643589],
  ])('half a cent goes away from zero: %s', (amount, digits, minor) => {
    expect(roundMinor(exactMinor(amount, digits))).toBe(minor);
  });
});
