import { compareDays } from '#shared/calendar/add-days';
import { exchangeFindings } from '#shared/invoices/exchange-findings';
import { when, type InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import { invoiceTexts } from '#shared/invoices/invoice-texts';
import { taxFindings } from '#shared/invoices/tax-findings';
import type { Finding } from '#shared/words/finding';
import { letterFindings } from '#shared/words/letter-findings';

/** EN 16931: BR-16 (lines), BR-07 and BR-11 (buyer), BR-CO-26 (seller). */
function partyFindings({ content, seller, mailsTo }: InvoiceInHand): Finding[] {
  const numbers = [seller.vatId, seller.taxNumber, seller.companyNumber];
  return [
    ...when(content.lines.length === 0, ['refuse', 'invoice-no-lines']),
    ...when(content.buyer.address.trim() === '', ['warn', 'invoice-buyer-address']),
    ...when(mailsTo === '', ['warn', 'invoice-buyer-email'], { client: content.buyer.name }),
    ...when(
      numbers.every((number) => number === ''),
      ['refuse', 'invoice-seller-number'],
    ),
  ];
}

/** BR-CO-25 is of the norm and not of its rule files: what is owed needs a day or terms. */
function dueFindings({ kind, content, worked, dueOn, issuedOn }: InvoiceInHand): Finding[] {
  const { due_minor } = worked.totals;
  const isUndated = due_minor > 0 && dueOn === null && content.terms.trim() === '';
  return [
    ...when(due_minor < 0, ['refuse', 'invoice-below-nothing'], { due_minor }),
    ...when(kind === 'invoice' && isUndated, ['refuse', 'invoice-due-missing']),
    ...when(dueOn !== null && compareDays(dueOn, issuedOn) < 0, ['refuse', 'invoice-due-early']),
  ];
}

/**
 * What has to be said of an invoice before it is issued: `refuse` stops it, `warn` and `note` only tell (EN 16931, its rules named beside
 * each check; prices without allowances where they hold the tax is a rule of our own).
 */
export const invoiceFindings = (hand: InvoiceInHand): Finding[] => [
  ...partyFindings(hand),
  ...dueFindings(hand),
  ...taxFindings(hand),
  ...exchangeFindings(hand),
  ...letterFindings(invoiceTexts(hand)),
];
