import { issueStanding } from '#shared/agreements/issue-standing';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { clientIssueSummarySchema } from '#shared/client-page/client-overview-schema';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { careCodes } from '#shared/documents/care-codes';
import { clientCautions } from '#shared/documents/client-cautions';
import { buildUpsUsed } from '#shared/documents/buildups-used';
import type { Figures } from '#shared/estimates/figures';
import type { Snapshot } from '#shared/estimates/snapshot';
import type { WorkshopSettingsRow } from '../accounts';
import { presentQuestion, type ClientIssueRows, type DecisionRow, type QuestionRow } from '../agreements';
import type { IssueOfEstimate } from '../estimates';
import type * as z from 'zod';
import { presentClientAlternative, presentBuildUp } from './client-alternatives-presenter';
import { presentClientLetterhead } from './client-letterhead-presenter';
import { presentClientPieces } from './client-pieces-presenter';
import { presentClientPrice } from './client-price-presenter';

/** All a client's page of an issue is made from. */
export interface ClientIssueFacts {
  readonly workshop: WorkshopSettingsRow;
  readonly issue: ClientIssueRows;
  readonly all: readonly IssueOfEstimate[];
  readonly decision: DecisionRow | undefined;
  readonly questions: readonly QuestionRow[];
  /** The figures of each alternative by itself; none where the issue was worked by an earlier reckoning. */
  readonly alternatives: ReadonlyMap<string, Figures>;
  readonly mayChoose: boolean;
  readonly today: string;
}

type Summary = z.infer<typeof clientIssueSummarySchema>;

export function presentClientSummary(
  { row, estimate, title }: IssueOfEstimate,
  at: { today: string; timeZone: string },
): Summary {
  return {
    id: row.id,
    kind: estimate.kind,
    number: estimate.number,
    letter: row.letter,
    title,
    state: issueStanding(row, at.today),
    issuedOn: dayOfInstant(row.issuedAt.getTime(), at.timeZone),
    validUntil: row.validUntil,
    gross_minor: row.grossMinor,
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

function careOf({ card, draft, figures }: Snapshot): string[] {
  const zones = draft.members.flatMap((member) => member.zones);
  return careCodes({
    systems: card.buildUps.buildUps
      .filter(({ id }) => zones.some((zone) => zone.buildUpId === id))
      .map((one) => one.system),
    metals: card.leaf.products
      .filter(({ id }) => figures.leaf.some((used) => used.productId === id))
      .map((one) => one.metal),
    isOutdoors: draft.settings.place !== 'indoors',
  });
}

/** What is written on the issue, as it is. */
function textsOf({ snapshot }: ClientIssueRows) {
  const { introduction, included, excluded, terms, presentation } = snapshot.draft.settings;
  const { note, issuedBy, client } = snapshot;
  return { introduction, included, excluded, terms, presentation, note, issuedBy, addressee: { ...client } };
}

/** Its dates; what they assume of benches, hands and hours stays with the workshop. */
function programmeOf({ programme }: Snapshot): ClientIssue['programme'] {
  if (!programme) return null;
  const { startsOn, finishesOn, offeredOn, workingDays } = programme;
  return { startsOn, finishesOn, offeredOn, workingDays };
}

function workOf({ issue: { snapshot }, alternatives, mayChoose }: ClientIssueFacts) {
  const { figures, draft, leafValidUntil } = snapshot;
  return {
    leafValidUntil: figures.leaf.length > 0 ? leafValidUntil : null,
    pieces: presentClientPieces(snapshot, alternatives),
    buildUps: buildUpsUsed(figures.zones).map(presentBuildUp),
    price: presentClientPrice(snapshot),
    alternatives: draft.settings.alternatives.map((one) =>
      presentClientAlternative(snapshot, one, alternatives.get(one.id)),
    ),
    mayChoose,
    programme: programmeOf(snapshot),
    isDrying: figures.dry.lots.some((lot) => lot.drying_minutes > 0),
    cautions: clientCautions({ findings: figures.findings, isRestoration: draft.settings.restoration }),
    care: careOf(snapshot),
  };
}

/** An issue as its client reads it; each field that leaves is named, and none of them knows what anything cost. */
export function presentClientIssue(facts: ClientIssueFacts): ClientIssue {
  const { workshop, issue, all, decision, questions, today } = facts;
  const { job, row, snapshot } = issue;
  const summary = presentClientSummary(issue, { today, timeZone: workshop.timeZone });
  const ofEstimate = all.filter(({ estimate }) => estimate.id === issue.estimate.id);
  return {
    letterhead: presentClientLetterhead(workshop),
    issue: summary,
    replacedBy: row.state === 'replaced' ? (ofEstimate[0]?.row.id ?? null) : null,
    job: { id: job.id, ...snapshot.job },
    ...textsOf(issue),
    ...workOf(facts),
    questions: questions.map(presentQuestion),
    decision: decision ? presentClientDecision(decision) : null,
  };
}
