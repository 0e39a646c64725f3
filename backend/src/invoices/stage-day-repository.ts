import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { stageDayTable, type StageDayRow } from './invoice-model';

/** The days stages of contracts are planned for and were reached on. */
export class StageDayRepository extends WorkshopRows<StageDayRow> {
  constructor(private readonly database: Database) {
    super(stageDayTable(database));
  }

  ofIssues(workshopId: string, issueIds: readonly string[]): Promise<StageDayRow[]> {
    return this.list(workshopId, { where: { issueId: [...issueIds] } });
  }

  /** Keeps the days of a stage; none where it has neither. */
  async put(workshopId: string, day: Omit<StageDayRow, 'workshopId'>): Promise<void> {
    const { issueId, claimKey, plannedOn, reachedOn, id } = day;
    const values = { workshopId, id, issueId, claimKey, plannedOn, reachedOn };
    await this.database.execute(
      plannedOn === null && reachedOn === null
        ? 'DELETE FROM stage_days WHERE workshop_id = :workshopId AND issue_id = :issueId AND claim_key = :claimKey'
        : `INSERT INTO stage_days (workshop_id, id, issue_id, claim_key, planned_on, reached_on)
           VALUES (:workshopId, :id, :issueId, :claimKey, :plannedOn, :reachedOn)
           ON DUPLICATE KEY UPDATE planned_on = :plannedOn, reached_on = :reachedOn`,
      values,
    );
  }
}
