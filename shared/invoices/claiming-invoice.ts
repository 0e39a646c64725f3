import type { StageClaim } from '#shared/invoices/stage-claim';
import type { MinorUnits } from '#shared/money/decimal';
import type { TaxableAmount } from '#shared/money/tax-by-category';

/** An invoice that claims something of a part, as far as the account asks. Amounts in whole minor units, with tax. */
export interface ClaimingInvoice {
  readonly invoiceId: string;
  readonly number: string;
  readonly issueId: string;
  readonly claim: StageClaim;
  readonly isIssued: boolean;
  /** What falls due of it; below nothing of a credit note that gives back what a variation takes away. */
  readonly due_minor: MinorUnits;
  /** What credit notes took off it, but for those that give back what a variation takes away: they count with the variation. */
  readonly credited_minor: MinorUnits;
  /** What it comes to and what those credit notes took off it, under each tax and without it. */
  readonly nets: readonly TaxableAmount[];
  readonly credited: readonly TaxableAmount[];
}

/** Whether an invoice stands: one that was credited to the last minor unit does not. */
export const isStanding = ({ isIssued, due_minor, credited_minor }: ClaimingInvoice): boolean =>
  !isIssued || due_minor === 0 || due_minor !== credited_minor;

/**
 * The invoices whose claims are taken: those that stand, and those of which something credited is claimed again by one that does, since
 * otherwise the whole of it would be offered beside that. What any other claimed may be claimed anew.
 */
export function takenClaims(invoices: readonly ClaimingInvoice[]): ClaimingInvoice[] {
  const byId = new Map(invoices.map((invoice) => [invoice.invoiceId, invoice]));
  const taken = new Set<string>();
  const take = (invoice: ClaimingInvoice | undefined): void => {
    if (!invoice || taken.has(invoice.invoiceId)) return;
    taken.add(invoice.invoiceId);
    if (invoice.claim.of === 'again') take(byId.get(invoice.claim.invoiceId));
  };
  invoices.filter(isStanding).forEach(take);
  return invoices.filter(({ invoiceId }) => taken.has(invoiceId));
}
