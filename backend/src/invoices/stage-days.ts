import type { ContractPart } from '#shared/agreements/contract';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { stageOfClaim } from '#shared/invoices/stage-of-claim';
import { D } from '#shared/money/decimal';
import type { StageDayRow } from './invoice-model';

/** The day a stage is planned for, and the day it was reached on. */
export type StageDays = Pick<StageDayRow, 'plannedOn' | 'reachedOn'>;

const none: StageDays = { plannedOn: null, reachedOn: null };

/** By what the days of a claim are kept: those of its stage, however much of that is left to claim. */
export function stageDayKey(part: Pick<ContractPart, 'plan'>, asked: StageClaim): string {
  const claim = stageOfClaim(part, asked);
  if (claim.of === 'again') return `again ${claim.invoiceId}`;
  if (claim.of !== 'work') return claim.of;
  return `work ${new D(claim.from_percent).toString()} ${new D(claim.to_percent).toString()}`;
}

/** Reads the days of claims out of their rows. */
export function daysOfClaims(rows: readonly StageDayRow[]) {
  const byKey = new Map(rows.map((row) => [`${row.issueId} ${row.claimKey}`, row]));
  return (part: Pick<ContractPart, 'issueId' | 'plan'>, claim: StageClaim): StageDays => {
    const { plannedOn, reachedOn } = byKey.get(`${part.issueId} ${stageDayKey(part, claim)}`) ?? none;
    return { plannedOn, reachedOn };
  };
}
