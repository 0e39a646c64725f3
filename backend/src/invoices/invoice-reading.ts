import type { Invoice, InvoicePaper, InvoiceSummary } from '#shared/invoices/invoice-schema';
import { invoiceFindings } from '#shared/invoices/invoice-findings';
import { mailsToOf } from '#shared/invoices/mails-to-of';
import type { Checkout, Payment } from '#shared/invoices/payment-schema';
import { Rejection } from '#shared/problems/rejection';
import { FileAnswer } from '../platform/http/answer';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import { thawedInvoice } from './frozen-invoice';
import type { InvoiceRow } from './invoice-model';
import { todayIn, type InvoiceParts } from './invoice-parts';
import { presentCheckout, presentInvoice, presentPayment, presentSummary } from './invoice-presenter';
import type { InvoicesAsked } from './invoice-repository';
import type { IssuingService } from './issuing-service';
import type { LedgerService } from './ledger-service';
import type { CheckoutRow, PaymentRow } from './payment-model';

interface Parts extends InvoiceParts {
  readonly issuing: IssuingService;
  readonly ledger: LedgerService;
}

/** Invoices and payments as they are read: with what clients are called, and a draft with what has to be said of it. */
export class InvoiceReading {
  constructor(private readonly parts: Parts) {}

  async page(workshopId: string, asked: InvoicesAsked): Promise<Page<InvoiceSummary>> {
    const page = await this.parts.invoices.pageOf(workshopId, asked);
    const names = await this.parts.jobs.clientNames(
      workshopId,
      page.items.map(({ clientId }) => clientId),
    );
    const today = await todayIn(this.parts, workshopId);
    return {
      ...page,
      items: page.items.map((row) => presentSummary(row, { clientName: names.get(row.clientId) ?? '', today })),
    };
  }

  async get(workshopId: string, id: string): Promise<Invoice> {
    return this.read(await this.parts.invoices.get(workshopId, id));
  }

  row(workshopId: string, id: string): Promise<InvoiceRow> {
    return this.parts.invoices.get(workshopId, id);
  }

  today(workshopId: string): Promise<string> {
    return todayIn(this.parts, workshopId);
  }

  /** What was issued to a client, of one job or all, the newest first. */
  async issuedTo(workshopId: string, to: { clientId: string; jobId: string | null }): Promise<InvoiceRow[]> {
    const { clientId, jobId } = to;
    const asked = { clientId, ...(jobId === null ? {} : { jobId }), state: 'issued' as const, limit: 100 };
    return (await this.parts.invoices.pageOf(workshopId, asked)).items;
  }

  /** A draft is worked as it would be issued now; what was issued is read as it was frozen. */
  async read(row: InvoiceRow): Promise<Invoice> {
    const { workshopId } = row;
    const client = await this.parts.jobs.client(workshopId, row.clientId);
    const facts = { clientName: client.name, today: await todayIn(this.parts, workshopId) };
    const mailsTo = mailsToOf(row.content.buyer, client);
    if (row.state === 'issued') {
      const { totals, rounding_minor } = thawedInvoice(row);
      const writeOffs = await this.parts.payments.writeOffsOf(workshopId, row.id);
      const letters = await this.parts.invoices.lettersOf(workshopId, row.id);
      return presentInvoice(row, facts, { totals, rounding_minor, findings: [], writeOffs, letters, mailsTo });
    }
    const hand = await this.parts.issuing.inHand(row, await this.parts.settings.read(workshopId));
    const { totals, rounding_minor } = hand.worked;
    const none = { writeOffs: [], letters: [] };
    return presentInvoice(row, facts, { totals, rounding_minor, findings: invoiceFindings(hand), mailsTo, ...none });
  }

  /** A payment by card as it stands, with what is open of its invoice now. */
  async checkout(row: CheckoutRow): Promise<Checkout> {
    const { workshopId, invoiceId } = row;
    const { openMinor } = await this.parts.invoices.get(workshopId, invoiceId);
    const letters = await this.parts.invoices.lettersOf(workshopId, invoiceId);
    return presentCheckout(row, { open_minor: openMinor, letters });
  }

  /** A paper as it was kept. */
  async paper(workshopId: string, id: string, paper: InvoicePaper): Promise<FileAnswer> {
    const row = await this.parts.invoices.get(workshopId, id);
    const fileId = paper === 'invoice.pdf' ? row.pdfFileId : row.xmlFileId;
    if (!fileId) throw new Rejection('not-found', 'problem-not-found');
    const { bytes, name, media } = await this.parts.files.read(workshopId, fileId);
    return new FileAnswer(bytes, { name, media });
  }

  async payments(workshopId: string, asked: PageAsked & { clientId?: string | undefined }): Promise<Page<Payment>> {
    const where = asked.clientId === undefined ? {} : { clientId: asked.clientId };
    const page = await this.parts.payments.page(workshopId, asked, where);
    return { ...page, items: await this.presented(workshopId, page.items) };
  }

  async payment(row: PaymentRow): Promise<Payment> {
    const [payment] = await this.presented(row.workshopId, [row]);
    return payment;
  }

  private async presented(workshopId: string, rows: readonly PaymentRow[]): Promise<Payment[]> {
    const shares = await this.parts.payments.sharesOf(
      workshopId,
      rows.map(({ id }) => id),
    );
    const named = await this.parts.invoices.named(
      workshopId,
      shares.map(({ invoiceId }) => invoiceId),
    );
    const numbers = new Map(named.map(({ id, number }) => [id, number ?? '']));
    const names = await this.parts.jobs.clientNames(
      workshopId,
      rows.map(({ clientId }) => clientId),
    );
    return rows.map((row) =>
      presentPayment(row, {
        clientName: names.get(row.clientId) ?? '',
        shares: shares
          .filter(({ paymentId }) => paymentId === row.id)
          .map(({ invoiceId, amountMinor }) => ({
            invoiceId,
            number: numbers.get(invoiceId) ?? '',
            amount_minor: amountMinor,
          })),
      }),
    );
  }
}
