import { issueStanding } from '#shared/agreements/issue-standing';
import { formatDay } from '#shared/calendar/format-day';
import { Rejection } from '#shared/problems/rejection';
import type { IssueOfEstimate } from '../estimates';

/** An issue somebody wants to decide, beside all issues of its job, on a day of the workshop's zone. */
export interface Deciding {
  readonly issue: IssueOfEstimate;
  readonly all: readonly IssueOfEstimate[];
  readonly today: string;
  /** How the workshop writes its days. */
  readonly locale: string;
}

/** Whether an issue may still be declined: neither replaced nor decided. */
export function mayBeDeclined({ issue: { row }, today }: Deciding): void {
  const standing = issueStanding(row, today);
  if (standing === 'replaced') throw new Rejection('conflict', 'decision-replaced');
  if (standing === 'accepted' || standing === 'declined')
    throw new Rejection('conflict', 'decision-made', { values: { state: standing } });
}

/** Whether an issue may still be accepted: besides, on a day it holds, and no other issue of its estimate accepted before. */
export function mayBeAccepted(deciding: Deciding): void {
  mayBeDeclined(deciding);
  const { issue, all, today, locale } = deciding;
  const others = all.filter(({ estimate, row }) => estimate.id === issue.estimate.id && row.id !== issue.row.id);
  if (others.some(({ row }) => row.state === 'accepted')) throw new Rejection('conflict', 'decision-another-accepted');
  if (issueStanding(issue.row, today) !== 'past-validity') return;
  const day = formatDay(issue.row.validUntil, locale);
  throw new Rejection('conflict', 'decision-past-validity', { values: { day } });
}
