import type { Role } from '#shared/actor/role';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** A person in one workshop, and what they do there. */
export interface MembershipRow extends VersionedRow {
  readonly accountId: string;
  readonly roles: readonly Role[];
  readonly disabledAt: Date | null;
  readonly createdAt: Date;
}

/** A membership with the person's name and address. */
export interface PersonRow extends MembershipRow {
  readonly name: string;
  readonly email: string;
}

export const membershipTable = (database: Database) =>
  database.table<MembershipRow>('memberships', {
    workshopId: column.workshopId,
    id: column.id,
    accountId: column.reference,
    roles: column.json,
    disabledAt: column.instant,
    version: column.whole,
    createdAt: column.instant,
  });
