import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { decisionTable, type DecisionRow } from './decision-model';

/** What clients decided: added and read. */
export class DecisionRepository {
  private readonly rows: WorkshopRows<DecisionRow>;

  constructor(database: Database) {
    this.rows = new WorkshopRows(decisionTable(database));
  }

  get(workshopId: string, id: string): Promise<DecisionRow> {
    return this.rows.get(workshopId, id);
  }

  ofJob(workshopId: string, jobId: string): Promise<DecisionRow[]> {
    return this.rows.list(workshopId, { where: { jobId } });
  }

  async onIssue(workshopId: string, issueId: string): Promise<DecisionRow | undefined> {
    const [row] = await this.rows.list(workshopId, { where: { issueId }, limit: 1 });
    return row;
  }

  accepted(workshopId: string, issueIds: readonly string[]): Promise<DecisionRow[]> {
    return this.rows.list(workshopId, { where: { kind: 'accepted', issueId: { [Op.in]: [...issueIds] } } });
  }

  add(workshopId: string, decision: Omit<DecisionRow, 'workshopId'>): Promise<DecisionRow> {
    return this.rows.insert(workshopId, decision);
  }
}
