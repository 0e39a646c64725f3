import type { ContractPart } from '#shared/agreements/contract';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { cumulativePercents } from '#shared/money/cumulative-parts';

/**
 * The claim of the whole planned stage in which a claim of work ends, in percent of the part: what is left of a stage that was claimed in
 * part keeps its day. Any other claim is its own.
 */
export function stageOfClaim({ plan }: Pick<ContractPart, 'plan'>, claim: StageClaim): StageClaim {
  if (claim.of !== 'work') return claim;
  const reached = cumulativePercents(plan.stages_percent);
  const place = reached.findIndex((end) => end.greaterThanOrEqualTo(claim.to_percent));
  if (place < 0) return claim;
  const from_percent = place === 0 ? '0' : reached[place - 1].toString();
  return { of: 'work', from_percent, to_percent: reached[place].toString() };
}
