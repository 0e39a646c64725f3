import type { Actor } from '#shared/actor/actor';
import { audienceOf } from '#shared/actor/role';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Paper } from '#shared/estimates/issue-schema';
import { Rejection } from '#shared/problems/rejection';
import { jobNumber } from '../jobs';
import type { FileStore } from '../platform/files/file-store';
import { FileAnswer } from '../platform/http/answer';
import type { AgreedChoices } from './agreed-choices';
import type { EstimateParts, EstimateService } from './estimate-service';
import type { FrozenIssueService } from './frozen-issue-service';
import { thawedSnapshot } from './frozen-snapshot';
import type { IssueRow } from './issue-model';
import type { IssueRepository } from './issue-repository';
import type { BenchSheetRequest, PaperMaker } from './paper-maker';
import { snapshotWorkshop } from './snapshot-of';

interface Parts extends Pick<EstimateParts, 'cards' | 'jobs' | 'workshops' | 'clock'> {
  readonly drafts: EstimateService;
  readonly issues: IssueRepository;
  readonly files: FileStore;
  readonly papers: PaperMaker;
  readonly frozen: FrozenIssueService;
  readonly choices: AgreedChoices;
}

const orders: readonly Paper[] = ['leaf-order.pdf', 'leaf-order.csv'];

/** What a bench sheet is made from: the draft, or what was agreed. */
type BenchWork = Pick<BenchSheetRequest, 'draft' | 'figures'>;

/** Papers to be read: those of issues, and the sheets for the bench. */
export class PaperService {
  constructor(private readonly parts: Parts) {}

  /**
   * A paper as it was kept; the workbook holds rates and margin, so it is for those who see cost. The leaf order of an issue whose client
   * took alternatives is made for these: leaf is bought for what was agreed.
   */
  async paper(actor: Actor, issueId: string, paper: Paper): Promise<FileAnswer> {
    const { workshopId } = actor;
    if (paper === 'estimate.xlsx' && audienceOf(actor.roles) !== 'cost')
      throw new Rejection('not-allowed', 'problem-not-allowed');
    const row = await this.parts.issues.get(workshopId, issueId);
    const agreed = orders.includes(paper) ? await this.agreedOrder(row, paper) : undefined;
    if (agreed) return agreed;
    const fileId = await this.parts.issues.paperFile(workshopId, issueId, paper);
    if (!fileId) throw new Rejection('not-found', 'problem-not-found');
    const { bytes, name, media } = await this.parts.files.read(workshopId, fileId);
    return new FileAnswer(bytes, { name, media });
  }

  /** What was agreed once an issue is accepted, and the draft as it stands until then, or of a piece that came later. */
  async benchSheet(workshopId: string, estimateId: string, pieceId: string): Promise<FileAnswer> {
    const { drafts, workshops, papers, clock, cards } = this.parts;
    const whole = await drafts.whole(workshopId, estimateId);
    const agreed = await this.agreedWork(workshopId, estimateId);
    const isAgreed = agreed?.draft.pieces.some(({ id }) => id === pieceId) ?? false;
    const work = agreed && isAgreed ? agreed : { draft: drafts.draft(whole), figures: await drafts.figures(whole) };
    const piece = work.draft.pieces.find(({ id }) => id === pieceId);
    if (!piece) throw new Rejection('not-found', 'problem-not-found');
    const row = await this.parts.jobs.job(workshopId, whole.estimate.jobId);
    const job = { ...row, number: jobNumber(row) };
    const workshop = snapshotWorkshop(await workshops.get(workshopId));
    const made = { madeAt: clock.now().toISOString(), madeOn: await cards.today(workshopId) };
    const bytes = await papers.benchSheet({ workshop, job, pieceId, ...work, ...made });
    return new FileAnswer(bytes, { name: `${job.number} ${piece.name}.pdf`, media: 'application/pdf' });
  }

  private async agreedWork(workshopId: string, estimateId: string): Promise<BenchWork | undefined> {
    const accepted = await this.parts.choices.ofEstimate(workshopId, estimateId);
    if (!accepted) return undefined;
    const { row, choice } = accepted;
    const { draft, figures } = await this.parts.frozen.worked(thawedSnapshot(row), choice);
    return { draft: chosenDraft(draft, choice), figures };
  }

  private async agreedOrder(row: IssueRow, paper: Paper): Promise<FileAnswer | undefined> {
    const choice = await this.parts.choices.ofIssue(row);
    if (choice.length === 0) return undefined;
    const chosen = await this.parts.frozen.worked(thawedSnapshot(row), choice);
    const { bytes, name, media } = await this.parts.frozen.set(row, chosen, paper);
    return new FileAnswer(bytes, { name, media });
  }
}
