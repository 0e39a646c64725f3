import type { OwnSession, SessionAnswer, SignedInAnswer } from '#shared/accounts/session-schema';
import type { ListedSession } from '../platform/session/session-list';
import type { AccountRow } from './account-model';
import type { OwnMembershipRow } from './membership-repository';
import type { WorkshopSettingsRow } from './workshop-model';

/** What a session is shown from. */
export interface SessionFacts {
  readonly account: AccountRow;
  readonly memberships: readonly OwnMembershipRow[];
  readonly membershipId: string | undefined;
  readonly workshop: WorkshopSettingsRow | undefined;
}

const presentMembership = ({ id, workshopName, roles }: OwnMembershipRow) => ({ id, workshopName, roles: [...roles] });

function presentWorkshopFacts(workshop: WorkshopSettingsRow) {
  const { id, name, locale, currency, lengthUnit, timeZone, paperSize, defaultTaxCategory } = workshop;
  return { id, name, locale, currency, lengthUnit, timeZone, paperSize, defaultTaxCategory };
}

function presentSignedIn({ account, memberships, membershipId, workshop }: SessionFacts): SignedInAnswer {
  const membership = memberships.find(({ id }) => id === membershipId);
  return {
    accountId: account.id,
    name: account.name,
    email: account.email,
    memberships: memberships.map(presentMembership),
    ...(membership && workshop
      ? { membership: presentMembership(membership), workshop: presentWorkshopFacts(workshop) }
      : {}),
  };
}

export const presentSession = (token: string, facts: SessionFacts | undefined): SessionAnswer => ({
  token,
  signedIn: facts ? presentSignedIn(facts) : null,
});

export const presentOwnSession = (session: ListedSession, currentId: string | undefined): OwnSession => ({
  id: session.id,
  agent: session.agent,
  startedAt: session.createdAt.toISOString(),
  seenAt: session.seenAt.toISOString(),
  isThisOne: session.id === currentId,
});
