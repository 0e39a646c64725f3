import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { feedTable, type FeedRow } from './feed-model';

/** Calendars for other programs. */
export class FeedRepository extends WorkshopRows<FeedRow> {
  constructor(database: Database) {
    super(feedTable(database));
  }

  all(workshopId: string): Promise<FeedRow[]> {
    return this.list(workshopId, { order: [['id', 'DESC']], limit: 200 });
  }

  /** Whose secret this is, in whatever workshop, unless it was taken back; the secret alone says so, before anybody is known. */
  async bySecretHash(secretHash: string): Promise<FeedRow | undefined> {
    const row = await this.table.findOne({ where: { secretHash, revokedAt: null }, raw: true });
    return (row as unknown as FeedRow | null) ?? undefined;
  }
}
