import {
  acceptInvitation,
  changeAccess,
  changeOwnName,
  changeRoles,
  invite,
  listInvitations,
  listPeople,
  readInvitation,
  withdrawInvitation,
} from '#shared/accounts/people-endpoints';
import { audienceOf } from '#shared/actor/role';
import { mount, type Route } from '../platform/http/mount';
import type { IdentityService } from './identity-service';
import type { InvitationService } from './invitation-service';
import { presentColleague, presentInvitation, presentPerson } from './people-presenter';
import type { PeopleService } from './people-service';
import { presentSession } from './session-presenter';

interface Parts {
  readonly people: PeopleService;
  readonly invitations: InvitationService;
  readonly identities: IdentityService;
}

export const peopleRoutes = ({ people, invitations, identities }: Parts): Route[] => [
  mount(listPeople, async ({ actor }) => {
    const rows = await people.list(actor.workshopId);
    return { items: rows.map(audienceOf(actor.roles) === 'cost' ? presentPerson : presentColleague) };
  }),
  mount(
    changeRoles,
    async ({ actor, params, version, body }) =>
      presentPerson(await people.changeRoles(actor, { id: params.id, version }, body.roles)),
    presentPerson,
  ),
  mount(
    changeAccess,
    async ({ actor, params, version, body }) =>
      presentPerson(await people.changeAccess(actor, { id: params.id, version }, body.isDisabled)),
    presentPerson,
  ),
  mount(changeOwnName, async ({ person, actor, body, session }) => {
    await people.changeOwnName(person.accountId, body.name);
    const identity = await identities.identityOf(person.accountId, actor?.workshopId);
    return presentSession(session.forgeryToken, await identities.facts(identity));
  }),
  mount(listInvitations, async ({ actor }) => ({
    items: (await invitations.open(actor.workshopId)).map(presentInvitation),
  })),
  mount(invite, async ({ actor, body }) => presentInvitation(await invitations.invite(actor, body))),
  mount(withdrawInvitation, ({ actor, params }) => invitations.withdraw(actor, params.id)),
  mount(readInvitation, ({ body }) => invitations.read(body.token)),
  mount(acceptInvitation, async ({ body, session, from }) => {
    const identity = await invitations.accept({ ...body, address: from.address });
    await session.signIn(identity);
    return presentSession(session.forgeryToken, await identities.facts(identity));
  }),
];
