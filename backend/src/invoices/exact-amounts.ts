import { workedInvoice, type WorkedInvoice } from '#shared/invoices/worked-invoice';
import type { InvoiceContent } from '#shared/invoices/invoice';
import type { MinorUnits } from '#shared/money/decimal';
import { Rejection } from '#shared/problems/rejection';
import type { InvoiceRow } from './invoice-model';

/** The invoice worked out; amounts beyond what is counted exactly are refused in words. */
export function exactAmounts(content: InvoiceContent, currency: string, known_minor: MinorUnits): WorkedInvoice {
  try {
    return workedInvoice(content, currency, known_minor);
  } catch (error) {
    if (error instanceof RangeError) throw new Rejection('invalid', 'invoice-too-large');
    throw error;
  }
}

/** What the row of a draft holds of its amounts; nothing is open before it is issued. */
export function amountsOfDraft(content: InvoiceContent, worked: WorkedInvoice) {
  const { totals, rounding_minor } = worked;
  return {
    content,
    clientId: content.clientId,
    jobId: content.jobId,
    roundingMinor: rounding_minor,
    netMinor: totals.net_minor,
    taxMinor: totals.tax_minor,
    grossMinor: totals.gross_minor,
    dueMinor: totals.due_minor,
    openMinor: 0,
    creditedMinor: 0,
  } satisfies Partial<InvoiceRow>;
}

/** What an invoice has not been given yet. */
export const notIssued = {
  ...{ number: null, series: null, year: null, ordinal: null, issuedOn: null, issuedAt: null, issuedBy: null },
  ...{ dueOn: null, snapshot: null, sha256: null, pdfFileId: null, xmlFileId: null },
} as const;
