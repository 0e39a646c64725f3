import { isVatNumber } from '#shared/invoices/exchange-country';
import type { InvoiceSeller, PayeeAccount } from '#shared/invoices/invoice';

/** How a workshop invoices: who it says it is, where money goes, when it falls due, and how its numbers begin. */
export interface InvoiceSettings {
  readonly seller: InvoiceSeller;
  readonly account: PayeeAccount;
  readonly due_days: number;
  readonly terms: string;
  /** What the country of the workshop wants said at the foot of every invoice. */
  readonly closing: string;
  readonly invoicePrefix: string;
  readonly creditNotePrefix: string;
  /** For whoever had numbers before: in this year the series begin at these. */
  readonly begins: { readonly year: number; readonly invoice: number; readonly creditNote: number } | null;
}

/** What a workshop invoices with until somebody says otherwise: its tax registration is taken for what it looks like. */
export function startInvoiceSettings(workshop: { name: string; taxRegistration: string }): InvoiceSettings {
  const registration = workshop.taxRegistration.replace(/\s/g, '');
  const isVatId = isVatNumber(registration);
  return {
    seller: {
      vatId: isVatId ? registration : '',
      taxNumber: isVatId ? '' : workshop.taxRegistration.trim(),
      companyNumber: '',
    },
    account: { name: workshop.name, iban: '', bic: '' },
    due_days: 14,
    terms: '',
    closing: '',
    invoicePrefix: '',
    creditNotePrefix: 'C',
    begins: null,
  };
}

/** The number of an invoice or credit note as it is written: prefix, year, and at least four figures. */
export const invoiceNumber = (prefix: string, year: number, ordinal: number): string =>
  `${prefix}${year}-${String(ordinal).padStart(4, '0')}`;
