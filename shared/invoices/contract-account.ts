import type { Contract, ContractPart } from '#shared/agreements/contract';
import { claimedAmounts, claimedDue, type StageClaim } from '#shared/invoices/stage-claim';
import { uncoveredWork, type WorkSpan } from '#shared/invoices/uncovered-work';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import { D, type MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory } from '#shared/money/tax-by-category';

/** An invoice that claims something of a part, as far as the account asks. Amounts in whole minor units, with tax. */
export interface ClaimingInvoice {
  readonly invoiceId: string;
  readonly issueId: string;
  readonly claim: StageClaim;
  readonly isIssued: boolean;
  readonly due_minor: MinorUnits;
  readonly credited_minor: MinorUnits;
}

/** What may be invoiced next of a part, and what it comes to: its lines without tax, and what falls due. `name` is that of a planned stage, empty for everything else. */
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
  /** Credited of invoices that stand: what they claimed is not offered again unless the rest of them is credited too. */
  readonly creditedInPart_minor: MinorUnits;
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

/** Whether an invoice still claims: one that was credited to the last minor unit does not, what it claimed may be claimed again. */
export const isClaiming = ({ isIssued, due_minor, credited_minor }: ClaimingInvoice): boolean =>
  !isIssued || due_minor === 0 || due_minor !== credited_minor;

const claimKey = (claim: StageClaim): string =>
  claim.of === 'work' ? `work ${claim.from_percent} ${claim.to_percent}` : claim.of;

const spanOf = ({ claim }: ClaimingInvoice): WorkSpan[] =>
  claim.of === 'work' ? [{ from: new D(claim.from_percent), to: new D(claim.to_percent) }] : [];

/** Net and gross of the lines of a claim, taxed as an invoice of its own; what falls due differs by the rounding. */
function linesTotals(part: ContractPart, claim: StageClaim): { net_minor: MinorUnits; gross_minor: MinorUnits } {
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
export const claimRounding = (part: ContractPart, claim: StageClaim): MinorUnits =>
  safeMinor(claimedDue(part, claim) - linesTotals(part, claim).gross_minor);

/** The stages of the plan as far as no invoice claims them; a stage that is claimed in part is left with the rest, one that comes to nothing is left out. */
function openWork(part: ContractPart, claiming: readonly ClaimingInvoice[]): { claim: StageClaim; name: string }[] {
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
function openClaims(part: ContractPart, claiming: readonly ClaimingInvoice[]): { claim: StageClaim; name: string }[] {
  const taken = new Set(claiming.map(({ claim }) => claimKey(claim)));
  const isOpen = (claim: StageClaim) => !taken.has(claimKey(claim)) && claimedAmounts(part, claim).length > 0;
  const single = (of: 'deposit' | 'first-release' | 'second-release') =>
    [{ claim: { of } as StageClaim, name: '' }].filter(({ claim }) => isOpen(claim));
  const work = openWork(part, claiming);
  const releases = [...single('first-release'), ...single('second-release')];
  return [...single('deposit'), ...(work.length > 0 ? work : releases)];
}

/** Where a part of a contract stands, given the invoices of the job; amounts in whole minor units. */
export function partAccount(part: ContractPart, invoices: readonly ClaimingInvoice[]): PartAccount {
  const own = invoices.filter(({ issueId }) => issueId === part.issueId);
  const issued = own.filter(({ isIssued }) => isIssued);
  const claiming = own.filter(isClaiming);
  const next = openClaims(part, claiming).map((open) => ({
    ...open,
    net_minor: linesTotals(part, open.claim).net_minor,
    gross_minor: claimedDue(part, open.claim),
  }));
  const invoiced_minor = sumMinor(issued.map((invoice) => invoice.due_minor));
  const credited_minor = sumMinor(issued.map((invoice) => invoice.credited_minor));
  const left_minor = sumMinor([part.gross_minor, -invoiced_minor, credited_minor]);
  return {
    ...{ issueId: part.issueId, invoiced_minor, credited_minor, left_minor, next },
    creditedInPart_minor: sumMinor(claiming.map((invoice) => invoice.credited_minor)),
    isComplete: next.length === 0 && left_minor === 0 && claiming.every(({ isIssued }) => isIssued),
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
