import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { membershipTable, type MembershipRow, type PersonRow } from './membership-model';

/** A membership with its workshop's name, for the person who chooses between theirs. */
export interface OwnMembershipRow extends MembershipRow {
  readonly workshopName: string;
}

const fields = `m.workshop_id AS workshopId, m.id, m.account_id AS accountId, m.roles, m.disabled_at AS disabledAt, m.version,
  m.created_at AS createdAt`;

export class MembershipRepository extends WorkshopRows<MembershipRow> {
  constructor(private readonly database: Database) {
    super(membershipTable(database));
  }

  people(workshopId: string): Promise<PersonRow[]> {
    return this.database.select<PersonRow>(
      `SELECT ${fields}, a.name, a.email FROM memberships m JOIN accounts a ON a.id = m.account_id
       WHERE m.workshop_id = :workshopId ORDER BY a.name, m.id`,
      { workshopId },
    );
  }

  async byAccount(workshopId: string, accountId: string): Promise<MembershipRow | undefined> {
    const [row] = await this.list(workshopId, { where: { accountId }, limit: 1 });
    return row;
  }

  /** All memberships of the workshop, held until the transaction ends: so that two owners cannot remove each other. */
  async lockAll(workshopId: string): Promise<MembershipRow[]> {
    return this.database.select<MembershipRow>(
      `SELECT ${fields} FROM memberships m WHERE m.workshop_id = :workshopId ORDER BY m.id FOR UPDATE`,
      { workshopId },
    );
  }

  /** The membership a session names, if the person still has access by it. */
  async ofIdentity(accountId: string, id: string): Promise<MembershipRow | undefined> {
    const row = await this.table.findOne({ where: { id, accountId, disabledAt: null }, raw: true });
    return (row as unknown as MembershipRow | null) ?? undefined;
  }

  /** The memberships of one person in all their workshops, where they still have access; across workshops by its nature. */
  ofPerson(accountId: string): Promise<OwnMembershipRow[]> {
    return this.database.select<OwnMembershipRow>(
      `SELECT ${fields}, w.name AS workshopName FROM memberships m JOIN workshops w ON w.id = m.workshop_id
       WHERE m.account_id = :accountId AND m.disabled_at IS NULL ORDER BY m.created_at, m.id`,
      { accountId },
    );
  }
}
