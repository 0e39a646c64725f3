import type { InvoiceContent } from '#shared/invoices/invoice';
import type { Invoice } from '#shared/invoices/invoice-schema';
import type { InvoiceTotals } from '#shared/invoices/invoice-totals';
import { workedInvoice } from '#shared/invoices/worked-invoice';

/** What an invoice comes to, with what was rounded at its end. */
export interface InvoiceAmounts {
  readonly totals: InvoiceTotals;
  readonly rounding_minor: number;
}

/** What the amounts of a draft follow from, as a text to compare; words do not move them. */
const written = ({ lines, allowancesCharges, pricesHold, roundsToCash }: InvoiceContent): string => {
  const counted = lines.map(({ quantity, price, baseQuantity, allowancesCharges: own, tax }) => [
    ...[quantity, price, baseQuantity, tax.code, tax.percent],
    own.map(({ charge, amount }) => [charge, amount]),
  ]);
  const whole = allowancesCharges.map(({ charge, amount, tax }) => [charge, amount, tax.code, tax.percent]);
  return JSON.stringify([counted, whole, pricesHold, roundsToCash]);
};

/**
 * What a draft comes to as it stands on the page: the server's own figures while nothing that counts differs from what it has, else
 * the same calculation; nothing where the amounts are beyond what is counted exactly.
 */
export function draftAmounts(content: InvoiceContent, kept: Invoice): InvoiceAmounts | undefined {
  if (written(content) === written(kept.content)) return kept;
  try {
    return workedInvoice(content, kept.currency);
  } catch (error) {
    if (error instanceof RangeError) return undefined;
    throw error;
  }
}
