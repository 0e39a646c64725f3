/**
 * Official example invoices, recomputed. Each entry of invoice-examples.json names the file its numbers come from: the examples and test
 * files of ConnectingEurope/eInvoicing-EN16931, OpenPEPPOL/peppol-bis-invoice-3 and others it names.
 */
import examples from './invoice-examples.json';
import { invoiceTotals, type InvoiceAmounts } from '#shared/invoices/invoice-totals';
import { currencyDigits } from '#shared/money/currency-digits';
import { minorOf } from '#shared/money/minor-of';
import { roundMinor } from '#shared/money/round-minor';
import { exactMinor } from '#shared/money/minor-of';
import type { TaxCode } from '#shared/money/tax-by-category';

interface ExampleAllowance {
  readonly charge: boolean;
  readonly amount: string;
  readonly base?: string;
  readonly percent?: string;
  readonly cat?: string;
  readonly rate?: string;
}

interface ExampleLine {
  readonly quantity: string;
  readonly price: string;
  readonly baseQuantity?: string;
  readonly net: string;
  readonly cat: string;
  readonly rate?: string;
  readonly allowancesCharges?: readonly ExampleAllowance[];
}

interface Example {
  readonly id: string;
  readonly source: string;
  readonly file: string;
  readonly currency: string;
  readonly lines: readonly ExampleLine[];
  readonly documentAllowancesCharges: readonly ExampleAllowance[];
  readonly expected: Readonly<Record<string, string>> & {
    readonly breakdown: readonly { cat: string; rate?: string; taxable: string; tax: string }[];
  };
}

const taxOf = ({ cat, rate }: { readonly cat?: string; readonly rate?: string }) => ({
  code: cat as TaxCode,
  percent: rate ?? '0',
});

/** Where base and percent are given the amount is worked from them, so that a wrong percentage is found. */
const allowanceOf = (one: ExampleAllowance, digits: number) => ({
  charge: one.charge,
  reason: 'as in the example',
  reasonCode: null,
  amount:
    one.percent === undefined || one.base === undefined
      ? { way: 'fixed' as const, amount_minor: minorOf(one.amount, digits) }
      : { way: 'percent' as const, base_minor: minorOf(one.base, digits), percent: one.percent },
});

function amountsOf(example: Example, digits: number): InvoiceAmounts {
  const minor = (text: string | undefined) => minorOf(text ?? '0', digits);
  return {
    lines: example.lines.map((line) => ({
      quantity: line.quantity,
      price: line.price,
      baseQuantity: line.baseQuantity ?? '1',
      allowancesCharges: (line.allowancesCharges ?? []).map((one) => allowanceOf(one, digits)),
      tax: taxOf(line),
    })),
    allowancesCharges: example.documentAllowancesCharges.map((one) => ({
      ...allowanceOf(one, digits),
      tax: taxOf(one),
    })),
    prepaid_minor: minor(example.expected['prepaid']),
    rounding_minor: minor(example.expected['rounding']),
  };
}

const all = examples.examples as unknown as readonly Example[];

describe('official example invoices', () => {
  it('are eighteen, each with its source', () => {
    expect(all).toHaveLength(18);
    expect(all.every(({ source, file }) => source !== '' && file !== '')).toBe(true);
  });

  it.each(all.map((example) => [example.id, example.source, example.file, example] as const))(
    '%s (%s, %s) recomputes to the cent',
    (_id, _source, _file, example) => {
      const digits = currencyDigits(example.currency);
      const minor = (text: string) => minorOf(text, digits);
      const totals = invoiceTotals(amountsOf(example, digits), digits);
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
