import type { InvoiceContent, InvoiceKind, InvoiceSeller, PayeeAccount } from '#shared/invoices/invoice';
import type { WorkedInvoice } from '#shared/invoices/worked-invoice';
import type { Finding } from '#shared/words/finding';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** An invoice about to be issued, with what the workshop adds to it. Days are of the workshop's zone. */
export interface InvoiceInHand {
  readonly kind: InvoiceKind;
  readonly content: InvoiceContent;
  readonly worked: WorkedInvoice;
  readonly currency: string;
  /** ISO 3166-1. */
  readonly country: string;
  readonly seller: InvoiceSeller;
  readonly account: PayeeAccount | null;
  readonly issuedOn: string;
  readonly dueOn: string | null;
  /** Where letters about it would go; empty where no address is known. */
  readonly mailsTo: string;
}

/** A finding where something is so, none where it is not. */
export const when = (
  isSo: boolean,
  [kind, code]: readonly [Finding['kind'], WordCode],
  values: WordValues = {},
): Finding[] => (isSo ? [{ kind, code, values }] : []);
