import { calculatorVersion } from '#shared/estimates/calculator-version';
import type { Choice } from '#shared/estimates/draft';
import type { Paper } from '#shared/estimates/issue-schema';
import type { Snapshot } from '#shared/estimates/snapshot';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { FileStore } from '../platform/files/file-store';
import type { EstimateRow } from './estimate-model';
import type { EstimateRepository } from './estimate-repository';
import { thawedSnapshot, titleOfIssue } from './frozen-snapshot';
import type { IssueRow } from './issue-model';
import type { IssueRepository } from './issue-repository';
import type { PaperFile, PaperMaker } from './paper-maker';
import type { RiskDrawing } from './risk-drawing';

interface Parts {
  readonly estimates: EstimateRepository;
  readonly issues: IssueRepository;
  readonly risks: RiskDrawing;
  readonly workshops: WorkshopService;
  readonly files: FileStore;
  readonly papers: PaperMaker;
}

/** An issue beside the estimate it was made of. */
export interface IssueOfEstimate {
  readonly row: IssueRow;
  readonly estimate: EstimateRow;
  /** What it was called when it was issued; a later name of the draft is nobody else's business. */
  readonly title: string;
}

/** An issue with all that it froze. */
export interface FrozenIssue extends IssueOfEstimate {
  readonly snapshot: Snapshot;
}

/** A paper to be sent or kept. */
export interface IssuedPaper {
  readonly name: string;
  readonly media: string;
  readonly bytes: Buffer;
}

/** Issues as they were frozen: read, priced with a choice of alternatives, and set on paper with it. */
export class FrozenIssueService {
  constructor(private readonly parts: Parts) {}

  /** All issues of a job, the newest first. */
  async ofJob(workshopId: string, jobId: string): Promise<IssueOfEstimate[]> {
    const estimates = await this.parts.estimates.ofJob(workshopId, jobId);
    const byId = new Map(estimates.map((estimate) => [estimate.id, estimate]));
    const rows = await this.parts.issues.ofEstimates(workshopId, [...byId.keys()]);
    return rows.flatMap((row) => {
      const estimate = byId.get(row.estimateId);
      return estimate ? [{ row, estimate, title: titleOfIssue(row) }] : [];
    });
  }

  /** Every accepted issue of a workshop by its id and gross amount. */
  accepted(workshopId: string): Promise<Pick<IssueRow, 'id' | 'grossMinor'>[]> {
    return this.parts.issues.accepted(workshopId);
  }

  /** Several with all they froze, asked for at once. */
  async several(workshopId: string, issueIds: readonly string[]): Promise<FrozenIssue[]> {
    if (issueIds.length === 0) return [];
    const rows = await this.parts.issues.several(workshopId, issueIds);
    const estimates = await this.parts.estimates.several(
      workshopId,
      rows.map(({ estimateId }) => estimateId),
    );
    const byId = new Map(estimates.map((estimate) => [estimate.id, estimate]));
    return rows.flatMap((row) => {
      const estimate = byId.get(row.estimateId);
      if (!estimate) return [];
      const snapshot = thawedSnapshot(row);
      return [{ row, estimate, title: snapshot.draft.settings.title, snapshot }];
    });
  }

  async read(workshopId: string, issueId: string): Promise<FrozenIssue> {
    return this.whole(await this.parts.issues.get(workshopId, issueId));
  }

  /** The same, held until the transaction ends: of many who decide at once one is first. */
  async hold(workshopId: string, issueId: string): Promise<FrozenIssue> {
    return this.whole(await this.parts.issues.lock(workshopId, issueId));
  }

  /** The snapshot with these alternatives taken, worked from nothing but what was frozen. The base is what was issued, to the letter. */
  async chosen({ snapshot }: Pick<FrozenIssue, 'snapshot'>, choice: Choice): Promise<Snapshot> {
    if (choice.length === 0) return snapshot;
    if (snapshot.calculatorVersion !== calculatorVersion) throw new Rejection('conflict', 'choice-fixed');
    return this.worked(snapshot, choice);
  }

  /** The same for work that is agreed on already: a later reckoning of it serves the bench as well. */
  async worked(snapshot: Snapshot, choice: Choice): Promise<Snapshot> {
    if (choice.length === 0) return snapshot;
    const { draft, card, workshop } = snapshot;
    const figures = await this.parts.risks.priced({ draft, card, choice, currency: workshop.currency });
    const all = [...figures.findings, ...figures.cost.findings];
    if (all.some(({ kind }) => kind === 'refuse' || kind === 'missing'))
      throw new Rejection('conflict', 'choice-not-possible');
    return { ...snapshot, choice, figures };
  }

  /** The client's paper: of the base the very one that was issued, of a choice one set from it as chosen. Equal choice, equal bytes. */
  async paper({ workshopId, id }: IssueRow, chosen: Snapshot): Promise<IssuedPaper> {
    if (chosen.choice.length > 0)
      return this.parts.papers.issuePaper(chosen, await this.logo(workshopId), 'estimate.pdf');
    const fileId = await this.parts.issues.paperFile(workshopId, id, 'estimate.pdf');
    if (!fileId) throw new Rejection('not-found', 'problem-not-found');
    return this.parts.files.read(workshopId, fileId);
  }

  /** One of its papers, set from an issue as chosen. */
  async set({ workshopId }: IssueRow, chosen: Snapshot, paper: Paper): Promise<PaperFile> {
    return this.parts.papers.issuePaper(chosen, await this.logo(workshopId), paper);
  }

  private async logo(workshopId: string): Promise<Buffer | null> {
    const { logoFileId } = await this.parts.workshops.get(workshopId);
    return logoFileId ? (await this.parts.files.read(workshopId, logoFileId)).bytes : null;
  }

  private async whole(row: IssueRow): Promise<FrozenIssue> {
    const estimate = await this.parts.estimates.get(row.workshopId, row.estimateId);
    const snapshot = thawedSnapshot(row);
    return { row, estimate, title: snapshot.draft.settings.title, snapshot };
  }
}
