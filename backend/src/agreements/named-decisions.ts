import { chosenNames } from '#shared/estimates/chosen-names';
import type { FrozenIssueService } from '../estimates';
import type { DecisionRow } from './decision-model';

/** What was decided, and what the alternatives chosen are called. */
export interface NamedDecision {
  readonly row: DecisionRow;
  readonly names: readonly string[];
}

/** Decisions with the names of what was chosen, as the issues call them. */
export class NamedDecisions {
  constructor(private readonly frozen: Pick<FrozenIssueService, 'read'>) {}

  of(rows: readonly DecisionRow[]): Promise<NamedDecision[]> {
    return Promise.all(rows.map(async (row) => ({ row, names: await this.namesOf(row) })));
  }

  private async namesOf({ workshopId, issueId, choice }: DecisionRow): Promise<string[]> {
    if (choice.length === 0) return [];
    const { snapshot } = await this.frozen.read(workshopId, issueId);
    return chosenNames(snapshot.draft.settings.alternatives, choice);
  }
}
