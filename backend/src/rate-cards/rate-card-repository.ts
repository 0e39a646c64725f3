import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { rateCardTable, type RateCardRow } from './rate-card-model';

/** The rate cards of each workshop; a card with a day is never changed again. */
export class RateCardRepository extends WorkshopRows<RateCardRow> {
  constructor(database: Database) {
    super(rateCardTable(database));
  }

  /** The card in force on a day: the latest of those that began by then. */
  async inForce(workshopId: string, day: string): Promise<RateCardRow | undefined> {
    const where = { inForceFrom: { [Op.lte]: day } };
    const [row] = await this.list(workshopId, { where, order: [['inForceFrom', 'DESC']], limit: 1 });
    return row;
  }
}
