import { exchangeCountry } from '#shared/invoices/exchange-country';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import { allowanceOf, lineOf, monetaryTotalOf, taxTotalOf } from './monetary-total-of';
import { ublDocument, type UblPart } from './ubl-document';
import { buyerOf, sellerOf } from './seller-of';

/** Countries of SEPA use code 58 for a transfer in euro, everything else is a plain transfer, 30 (UNTDID 4461). */
const sepa: ReadonlySet<string> = new Set(
  'AT BE BG CH CY CZ DE DK EE ES FI FR GB GI GR HR HU IE IS IT LI LT LU LV MC MT NL NO PL PT RO SE SI SK SM VA AD'.split(
    ' ',
  ),
);

/** UNTDID 1001: 380 invoice, 386 prepayment invoice, 381 credit note. */
const typeCodeOf = ({ kind, isDeposit }: FrozenInvoice): string => {
  if (kind === 'credit-note') return '381';
  return isDeposit ? '386' : '380';
};

/** A credit note has no element for the day it is due; the day stands with the means of payment (UBL 2.1). */
function paymentMeansOf(invoice: FrozenInvoice): UblPart | null {
  const { account, currency, kind, dueOn, number } = invoice;
  if (!account) return null;
  const isSepa = currency === 'EUR' && sepa.has(account.iban.slice(0, 2));
  return [
    'PaymentMeans',
    [
      ['PaymentMeansCode', isSepa ? '58' : '30'],
      ['PaymentDueDate', kind === 'credit-note' ? dueOn : null],
      ['PaymentID', number],
      [
        'PayeeFinancialAccount',
        [
          ['ID', account.iban],
          ['Name', account.name],
          ['FinancialInstitutionBranch', [['ID', account.bic]]],
        ],
      ],
    ],
  ];
}

/** A supply within the Union says where it went (BR-IC-12): the country of the buyer. */
function deliveryOf({ deliveredOn, totals, buyer }: FrozenInvoice): UblPart {
  const isWithinUnion = totals.categories.some(({ tax }) => tax.code === 'K');
  const country = exchangeCountry(buyer.country) ?? buyer.country;
  return [
    'Delivery',
    [
      ['ActualDeliveryDate', deliveredOn],
      ['DeliveryLocation', [['Address', [['Country', [['IdentificationCode', isWithinUnion ? country : null]]]]]]],
    ],
  ];
}

const creditedOf = ({ credits }: FrozenInvoice): UblPart => [
  'BillingReference',
  [
    [
      'InvoiceDocumentReference',
      [
        ['ID', credits?.number ?? null],
        ['IssueDate', credits?.issuedOn ?? null],
      ],
    ],
  ],
];

/** Three characters between two # would be read as the subject of the note (BR-CL-08), so they are set apart. */
const withoutSubject = (note: string): string => note.replace(/^([^#]*#)([^#]{3}#)/u, '$1 $2');

const noteOf = ({ note, closing }: FrozenInvoice): string =>
  withoutSubject([note, closing].filter((text) => text.trim() !== '').join('\n'));

/** The heads in the order of the schema, which differs between the two roots: a credit note has no due day of its own. */
function headOf(invoice: FrozenInvoice): UblPart[] {
  const isInvoice = invoice.kind === 'invoice';
  const typeCode: UblPart = [isInvoice ? 'InvoiceTypeCode' : 'CreditNoteTypeCode', typeCodeOf(invoice)];
  const { period } = invoice;
  return [
    ['CustomizationID', 'urn:cen.eu:en16931:2017'],
    ['ID', invoice.number],
    ['IssueDate', invoice.issuedOn],
    ['DueDate', isInvoice ? invoice.dueOn : null],
    typeCode,
    ['Note', noteOf(invoice)],
    ['DocumentCurrencyCode', invoice.currency],
    ['BuyerReference', invoice.buyer.reference],
    [
      'InvoicePeriod',
      [
        ['StartDate', period?.from ?? null],
        ['EndDate', period?.to ?? null],
      ],
    ],
    creditedOf(invoice),
  ];
}

/**
 * An issued invoice or credit note as UBL 2.1 under EN 16931 (core invoice), elements in the order of the published schemas
 * (OASIS UBL-Invoice-2.1, UBL-CreditNote-2.1). For currencies of at most two decimals.
 */
export function ublInvoice(invoice: FrozenInvoice): string {
  return ublDocument(invoice.kind === 'invoice' ? 'Invoice' : 'CreditNote', [
    ...headOf(invoice),
    sellerOf(invoice),
    buyerOf(invoice),
    deliveryOf(invoice),
    paymentMeansOf(invoice),
    ['PaymentTerms', [['Note', invoice.terms]]],
    ...invoice.allowancesCharges.map((one) => allowanceOf(invoice, one, one.tax)),
    taxTotalOf(invoice),
    monetaryTotalOf(invoice),
    ...invoice.lines.map((_, place) => lineOf(invoice, place)),
  ]);
}
