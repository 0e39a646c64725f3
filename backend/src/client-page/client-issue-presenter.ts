import { issueStanding } from '#shared/agreements/issue-standing';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { clientIssueSummarySchema } from '#shared/client-page/client-overview-schema';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { WorkshopSettingsRow } from '../accounts';
import { presentQuestion, type ClientIssueRows, type DecisionRow, type QuestionRow } from '../agreements';
import type { IssueOfEstimate } from '../estimates';
import type * as z from 'zod';
import type { ClientFrozen } from './client-frozen-presenter';
import { presentClientLetterhead } from './client-letterhead-presenter';

/** All a client's page of an issue is made from. */
export interface ClientIssueFacts {
  readonly workshop: WorkshopSettingsRow;
  readonly issue: ClientIssueRows;
  readonly all: readonly IssueOfEstimate[];
  readonly decision: DecisionRow | undefined;
  readonly questions: readonly QuestionRow[];
  readonly frozen: ClientFrozen;
  readonly mayChoose: boolean;
  readonly today: string;
}

type Summary = z.infer<typeof clientIssueSummarySchema>;

/** An issue in a list; one that was accepted with what was agreed. */
export function presentClientSummary(
  { row, estimate, title }: IssueOfEstimate,
  at: { today: string; timeZone: string; decision: DecisionRow | undefined },
): Summary {
  const { decision } = at;
  return {
    id: row.id,
    kind: estimate.kind,
    number: estimate.number,
    letter: row.letter,
    title,
    state: issueStanding(row, at.today),
    issuedOn: dayOfInstant(row.issuedAt.getTime(), at.timeZone),
    validUntil: row.validUntil,
    gross_minor: decision?.kind === 'accepted' ? decision.grossMinor : row.grossMinor,
    currency: estimate.currency,
  };
}

export const presentClientDecision = (row: DecisionRow): NonNullable<ClientIssue['decision']> => ({
  kind: row.kind,
  typedName: row.typedName,
  at: row.at.toISOString(),
  choice: [...row.choice],
  reason: row.reason,
  gross_minor: row.grossMinor,
  pdfSha256: row.pdfSha256,
});

/** An issue as its client reads it; each field that leaves is named, and none of them knows what anything cost. */
export function presentClientIssue(facts: ClientIssueFacts): ClientIssue {
  const { workshop, issue, frozen, mayChoose, all, decision, questions, today } = facts;
  const { job, row, snapshot } = issue;
  const summary = presentClientSummary(issue, { today, timeZone: workshop.timeZone, decision });
  const newest = all.find(({ estimate }) => estimate.id === issue.estimate.id)?.row.id;
  return {
    letterhead: presentClientLetterhead(workshop, snapshot.workshop.currency),
    issue: summary,
    // The later one is named once it was sent.
    replacedBy: row.state === 'replaced' && newest !== undefined && newest !== row.id ? newest : null,
    job: { id: job.id, ...snapshot.job },
    ...frozen,
    mayChoose,
    questions: questions.map(presentQuestion),
    decision: decision ? presentClientDecision(decision) : null,
  };
}
