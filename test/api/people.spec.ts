import { randomUUID } from 'node:crypto';
import {
  acceptInvitation,
  changeAccess,
  changeRoles,
  invite,
  listInvitations,
  listPeople,
  readInvitation,
  withdrawInvitation,
} from '#shared/accounts/people-endpoints';
import { foundByLink, askToFound, readWorkshop } from '#shared/accounts/workshop-endpoints';
import type { Role } from '#shared/actor/role';
import { listHistory } from '#shared/audit/history-endpoints';
import { password, startApi, type Api } from './start-api';
import { foundingSettings } from './test-workshop';
import { Visitor } from './visitor';

/** Who belongs to a workshop, how they come in, and that it never loses its owner. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const chosen = 'nine slow otters swim';
const lastToken = async (): Promise<string> => /#([\w-]+)/.exec((await api.mails())[0]?.text ?? '')?.[1] ?? '';

async function invited(email: string, roles: Role[] = ['estimator']): Promise<{ id: string; token: string }> {
  const body = { name: 'Ada Invited', email, roles };
  const response = await api.as('owner').call(invite, { body, key: randomUUID() });
  expect(response.status).toBe(200);
  return { id: (response.body as { id: string }).id, token: await lastToken() };
}
const newEmail = (): string => `${randomUUID()}@guests.example`;
const accept = async (token: string, entered = chosen) => {
  const visitor = await api.stranger();
  const response = await visitor.call(acceptInvitation, { body: { token, name: 'Ada Invited', password: entered } });
  return { visitor, response };
};

describe('an invitation', () => {
  test('lets somebody new in, in the roles they were invited for, once', async () => {
    const email = newEmail();
    const { token } = await invited(email);
    const read = await (await api.stranger()).call(readInvitation, { body: { token } });
    expect(read.body).toEqual({ workshopName: 'Herons Carvers', name: 'Ada Invited', email, isKnown: false });
    const { visitor, response } = await accept(token);
    expect(response.body).toMatchObject({
      signedIn: { email, membership: { roles: ['estimator'] }, workshop: { id: api.ours.id } },
    });
    expect((await visitor.call(listPeople)).status).toBe(200);
    expect((await accept(token)).response.status).toBe(410);
    const history = await api.as('owner').call(listHistory, { query: { limit: 1 } });
    expect(history.body).toMatchObject({ items: [{ code: 'history-person-joined', values: { name: 'Ada Invited' } }] });
  });

  test('asks somebody known for their own password', async () => {
    const { email } = await api.newcomer(api.theirs, 'bench');
    const { token } = await invited(email);
    expect((await (await api.stranger()).call(readInvitation, { body: { token } })).body).toMatchObject({
      isKnown: true,
    });
    expect((await accept(token, chosen)).response.status).toBe(403);
    const { response } = await accept(token, password);
    expect(response.body).toMatchObject({ signedIn: { memberships: [{}, {}], workshop: { id: api.ours.id } } });
  });

  test('ends after three days', async () => {
    const { token } = await invited(newEmail());
    const clock = 3 * 24 * 60 + 1;
    api.clock.move({ minutes: clock });
    const { status } = await (await api.stranger()).call(readInvitation, { body: { token } });
    api.clock.move({ minutes: -clock });
    expect(status).toBe(410);
  });

  test('can be taken back', async () => {
    const { id, token } = await invited(newEmail());
    expect((await api.as('owner').call(withdrawInvitation, { params: { id } })).status).toBe(204);
    expect((await accept(token)).response.status).toBe(410);
    const { body } = await api.as('owner').call(listInvitations);
    expect((body as { items: { id: string }[] }).items.map((one) => one.id)).not.toContain(id);
  });

  test('is not sent to somebody who is here already', async () => {
    const body = { name: 'Bench', email: 'bench@herons.example', roles: ['office'] };
    expect((await api.as('owner').call(invite, { body, key: randomUUID() })).status).toBe(409);
  });

  test('whose names hold line breaks is refused, so that no mail gets a header more', async () => {
    const body = { name: 'Ada\r\nBcc: all@evil.example', email: newEmail(), roles: ['office'] };
    expect((await api.as('owner').call(invite, { body, key: randomUUID() })).status).toBe(400);
  });

  test('is text, not a template', async () => {
    const body = { name: '{{7*7}} ${7*7} <%= 7*7 %> {workshop}', email: newEmail(), roles: ['office'] };
    expect((await api.as('owner').call(invite, { body, key: randomUUID() })).status).toBe(200);
    const [mail] = await api.mails();
    expect(mail?.text).toContain('{{7*7}} ${7*7} <%= 7*7 %> {workshop}');
    // The secret of the link is drawn by chance, and may have the figure in it.
    expect(mail?.text.replace(/#\S+/, '')).not.toContain('49');
  });
});

describe('the last owner', () => {
  const owner = () => api.theirs.people.owner;
  const at = () => ({ params: { id: owner().actor.membershipId }, version: 1 });

  test('keeps their role and their access', async () => {
    const { visitor } = owner();
    expect((await visitor.call(changeRoles, { ...at(), body: { roles: ['bench'] } })).status).toBe(409);
    expect((await visitor.call(changeAccess, { ...at(), body: { isDisabled: true } })).status).toBe(409);
    expect((await visitor.call(readWorkshop)).status).toBe(200);
  });

  test('is still there when two owners remove each other at the same moment', async () => {
    const other = await api.newcomer(api.theirs, 'owner');
    const results = await Promise.all([
      owner().visitor.call(changeRoles, {
        params: { id: other.actor.membershipId },
        version: 1,
        body: { roles: ['bench'] },
      }),
      other.visitor.call(changeRoles, { ...at(), body: { roles: ['bench'] } }),
    ]);
    expect(results.filter(({ status }) => status === 200)).toHaveLength(1);
    const people = await api.app.accounts.people.list(api.theirs.id);
    expect(people.filter(({ roles }) => roles.includes('owner'))).toHaveLength(1);
  });
});

test('a change from an older version is refused with what stands there now', async () => {
  const { actor } = await api.newcomer(api.ours, 'bench');
  const change = (version: number, roles: Role[]) =>
    api.as('owner').call(changeRoles, { params: { id: actor.membershipId }, version, body: { roles } });
  expect((await change(1, ['office'])).headers['etag']).toBe('"2"');
  const stale = await change(1, ['bench']);
  expect(stale.status).toBe(412);
  expect(stale.body).toMatchObject({ current: { membershipId: actor.membershipId, roles: ['office'], version: 2 } });
  const none = await api
    .as('owner')
    .call(changeRoles, { params: { id: actor.membershipId }, body: { roles: ['bench'] } });
  expect(none.status).toBe(400);
});

test('a workshop is founded by a mailed link, and its founder owns it', async () => {
  const email = newEmail();
  const workshop = { name: 'Otter Row Gilders', ...foundingSettings };
  await (await api.stranger()).call(askToFound, { body: { name: 'Otto Founder', email, workshop } });
  const token = await lastToken();
  const visitor = new Visitor(api.app.web.express);
  await visitor.arrive();
  const founded = await visitor.call(foundByLink, { body: { token, password: chosen } });
  expect(founded.body).toMatchObject({
    signedIn: { name: 'Otto Founder', membership: { roles: ['owner'] }, workshop: { name: 'Otter Row Gilders' } },
  });
  expect((await visitor.call(listPeople)).body).toMatchObject({ items: [{ email, roles: ['owner'] }] });
  expect((await (await api.stranger()).call(foundByLink, { body: { token, password: chosen } })).status).toBe(410);
});
