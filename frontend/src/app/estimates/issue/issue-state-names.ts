import type { IssueState } from '#shared/estimates/issue-state';

/** Where an issue stands with the client. */
export const issueStateNames: Readonly<Record<IssueState, string>> = {
  issued: $localize`issued`,
  sent: $localize`sent`,
  accepted: $localize`accepted`,
  declined: $localize`declined`,
  replaced: $localize`replaced`,
};
