import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { LetterValues } from '#shared/agreements/filled-letter';
import type { MinorUnits } from '#shared/money/decimal';
import { mailsToOf } from '#shared/invoices/mails-to-of';
import type { InvoiceLetterKind } from '#shared/invoices/invoice-schema';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode, WordValues } from '#shared/words/word-code';
import type { ClientLetter, LetterFigures } from '../agreements';
import { words } from '../platform/http/words';
import type { InvoiceRow } from './invoice-model';
import { todayIn, type InvoiceParts } from './invoice-parts';
import { mustBeIssued, mustBeIssuedInvoice } from './invoice-policy';

/** What a payment by card asks of the letters. */
export interface ReceiptLetters {
  receipt(invoice: InvoiceRow, amount_minor: MinorUnits): Promise<void>;
}

/** A letter about an invoice: its kind, the day it speaks of, and what differs from the invoice itself. */
interface About {
  readonly kind: ClientLetter['kind'];
  readonly email: string;
  readonly day: string;
  readonly total_minor?: MinorUnits;
  readonly note?: string;
  readonly encloses: boolean;
}

/** What is kept of a letter; nobody sends a receipt. */
interface Kept {
  readonly kind: InvoiceLetterKind;
  readonly email: string;
  readonly byName: string;
}

/** Letters about invoices in the workshop's words: the invoice itself, a reminder, the receipt of a payment by card. */
export class InvoiceLetters implements ReceiptLetters {
  constructor(private readonly parts: InvoiceParts) {}

  /** Mails an issued invoice or credit note with its papers. */
  async send(actor: Actor, invoiceId: string, note: string): Promise<void> {
    const row = await this.parts.invoices.get(actor.workshopId, invoiceId);
    mustBeIssued(row);
    const email = await this.addressOf(row);
    const { name } = row.content.buyer;
    if (email === '') throw new Rejection('conflict', 'letter-no-address', { values: { name } });
    await this.post(row, { kind: row.kind, email, day: row.dueOn ?? row.issuedOn ?? '', note, encloses: true });
    await this.keep(row, { kind: 'paper', email, byName: actor.name });
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
    const { name } = content.buyer;
    const email = await this.addressOf(row);
    if (email === '') throw new Rejection('conflict', 'reminder-no-address', { values: { name } });
    await this.post(row, { kind: 'reminder', email, day: dueOn, note, encloses: true });
    await this.keep(row, { kind: 'reminder', email, byName: actor.name });
    await this.record(actor, row, { code: 'history-reminded', values: { client: name, number: number ?? '' } });
  }

  /** Thanks for a payment by card, where there is an address to thank. */
  async receipt({ workshopId, id }: InvoiceRow, amount_minor: MinorUnits): Promise<void> {
    const row = await this.parts.invoices.get(workshopId, id);
    const email = await this.addressOf(row);
    if (email === '') return;
    const day = await todayIn(this.parts, workshopId);
    await this.post(row, { kind: 'receipt', email, day, total_minor: amount_minor, encloses: false });
    await this.keep(row, { kind: 'receipt', email, byName: '' });
  }

  private async addressOf({ workshopId, clientId, content }: InvoiceRow): Promise<string> {
    return mailsToOf(content.buyer, await this.parts.jobs.client(workshopId, clientId));
  }

  private async keep({ workshopId, id, openMinor }: InvoiceRow, letter: Kept): Promise<void> {
    const at = this.parts.clock.now();
    await this.parts.invoices.letters.insert(workshopId, { id: newId(), invoiceId: id, openMinor, at, ...letter });
  }

  private async post(row: InvoiceRow, about: About): Promise<void> {
    const { workshopId, jobId, content, pdfFileId, xmlFileId } = row;
    const job = jobId === null ? words('letter-job-none') : (await this.parts.jobs.job(workshopId, jobId)).title;
    const files = about.encloses ? [pdfFileId, xmlFileId] : [];
    await this.parts.clientLetters.post(workshopId, {
      kind: about.kind,
      client: { ...content.buyer, email: about.email },
      values: (figures) => this.values(row, about, { job, figures }),
      enclosures: files.flatMap((fileId) => (fileId === null ? [] : [{ fileId }])),
    });
  }

  private values(
    { number, currency, dueMinor, openMinor }: InvoiceRow,
    { day, total_minor = dueMinor, note = '' }: About,
    { job, figures }: { job: string; figures: LetterFigures },
  ): LetterValues {
    return {
      ...{ job, note, number: number ?? '', link: this.parts.clientEntrance, day: figures.day(day) },
      total: figures.money(total_minor, currency),
      open: figures.money(openMinor, currency),
    };
  }

  private record(actor: Actor, { id, jobId }: InvoiceRow, deed: { code: WordCode; values: WordValues }): Promise<void> {
    return this.parts.audit.record(actor, { subject: { kind: 'invoice', id }, ...(jobId ? { jobId } : {}), ...deed });
  }
}
