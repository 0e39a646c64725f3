import { exemptionOf } from '#shared/invoices/exemption-of';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { AllowanceOrCharge } from '#shared/invoices/invoice-lines';
import { allowanceAmount } from '#shared/invoices/invoice-totals';
import { currencyDigits } from '#shared/money/currency-digits';
import { D, type MinorUnits } from '#shared/money/decimal';
import { isOutsideTax } from '#shared/money/is-outside-tax';
import { ratePercent, type TaxRate } from '#shared/money/tax-by-category';
import type { TaxCode } from '#shared/money/tax-codes';
import { textStyles, type PaperWords, type TableColumn, type TableRow } from '../../documents';

/** An issued invoice and the words its paper is set in. */
export interface InvoiceOnPaper {
  readonly invoice: FrozenInvoice;
  readonly words: PaperWords;
}

/** Whether there is no tax to speak of at all. */
const isUntaxed = ({ totals }: FrozenInvoice): boolean => isOutsideTax(totals.categories.map(({ tax }) => tax));

/** A price may have more decimals than its currency; all of them are shown. */
function priceText({ invoice }: InvoiceOnPaper, price: string): string {
  const digits = currencyDigits(invoice.currency);
  const settings = { minimumFractionDigits: digits, maximumFractionDigits: Math.max(6, digits) };
  return new Intl.NumberFormat(invoice.workshop.locale, settings).format(price as `${number}`);
}

const quantityText = ({ words }: InvoiceOnPaper, quantity: string, unit: string): string =>
  words.say('paper-invoice-quantity', { quantity: words.figure('number', Number(quantity)), unit });

const taxText = ({ words }: InvoiceOnPaper, tax: TaxRate): string => {
  const rate_percent = Number(ratePercent(tax));
  return rate_percent > 0 ? words.say('paper-invoice-tax-of', { rate_percent }) : tax.code;
};

/** What comes off or on, said in small print under its line, and as a row of its own for the document. */
function allowanceText({ words }: InvoiceOnPaper, one: AllowanceOrCharge): string {
  const reason = `${one.reason}: ${words.money(allowanceAmount(one))}`;
  return words.say(one.charge ? 'paper-invoice-charge' : 'paper-invoice-allowance', { reason });
}

function lineRow(paper: InvoiceOnPaper, place: number): TableRow {
  const { invoice, words } = paper;
  const line = invoice.lines[place];
  const price = priceText(paper, line.price);
  const isForOne = new D(line.baseQuantity).equals(1);
  const quantity = quantityText(paper, line.baseQuantity, line.unit);
  const note = [line.description, ...line.allowancesCharges.map((one) => allowanceText(paper, one))];
  return {
    cells: [
      { text: line.name, note: note.filter((text) => text.trim() !== '').join('\n'), isRowHead: true },
      { text: quantityText(paper, line.quantity, line.unit) },
      { text: isForOne ? price : words.say('paper-invoice-price-for', { price, quantity }) },
      ...(isUntaxed(invoice) ? [] : [{ text: taxText(paper, line.tax) }]),
      { text: words.money(invoice.totals.lineNets_minor[place]) },
    ],
    above: 'hair',
  };
}

export const invoiceColumns = ({ invoice, words }: InvoiceOnPaper): TableColumn[] => [
  { head: words.say('paper-column-work'), width: 'rest' },
  { head: words.say('paper-invoice-column-quantity'), width: 'fit', align: 'right' },
  { head: words.say('paper-invoice-column-unit-price'), width: 'fit', align: 'right' },
  ...(isUntaxed(invoice)
    ? []
    : [{ head: words.say('paper-invoice-column-tax'), width: 'fit', align: 'right' } as const]),
  { head: words.say('paper-invoice-column-amount'), width: 'fit', align: 'right' },
];

export const lineRows = (paper: InvoiceOnPaper): TableRow[] =>
  paper.invoice.lines.map((_, place) => lineRow(paper, place));

interface Sum {
  readonly text: string;
  readonly note?: string;
  readonly amount: string;
  readonly look?: 'plain' | 'strong' | 'sum';
}

