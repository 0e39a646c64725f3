import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { estimateTable, type EstimateRow } from './estimate-model';

/** The estimates of each workshop. */
export class EstimateRepository extends WorkshopRows<EstimateRow> {
  constructor(database: Database) {
    super(estimateTable(database));
  }

  ofJob(workshopId: string, jobId: string): Promise<EstimateRow[]> {
    return this.list(workshopId, { where: { jobId } });
  }

  several(workshopId: string, ids: readonly string[]): Promise<EstimateRow[]> {
    return this.list(workshopId, { where: { id: { [Op.in]: [...ids] } } });
  }
}
