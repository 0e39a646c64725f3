import examples from './invoice-examples.json';
import type { InvoiceAmounts } from '#shared/invoices/invoice-totals';
import { minorOf } from '#shared/money/minor-of';
import type { TaxCode } from '#shared/money/tax-codes';

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

/** An official example, as invoice-examples.json holds its numbers; `source` and `file` say where they come from. */
export interface InvoiceExample {
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

/** What the totals of an example are worked from. */
export function exampleAmounts(example: InvoiceExample, digits: number): InvoiceAmounts {
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

export const invoiceExamples = examples.examples as unknown as readonly InvoiceExample[];
