import { chosenNames } from '#shared/estimates/chosen-names';
import type { Choice } from '#shared/estimates/draft';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import type { AgreedIssue, AgreedIssues } from './agreed-issue';
import { thawedSnapshot } from './frozen-snapshot';
import type { IssueRow } from './issue-model';
import { presentIssue } from './issue-presenter';
import type { IssueRepository } from './issue-repository';

interface Parts {
  readonly issues: IssueRepository;
  readonly agreed: AgreedIssues;
}

/** An accepted issue with the alternatives that were taken; none where the office marked it by hand. */
export interface AcceptedIssue {
  readonly row: IssueRow;
  readonly choice: Choice;
}

/** What was agreed on issues: the base, or the choice their client made. */
export class AgreedChoices {
  constructor(private readonly parts: Parts) {}

  /** The issue of an estimate that was accepted, if one was. */
  async ofEstimate(workshopId: string, estimateId: string): Promise<AcceptedIssue | undefined> {
    const rows = await this.parts.issues.ofEstimate(workshopId, estimateId);
    const row = rows.find(({ state }) => state === 'accepted');
    return row && { row, choice: await this.ofIssue(row) };
  }

  async ofIssue({ workshopId, id, state }: IssueRow): Promise<Choice> {
    if (state !== 'accepted') return [];
    return (await this.parts.agreed(workshopId, [id])).get(id)?.choice ?? [];
  }

  /** Issues as they are shown, with what was agreed where their client accepted them. */
  async shown(workshopId: string, rows: readonly IssueRow[]): Promise<PricedIssueSummary[]> {
    const accepted = rows.filter(({ state }) => state === 'accepted').map(({ id }) => id);
    const agreed = accepted.length > 0 ? await this.parts.agreed(workshopId, accepted) : new Map<string, AgreedIssue>();
    return rows.map((row) => shownWith(row, agreed.get(row.id)));
  }
}

function shownWith(row: IssueRow, agreed: AgreedIssue | undefined): PricedIssueSummary {
  if (!agreed) return presentIssue(row);
  const { choice, netMinor, taxMinor, grossMinor } = agreed;
  const names = choice.length > 0 ? chosenNames(thawedSnapshot(row).draft.settings.alternatives, choice) : [];
  const sums = { net_minor: netMinor, tax_minor: taxMinor, gross_minor: grossMinor };
  return { ...presentIssue(row), agreed: { alternatives: names, ...sums } };
}
