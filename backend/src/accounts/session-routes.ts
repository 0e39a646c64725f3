import {
  endOtherSessions,
  endOwnSession,
  enterWorkshop,
  listOwnSessions,
  readSession,
  signIn,
  signOut,
} from '#shared/accounts/session-endpoints';
import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';
import { mount, type Route } from '../platform/http/mount';
import type { SessionList } from '../platform/session/session-list';
import type { IdentityService } from './identity-service';
import { presentOwnSession, presentSession } from './session-presenter';

interface Parts {
  readonly identities: IdentityService;
  readonly sessions: SessionList;
  readonly clock: Clock;
}

export const sessionRoutes = ({ identities, sessions, clock }: Parts): Route[] => [
  mount(readSession, async ({ person, actor, session }) => {
    await session.keep();
    const identity = person && { accountId: person.accountId, ...(actor ? { membershipId: actor.membershipId } : {}) };
    return presentSession(session.forgeryToken, identity && (await identities.facts(identity)));
  }),
  mount(signIn, async ({ session, body }) => {
    const identity = await session.signInByPassword(body);
    if (!identity) throw new Rejection('not-allowed', 'sign-in-refused');
    return presentSession(session.forgeryToken, await identities.facts(identity));
  }),
  mount(signOut, ({ session }) => session.signOut()),
  mount(enterWorkshop, async ({ person, body, session }) => {
    const identity = await identities.entering(person.accountId, body.membershipId);
    await session.enter(identity);
    return presentSession(session.forgeryToken, await identities.facts(identity));
  }),
  mount(listOwnSessions, async ({ person, session }) => {
    const rows = await sessions.of(person.accountId, clock.now());
    return { items: rows.map((row) => presentOwnSession(row, session.id)) };
  }),
  mount(endOwnSession, async ({ person, params }) => {
    if (!(await sessions.end(person.accountId, params.id))) throw new Rejection('not-found', 'problem-not-found');
  }),
  mount(endOtherSessions, async ({ person, session }) => {
    await sessions.endOthers(person.accountId, session.id);
  }),
];
