import type { Day } from '#shared/calendar/day';
import type { MinorUnits } from '#shared/money/decimal';

/** What moves the account of a client. */
export const ledgerKinds = ['invoice', 'credit-note', 'payment', 'refund', 'dispute', 'write-off'] as const;
export type LedgerKind = (typeof ledgerKinds)[number];

/**
 * One movement on a client's account, in whole minor units: what an invoice or refund adds to what is owed is above nothing, what a
 * credit note, a payment or a write-off takes off is below; what a bank takes back in a dispute is above, what it gives back below. Net, tax and rounding are 0 for what is no paper with tax.
 */
export interface LedgerEntry {
  readonly id: string;
  readonly day: Day;
  readonly kind: LedgerKind;
  readonly clientId: string;
  readonly clientName: string;
  /** Of the paper, or what was noted of a payment. */
  readonly number: string;
  /** Why, where somebody had to say so; for the workshop and its accountant, never for the client. */
  readonly note: string;
  /** Of money that came or went: by what way, and the numbers of the invoices it is for; for the journal alone. */
  readonly paid?: { readonly way: 'bank' | 'cash' | 'card'; readonly invoices: readonly string[] };
  /** ISO 4217. */
  readonly currency: string;
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly rounding_minor: MinorUnits;
  readonly amount_minor: MinorUnits;
}
