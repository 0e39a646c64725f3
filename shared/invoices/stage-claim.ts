import type { ContractPart } from '#shared/agreements/contract';
import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { percentOf } from '#shared/money/percent-of';
import { safeMinor } from '#shared/money/safe-minor';
import type { TaxRate } from '#shared/money/tax-by-category';

/** What a plan of payment foresees: the deposit, work from one share done to another (in percent of the part), two halves of what was held back. */
export type PlannedClaim =
  | { readonly of: 'deposit' | 'first-release' | 'second-release' }
  | { readonly of: 'work'; readonly from_percent: DecimalText; readonly to_percent: DecimalText };

/** What one invoice claims of a part of a contract: something its plan foresees, or again what was credited of an invoice that stands. */
export type StageClaim = PlannedClaim | { readonly of: 'again'; readonly invoiceId: string };

/** What a claim comes to under one tax, without it: the work, less what is recovered of the deposit and what is held back. */
export interface ClaimedAmount {
  readonly tax: TaxRate;
  readonly work_minor: MinorUnits;
  readonly recovered_minor: MinorUnits;
  readonly retained_minor: MinorUnits;
}

const nothing = { work_minor: 0, recovered_minor: 0, retained_minor: 0 } as const;

/** The difference of two rounded cumulative amounts, so that claims that meet leave nothing over. */
const between = (total_minor: MinorUnits, from_percent: DecimalText, to_percent: DecimalText): MinorUnits =>
  percentOf(total_minor, to_percent) - percentOf(total_minor, from_percent);

type Part = Pick<ContractPart, 'taxes' | 'gross_minor' | 'plan'>;

function claimedOf(total_minor: MinorUnits, plan: ContractPart['plan'], claim: PlannedClaim) {
  const deposit_minor = percentOf(total_minor, String(plan.deposit_percent));
  const retention_minor = percentOf(total_minor, String(plan.retention_percent));
  const first_minor = percentOf(retention_minor, '50');
  if (claim.of === 'work') {
    const { from_percent, to_percent } = claim;
    return {
      work_minor: between(total_minor, from_percent, to_percent),
      recovered_minor: between(deposit_minor, from_percent, to_percent),
      retained_minor: between(retention_minor, from_percent, to_percent),
    };
  }
  const amounts_minor = {
    deposit: deposit_minor,
    'first-release': first_minor,
    'second-release': retention_minor - first_minor,
  };
  return { ...nothing, work_minor: amounts_minor[claim.of] };
}

/**
 * What falls due of a claim, with tax, in whole minor units: the payment as paper and review promise it, out of the gross of the part, so
 * that deposit, all work and both releases are the gross to the last minor unit.
 */
export function claimedDue({ gross_minor, plan }: Part, claim: PlannedClaim): MinorUnits {
  const { work_minor, recovered_minor, retained_minor } = claimedOf(gross_minor, plan, claim);
  return safeMinor(work_minor - recovered_minor - retained_minor);
}

function mustGoForward(claim: PlannedClaim): void {
  if (claim.of !== 'work') return;
  const [from, to] = [new D(claim.from_percent), new D(claim.to_percent)];
  if (from.lessThan(0) || to.greaterThan(100) || !to.greaterThan(from))
    throw new RangeError('work is claimed from one share done to a larger one, within 100 percent');
}

/**
 * What a claim comes to, under each tax of the part by itself, in whole minor units without tax. Deposit, all work and both releases
 * together are the part's net to the last minor unit; RangeError when work is claimed backwards or beyond 0 to 100 percent.
 */
export function claimedAmounts(part: Part, claim: PlannedClaim): ClaimedAmount[] {
  mustGoForward(claim);
  const amounts = part.taxes.map(({ tax, net_minor }) => ({ tax, ...claimedOf(net_minor, part.plan, claim) }));
  const some = amounts.filter(({ work_minor, recovered_minor, retained_minor }) =>
    [work_minor, recovered_minor, retained_minor].some((amount) => amount !== 0),
  );
  // A minor unit may fall due of a claim too small to come to anything without its tax; it has a line all the same.
  return some.length === 0 && claimedDue(part, claim) !== 0 ? amounts.slice(0, 1) : some;
}
