import { Rejection } from '#shared/problems/rejection';
import type { Database, Table } from '../platform/database/database';
import { workshopTable, type WorkshopSettingsRow } from './workshop-model';

type Change = Partial<Omit<WorkshopSettingsRow, 'id' | 'version' | 'createdAt'>>;

/** The workshops themselves. */
export class WorkshopRepository {
  private readonly table: Table<WorkshopSettingsRow>;

  constructor(database: Database) {
    this.table = workshopTable(database);
  }

  async get(workshopId: string): Promise<WorkshopSettingsRow> {
    const row = await this.table.findOne({ where: { id: workshopId }, raw: true });
    if (!row) throw new Rejection('not-found', 'problem-not-found');
    return row as unknown as WorkshopSettingsRow;
  }

  async insert(workshop: WorkshopSettingsRow): Promise<void> {
    await this.table.create(workshop);
  }

  async change(workshopId: string, version: number, change: Change): Promise<WorkshopSettingsRow> {
    const [changed] = await this.table.update(
      { ...change, version: version + 1 },
      { where: { id: workshopId, version } },
    );
    const current = await this.get(workshopId);
    if (changed === 0) throw new Rejection('stale', 'problem-stale', { detail: current });
    return current;
  }

  async isAnyFounded(): Promise<boolean> {
    return (await this.table.findOne({ attributes: ['id'], raw: true })) !== null;
  }
}
