import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { questionTable, type QuestionRow } from './question-model';

const mostShown = 500;

/** What clients asked and what was answered. */
export class QuestionRepository extends WorkshopRows<QuestionRow> {
  constructor(database: Database) {
    super(questionTable(database));
  }

  /** In order of time; of a very long thread the newest. */
  async ofJob(workshopId: string, jobId: string): Promise<QuestionRow[]> {
    const rows = await this.list(workshopId, { where: { jobId }, order: [['id', 'DESC']], limit: mostShown });
    return rows.reverse();
  }
}
