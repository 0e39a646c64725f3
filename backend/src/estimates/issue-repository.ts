import { Op } from 'sequelize';
import type { Paper } from '#shared/estimates/issue-schema';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { issuePaperTable, issueTable, type IssuePaperRow, type IssueRow } from './issue-model';

/** What a person marks of an issue. */
export type IssueMark = Pick<IssueRow, 'state' | 'markedOn' | 'markNote'>;

/** Issues: added and read; nothing but their state with the client is ever written again. */
export class IssueRepository {
  private readonly issues: WorkshopRows<IssueRow>;
  private readonly papers: WorkshopRows<IssuePaperRow>;

  constructor(private readonly database: Database) {
    this.issues = new WorkshopRows(issueTable(database));
    this.papers = new WorkshopRows(issuePaperTable(database));
  }

  /** The newest first. */
  ofEstimate(workshopId: string, estimateId: string): Promise<IssueRow[]> {
    return this.issues.list(workshopId, { where: { estimateId }, order: [['sequence', 'DESC']] });
  }

  async newest(workshopId: string, estimateId: string, before = 1_000_000): Promise<IssueRow | undefined> {
    const where = { estimateId, sequence: { [Op.lt]: before } };
    const [row] = await this.issues.list(workshopId, { where, order: [['sequence', 'DESC']], limit: 1 });
    return row;
  }

  async isAny(workshopId: string): Promise<boolean> {
    return (await this.issues.list(workshopId, { limit: 1 })).length > 0;
  }

  get(workshopId: string, id: string): Promise<IssueRow> {
    return this.issues.get(workshopId, id);
  }

  lock(workshopId: string, id: string): Promise<IssueRow> {
    return this.issues.lock(workshopId, id);
  }

  add(workshopId: string, issue: Omit<IssueRow, 'workshopId'>): Promise<IssueRow> {
    return this.issues.insert(workshopId, issue);
  }

  async mark(workshopId: string, id: string, mark: IssueMark): Promise<IssueRow> {
    await this.issues.write(workshopId, id, mark);
    return this.get(workshopId, id);
  }

  /** Another issue takes its place, unless it has been decided at this very moment. */
  async markReplaced(workshopId: string, id: string): Promise<void> {
    await this.issues.writeWhere(workshopId, { id, state: ['issued', 'sent'] }, { state: 'replaced' });
  }

  async addPaper(workshopId: string, paper: Omit<IssuePaperRow, 'workshopId'>): Promise<void> {
    await this.papers.insert(workshopId, paper);
  }

  /** Of several estimates, the newest first. */
  ofEstimates(workshopId: string, estimateIds: readonly string[]): Promise<IssueRow[]> {
    const where = { estimateId: { [Op.in]: [...estimateIds] } };
    return this.issues.list(workshopId, { where, order: [['id', 'DESC']] });
  }

  /** Every accepted issue of a workshop, without what it froze. */
  accepted(workshopId: string): Promise<Pick<IssueRow, 'id' | 'grossMinor'>[]> {
    return this.database.select(
      `SELECT id, gross_minor AS grossMinor FROM issues WHERE workshop_id = :workshopId AND state = 'accepted'`,
      { workshopId },
    );
  }

  several(workshopId: string, ids: readonly string[]): Promise<IssueRow[]> {
    return this.issues.list(workshopId, { where: { id: { [Op.in]: [...ids] } } });
  }

  async paperFile(workshopId: string, issueId: string, paper: Paper): Promise<string | undefined> {
    const [row] = await this.papers.list(workshopId, { where: { issueId, paper }, limit: 1 });
    return row?.fileId;
  }
}
