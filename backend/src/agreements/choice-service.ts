import { createHash } from 'node:crypto';
import { choiceComplaints } from '#shared/agreements/choice-complaints';
import type { Choice } from '#shared/estimates/draft';
import type { Snapshot } from '#shared/estimates/snapshot';
import { Rejection } from '#shared/problems/rejection';
import type { FrozenIssue, FrozenIssueService, IssuedPaper } from '../estimates';

/** An issue with a choice taken: the snapshot that says so, and the paper of it with its SHA-256. */
export interface ReviewedChoice {
  readonly chosen: Snapshot;
  readonly paper: IssuedPaper;
  readonly sha256: string;
}

/** An issue with some of its alternatives: what it comes to, and its exact paper. */
export class ChoiceService {
  constructor(private readonly frozen: FrozenIssueService) {}

  /** Refused with a complaint where something is not offered, or two are of one group; alternatives stand in the issue's own order. */
  async priced(issue: FrozenIssue, choice: Choice): Promise<Snapshot> {
    const { alternatives } = issue.snapshot.draft.settings;
    const complaints = choiceComplaints(choice, alternatives);
    if (complaints.length > 0) throw new Rejection('invalid', 'problem-invalid', { complaints });
    const inOrder = alternatives.map(({ id }) => id).filter((id) => choice.includes(id));
    return this.frozen.chosen(issue, inOrder);
  }

  async reviewed(issue: FrozenIssue, choice: Choice): Promise<ReviewedChoice> {
    const chosen = await this.priced(issue, choice);
    const paper = await this.frozen.paper(issue.row, chosen);
    return { chosen, paper, sha256: createHash('sha256').update(paper.bytes).digest('hex') };
  }
}
