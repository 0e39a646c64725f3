import type { Shop } from '#shared/programme/shop';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** What a workshop entered of itself to be planned with; the id is the workshop's. */
export interface ShopRow extends VersionedRow {
  readonly content: Shop;
  readonly changedAt: Date;
}

export const shopTable = (database: Database) =>
  database.table<ShopRow>('shops', {
    workshopId: column.workshopId,
    id: column.id,
    version: column.whole,
    content: column.json,
    changedAt: column.instant,
  });
