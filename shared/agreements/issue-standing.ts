import type { IssueState } from '#shared/estimates/issue-state';

/** Where an issue stands for its client: `open` may be accepted. */
export const issueStandings = ['open', 'accepted', 'declined', 'replaced', 'past-validity'] as const;
export type IssueStanding = (typeof issueStandings)[number];

/** Where an issue stands on a day (both days YYYY-MM-DD in the workshop's zone); it holds to the end of its last day. */
export function issueStanding(issue: { state: IssueState; validUntil: string }, today: string): IssueStanding {
  const { state, validUntil } = issue;
  if (state === 'accepted' || state === 'declined' || state === 'replaced') return state;
  return today > validUntil ? 'past-validity' : 'open';
}
