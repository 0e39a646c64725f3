import { exemptionOf } from '#shared/invoices/exemption-of';
import { when, type InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import { explainedCodes, type TaxCode } from '#shared/money/tax-codes';
import type { Finding } from '#shared/words/finding';

/** Categories under which the seller has to have a tax number of one kind or other (BR-S-02, BR-Z-02, BR-E-02, BR-AE-02, BR-AF-02 …). */
const needsSellerTaxId: readonly TaxCode[] = ['S', 'Z', 'E', 'AE', 'L', 'M'];
/** Categories for which only the number with the letters of the country will do (BR-IC-02, BR-G-02). */
const needsSellerVatId: readonly TaxCode[] = ['K', 'G'];

/** Which numbers the categories ask of seller and buyer. */
function numberFindings({ content, seller }: InvoiceInHand, codes: ReadonlySet<TaxCode>): Finding[] {
  const has = (listed: readonly TaxCode[]) => listed.some((code) => codes.has(code));
  const { vatId, companyNumber } = content.buyer;
  const isAnonymous = seller.vatId === '' && seller.taxNumber === '';
  return [
    ...when(has(needsSellerTaxId) && isAnonymous, ['refuse', 'invoice-seller-tax-number']),
    ...when(has(needsSellerVatId) && seller.vatId === '', ['refuse', 'invoice-seller-vat-number']),
    ...when(codes.has('AE') && vatId === '' && companyNumber === '', ['refuse', 'invoice-buyer-number']),
    ...when(codes.has('K') && vatId === '', ['refuse', 'invoice-buyer-vat-number']),
    // Under O no VAT number is written at all (BR-O-02), so something else has to say who sells (BR-CO-26).
    ...when(codes.has('O') && seller.companyNumber === '' && seller.taxNumber === '', [
      'refuse',
      'invoice-seller-company-number',
    ]),
  ];
}

/** BR-O-11 to 14: O stands alone. B is for invoices within Italy, and not beside S (BR-B-01, BR-B-02). */
function companyFindings({ content, country }: InvoiceInHand, codes: ReadonlySet<TaxCode>): Finding[] {
  const isItalian = country === 'IT' && content.buyer.country === 'IT';
  return [
    ...when(codes.has('O') && codes.size > 1, ['refuse', 'invoice-outside-scope-alone']),
    ...when(codes.has('B') && (!isItalian || codes.has('S')), ['refuse', 'invoice-split-payment']),
  ];
}

/** BR-IC-11: a supply within the Union says when it was delivered. */
const deliveryFindings = ({ content }: InvoiceInHand, codes: ReadonlySet<TaxCode>): Finding[] =>
  when(codes.has('K') && content.deliveredOn === null && content.period === null, [
    'refuse',
    'invoice-delivery-missing',
  ]);

/** What the tax categories of an invoice ask for (EN 16931; the rules are named beside each check). */
export function taxFindings(hand: InvoiceInHand): Finding[] {
  const rates = hand.worked.totals.categories.map(({ tax }) => tax);
  const codes = new Set(rates.map(({ code }) => code));
  const unexplained = explainedCodes.filter((code) => codes.has(code) && !exemptionOf(code, hand.content.exemptions));
  return [
    ...when(
      rates.some(({ code, percent }) => code === 'S' && Number(percent) === 0),
      ['refuse', 'invoice-standard-rate'],
    ),
    ...unexplained.flatMap((code) => when(true, ['refuse', 'invoice-exemption-missing'], { code })),
    ...numberFindings(hand, codes),
    ...companyFindings(hand, codes),
    ...deliveryFindings(hand, codes),
  ];
}