function sumRow({ text, note, amount, look = 'plain' }: Sum, columns: number): TableRow {
  const style = { plain: textStyles.body, strong: textStyles.strong, sum: textStyles.sum }[look];
  const above = { plain: 'none', strong: 'hair', sum: 'gold' } as const;
  const cells = [
    { text, style, span: columns - 1, isRowHead: true, ...(note ? { note } : {}) },
    { text: amount, style },
  ];
  return { cells, above: above[look], padding_pt: look === 'plain' ? 1.5 : 4 };
}

const exemptionWords = {
  E: 'exemption-e',
  AE: 'exemption-ae',
  K: 'exemption-k',
  G: 'exemption-g',
  O: 'exemption-o',
} as const;

/** Why a category charges nothing, in the words entered or in ours, with the code other programs read. */
function exemptionText({ invoice, words }: InvoiceOnPaper, code: TaxCode): string {
  const exemption = exemptionOf(code, invoice.exemptions);
  if (!exemption) return '';
  const reason = exemption.reason || words.say(exemptionWords[code as keyof typeof exemptionWords]);
  return exemption.reasonCode === ''
    ? reason
    : words.say('paper-invoice-exempt', { reason, code: exemption.reasonCode });
}

const taxSums = (paper: InvoiceOnPaper): Sum[] =>
  paper.invoice.totals.categories.map(({ tax, net_minor, tax_minor }) => ({
    text: paper.words.say(Number(ratePercent(tax)) > 0 ? 'paper-invoice-tax-sum' : 'paper-invoice-untaxed', {
      ...{ code: tax.code, rate_percent: Number(ratePercent(tax)), net_minor },
    }),
    note: exemptionText(paper, tax.code),
    amount: paper.words.money(tax_minor),
  }));

/** Net, tax and gross; one total, and why, where all of it lies outside the scope of tax. */
function taxedSums(paper: InvoiceOnPaper): Sum[] {
  const { invoice, words } = paper;
  const { net_minor, gross_minor, categories } = invoice.totals;
  if (isUntaxed(invoice)) {
    const [reason = ''] = categories.map(({ tax }) => exemptionOf(tax.code, invoice.exemptions)?.reason ?? '');
    const note = reason || words.say('exemption-o');
    return [{ text: words.say('paper-total'), note, amount: words.money(gross_minor), look: 'strong' }];
  }
  return [
    { text: words.say('paper-invoice-net'), amount: words.money(net_minor), look: 'strong' },
    ...taxSums(paper),
    { text: words.say('paper-invoice-gross'), amount: words.money(gross_minor), look: 'strong' },
  ];
}

/** The sums under the lines, in the order in which they are worked. */
export function sumRows(paper: InvoiceOnPaper): TableRow[] {
  const { invoice, words } = paper;
  const { totals, allowancesCharges, prepaid_minor, rounding_minor, kind } = invoice;
  const single = (text: string, amount_minor: MinorUnits, look: Sum['look'] = 'plain'): Sum => ({
    text,
    amount: words.money(amount_minor),
    look,
  });
  const bears = allowancesCharges.length > 0;
  const sums = [
    ...(bears ? [single(words.say('paper-invoice-lines-sum'), totals.lineSum_minor, 'strong')] : []),
    ...allowancesCharges.map((one) =>
      single(allowanceText(paper, one), one.charge ? allowanceAmount(one) : -allowanceAmount(one)),
    ),
    ...taxedSums(paper),
    ...(prepaid_minor === 0 ? [] : [single(words.say('paper-invoice-prepaid'), -prepaid_minor)]),
    ...(rounding_minor === 0 ? [] : [single(words.say('paper-invoice-rounding'), rounding_minor)]),
    single(words.say('paper-invoice-due-sum', { kind }), totals.due_minor, 'sum'),
  ];
  const columns = invoiceColumns(paper).length;
  return sums
    .map((sum) => sumRow(sum, columns))
    .map((row, place) => ({ ...row, keepsWithNext: place < sums.length - 1 }));
}
