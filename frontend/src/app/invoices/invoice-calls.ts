import { Injectable, inject } from '@angular/core';
import { beginStageInvoice, nameStageDay, readContractAccount } from '#shared/invoices/contract-account-endpoints';
import { listDueStages } from '#shared/invoices/due-stages-endpoints';
import type { InvoiceContent, InvoiceKind } from '#shared/invoices/invoice';
import type { InvoiceState } from '#shared/invoices/invoice-schema';
import type { InvoiceSettings } from '#shared/invoices/invoice-settings';
import {
  beginCreditNote,
  issueInvoice,
  keepInvoice,
  keepInvoiceSettings,
  listInvoices,
  readInvoice,
  readInvoiceSettings,
  removeInvoice,
  sendInvoice,
} from '#shared/invoices/invoices-endpoints';
import { readJournal, readOwed, readStatement, remindOfInvoice, sendStatement } from '#shared/invoices/owed-endpoints';
import type { PaymentEntry, RefundEntry } from '#shared/invoices/payment-schema';
import type { Share } from '#shared/invoices/payment-shares';
import {
  listPayments,
  listUnknownPaymentEvents,
  recordPayment,
  refundPayment,
  sharePayment,
  writeOff,
} from '#shared/invoices/payments-endpoints';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { Api } from '../core/api/api';

/** Which invoices of a list. */
export interface InvoicesAsked {
  readonly jobId?: string | undefined;
  readonly clientId?: string | undefined;
  readonly kind?: InvoiceKind | undefined;
  readonly state?: InvoiceState | undefined;
  readonly open?: 'yes' | undefined;
  readonly limit?: number;
}

/** Two days, both included. */
export interface Period {
  readonly from: string;
  readonly to: string;
}

interface Seen {
  readonly id: string;
  readonly version: number;
}

/** The calls about invoices, payments and what is owed. What moves money carries a key, so that it is done once. */
@Injectable({ providedIn: 'root' })
export class InvoiceCalls {
  private readonly api = inject(Api);

  list(asked: InvoicesAsked, cursor: string | undefined, signal: AbortSignal) {
    return this.api.call(listInvoices, { query: { ...asked, cursor }, signal });
  }

  read(invoiceId: string, signal?: AbortSignal) {
    return this.api.call(readInvoice, { params: { invoiceId }, ...(signal ? { signal } : {}) });
  }

  keep({ id, version }: Seen, content: InvoiceContent) {
    return this.api.call(keepInvoice, { params: { invoiceId: id }, version, body: content as never });
  }

  async remove({ id, version }: Seen): Promise<void> {
    await this.api.call(removeInvoice, { params: { invoiceId: id }, version });
  }

  issue({ id, version }: Seen, idempotencyKey: string) {
    return this.api.call(issueInvoice, { params: { invoiceId: id }, body: { version }, idempotencyKey });
  }

  beginCreditNote(invoiceId: string, creditNoteId: string) {
    return this.api.call(beginCreditNote, { params: { invoiceId }, body: { creditNoteId } });
  }

  async mail(invoiceId: string, note: string, idempotencyKey: string): Promise<void> {
    await this.api.call(sendInvoice, { params: { invoiceId }, body: { note }, idempotencyKey });
  }

  async remind(invoiceId: string, note: string, idempotencyKey: string): Promise<void> {
    await this.api.call(remindOfInvoice, { params: { invoiceId }, body: { note }, idempotencyKey });
  }

  async mailStatement(clientId: string, body: Period & { note: string }, idempotencyKey: string): Promise<void> {
    await this.api.call(sendStatement, { params: { clientId }, body, idempotencyKey });
  }

  writeOff(invoiceId: string, body: { amount_minor: number; reason: string }, idempotencyKey: string) {
    return this.api.call(writeOff, { params: { invoiceId }, body, idempotencyKey });
  }

  payments(clientId: string | undefined, cursor: string | undefined, signal: AbortSignal) {
    return this.api.call(listPayments, { query: { clientId, cursor }, signal });
  }

  async unknownEvents(signal: AbortSignal) {
    return (await this.api.call(listUnknownPaymentEvents, { signal })).items;
  }

  recordPayment(body: PaymentEntry, idempotencyKey: string) {
    return this.api.call(recordPayment, { body, idempotencyKey });
  }

  sharePayment(paymentId: string, body: Share, idempotencyKey: string) {
    return this.api.call(sharePayment, { params: { paymentId }, body, idempotencyKey });
  }

  refund(paymentId: string, body: RefundEntry, idempotencyKey: string) {
    return this.api.call(refundPayment, { params: { paymentId }, body, idempotencyKey });
  }

  owed(signal: AbortSignal) {
    return this.api.call(readOwed, { signal });
  }

  statement(clientId: string, period: Period, signal: AbortSignal) {
    return this.api.call(readStatement, { params: { clientId }, query: period, signal });
  }

  journal(period: Period, signal: AbortSignal) {
    return this.api.call(readJournal, { query: period, signal });
  }

  settings(signal?: AbortSignal) {
    return this.api.call(readInvoiceSettings, { ...(signal ? { signal } : {}) });
  }

  keepSettings(version: number, body: InvoiceSettings) {
    return this.api.call(keepInvoiceSettings, { version, body: body });
  }

  dueStages(cursor: string | undefined, signal: AbortSignal) {
    return this.api.call(listDueStages, { query: { cursor }, signal });
  }

  async contract(jobId: string, signal: AbortSignal) {
    return (await this.api.call(readContractAccount, { params: { jobId }, signal })).contract;
  }

  beginStage(jobId: string, body: { invoiceId: string; issueId: string; claim: StageClaim }) {
    return this.api.call(beginStageInvoice, { params: { jobId }, body });
  }

  async nameStageDay(
    jobId: string,
    body: { issueId: string; claim: StageClaim; of: 'planned' | 'reached'; day: string | null },
  ): Promise<void> {
    await this.api.call(nameStageDay, { params: { jobId }, body });
  }
}
