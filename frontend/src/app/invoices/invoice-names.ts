import type { InvoiceKind } from '#shared/invoices/invoice';
import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { LedgerKind } from '#shared/invoices/ledger-entry';
import type { Age } from '#shared/invoices/owed-by-age';
import type { Payment, PaymentWay } from '#shared/invoices/payment-schema';

export const invoiceKindNames: Readonly<Record<InvoiceKind, string>> = {
  invoice: $localize`Invoice`,
  'credit-note': $localize`Credit note`,
};

export const ledgerKindNames: Readonly<Record<LedgerKind, string>> = {
  invoice: $localize`Invoices`,
  'credit-note': $localize`Credit notes`,
  payment: $localize`Payments`,
  refund: $localize`Refunds`,
  dispute: $localize`Disputed payments`,
  'write-off': $localize`Written off`,
};

/** One of a kind, as an entry of a journal or statement is called. */
export const ledgerEntryNames: Readonly<Record<LedgerKind, string>> = {
  invoice: $localize`Invoice`,
  'credit-note': $localize`Credit note`,
  payment: $localize`Payment`,
  refund: $localize`Refund`,
  dispute: $localize`Disputed payment`,
  'write-off': $localize`Written off`,
};

export const ageNames: Readonly<Record<Age, string>> = {
  'not-due': $localize`Not due yet`,
  'to-30': $localize`1 to 30 days over`,
  'to-60': $localize`31 to 60 days`,
  'to-90': $localize`61 to 90 days`,
  'over-90': $localize`Over 90 days`,
};

export const paymentWayNames: Readonly<Record<PaymentWay, string>> = {
  bank: $localize`by bank`,
  cash: $localize`in cash`,
  card: $localize`by card`,
};

/** What a movement beside a payment is, in a word; nothing for a payment itself. */
export function movementName({ deed, amount_minor }: Payment): string {
  if (deed === 'refund') return $localize`given back`;
  if (deed === 'refund-failed') return $localize`refund that failed`;
  if (deed === 'payment') return '';
  return amount_minor < 0 ? $localize`taken back by the bank` : $localize`dispute settled`;
}

/** Where a paper stands, in a word. */
export type InvoiceStanding = 'draft' | 'overdue' | 'open' | 'settled' | 'credit-note';

export const invoiceStandingNames: Readonly<Record<InvoiceStanding, string>> = {
  draft: $localize`draft`,
  overdue: $localize`overdue`,
  open: $localize`open`,
  settled: $localize`settled`,
  'credit-note': $localize`issued`,
};

/** Where a paper stands: whether it is still a draft, is owed, is overdue, or is dealt with. */
export function standingOf({ state, kind, isOverdue, open_minor }: InvoiceSummary): InvoiceStanding {
  if (state === 'draft') return 'draft';
  if (kind === 'credit-note') return 'credit-note';
  if (isOverdue) return 'overdue';
  return open_minor > 0 ? 'open' : 'settled';
}
