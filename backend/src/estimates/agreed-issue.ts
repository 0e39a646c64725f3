import type { Choice } from '#shared/estimates/draft';

/** What a client took of an issue on their page, and what it comes to with that. */
export interface AgreedIssue {
  readonly choice: Choice;
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly grossMinor: number;
}

/** What was agreed on these issues, by their ids; those nobody accepted on the page are left out. A later feature supplies it. */
export type AgreedIssues = (
  workshopId: string,
  issueIds: readonly string[],
) => Promise<ReadonlyMap<string, AgreedIssue>>;
