import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { clientAccessTable, type ClientAccessRow } from './client-access-model';

/** Ways in that clients were given. */
export class ClientAccessRepository extends WorkshopRows<ClientAccessRow> {
  constructor(database: Database) {
    super(clientAccessTable(database));
  }

  ofJob(workshopId: string, jobId: string): Promise<ClientAccessRow[]> {
    return this.list(workshopId, { where: { jobId }, order: [['id', 'DESC']], limit: 100 });
  }

  /** The access that still holds; nothing if it has ended or was taken back. */
  async holding(workshopId: string, id: string, now: Date): Promise<ClientAccessRow | undefined> {
    const where = { id, revokedAt: null, endsAt: { [Op.gt]: now } };
    const [row] = await this.list(workshopId, { where, limit: 1 });
    return row;
  }

  /** How many letters to sign in a client was sent since. */
  async signInsSince(workshopId: string, clientId: string, since: Date): Promise<number> {
    const where = { clientId, purpose: 'sign-in', createdAt: { [Op.gt]: since } };
    return (await this.list(workshopId, { where, limit: 10 })).length;
  }

  /** Links to sign in that ended before; those to the papers of a job stay, since the workshop is shown them. */
  sweepSignIns(before: Date): Promise<number> {
    return this.table.destroy({ where: { purpose: 'sign-in', endsAt: { [Op.lt]: before } } });
  }

  /** Whose secret this is, in whatever workshop; the secret alone says so, before anybody is known. */
  async byTokenHash(tokenHash: string): Promise<ClientAccessRow | undefined> {
    const row = await this.table.findOne({ where: { tokenHash }, raw: true });
    return (row as unknown as ClientAccessRow | null) ?? undefined;
  }
}
