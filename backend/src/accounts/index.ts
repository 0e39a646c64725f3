import type { Audit } from '../audit';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { SessionList } from '../platform/session/session-list';
import type { Identities } from '../platform/session/session-control';
import { AccountRepository } from './account-repository';
import { IdentityService } from './identity-service';
import { LoginThrottlePolicy } from './login-throttle-policy';
import { MembershipRepository } from './membership-repository';
import { sessionRoutes } from './session-routes';
import { WorkshopRepository } from './workshop-repository';

export interface Accounts {
  readonly identities: Identities;
  readonly routes: readonly Route[];
}

/** People, their workshops and how they sign in. */
export function openAccounts({ database, clock }: Platform, audit: Audit): Accounts {
  void audit;
  const sessions = new SessionList(database);
  const parts = {
    accounts: new AccountRepository(database),
    memberships: new MembershipRepository(database),
    workshops: new WorkshopRepository(database),
    throttle: new LoginThrottlePolicy(clock),
  };
  const identities = new IdentityService(parts);
  return { identities, routes: sessionRoutes({ identities, sessions, clock }) };
}
