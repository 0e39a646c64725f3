import type { InvoiceContent } from '#shared/invoices/invoice';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import type { MinorUnits } from '#shared/money/decimal';
import { Rejection } from '#shared/problems/rejection';
import type { Finding } from '#shared/words/finding';
import type { InvoiceRow } from './invoice-model';

/** Only a draft may be changed, removed or issued. */
export function mustBeDraft({ state, number }: InvoiceRow): void {
  if (state !== 'draft') throw new Rejection('conflict', 'invoice-is-issued', { values: { number: number ?? '' } });
}

export function mustBeIssued({ state }: InvoiceRow): void {
  if (state !== 'issued') throw new Rejection('conflict', 'invoice-is-draft');
}

/** An issued invoice; a credit note is neither paid nor corrected. */
export function mustBeIssuedInvoice(row: InvoiceRow): void {
  mustBeIssued(row);
  if (row.kind === 'credit-note')
    throw new Rejection('conflict', 'payment-not-invoice', { values: { number: row.number ?? '' } });
}

const amounts = ({ id, quantity, price, baseQuantity, allowancesCharges, tax }: InvoiceLine): string =>
  JSON.stringify([id, quantity, price, baseQuantity, allowancesCharges, tax.code, tax.percent]);

/** The amounts of a stage follow the contract; only its words may be changed. */
export function mustKeepAmounts(before: InvoiceContent, after: InvoiceContent): void {
  const isKept =
    before.lines.length === after.lines.length &&
    before.lines.every((line, place) => amounts(line) === amounts(after.lines[place])) &&
    after.allowancesCharges.length === 0 &&
    !after.roundsToCash &&
    after.pricesHold === before.pricesHold &&
    after.jobId === before.jobId &&
    after.clientId === before.clientId;
  if (!isKept) throw new Rejection('conflict', 'invoice-stage-lines');
}

/** Nothing that is refused may be issued; all of it is said at once. */
export function mustBeIssuable(findings: readonly Finding[]): void {
  const stopping = findings.filter(({ kind }) => kind === 'refuse' || kind === 'missing');
  if (stopping.length === 0) return;
  const complaints = stopping.map(({ code, values }) => ({ path: [], code, values }));
  throw new Rejection('conflict', 'invoice-refused', { complaints });
}

/** A credit note never gives back more than is left of its invoice, other credit notes and write-offs counted. */
export function mustBeLeft(invoice: InvoiceRow, writtenOff_minor: MinorUnits, credit_minor: MinorUnits): void {
  const left_minor = invoice.dueMinor - invoice.creditedMinor - writtenOff_minor;
  const values = { number: invoice.number ?? '', left_minor };
  if (left_minor <= 0) throw new Rejection('conflict', 'invoice-credit-nothing', { values });
  if (credit_minor > left_minor) throw new Rejection('conflict', 'invoice-credit-over', { values });
}
