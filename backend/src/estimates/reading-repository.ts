import type { Audience } from '#shared/actor/role';
import type { Database, Table } from '../platform/database/database';
import { readingTable, type ReadingRow } from './reading-model';

/** Readings of estimates, one for each audience. */
export class ReadingRepository {
  private readonly table: Table<ReadingRow>;

  constructor(database: Database) {
    this.table = readingTable(database);
  }

  async find(workshopId: string, id: string, audience: Audience): Promise<ReadingRow | undefined> {
    const row = await this.table.findOne({ where: { workshopId, id, audience }, raw: true });
    return (row as unknown as ReadingRow | null) ?? undefined;
  }

  async forget(workshopId: string, id: string): Promise<void> {
    await this.table.destroy({ where: { workshopId, id } });
  }

  async put(workshopId: string, rows: readonly Omit<ReadingRow, 'workshopId'>[]): Promise<void> {
    const whole = rows.map((row) => ({ ...row, workshopId }));
    await this.table.bulkCreate(whole, { updateOnDuplicate: ['version', 'calculatorVersion', 'bytes'] });
  }
}
