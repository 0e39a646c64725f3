import type { Actor } from '#shared/actor/actor';
import { partsOfDay } from '#shared/calendar/day';
import { dueDay } from '#shared/invoices/due-day';
import { isExchangeCurrency } from '#shared/invoices/exchange-currency';
import type { FrozenInvoice, PayeeAccount } from '#shared/invoices/invoice';
import { invoiceFindings } from '#shared/invoices/invoice-findings';
import type { InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import { mailsToOf } from '#shared/invoices/mails-to-of';
import { Rejection } from '#shared/problems/rejection';
import { fileName } from '../documents';
import { jobNumber } from '../jobs';
import { atOf } from '../platform/database/keeping';
import { exactAmounts } from './exact-amounts';
import { frozenInvoice } from './frozen-invoice';
import type { InvoiceRow } from './invoice-model';
import type { GivenNumber, InvoiceNumbers } from './invoice-numbers';
import { todayIn, workshopOnPaper, type InvoiceParts } from './invoice-parts';
import { mustBeDraft, mustBeIssuable, mustBeLeft } from './invoice-policy';
import type { KeptSettings } from './invoice-settings-service';
import { writtenOffOf, type SettlingService } from './settling-service';
import type { StageService } from './stage-service';
import { ublInvoice } from './ubl/ubl-invoice';

interface Parts extends InvoiceParts {
  readonly stages: StageService;
  readonly settling: SettlingService;
  readonly numbers: InvoiceNumbers;
}

/** Only an invoice says where money goes; what a credit note gives back goes to the client. */
const accountOf = ({ kind }: InvoiceRow, { account }: KeptSettings): PayeeAccount | null =>
  kind === 'invoice' && account.iban !== '' ? account : null;

/** Issuing invoices and credit notes: number, frozen content, papers and what is open, all or nothing. */
export class IssuingService {
  constructor(private readonly parts: Parts) {}

  /** A draft as it would be issued now, with what has to be said of it. */
  async inHand(row: InvoiceRow, settings: KeptSettings): Promise<InvoiceInHand> {
    const { content, kind, currency } = row;
    const { country } = await this.parts.workshops.get(row.workshopId);
    const client = await this.parts.jobs.client(row.workshopId, row.clientId);
    const issuedOn = await todayIn(this.parts, row.workshopId);
    const known_minor = row.claim ? await this.parts.stages.roundingOf(row) : this.knownOf(row);
    return {
      ...{ kind, content, currency, country, issuedOn },
      ...{ seller: settings.seller, account: accountOf(row, settings) },
      worked: exactAmounts(content, currency, known_minor),
      mailsTo: mailsToOf(content.buyer, client),
      dueOn: kind === 'invoice' ? dueDay(issuedOn, content.dueOn, settings.due_days) : null,
    };
  }

  async issue(actor: Actor, id: string, version: number): Promise<InvoiceRow> {
    const { workshopId } = actor;
    await this.parts.settings.hold(workshopId);
    const row = await this.parts.invoices.lock(workshopId, id);
    mustBeDraft(row);
    if (row.version !== version) throw new Rejection('stale', 'invoice-draft-changed');
    const settings = await this.parts.settings.read(workshopId);
    const hand = await this.inHand(row, settings);
    mustBeIssuable(invoiceFindings(hand));
    const credited = await this.credited(row, hand);
    const [year] = partsOfDay(hand.issuedOn);
    const given = await this.parts.numbers.next(workshopId, row.kind, { year, settings });
    const frozen = await this.freeze(actor, row, { hand, settings, given, credited });
    await this.write(row, hand, { given, frozen });
    if (credited) await this.parts.settling.credit(credited, hand.worked.totals.due_minor);
    await this.record(actor, row, frozen);
    return this.parts.invoices.get(workshopId, id);
  }

  /** What a draft of a credit note was rounded by beyond what its own prices and cash ask for. */
  private knownOf({ creditedInvoiceId, roundingMinor, content }: InvoiceRow): number {
    const isPlain = content.pricesHold === 'net' && !content.roundsToCash;
    return creditedInvoiceId !== null && isPlain ? roundingMinor : 0;
  }

  /** The invoice a credit note corrects, held, with enough of it left. */
  private async credited(row: InvoiceRow, { worked }: InvoiceInHand): Promise<InvoiceRow | null> {
    if (row.creditedInvoiceId === null) return null;
    const invoice = await this.parts.invoices.lock(row.workshopId, row.creditedInvoiceId);
    const writtenOff_minor = await writtenOffOf(this.parts.payments, row.workshopId, invoice.id);
    mustBeLeft(invoice, writtenOff_minor, worked.totals.due_minor);
    return invoice;
  }

  private async freeze(
    actor: Actor,
    row: InvoiceRow,
    made: { hand: InvoiceInHand; settings: KeptSettings; given: GivenNumber; credited: InvoiceRow | null },
  ): Promise<FrozenInvoice> {
    const { hand, settings, given, credited } = made;
    const { content, worked } = hand;
    const job = row.jobId === null ? null : await this.parts.jobs.job(row.workshopId, row.jobId);
    return {
      ...{ snapshotVersion: 1, kind: row.kind, number: given.number, currency: row.currency, prepaid_minor: 0 },
      ...{ issuedAt: this.parts.clock.now().toISOString(), issuedOn: hand.issuedOn, issuedBy: actor.name },
      ...{ dueOn: hand.dueOn, terms: content.terms, note: content.note, closing: settings.closing },
      workshop: { ...(await workshopOnPaper(this.parts, row.workshopId)), currency: row.currency },
      ...{ seller: hand.seller, buyer: content.buyer, account: hand.account, isDeposit: row.claim?.of === 'deposit' },
      credits: credited && { number: credited.number ?? '', issuedOn: credited.issuedOn ?? '' },
      job: job && { number: jobNumber(job), title: job.title, reference: job.reference },
      ...{ deliveredOn: content.deliveredOn, period: content.period, exemptions: content.exemptions },
      ...{ lines: worked.lines, allowancesCharges: content.allowancesCharges },
      ...{ rounding_minor: worked.rounding_minor, totals: worked.totals },
    };
  }

  private async write(
    row: InvoiceRow,
    { worked, issuedOn, dueOn }: InvoiceInHand,
    { given, frozen }: { given: GivenNumber; frozen: FrozenInvoice },
  ): Promise<void> {
    const { totals } = worked;
    await this.parts.invoices.change(row.workshopId, atOf(row), {
      ...given,
      ...frozenInvoice(frozen),
      ...(await this.papers(row.workshopId, frozen)),
      ...{ state: 'issued', issuedOn, dueOn, issuedBy: frozen.issuedBy, issuedAt: new Date(frozen.issuedAt) },
      ...{ roundingMinor: worked.rounding_minor, netMinor: totals.net_minor, taxMinor: totals.tax_minor },
      ...{ grossMinor: totals.gross_minor, dueMinor: totals.due_minor },
      openMinor: row.kind === 'invoice' ? totals.due_minor : 0,
    });
  }

  /**
   * The papers as they stay: data where the currency has a place in it, and the PDF with the data inside. They bear the number, which is
   * given in this transaction, so they are set before it ends, in a thread of their own: only who moves money of this workshop waits.
   */
  private async papers(
    workshopId: string,
    frozen: FrozenInvoice,
  ): Promise<Pick<InvoiceRow, 'pdfFileId' | 'xmlFileId'>> {
    const xml = isExchangeCurrency(frozen.currency) ? ublInvoice(frozen) : null;
    const { logoFileId } = await this.parts.workshops.get(workshopId);
    const logo = logoFileId ? (await this.parts.workshops.logo(workshopId)).bytes : null;
    const pdf = await this.parts.papers.invoice(frozen, { logo, xml });
    const save = (ending: string, media: string, bytes: Buffer) =>
      this.parts.files.save(workshopId, {
        name: fileName([frozen.workshop.name, frozen.number], ending),
        media,
        bytes,
      });
    const pdfFile = await save('pdf', 'application/pdf', pdf);
    const xmlFile = xml === null ? null : await save('xml', 'application/xml', Buffer.from(xml));
    return { pdfFileId: pdfFile.id, xmlFileId: xmlFile?.id ?? null };
  }

  private async record(actor: Actor, row: InvoiceRow, { kind, number, totals }: FrozenInvoice): Promise<void> {
    await this.parts.audit.record(actor, {
      subject: { kind: 'invoice', id: row.id },
      ...(row.jobId ? { jobId: row.jobId } : {}),
      code: 'history-invoice-issued',
      values: { kind, number, due_minor: totals.due_minor },
    });
    if (row.jobId) await this.parts.jobs.touch(row.workshopId, row.jobId);
  }
}
