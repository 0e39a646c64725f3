import type { ContractPart } from '#shared/agreements/contract';
import { claimedDue, type PlannedClaim } from '#shared/invoices/stage-claim';
import { D, type MinorUnits } from '#shared/money/decimal';

type Work = Extract<PlannedClaim, { of: 'work' }>;

/** Shares of a claim are written with six decimals. */
const finest_percent = new D('0.000001');

/**
 * As much of what a variation takes away, from where a claim begins, as an invoice has room for (whole minor units): the whole claim where
 * it fits, else the largest share of it; nothing where not a minor unit fits.
 */
export function fittingClaim(
  part: Pick<ContractPart, 'taxes' | 'gross_minor' | 'plan'>,
  claim: Work,
  room_minor: MinorUnits,
): Work | undefined {
  const credited = (to: D) => -claimedDue(part, { ...claim, to_percent: to.toString() });
  const end = new D(claim.to_percent);
  if (credited(end) <= room_minor) return claim;
  const share = new D(room_minor).div(-part.gross_minor).times(100);
  let to = D.min(end, new D(claim.from_percent).plus(share)).toDecimalPlaces(6, D.ROUND_DOWN);
  while (to.greaterThan(claim.from_percent) && credited(to) > room_minor) to = to.minus(finest_percent);
  return to.greaterThan(claim.from_percent) && credited(to) > 0 ? { ...claim, to_percent: to.toString() } : undefined;
}
