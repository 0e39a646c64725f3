import type { Role } from '#shared/actor/role';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

export interface InvitationRow extends WorkshopRow {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly tokenHash: string;
  readonly endsAt: Date;
  readonly acceptedAt: Date | null;
  readonly createdAt: Date;
}

export const invitationTable = (database: Database) =>
  database.table<InvitationRow>('invitations', {
    workshopId: column.workshopId,
    id: column.id,
    name: column.word,
    email: column.word,
    roles: column.json,
    tokenHash: column.hash,
    endsAt: column.instant,
    acceptedAt: column.instant,
    createdAt: column.instant,
  });
