import type { InvoiceLetterKind } from '#shared/invoices/invoice-schema';
import type { CheckoutState, PaymentWay } from '#shared/invoices/payment-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** Of a payment by card: a refund that came back to us, or what a dispute took (below nothing) and gave back. */
export type OutsideDeed = 'refund-failed' | 'dispute';

/** Money that came, or went back (below nothing); only what no invoice has taken of it is ever written again. */
export interface PaymentRow extends WorkshopRow {
  readonly clientId: string;
  readonly way: PaymentWay;
  readonly currency: string;
  readonly amountMinor: number;
  readonly creditMinor: number;
  readonly receivedOn: string;
  readonly reference: string;
  readonly refundsPaymentId: string | null;
  /** What the payment service calls it, where it came through one. */
  readonly externalId: string | null;
  readonly deed: OutsideDeed | null;
  /** The refund or dispute of the payment service that this row follows. */
  readonly follows: string | null;
  readonly recordedAt: Date;
  readonly recordedBy: string;
}

/** So much of a payment for one invoice; below nothing where it was taken back again. */
export interface PaymentShareRow extends WorkshopRow {
  readonly paymentId: string;
  readonly invoiceId: string;
  readonly amountMinor: number;
  readonly at: Date;
}

/** What was given up of an invoice; below nothing where a credit note took its place. */
export interface WriteOffRow extends WorkshopRow {
  readonly invoiceId: string;
  readonly amountMinor: number;
  readonly reason: string;
  readonly writtenOn: string;
  readonly at: Date;
  readonly byName: string;
}

/** A payment by card that was begun, of an amount from our own record. */
export interface CheckoutRow extends WorkshopRow {
  readonly invoiceId: string;
  readonly accessId: string | null;
  readonly state: CheckoutState;
  readonly amountMinor: number;
  readonly currency: string;
  readonly sessionId: string | null;
  readonly url: string | null;
  readonly intentId: string | null;
  /** Raised by whatever changes it or its payment: an answer asked for before is not taken after. */
  readonly turn: number;
  readonly createdAt: Date;
}

/** A letter that went out about an invoice, and what was open of it then. */
export interface InvoiceLetterRow extends WorkshopRow {
  readonly kind: InvoiceLetterKind;
  readonly invoiceId: string;
  readonly openMinor: number;
  readonly email: string;
  readonly at: Date;
  readonly byName: string;
}

const own = { workshopId: column.workshopId, id: column.id };

export const paymentTable = (database: Database) =>
  database.table<PaymentRow>('payments', {
    ...own,
    clientId: column.reference,
    way: column.word,
    currency: column.word,
    amountMinor: column.minor,
    creditMinor: column.minor,
    receivedOn: column.day,
    reference: column.word,
    refundsPaymentId: column.reference,
    externalId: column.word,
    deed: column.word,
    follows: column.word,
    recordedAt: column.instant,
    recordedBy: column.word,
  });

export const paymentShareTable = (database: Database) =>
  database.table<PaymentShareRow>('payment_shares', {
    ...own,
    paymentId: column.reference,
    invoiceId: column.reference,
    amountMinor: column.minor,
    at: column.instant,
  });

export const writeOffTable = (database: Database) =>
  database.table<WriteOffRow>('write_offs', {
    ...own,
    invoiceId: column.reference,
    amountMinor: column.minor,
    reason: column.word,
    writtenOn: column.day,
    at: column.instant,
    byName: column.word,
  });

export const checkoutTable = (database: Database) =>
  database.table<CheckoutRow>('checkouts', {
    ...own,
    invoiceId: column.reference,
    accessId: column.reference,
    state: column.word,
    amountMinor: column.minor,
    currency: column.word,
    sessionId: column.word,
    url: column.word,
    intentId: column.word,
    turn: column.whole,
    createdAt: column.instant,
  });

export const invoiceLetterTable = (database: Database) =>
  database.table<InvoiceLetterRow>('invoice_letters', {
    ...own,
    kind: column.word,
    invoiceId: column.reference,
    openMinor: column.minor,
    email: column.word,
    at: column.instant,
    byName: column.word,
  });
