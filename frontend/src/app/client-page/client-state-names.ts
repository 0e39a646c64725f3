import type { ClientIssue } from '#shared/client-page/client-issue-schema';

/** How it is said where an issue stands, to its client. */
export const clientStateNames: Readonly<Record<ClientIssue['issue']['state'], string>> = {
  open: $localize`waits for your answer`,
  accepted: $localize`accepted`,
  declined: $localize`declined`,
  replaced: $localize`replaced by a later issue`,
  'past-validity': $localize`no longer holds`,
};
