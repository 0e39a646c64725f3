import { Op } from 'sequelize';
import type { InvoiceKind } from '#shared/invoices/invoice';
import type { InvoiceState } from '#shared/invoices/invoice-schema';
import type { Database } from '../platform/database/database';
import { WorkshopRows, type Page, type PageAsked } from '../platform/database/workshop-rows';
import { invoiceTable, type InvoiceRow } from './invoice-model';
import { invoiceLetterTable, type InvoiceLetterRow } from './payment-model';

export interface InvoicesAsked extends PageAsked {
  readonly jobId?: string | undefined;
  readonly clientId?: string | undefined;
  readonly kind?: InvoiceKind | undefined;
  readonly state?: InvoiceState | undefined;
  readonly open?: 'yes' | undefined;
}

/** Invoices and credit notes, and the letters that went out about them. */
export class InvoiceRepository extends WorkshopRows<InvoiceRow> {
  readonly letters: WorkshopRows<InvoiceLetterRow>;

  constructor(database: Database) {
    super(invoiceTable(database));
    this.letters = new WorkshopRows(invoiceLetterTable(database));
  }

  lettersOf(workshopId: string, invoiceId: string): Promise<InvoiceLetterRow[]> {
    return this.letters.list(workshopId, { where: { invoiceId } });
  }

  pageOf(workshopId: string, asked: InvoicesAsked): Promise<Page<InvoiceRow>> {
    const { jobId, clientId, kind, state, open } = asked;
    const named = Object.entries({ jobId, clientId, kind, state }).filter(([, value]) => value !== undefined);
    const where = { ...Object.fromEntries(named), ...(open ? { openMinor: { [Op.gt]: 0 } } : {}) };
    return this.page(workshopId, asked, where);
  }

  /** Those that claim something of a job's contract, in the order they were begun. */
  claiming(workshopId: string, jobId: string): Promise<InvoiceRow[]> {
    return this.list(workshopId, { where: { jobId, claimIssueId: { [Op.ne]: null }, kind: 'invoice' } });
  }

  /** What has been issued and is not settled, the oldest due first. */
  open(workshopId: string, clientId?: string): Promise<InvoiceRow[]> {
    const ofClient = clientId === undefined ? {} : { clientId };
    return this.list(workshopId, {
      where: { state: 'issued', kind: 'invoice', openMinor: { [Op.gt]: 0 }, ...ofClient },
      order: [
        ['dueOn', 'ASC'],
        ['id', 'ASC'],
      ],
    });
  }

  named(workshopId: string, ids: readonly string[]): Promise<InvoiceRow[]> {
    return ids.length === 0 ? Promise.resolve([]) : this.list(workshopId, { where: { id: [...new Set(ids)] } });
  }

  /** What was issued between two days, both included. */
  issuedBetween(workshopId: string, { from, to }: { from: string; to: string }): Promise<InvoiceRow[]> {
    return this.list(workshopId, { where: { state: 'issued', issuedOn: { [Op.between]: [from, to] } } });
  }

  /** Holds several rows in one order, so that two who need the same ones wait instead of dead-locking. */
  async lockAll(workshopId: string, ids: readonly string[]): Promise<Map<string, InvoiceRow>> {
    const rows = new Map<string, InvoiceRow>();
    for (const id of [...new Set(ids)].sort()) rows.set(id, await this.lock(workshopId, id));
    return rows;
  }
}
