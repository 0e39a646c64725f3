import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { invitationTable, type InvitationRow } from './invitation-model';

export class InvitationRepository extends WorkshopRows<InvitationRow> {
  constructor(database: Database) {
    super(invitationTable(database));
  }

  open(workshopId: string, now: Date): Promise<InvitationRow[]> {
    return this.list(workshopId, { where: { acceptedAt: null, endsAt: { [Op.gt]: now } } });
  }

  /** By the secret of its link, held until the transaction ends: whoever holds the link need not know the workshop. */
  async lockByToken(tokenHash: string): Promise<InvitationRow | undefined> {
    const row = await this.table.findOne({ where: { tokenHash }, raw: true, lock: true });
    return (row as unknown as InvitationRow | null) ?? undefined;
  }
}
