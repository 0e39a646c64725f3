import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { shopTable, type ShopRow } from './shop-model';

/** What each workshop plans with: one row of each. */
export class ShopRepository extends WorkshopRows<ShopRow> {
  constructor(database: Database) {
    super(shopTable(database));
  }
}
