import { Op } from 'sequelize';
import type { InvoiceKind } from '#shared/invoices/invoice';
import type { InvoiceState } from '#shared/invoices/invoice-schema';
import type { MinorUnits } from '#shared/money/decimal';
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

  constructor(private readonly database: Database) {
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

  /** Invoices and credit notes that claim something of the contracts of jobs, in the order they were begun. */
  claiming(workshopId: string, jobIds: readonly string[]): Promise<InvoiceRow[]> {
    return this.list(workshopId, { where: { jobId: { [Op.in]: [...jobIds] }, claimIssueId: { [Op.ne]: null } } });
  }

  /** Issued credit notes that correct these invoices; those that give back what a variation takes away are none of them. */
  creditNotesOf(workshopId: string, invoiceIds: readonly string[]): Promise<InvoiceRow[]> {
    if (invoiceIds.length === 0) return Promise.resolve([]);
    const creditedInvoiceId = { [Op.in]: [...invoiceIds] };
    return this.list(workshopId, { where: { creditedInvoiceId, state: 'issued', claimIssueId: null } });
  }

  /** What is invoiced and not credited of each accepted issue; credit notes of what a variation takes away below nothing. */
  async standingByIssue(workshopId: string): Promise<ReadonlyMap<string, MinorUnits>> {
    const rows = await this.database.select<{ issueId: string; standing: number }>(
      `SELECT i.claim_issue_id AS issueId, CAST(SUM(IF(i.kind = 'credit-note', -i.due_minor, i.due_minor - COALESCE(n.due, 0))) AS SIGNED) AS standing
       FROM invoices i
       LEFT JOIN (SELECT credited_invoice_id AS id, SUM(due_minor) AS due FROM invoices WHERE workshop_id = :workshopId
         AND kind = 'credit-note' AND state = 'issued' AND claim_issue_id IS NULL GROUP BY credited_invoice_id) n ON n.id = i.id
       WHERE i.workshop_id = :workshopId AND i.state = 'issued' AND i.claim_issue_id IS NOT NULL GROUP BY i.claim_issue_id`,
      { workshopId },
    );
    return new Map(rows.map(({ issueId, standing }) => [issueId, Number(standing)]));
  }

  /** What was invoiced on a job, the newest first. */
  issuedOfJob(workshopId: string, jobId: string): Promise<InvoiceRow[]> {
    return this.list(workshopId, { where: { jobId, kind: 'invoice', state: 'issued' }, order: [['ordinal', 'DESC']] });
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
