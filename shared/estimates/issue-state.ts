/** Where an issue stands with the client, only sent, accepted and declined are marked by hand. */
export const issueStates = ['issued', 'sent', 'accepted', 'declined', 'replaced'] as const;
export type IssueState = (typeof issueStates)[number];
