import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { MinorUnits } from '#shared/money/decimal';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode, WordValues } from '#shared/words/word-code';
import type { WorkshopRows } from '../platform/database/workshop-rows';
import type { InvoiceRow } from './invoice-model';
import { todayIn, wordsOf, workshopOnPaper, type InvoiceParts } from './invoice-parts';
import { mustBeIssued, mustBeIssuedInvoice } from './invoice-policy';
import type { ReminderRow } from './payment-model';

interface Parts extends InvoiceParts {
  readonly reminders: WorkshopRows<ReminderRow>;
}

/** What a payment by card asks of the letters. */
export interface ReceiptLetters {
  receipt(invoice: InvoiceRow, amount_minor: MinorUnits): Promise<void>;
}

interface Wording {
  readonly subject: WordCode;
  readonly text: WordCode;
  readonly values: WordValues;
  readonly encloses: boolean;
}

/** Letters about invoices: the invoice itself, a reminder, the receipt of a payment by card. */
export class InvoiceLetters implements ReceiptLetters {
  constructor(private readonly parts: Parts) {}

  /** Mails an issued invoice with its papers. */
  async send(actor: Actor, invoiceId: string, note: string): Promise<void> {
    const row = await this.parts.invoices.get(actor.workshopId, invoiceId);
    mustBeIssued(row);
    const { email } = row.content.buyer;
    if (email === '') throw new Rejection('conflict', 'letter-no-address');
    const dueOn = row.dueOn === null ? 'none' : (await wordsOf(this.parts, actor.workshopId)).day(row.dueOn);
    await this.post(row, {
      ...{ subject: 'mail-invoice-subject', text: 'mail-invoice-text', encloses: true },
      values: { due_minor: row.dueMinor, dueOn, note },
    });
    await this.record(actor, row, { code: 'history-invoice-sent', values: { number: row.number ?? '', email } });
  }

  /** Reminds of what is overdue, as it stands today. */
  async remind(actor: Actor, invoiceId: string, note: string): Promise<void> {
    const { workshopId } = actor;
    const row = await this.parts.invoices.lock(workshopId, invoiceId);
    mustBeIssuedInvoice(row);
    const { number, dueOn, openMinor, content } = row;
    const isOverdue = openMinor > 0 && dueOn !== null && dueOn < (await todayIn(this.parts, workshopId));
    if (!isOverdue) throw new Rejection('conflict', 'reminder-not-due', { values: { number: number ?? '' } });
    const { name, email } = content.buyer;
    if (email === '') throw new Rejection('conflict', 'reminder-no-address', { values: { name } });
    const words = await wordsOf(this.parts, workshopId);
    await this.post(row, {
      ...{ subject: 'mail-reminder-subject', text: 'mail-reminder-text', encloses: true },
      values: { open_minor: openMinor, dueOn: words.day(dueOn), note },
    });
    const at = this.parts.clock.now();
    await this.parts.reminders.insert(workshopId, { id: newId(), invoiceId, openMinor, email, at, byName: actor.name });
    await this.record(actor, row, { code: 'history-reminded', values: { client: name, number: number ?? '' } });
  }

  /** Thanks for a payment by card, where there is an address to thank. */
  async receipt({ workshopId, id }: InvoiceRow, amount_minor: MinorUnits): Promise<void> {
    const row = await this.parts.invoices.get(workshopId, id);
    if (row.content.buyer.email === '') return;
    await this.post(row, {
      ...{ subject: 'mail-receipt-subject', text: 'mail-receipt-text', encloses: false },
      values: { amount_minor, isPaid: row.openMinor <= 0 ? 'yes' : 'no' },
    });
  }

  private async post(row: InvoiceRow, { subject, text, values, encloses }: Wording): Promise<void> {
    const { workshopId, content, kind, number, pdfFileId, xmlFileId } = row;
    const { say } = await wordsOf(this.parts, workshopId);
    const workshop = await workshopOnPaper(this.parts, workshopId);
    const name = content.buyer.contact || content.buyer.name;
    const all = { ...values, kind, number: number ?? '', name, workshop: workshop.name };
    const files = encloses ? [pdfFileId, xmlFileId].flatMap((fileId) => (fileId === null ? [] : [{ fileId }])) : [];
    await this.parts.mailbox.post(workshopId, {
      to: { name: content.buyer.name, email: content.buyer.email },
      subject: say(subject, all),
      text: say(text, all).replace(/\n{3,}/g, '\n\n'),
      from: workshop.name,
      ...(workshop.email === '' ? {} : { replyTo: workshop.email }),
      enclosures: files,
    });
  }

  private record(actor: Actor, { id, jobId }: InvoiceRow, deed: { code: WordCode; values: WordValues }): Promise<void> {
    return this.parts.audit.record(actor, { subject: { kind: 'invoice', id }, ...(jobId ? { jobId } : {}), ...deed });
  }
}
