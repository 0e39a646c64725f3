import type { Figures } from '#shared/estimates/figures';
import type { IssueState } from '#shared/estimates/issue-state';
import { Rejection } from '#shared/problems/rejection';
import type { IssueRow } from './issue-model';
import type { WholeEstimate } from './whole-estimate';

/** What a person said who issues, and what stands. */
export interface Issuing {
  readonly whole: WholeEstimate;
  readonly figures: Figures;
  readonly request: { readonly version: number; readonly acceptsOldCard: boolean };
  readonly cardInForceId: string;
}

/** Whether an estimate may be issued: unchanged since it was seen, on a card in force or knowingly not, nothing refused or missing. */
export function mayBeIssued({ whole, figures, request, cardInForceId }: Issuing): void {
  if (whole.estimate.version !== request.version) throw new Rejection('stale', 'issue-draft-changed');
  if (whole.members.length === 0 && whole.estimate.settings.extras.length === 0)
    throw new Rejection('conflict', 'issue-empty');
  if (whole.estimate.rateCardId !== cardInForceId && !request.acceptsOldCard)
    throw new Rejection('conflict', 'issue-card-old');
  if (whole.estimate.kind === 'estimate' && figures.price.net_minor < 0)
    throw new Rejection('conflict', 'issue-below-nothing');
  const all = [...figures.findings, ...figures.cost.findings];
  const stopping = all.filter(({ kind }) => kind === 'refuse' || kind === 'missing');
  if (stopping.length === 0) return;
  const complaints = stopping.map(({ code, values, about }) => ({ path: about ? [about] : [], code, values }));
  throw new Rejection('conflict', 'issue-refused', { complaints });
}

const decided: readonly IssueState[] = ['accepted', 'declined'];

/** Whether an issue may be marked on a day: not once decided or replaced, not before it was made, not in the future. */
export function mayBeMarked(
  issue: IssueRow,
  mark: { state: IssueState; day: string },
  days: { issued: string; today: string },
): void {
  if (issue.state === 'replaced')
    throw new Rejection('conflict', 'issue-replaced', { values: { letter: issue.letter } });
  if (decided.includes(issue.state))
    throw new Rejection('conflict', 'issue-decided', { values: { letter: issue.letter, state: issue.state } });
  const complain = (code: 'issue-day-early' | 'issue-day-late') =>
    new Rejection('invalid', 'problem-invalid', { complaints: [{ path: ['body', 'day'], code, values: {} }] });
  if (mark.day < days.issued) throw complain('issue-day-early');
  if (mark.day > days.today) throw complain('issue-day-late');
}
