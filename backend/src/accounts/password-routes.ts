import { askForReset, changePassword, resetPassword } from '#shared/accounts/password-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { IdentityService } from './identity-service';
import type { PasswordService } from './password-service';

interface Parts {
  readonly passwords: PasswordService;
  readonly identities: IdentityService;
}

export const passwordRoutes = ({ passwords, identities }: Parts): Route[] => [
  mount(changePassword, async ({ person, actor, body, session, from }) => {
    await passwords.change(person, { ...body, address: from.address });
    await session.signIn(await identities.identityOf(person.accountId, actor?.workshopId));
  }),
  mount(askForReset, ({ body }) => passwords.askForReset(body.email)),
  mount(resetPassword, ({ body }) => passwords.resetByLink(body.token, body.password)),
];
