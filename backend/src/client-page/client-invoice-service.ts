import type { ClientActor } from '#shared/actor/client-actor';
import type { ClientInvoice } from '#shared/client-page/client-invoices-endpoints';
import type { ClientInvoiceSummary } from '#shared/client-page/client-overview-schema';
import type { InvoicePaper } from '#shared/invoices/invoice-schema';
import type { Checkout } from '#shared/invoices/payment-schema';
import { Rejection } from '#shared/problems/rejection';
import type { Invoices, InvoiceRow } from '../invoices';
import type { FileAnswer } from '../platform/http/answer';
import type { ClientInvoices } from './client-invoices';

interface Parts {
  readonly invoices: Pick<Invoices, 'reading' | 'checkouts'>;
  readonly paysByCard: () => boolean;
  /** Where a client comes back to from paying. */
  readonly returnUrl: (checkoutId: string) => string;
}

const summaryOf = (row: InvoiceRow, today: string): ClientInvoiceSummary => ({
  id: row.id,
  kind: row.kind,
  jobId: row.jobId,
  number: row.number ?? '',
  issuedOn: row.issuedOn ?? '',
  dueOn: row.dueOn,
  due_minor: row.dueMinor,
  open_minor: row.openMinor,
  credited_minor: row.creditedMinor,
  currency: row.currency,
  isOverdue: row.openMinor > 0 && row.dueOn !== null && row.dueOn < today,
});

/** What a client may see and pay: issued invoices of the job of their link, or all that are theirs. Drafts are not there. */
export class ClientInvoiceService implements ClientInvoices {
  constructor(private readonly parts: Parts) {}

  readonly of = async (client: ClientActor): Promise<readonly ClientInvoiceSummary[]> => {
    const today = await this.parts.invoices.reading.today(client.workshopId);
    return (await this.rows(client)).map((row) => summaryOf(row, today));
  };

  async list(client: ClientActor): Promise<ClientInvoice[]> {
    const today = await this.parts.invoices.reading.today(client.workshopId);
    return (await this.rows(client)).map((row) => ({
      ...summaryOf(row, today),
      papers: row.xmlFileId === null ? ['invoice.pdf'] : ['invoice.pdf', 'invoice.xml'],
      mayPayByCard:
        this.parts.paysByCard() && row.openMinor > 0 && this.parts.invoices.checkouts.mayCharge(row.currency),
    }));
  }

  async paper(client: ClientActor, invoiceId: string, paper: InvoicePaper): Promise<FileAnswer> {
    await this.own(client, invoiceId);
    return this.parts.invoices.reading.paper(client.workshopId, invoiceId, paper);
  }

  async begin(client: ClientActor, invoiceId: string): Promise<Checkout> {
    await this.own(client, invoiceId);
    const { accessId, name, email } = client;
    const payer = { accessId, name, email, returnUrl: this.parts.returnUrl };
    const checkout = await this.parts.invoices.checkouts.begin(client.workshopId, invoiceId, payer);
    return this.parts.invoices.reading.checkout(checkout);
  }

  async ask(client: ClientActor, checkoutId: string): Promise<Checkout> {
    const { checkouts } = this.parts.invoices;
    const found = await checkouts.get(client.workshopId, checkoutId);
    await this.own(client, found.invoiceId);
    return this.parts.invoices.reading.checkout(await checkouts.ask(client.workshopId, checkoutId));
  }

  private rows({ workshopId, clientId, jobId }: ClientActor): Promise<InvoiceRow[]> {
    return this.parts.invoices.reading.issuedTo(workshopId, { clientId, jobId });
  }

  private async own(client: ClientActor, invoiceId: string): Promise<InvoiceRow> {
    const row = await this.parts.invoices.reading.row(client.workshopId, invoiceId);
    const isTheirs = row.clientId === client.clientId && (client.jobId === null || client.jobId === row.jobId);
    if (!isTheirs || row.state !== 'issued') throw new Rejection('not-found', 'problem-not-found');
    return row;
  }
}
