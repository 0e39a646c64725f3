import type { Audit } from '../audit';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import type { Identities } from '../platform/session/session-control';
import { SessionList } from '../platform/session/session-list';
import { AccountRepository } from './account-repository';
import { FoundationService } from './foundation-service';
import { IdentityService } from './identity-service';
import { InvitationRepository } from './invitation-repository';
import { InvitationService } from './invitation-service';
import { Letters } from './letters';
import { LoginAttemptRepository } from './login-attempt-repository';
import { LoginThrottleService } from './login-throttle-service';
import { MailedLinkRepository } from './mailed-link-repository';
import { MailedLinks } from './mailed-links';
import { MembershipRepository } from './membership-repository';
import { NewcomerService } from './newcomer-service';
import { passwordRoutes } from './password-routes';
import { PasswordService } from './password-service';
import { peopleRoutes } from './people-routes';
import { PeopleService } from './people-service';
import { sessionRoutes } from './session-routes';
import { WorkshopRepository } from './workshop-repository';
import { workshopRoutes } from './workshop-routes';
import { WorkshopService } from './workshop-service';

export { hashOfToken, newToken } from './new-token';
export type { WorkshopSettingsRow } from './workshop-model';
export type { WorkshopService } from './workshop-service';

/** What other features and the start data may ask of this one. */
export interface Accounts {
  readonly identities: Identities;
  /** Holds off guessing: of passwords, and of clients' links. */
  readonly throttle: LoginThrottleService;
  readonly workshops: WorkshopService;
  readonly people: PeopleService;
  readonly newcomers: NewcomerService;
  readonly isAnyFounded: () => Promise<boolean>;
  readonly sweep: () => Promise<void>;
  readonly routes: readonly Route[];
}

function openRepositories({ database }: Platform) {
  return {
    accounts: new AccountRepository(database),
    memberships: new MembershipRepository(database),
    workshopRows: new WorkshopRepository(database),
    invitationRows: new InvitationRepository(database),
    sessions: new SessionList(database),
  };
}

const openThrottle = ({ database, clock }: Platform) =>
  new LoginThrottleService(new LoginAttemptRepository(database), clock);

/** People, their workshops, and how they sign in. */
export function openAccounts(platform: Platform, audit: Audit): Accounts {
  const repositories = openRepositories(platform);
  const { accounts, memberships, workshopRows } = repositories;
  const throttle = openThrottle(platform);
  const links = new MailedLinks(new MailedLinkRepository(platform.database), platform.clock);
  const base = {
    ...platform,
    ...repositories,
    ...{ audit: audit.service, throttle, links },
    letters: new Letters(platform.config),
  };
  const identities = new IdentityService({ accounts, memberships, workshops: workshopRows, throttle });
  const workshops = new WorkshopService({ ...base, workshops: workshopRows });
  const newcomers = new NewcomerService(base);
  const foundations = new FoundationService({ ...base, identities, workshops, newcomers });
  const invitations = new InvitationService({
    ...base,
    invitations: repositories.invitationRows,
    workshops,
    newcomers,
  });
  const passwords = new PasswordService(base);
  const people = new PeopleService(base);
  return {
    identities,
    throttle,
    workshops,
    people,
    newcomers,
    isAnyFounded: () => workshopRows.isAnyFounded(),
    sweep: async () => void (await Promise.all([links.sweep(), throttle.sweep()])),
    routes: [
      ...sessionRoutes({ ...base, identities }),
      ...passwordRoutes({ passwords, identities }),
      ...workshopRoutes({ foundations, workshops, identities }),
      ...peopleRoutes({ people, invitations, identities }),
    ],
  };
}
