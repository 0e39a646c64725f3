import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { markTable, type MarkRow } from './mark-model';

/** Where tasks stand. */
export class MarkRepository extends WorkshopRows<MarkRow> {
  constructor(database: Database) {
    super(markTable(database));
  }

  ofProgramme(workshopId: string, programmeId: string): Promise<MarkRow[]> {
    return this.list(workshopId, { where: { programmeId } });
  }

  ofProgrammes(workshopId: string, programmeIds: readonly string[]): Promise<MarkRow[]> {
    if (programmeIds.length === 0) return Promise.resolve([]);
    return this.list(workshopId, { where: { programmeId: { [Op.in]: [...programmeIds] } } });
  }

  async ofTask(workshopId: string, at: { programmeId: string; taskId: string }): Promise<MarkRow | undefined> {
    const [row] = await this.list(workshopId, { where: { ...at }, limit: 1 });
    return row;
  }
}
