import type { Contract, ContractPart } from '#shared/agreements/contract';
import { creditedRest } from '#shared/invoices/credited-rest';
import { takenClaims, type ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import { claimedAmounts, claimedDue, type PlannedClaim, type StageClaim } from '#shared/invoices/stage-claim';
import { uncoveredWork, type WorkSpan } from '#shared/invoices/uncovered-work';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import { D, type MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory } from '#shared/money/tax-by-category';

/**
 * What may be invoiced next of a part, and what it comes to: its lines without tax, and what falls due; below nothing where a credit note
 * gives it back. `name` is that of a planned stage, or the number of the invoice of which something credited is claimed again.
 */
export interface NextClaim {
  readonly claim: StageClaim;
  readonly name: string;
  readonly net_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
}

/** Where one part of a contract stands: what is invoiced, credited and left of it, with tax. */
export interface PartAccount {
  readonly issueId: string;
  readonly invoiced_minor: MinorUnits;
  readonly credited_minor: MinorUnits;
  readonly left_minor: MinorUnits;
  readonly next: readonly NextClaim[];
  /** Whether every claim is issued and nothing is left to invoice. */
  readonly isComplete: boolean;
}

/** Where a contract stands; the parts' figures added up. */
export interface ContractAccount {
  readonly parts: readonly PartAccount[];
  readonly gross_minor: MinorUnits;
  readonly invoiced_minor: MinorUnits;
  readonly credited_minor: MinorUnits;
  readonly left_minor: MinorUnits;
}

const claimKey = (claim: StageClaim): string =>
  claim.of === 'work' ? `work ${claim.from_percent} ${claim.to_percent}` : claim.of;

const spanOf = ({ claim }: ClaimingInvoice): WorkSpan[] =>
  claim.of === 'work' ? [{ from: new D(claim.from_percent), to: new D(claim.to_percent) }] : [];

/** Net and gross of the lines of a claim, taxed as an invoice of its own; what falls due differs by the rounding. */
function linesTotals(part: ContractPart, claim: PlannedClaim): { net_minor: MinorUnits; gross_minor: MinorUnits } {
  const { net_minor, gross_minor } = taxByCategory(
    claimedAmounts(part, claim).map(({ tax, work_minor, recovered_minor, retained_minor }) => ({
      tax,
      net_minor: work_minor - recovered_minor - retained_minor,
    })),
  );
  return { net_minor, gross_minor };
}

/**
 * What the invoice of a claim is rounded by (BT-114), in minor units: tax is worked once per category on the sum of an invoice, so it may
 * differ from the tax within the payment that was promised. The rounding stands outside the tax, and what falls due is the promise.
 */
export const claimRounding = (part: ContractPart, claim: PlannedClaim): MinorUnits =>
  safeMinor(claimedDue(part, claim) - linesTotals(part, claim).gross_minor);

interface OpenClaim {
  readonly claim: PlannedClaim;
  readonly name: string;
}

/** The stages of the plan as far as no invoice claims them; a stage that is claimed in part is left with the rest, one that comes to nothing is left out. */
function openWork(part: ContractPart, claiming: readonly ClaimingInvoice[]): OpenClaim[] {
  const reached = cumulativePercents(part.plan.stages_percent);
  const gaps = uncoveredWork(claiming.flatMap(spanOf));
  return gaps.flatMap(({ from, to }) =>
    reached.flatMap((end, place) => {
      const start = place === 0 ? new D(0) : reached[place - 1];
      const [low, high] = [D.max(from, start), D.min(to, end)];
      if (!high.greaterThan(low)) return [];
      const claim = { of: 'work', from_percent: low.toString(), to_percent: high.toString() } as const;
      if (claimedAmounts(part, claim).length === 0) return [];
      return [{ claim, name: part.stageNames[place] ?? '' }];
    }),
  );
}

/** Deposit first, then the work in its order; what was held back is released once all work is invoiced (common practice, no source). */
function openClaims(part: ContractPart, claiming: readonly ClaimingInvoice[]): OpenClaim[] {
  const taken = new Set(claiming.map(({ claim }) => claimKey(claim)));
  const isOpen = (claim: PlannedClaim) => !taken.has(claimKey(claim)) && claimedAmounts(part, claim).length > 0;
  const single = (of: 'deposit' | 'first-release' | 'second-release') =>
    [{ claim: { of } as PlannedClaim, name: '' }].filter(({ claim }) => isOpen(claim));
  const work = openWork(part, claiming);
  const releases = [...single('first-release'), ...single('second-release')];
  return [...single('deposit'), ...(work.length > 0 ? work : releases)];
}

/** What was credited of invoices that stand, to be claimed again: it belongs to the contract until a variation takes it away. */
const openAgain = (taken: readonly ClaimingInvoice[]): NextClaim[] =>
  taken.flatMap((invoice) => {
    const { due_minor, nets } = creditedRest(invoice, taken);
    if (due_minor <= 0) return [];
    const claim = { of: 'again', invoiceId: invoice.invoiceId } as const;
    const net_minor = sumMinor(nets.map((net) => net.net_minor));
    return [{ claim, name: invoice.number, net_minor, gross_minor: due_minor }];
  });

/** Where a part of a contract stands, given the invoices of the job; amounts in whole minor units. */
export function partAccount(part: ContractPart, invoices: readonly ClaimingInvoice[]): PartAccount {
  const own = invoices.filter(({ issueId }) => issueId === part.issueId);
  const issued = own.filter(({ isIssued }) => isIssued);
  const taken = takenClaims(own);
  const planned = openClaims(part, taken).map((open) => ({
    ...open,
    net_minor: linesTotals(part, open.claim).net_minor,
    gross_minor: claimedDue(part, open.claim),
  }));
  const next = [...openAgain(taken), ...planned];
  const invoiced_minor = sumMinor(issued.map((invoice) => invoice.due_minor));
  const credited_minor = sumMinor(issued.map((invoice) => invoice.credited_minor));
  const left_minor = sumMinor([part.gross_minor, -invoiced_minor, credited_minor]);
  return {
    ...{ issueId: part.issueId, invoiced_minor, credited_minor, left_minor, next },
    isComplete: next.length === 0 && left_minor === 0 && taken.every(({ isIssued }) => isIssued),
  };
}

/** Where a contract stands as a whole, given every invoice that claims something of it; whole minor units, with tax. */
export function contractAccount(contract: Contract, invoices: readonly ClaimingInvoice[]): ContractAccount {
  const parts = contract.parts.map((part) => partAccount(part, invoices));
  const sum = (pick: (part: PartAccount) => MinorUnits) => sumMinor(parts.map(pick));
  return {
    parts,
    gross_minor: contract.gross_minor,
    invoiced_minor: sum((part) => part.invoiced_minor),
    credited_minor: sum((part) => part.credited_minor),
    left_minor: sum((part) => part.left_minor),
  };
}
