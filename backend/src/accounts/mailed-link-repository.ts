import { Op } from 'sequelize';
import type { Database, Table } from '../platform/database/database';
import { mailedLinkTable, type LinkPurpose, type MailedLinkRow } from './mailed-link-model';

/** Links that were mailed to somebody outside any workshop; only the hash of their secret is kept. */
export class MailedLinkRepository {
  private readonly table: Table<MailedLinkRow>;

  constructor(database: Database) {
    this.table = mailedLinkTable(database);
  }

  async insert(link: MailedLinkRow): Promise<void> {
    await this.table.create(link);
  }

  countSince(purpose: LinkPurpose, about: string, since: Date): Promise<number> {
    return this.table.count({ where: { purpose, about, createdAt: { [Op.gt]: since } } });
  }

  /** Uses the link up and gives it back; nothing if it was used, has ended, or never was. */
  async use(purpose: LinkPurpose, tokenHash: string, now: Date): Promise<MailedLinkRow | undefined> {
    const where = { tokenHash, purpose, usedAt: null, endsAt: { [Op.gt]: now } };
    const [used] = await this.table.update({ usedAt: now }, { where });
    if (used === 0) return undefined;
    return (await this.table.findOne({ where: { tokenHash }, raw: true })) as unknown as MailedLinkRow;
  }

  async end(purpose: LinkPurpose, about: string, now: Date): Promise<void> {
    await this.table.update({ usedAt: now }, { where: { purpose, about, usedAt: null } });
  }

  sweep(before: Date): Promise<number> {
    return this.table.destroy({ where: { endsAt: { [Op.lt]: before } } });
  }
}
