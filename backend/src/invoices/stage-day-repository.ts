import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { stageDayTable, type StageDayRow } from './invoice-model';

/** The days stages of contracts are planned for. */
export class StageDayRepository extends WorkshopRows<StageDayRow> {
  constructor(private readonly database: Database) {
    super(stageDayTable(database));
  }

  ofIssues(workshopId: string, issueIds: readonly string[]): Promise<StageDayRow[]> {
    return this.list(workshopId, { where: { issueId: [...issueIds] } });
  }

  /** Names the day, or none. */
  async put(
    workshopId: string,
    day: Omit<StageDayRow, 'workshopId' | 'plannedOn'> & { plannedOn: string | null },
  ): Promise<void> {
    const { issueId, claimKey, plannedOn, id } = day;
    const values = { workshopId, id, issueId, claimKey, plannedOn };
    await this.database.execute(
      plannedOn === null
        ? 'DELETE FROM stage_days WHERE workshop_id = :workshopId AND issue_id = :issueId AND claim_key = :claimKey'
        : `INSERT INTO stage_days (workshop_id, id, issue_id, claim_key, planned_on)
           VALUES (:workshopId, :id, :issueId, :claimKey, :plannedOn) ON DUPLICATE KEY UPDATE planned_on = :plannedOn`,
      values,
    );
  }
}
