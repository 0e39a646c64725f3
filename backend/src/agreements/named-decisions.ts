import { chosenNames } from '#shared/estimates/chosen-names';
import type { FrozenIssueService } from '../estimates';
import { words } from '../platform/http/words';
import type { DecisionRow } from './decision-model';

/** What was decided, on which paper, and what the alternatives chosen are called. */
export interface NamedDecision {
  readonly row: DecisionRow;
  readonly number: string;
  readonly names: readonly string[];
}

/** Decisions with the names of what was decided on and what was chosen, as the issues have them. */
export class NamedDecisions {
  constructor(private readonly frozen: Pick<FrozenIssueService, 'read'>) {}

  of(rows: readonly DecisionRow[]): Promise<NamedDecision[]> {
    return Promise.all(rows.map((row) => this.named(row)));
  }

  private async named(row: DecisionRow): Promise<NamedDecision> {
    const { snapshot } = await this.frozen.read(row.workshopId, row.issueId);
    const { number, letter } = snapshot.estimate;
    const names = chosenNames(snapshot.draft.settings.alternatives, row.choice);
    return { row, number: words('paper-number-letter', { number, letter }), names };
  }
}
