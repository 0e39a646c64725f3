import type { Colleague, Invitation, WorkshopPerson } from '#shared/accounts/people-schema';
import type { InvitationRow } from './invitation-model';
import type { PersonRow } from './membership-model';

export const presentColleague = (row: PersonRow): Colleague => ({
  membershipId: row.id,
  accountId: row.accountId,
  name: row.name,
  roles: [...row.roles],
  isDisabled: row.disabledAt !== null,
});

export const presentPerson = (row: PersonRow): WorkshopPerson => ({
  ...presentColleague(row),
  email: row.email,
  joinedAt: row.createdAt.toISOString(),
  version: row.version,
});

export const presentInvitation = (row: InvitationRow): Invitation => ({
  id: row.id,
  name: row.name,
  email: row.email,
  roles: [...row.roles],
  sentAt: row.createdAt.toISOString(),
  endsAt: row.endsAt.toISOString(),
});
