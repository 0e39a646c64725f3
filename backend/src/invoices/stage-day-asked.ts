import type { ContractPart } from '#shared/agreements/contract';
import { mayBeReached } from '#shared/invoices/may-be-reached';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { stageOfClaim } from '#shared/invoices/stage-of-claim';
import { Rejection } from '#shared/problems/rejection';
import { plannedName } from './stage-names';

/** Which day of a stage is named, or taken back. */
export interface StageDayAsked {
  readonly issueId: string;
  readonly claim: StageClaim;
  readonly of: 'planned' | 'reached';
  readonly day: string | null;
}

/** Only what waits for something is reached, and on no day that is still to come. */
export function mustBeReachable({ gross_minor }: ContractPart, { claim, day }: StageDayAsked, today: string): void {
  if (!mayBeReached({ claim, gross_minor })) throw new Rejection('conflict', 'invoice-stage-waits-for-nothing');
  if (day === null || day <= today) return;
  const complaints = [{ path: ['body', 'day'], code: 'invoice-reached-late' as const, values: {} }];
  throw new Rejection('invalid', 'problem-invalid', { complaints });
}

function told(part: ContractPart, asked: StageClaim): { stage: string; name: string } {
  if (asked.of === 'first-release') return { stage: 'first', name: '' };
  if (asked.of === 'second-release') return { stage: 'second', name: '' };
  const claim = stageOfClaim(part, asked);
  const name = claim.of === 'work' ? plannedName(part, claim) : '';
  return name ? { stage: 'named', name } : { stage: 'whole', name: '' };
}

/** How the history tells that a stage was reached, or was not after all. */
export function reachedDeed(part: ContractPart, { claim, day }: StageDayAsked) {
  const values = told(part, claim);
  return day === null
    ? ({ code: 'history-stage-not-reached', values } as const)
    : ({ code: 'history-stage-reached', values: { ...values, day } } as const);
}
