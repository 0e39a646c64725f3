import type { WhereOptions } from 'sequelize';
import { Rejection } from '#shared/problems/rejection';
import type { Database, Table } from '../platform/database/database';
import { accountTable, type AccountRow } from './account-model';

/** People. They stand above the workshops, so these methods alone take no workshop. */
export class AccountRepository {
  private readonly table: Table<AccountRow>;

  constructor(database: Database) {
    this.table = accountTable(database);
  }

  byEmail(email: string): Promise<AccountRow | undefined> {
    return this.one({ email });
  }

  find(id: string): Promise<AccountRow | undefined> {
    return this.one({ id });
  }

  async get(id: string): Promise<AccountRow> {
    const account = await this.one({ id });
    if (!account) throw new Rejection('not-found', 'problem-not-found');
    return account;
  }

  async insert(account: AccountRow): Promise<AccountRow> {
    await this.table.create(account);
    return account;
  }

  async setPassword(id: string, passwordHash: string): Promise<void> {
    await this.table.update({ passwordHash }, { where: { id } });
  }

  async setName(id: string, name: string): Promise<void> {
    await this.table.update({ name }, { where: { id } });
  }

  private async one(where: WhereOptions<AccountRow>): Promise<AccountRow | undefined> {
    const row = await this.table.findOne({ where, raw: true });
    return (row as AccountRow | null) ?? undefined;
  }
}
