import { exemptionOf } from '#shared/invoices/exemption-of';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { AllowanceOrCharge } from '#shared/invoices/invoice-lines';
import { allowanceAmount } from '#shared/invoices/invoice-totals';
import { isReasonCode } from '#shared/invoices/reason-codes';
import { currencyDigits } from '#shared/money/currency-digits';
import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { ratePercent, type TaxRate } from '#shared/money/tax-by-category';
import { textOf } from '#shared/money/text-of';
import type { UblPart, UblValue } from './ubl-document';

/** An amount with its currency, in the currency's own decimals (EN 16931: at most two). */
export const amountOf = ({ currency }: Pick<FrozenInvoice, 'currency'>, amount_minor: MinorUnits): UblValue => ({
  text: textOf(amount_minor, currencyDigits(currency)),
  attributes: { currencyID: currency },
});

const plain = (decimal: DecimalText): string => new D(decimal).toString();

/** Category and rate. Outside the scope of VAT there is no rate (BR-O-05), without a tax the rate is written as 0 (BR-E-05 …). */
export const categoryOf = (tax: TaxRate, inner: readonly (UblPart | null)[] = []): readonly (UblPart | null)[] => [
  ['ID', tax.code],
  tax.code === 'O' ? null : ['Percent', plain(ratePercent(tax))],
  ...inner,
  ['TaxScheme', [['ID', 'VAT']]],
];

/** Why, as a code of the lists; one they do not have is left out, the words stand beside it all the same. */
const reasonCodeOf = ({ reasonCode, charge }: AllowanceOrCharge): string | null =>
  reasonCode !== null && isReasonCode(reasonCode, charge) ? reasonCode : null;

/** Allowance or charge of a line or, with its tax, of the document. */
export function allowanceOf(invoice: FrozenInvoice, one: AllowanceOrCharge, tax: TaxRate | null): UblPart {
  const { amount } = one;
  return [
    'AllowanceCharge',
    [
      ['ChargeIndicator', String(one.charge)],
      ['AllowanceChargeReasonCode', reasonCodeOf(one)],
      ['AllowanceChargeReason', one.reason],
      ['MultiplierFactorNumeric', amount.way === 'percent' ? plain(amount.percent) : null],
      ['Amount', amountOf(invoice, allowanceAmount(one))],
      ['BaseAmount', amount.way === 'percent' ? amountOf(invoice, amount.base_minor) : null],
      tax && ['TaxCategory', categoryOf(tax)],
    ],
  ];
}

function subtotalOf(
  invoice: FrozenInvoice,
  { tax, net_minor, tax_minor }: FrozenInvoice['totals']['categories'][number],
): UblPart {
  const exemption = exemptionOf(tax.code, invoice.exemptions);
  return [
    'TaxSubtotal',
    [
      ['TaxableAmount', amountOf(invoice, net_minor)],
      ['TaxAmount', amountOf(invoice, tax_minor)],
      [
        'TaxCategory',
        categoryOf(tax, [
          ['TaxExemptionReasonCode', exemption?.reasonCode ?? null],
          ['TaxExemptionReason', exemption?.reason ?? null],
        ]),
      ],
    ],
  ];
}

/** The tax as a whole and category by category (BG-23). */
export const taxTotalOf = (invoice: FrozenInvoice): UblPart => [
  'TaxTotal',
  [
    ['TaxAmount', amountOf(invoice, invoice.totals.tax_minor)],
    ...invoice.totals.categories.map((category) => subtotalOf(invoice, category)),
  ],
];

/**
 * All totals of the document (BG-22); what is nothing and may be left out is left out. Where something comes off or on its sum is there,
 * even one of nothing (BR-CO-11, BR-CO-12).
 */
export function monetaryTotalOf(invoice: FrozenInvoice): UblPart {
  const { totals, prepaid_minor, rounding_minor, allowancesCharges } = invoice;
  const amount = (minor: MinorUnits) => amountOf(invoice, minor);
  const unlessNothing = (minor: MinorUnits) => (minor === 0 ? null : amount(minor));
  const where = (charge: boolean, minor: MinorUnits) =>
    allowancesCharges.some((one) => one.charge === charge) ? amount(minor) : null;
  return [
    'LegalMonetaryTotal',
    [
      ['LineExtensionAmount', amount(totals.lineSum_minor)],
      ['TaxExclusiveAmount', amount(totals.net_minor)],
      ['TaxInclusiveAmount', amount(totals.gross_minor)],
      ['AllowanceTotalAmount', where(false, totals.allowances_minor)],
      ['ChargeTotalAmount', where(true, totals.charges_minor)],
      ['PrepaidAmount', unlessNothing(prepaid_minor)],
      ['PayableRoundingAmount', unlessNothing(rounding_minor)],
      ['PayableAmount', amount(totals.due_minor)],
    ],
  ];
}

/** One line; its number is its place. */
export function lineOf(invoice: FrozenInvoice, place: number): UblPart {
  const line = invoice.lines[place];
  const [element, quantity] =
    invoice.kind === 'invoice'
      ? (['InvoiceLine', 'InvoicedQuantity'] as const)
      : (['CreditNoteLine', 'CreditedQuantity'] as const);
  const unit = { unitCode: line.unit };
  const isForOne = new D(line.baseQuantity).equals(1);
  return [
    element,
    [
      ['ID', String(place + 1)],
      [quantity, { text: plain(line.quantity), attributes: unit }],
      ['LineExtensionAmount', amountOf(invoice, invoice.totals.lineNets_minor[place])],
      ...line.allowancesCharges.map((one) => allowanceOf(invoice, one, null)),
      [
        'Item',
        [
          ['Description', line.description],
          ['Name', line.name],
          ['ClassifiedTaxCategory', categoryOf(line.tax)],
        ],
      ],
      [
        'Price',
        [
          ['PriceAmount', { text: plain(line.price), attributes: { currencyID: invoice.currency } }],
          ['BaseQuantity', isForOne ? null : { text: plain(line.baseQuantity), attributes: unit }],
        ],
      ],
    ],
  ];
}
