import { Op, type WhereOptions } from 'sequelize';
import type { Database } from '../platform/database/database';
import { ListedRows, type ListOrder } from '../platform/database/listed-rows';
import { SearchWords } from '../platform/database/search-words';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import { clientTable, type ClientRow } from './client-model';

const byName: ListOrder<ClientRow> = { columns: { name: 'text', id: 'id' }, direction: 'ASC' };

export class ClientRepository extends ListedRows<ClientRow> {
  constructor(database: Database) {
    super(clientTable(database), new SearchWords(database, 'client'));
  }

  pageByName(workshopId: string, asked: PageAsked & { search: string }): Promise<Page<ClientRow>> {
    return this.pageInOrder(workshopId, { ...asked, order: byName });
  }

  /** What these clients are called, by their ids. */
  async names(workshopId: string, ids: readonly string[]): Promise<ReadonlyMap<string, string>> {
    const where: WhereOptions<ClientRow> = { workshopId, id: { [Op.in]: [...new Set(ids)] } };
    const rows = await this.table.findAll({ attributes: ['id', 'name'], where, raw: true });
    return new Map((rows as unknown as Pick<ClientRow, 'id' | 'name'>[]).map(({ id, name }) => [id, name]));
  }

  /** All who have this address, in whatever workshop: an address alone says nothing of who asks. */
  async byEmail(email: string): Promise<ClientRow[]> {
    const rows = await this.table.findAll({ where: { email }, order: [['id', 'ASC']], limit: 50, raw: true });
    return rows as unknown as ClientRow[];
  }

  async countJobs(workshopId: string, id: string, by: 1 | -1): Promise<void> {
    await this.table.increment('jobs', { by, where: { workshopId, id } });
  }

  /** Writes down the words by which the client is found. */
  writeWords(workshopId: string, { id, name, contact, email, telephone }: ClientRow): Promise<void> {
    return this.words.write(workshopId, [{ id, text: [name, contact, email, telephone].join(' ') }]);
  }

  removeWords(workshopId: string, id: string): Promise<void> {
    return this.words.remove(workshopId, [id]);
  }
}
