import type { Actor } from '#shared/actor/actor';
import type { InvoiceContent } from '#shared/invoices/invoice';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { Rejection } from '#shared/problems/rejection';
import { refuseStale, type Seen } from '../platform/database/keeping';
import { amountsOfDraft, exactAmounts, notIssued } from './exact-amounts';
import type { InvoiceRow } from './invoice-model';
import type { InvoiceParts } from './invoice-parts';
import { wordsOf } from './invoice-parts';
import { mustBeDraft, mustBeIssued, mustBeLeft, mustKeepAmounts } from './invoice-policy';
import { writtenOffOf } from './settling-service';

type Deed = 'history-invoice-begun' | 'history-invoice-changed' | 'history-invoice-removed';

/** Invoices and credit notes while they may still be changed. */
export class DraftService {
  constructor(private readonly parts: InvoiceParts) {}

  /** Begins a plain invoice, or changes a draft; what was sent twice is kept once. */
  async keep(actor: Actor, seen: Seen, content: InvoiceContent): Promise<InvoiceRow> {
    const { workshopId } = actor;
    const row = await this.parts.invoices.hold(workshopId, seen.id);
    if (!row) return this.begin(actor, seen, content);
    mustBeDraft(row);
    refuseStale(row, seen.version);
    if (row.claim) mustKeepAmounts(row.content, content);
    if (row.kind === 'credit-note' && content.clientId !== row.clientId)
      throw new Rejection('conflict', 'invoice-foreign-client');
    await this.mustBelong(workshopId, content);
    const known_minor = await this.knownRounding(row, content);
    const worked = exactAmounts(content, row.currency, known_minor);
    const after = await this.parts.invoices.change(workshopId, seen, amountsOfDraft(content, worked));
    await this.record(actor, after, 'history-invoice-changed');
    return after;
  }

  async remove(actor: Actor, { id, version }: Seen): Promise<void> {
    const row = await this.parts.invoices.lock(actor.workshopId, id);
    mustBeDraft(row);
    refuseStale(row, version);
    await this.parts.invoices.remove(actor.workshopId, id);
    await this.record(actor, row, 'history-invoice-removed');
  }

  /** Drafts a credit note with the lines of its invoice, of which some may then be taken away. */
  async beginCreditNote(actor: Actor, invoiceId: string, creditNoteId: string): Promise<InvoiceRow> {
    const { workshopId } = actor;
    const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
    mustBeIssued(invoice);
    if (invoice.kind === 'credit-note') throw new Rejection('conflict', 'invoice-credits-credit');
    mustBeLeft(invoice, await writtenOffOf(this.parts.payments, workshopId, invoiceId), 0);
    const words = await wordsOf(this.parts, workshopId);
    const terms = words.say('invoice-credit-terms');
    const content: InvoiceContent = { ...invoice.content, dueOn: null, terms, note: '' };
    const known_minor = invoice.claim ? invoice.roundingMinor : 0;
    return this.add(actor, content, {
      ...{ id: creditNoteId, kind: 'credit-note', creditedInvoiceId: invoiceId, currency: invoice.currency },
      known_minor,
    });
  }

  /** Writes a first draft; amounts of stages and credit notes may carry a rounding that is known already. */
  async add(
    actor: Actor,
    content: InvoiceContent,
    first: Pick<InvoiceRow, 'id' | 'kind' | 'currency'> &
      Partial<Pick<InvoiceRow, 'creditedInvoiceId' | 'claimIssueId' | 'claim'>> & { known_minor: MinorUnits },
  ): Promise<InvoiceRow> {
    const { known_minor, ...given } = first;
    const row = await this.parts.invoices.insert(actor.workshopId, {
      ...{ version: 1, state: 'draft', creditedInvoiceId: null, claimIssueId: null, claim: null },
      ...notIssued,
      ...amountsOfDraft(content, exactAmounts(content, given.currency, known_minor)),
      ...given,
    });
    await this.record(actor, row, 'history-invoice-begun');
    return row;
  }

  private async begin(actor: Actor, seen: Seen, content: InvoiceContent): Promise<InvoiceRow> {
    if (seen.version !== 0) throw new Rejection('not-found', 'problem-not-found');
    await this.mustBelong(actor.workshopId, content);
    const { currency } = await this.parts.workshops.get(actor.workshopId);
    return this.add(actor, content, { id: seen.id, kind: 'invoice', currency, known_minor: 0 });
  }

  /** Client and job are the workshop's own, and the job is the client's. */
  private async mustBelong(workshopId: string, { clientId, jobId }: InvoiceContent): Promise<void> {
    await this.parts.jobs.client(workshopId, clientId);
    if (jobId === null) return;
    const job = await this.parts.jobs.job(workshopId, jobId);
    if (job.clientId === clientId) return;
    const complaints = [{ path: ['jobId'], code: 'invoice-foreign-client' as const, values: {} }];
    throw new Rejection('invalid', 'problem-invalid', { complaints });
  }

  /** The credit note that credits the last line of a stage gives back its rounding too; before that there is none to give back. */
  private async knownRounding(row: InvoiceRow, content: InvoiceContent): Promise<MinorUnits> {
    if (row.claim) return row.roundingMinor;
    if (row.creditedInvoiceId === null) return 0;
    const { workshopId, currency, creditedInvoiceId } = row;
    const invoice = await this.parts.invoices.get(workshopId, creditedInvoiceId);
    if (!invoice.claim) return 0;
    const notes = await this.parts.invoices.list(workshopId, { where: { creditedInvoiceId, state: 'issued' } });
    const { totals } = exactAmounts(content, currency, 0);
    const isLast = sumMinor([totals.net_minor, ...notes.map(({ netMinor }) => netMinor)]) === invoice.netMinor;
    const off_minor = sumMinor([invoice.taxMinor, -totals.tax_minor, ...notes.map(({ taxMinor }) => -taxMinor)]);
    // Taxes of notes differ from the tax of the invoice by half a unit each; more than that was taxed otherwise.
    const isTaxedAlike = Math.abs(off_minor) <= (notes.length + 1) * totals.categories.length;
    if (!isLast || !isTaxedAlike) return 0;
    return sumMinor([invoice.dueMinor, -invoice.creditedMinor, -totals.gross_minor]);
  }

  private record(actor: Actor, row: InvoiceRow, code: Deed): Promise<void> {
    return this.parts.audit.record(actor, {
      subject: { kind: 'invoice', id: row.id },
      ...(row.jobId ? { jobId: row.jobId } : {}),
      code,
      values: { kind: row.kind, client: row.content.buyer.name },
      merges: code === 'history-invoice-changed',
    });
  }
}
