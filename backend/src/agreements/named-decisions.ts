import { chosenNames } from '#shared/estimates/chosen-names';
import type { Snapshot } from '#shared/estimates/snapshot';
import type { FrozenIssueService } from '../estimates';
import { words } from '../platform/http/words';
import type { DecisionRow } from './decision-model';

/** What was decided, on which paper, and what the alternatives chosen are called. */
export interface NamedDecision {
  readonly row: DecisionRow;
  readonly number: string;
  readonly names: readonly string[];
}

function named(row: DecisionRow, { estimate, draft }: Snapshot): NamedDecision {
  const { number, letter } = estimate;
  const names = chosenNames(draft.settings.alternatives, row.choice);
  return { row, number: words('paper-number-letter', { number, letter }), names };
}

/** Decisions with the names of what was decided on and what was chosen, as the issues have them. */
export class NamedDecisions {
  constructor(private readonly frozen: Pick<FrozenIssueService, 'several'>) {}

  /** Of decisions of one workshop. */
  async of(rows: readonly DecisionRow[]): Promise<NamedDecision[]> {
    const [first] = rows;
    if (!first) return [];
    const issueIds = rows.map(({ issueId }) => issueId);
    const issues = await this.frozen.several(first.workshopId, issueIds);
    const snapshots = new Map(issues.map(({ row, snapshot }) => [row.id, snapshot]));
    return rows.flatMap((row) => {
      const snapshot = snapshots.get(row.issueId);
      return snapshot ? [named(row, snapshot)] : [];
    });
  }
}
