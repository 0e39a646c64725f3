import { Op } from 'sequelize';
import { column } from '../platform/database/columns';
import type { Database, Table } from '../platform/database/database';

interface PresenceRow {
  readonly workshopId: string;
  readonly estimateId: string;
  readonly membershipId: string;
  readonly name: string;
  readonly seenAt: Date;
}

/** Who was seen at work on which estimate, and when last. */
export class PresenceRepository {
  private readonly table: Table<PresenceRow>;

  constructor(database: Database) {
    this.table = database.table<PresenceRow>('presences', {
      workshopId: column.workshopId,
      estimateId: column.id,
      membershipId: column.id,
      name: column.word,
      seenAt: column.instant,
    });
  }

  async tell(workshopId: string, presence: Omit<PresenceRow, 'workshopId'>): Promise<void> {
    await this.table.upsert({ ...presence, workshopId });
  }

  async forget(workshopId: string, estimateId: string): Promise<void> {
    await this.table.destroy({ where: { workshopId, estimateId } });
  }

  async others(workshopId: string, at: { estimateId: string; membershipId: string }, since: Date): Promise<string[]> {
    const { estimateId, membershipId } = at;
    const where = { workshopId, estimateId, membershipId: { [Op.ne]: membershipId }, seenAt: { [Op.gt]: since } };
    const rows = await this.table.findAll({ where, order: [['name', 'ASC']], raw: true });
    return (rows as unknown as PresenceRow[]).map((row) => row.name);
  }
}
