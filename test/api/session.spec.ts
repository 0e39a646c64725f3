import { changePassword } from '#shared/accounts/password-endpoints';
import { changeAccess, changeOwnName, changeRoles, listPeople } from '#shared/accounts/people-endpoints';
import {
  endOtherSessions,
  enterWorkshop,
  listOwnSessions,
  readSession,
  signOut,
} from '#shared/accounts/session-endpoints';
import { foundAnother, readWorkshop } from '#shared/accounts/workshop-endpoints';
import { beginClientVisit } from '#shared/client-page/visits-endpoints';
import { linkTo, sampleIssue } from './sample-client-visit';
import { password, startApi, type Api, type TestPerson } from './start-api';
import { newSessionId } from '../../backend/src/platform/session/new-session-id';
import { foundingSettings } from './test-workshop';
import { Visitor } from './visitor';

/** How sessions begin and end (ASVS 7.2.3, 7.2.4, 7.3.1, 7.3.2, 7.4, 7.5.2). */
let api: Api;
let owner: TestPerson;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
beforeEach(async () => {
  owner = await api.newcomer(api.ours, 'owner');
});
afterAll(() => api.stop());

const cookieOf = (headers: Record<string, unknown>): string =>
  /bolewright=([^;]+)/.exec((headers['set-cookie'] as string[] | undefined)?.[0] ?? '')?.[1] ?? '';

const newSession = async (email: string): Promise<Visitor> => {
  const visitor = new Visitor(api.app.web.express);
  await visitor.signIn(email, password);
  return visitor;
};

describe('time', () => {
  test('after half an hour without a request the session has ended', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    api.clock.move({ minutes: 29, seconds: 59 });
    expect((await visitor.call(listPeople)).status).toBe(200);
    api.clock.move({ minutes: 30, seconds: 1 });
    expect((await visitor.call(listPeople)).status).toBe(401);
  });

  test('after twelve hours it has ended though it was used', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    for (let passed_minutes = 0; passed_minutes < 700; passed_minutes += 20) {
      api.clock.move({ minutes: 20 });
      expect((await visitor.call(listPeople)).status).toBe(200);
    }
    api.clock.move({ minutes: 20, seconds: 1 });
    expect((await visitor.call(listPeople)).status).toBe(401);
  });

  const used = async (visitor: Visitor, hours: number) => {
    for (let quarters = 0; quarters < hours * 4; quarters++) {
      api.clock.move({ minutes: 15 });
      expect((await visitor.call(listPeople)).status).toBe(200);
    }
  };

  test.each<[string, (person: TestPerson) => Promise<number>]>([
    [
      'the workshop is entered again',
      async ({ visitor, actor: { membershipId } }) =>
        (await visitor.call(enterWorkshop, { body: { membershipId } })).status,
    ],
    [
      'another workshop is founded',
      async ({ visitor }) =>
        (await visitor.call(foundAnother, { body: { name: 'Second Bench', ...foundingSettings } })).status,
    ],
    [
      'the visit of a client is begun beside it',
      async ({ visitor }) => {
        // The owner of the start has been signed out by the hours gone.
        const people = { ...api.ours.people, owner: await api.newcomer(api.ours, 'owner') };
        const workshop = { ...api.ours, people };
        const { issueId } = await sampleIssue(workshop, api);
        const { token } = await linkTo(workshop, api, issueId);
        return (await visitor.call(beginClientVisit, { body: { token } })).status;
      },
    ],
  ])('its twelve hours go on when %s', async (_, change) => {
    const person = await api.newcomer(api.ours, 'bench');
    await used(person.visitor, 11);
    expect(await change(person)).toBeLessThan(300);
    await used(person.visitor, 0.75);
    api.clock.move({ minutes: 15, seconds: 1 });
    expect((await person.visitor.call(listPeople)).status).toBe(401);
  });

  test('signing in anew gives it twelve hours again', async () => {
    const { visitor, email } = await api.newcomer(api.ours, 'bench');
    await used(visitor, 11);
    expect((await visitor.signIn(email, password)).status).toBe(200);
    await used(visitor, 2);
  });

  test('requests that no hand made do not prolong it', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    for (let count = 0; count < 3; count++) {
      api.clock.move({ minutes: 9 });
      expect((await visitor.request('get', listPeople.path).set('x-unattended', '1')).status).toBe(200);
    }
    api.clock.move({ minutes: 4 });
    expect((await visitor.call(listPeople)).status).toBe(401);
  });

  test('a stranger may take two hours over the sign-in page', async () => {
    const { email } = await api.newcomer(api.ours, 'bench');
    const [patient, late] = [await api.stranger(), await api.stranger()];
    api.clock.move({ minutes: 119 });
    expect((await patient.signIn(email, password)).status).toBe(200);
    api.clock.move({ minutes: 2 });
    expect((await late.signIn(email, password)).status).toBe(403);
  });

  test('it is marked as used at most once a minute', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    const seen = async () =>
      (await api.platform.database.select<{ at: Date }>('SELECT MAX(seen_at) AS at FROM sessions'))[0]?.at.getTime();
    const before = await seen();
    api.clock.move({ seconds: 30 });
    await visitor.call(listPeople);
    expect(await seen()).toBe(before);
    api.clock.move({ seconds: 31 });
    await visitor.call(listPeople);
    expect(await seen()).toBeGreaterThan(before ?? Infinity);
  });
});

describe('its id', () => {
  test('is new at sign-in, and the one before is dead', async () => {
    const { email } = await api.newcomer(api.ours, 'bench');
    const visitor = new Visitor(api.app.web.express);
    const before = cookieOf((await visitor.request('get', readSession.path)).headers);
    await visitor.arrive();
    const response = await visitor.signIn(email, password);
    const after = cookieOf(response.headers);
    expect(after).not.toBe(before);
    const fixed = await new Visitor(api.app.web.express)
      .request('get', listPeople.path)
      .set('cookie', `bolewright=${before}`);
    expect(fixed.status).toBe(401);
  });

  test('is 256 bits, never twice, and kept only as a hash', async () => {
    const ids = new Set<string>();
    for (let count = 0; count < 200; count++) {
      const { headers } = await new Visitor(api.app.web.express).request('get', readSession.path);
      ids.add(decodeURIComponent(cookieOf(headers)).replace(/^s:/, '').split('.')[0] ?? '');
    }
    expect(ids.size).toBe(200);
    const [id] = [...ids];
    expect(Buffer.from(id ?? '', 'base64url')).toHaveLength(32);
    const rows = await api.platform.database.select('SELECT * FROM sessions');
    expect(JSON.stringify(rows)).not.toContain(id);
  });

  test('is one of ten thousand that are all different and as long', () => {
    const ids = Array.from({ length: 10_000 }, newSessionId);
    expect(new Set(ids).size).toBe(10_000);
    expect(ids.filter((id) => Buffer.from(id, 'base64url').length !== 32)).toEqual([]);
  });

  test('is not accepted with another signature', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    const cookie = cookieOf((await visitor.signIn('x@y.example', 'wrong password here')).headers);
    expect(cookie).toBe('');
    const response = await new Visitor(api.app.web.express)
      .request('get', listPeople.path)
      .set('cookie', 'bolewright=s%3Aabc.def');
    expect(response.status).toBe(401);
  });
});

describe('its end', () => {
  test('comes with signing out', async () => {
    const { visitor } = await api.newcomer(api.ours, 'bench');
    expect((await visitor.call(signOut)).status).toBe(204);
    expect((await visitor.call(listPeople)).status).toBe(401);
  });

  test('comes with signing out though a workshop is entered at the same time', async () => {
    const { email, actor } = await api.newcomer(api.ours, 'bench');
    const body = { membershipId: actor.membershipId };
    const left = 'SELECT COUNT(*) AS count FROM sessions WHERE account_id = :accountId';
    const found: { out: number; left: number }[] = [];
    for (let round = 0; round < 20; round++) {
      const visitor = await newSession(email);
      await visitor.call(endOtherSessions);
      const calls = [() => visitor.call(enterWorkshop, { body }), () => visitor.call(signOut)];
      const together = (round % 2 ? calls : calls.toReversed()).map((call) => call().then(({ status }) => status));
      const out = (await Promise.all(together))[round % 2] ?? 0;
      const [row] = await api.platform.database.select<{ count: number }>(left, { accountId: actor.accountId });
      found.push({ out, left: Number(row?.count) });
    }
    // A sign-out that came only after the other session had taken its place is refused, and so told apart.
    const told = found.filter(({ out }) => out === 204);
    expect(told.length).toBeGreaterThan(0);
    expect(told.filter(({ left }) => left > 0)).toEqual([]);
    expect(found.filter(({ out }) => out !== 204 && out !== 401)).toEqual([]);
  });

  test('comes with the end of access, which does not touch other workshops', async () => {
    const { visitor, actor } = await api.newcomer(api.ours, 'bench');
    const end = { params: { id: actor.membershipId }, version: 1, body: { isDisabled: true } };
    expect((await owner.visitor.call(changeAccess, end)).status).toBe(200);
    expect((await visitor.call(listPeople)).status).toBe(401);
    const restore = { params: { id: actor.membershipId }, version: 2, body: { isDisabled: false } };
    expect((await owner.visitor.call(changeAccess, restore)).status).toBe(200);
  });

  test('comes to the other sessions with a new password; this one gets a new id', async () => {
    const { visitor, email } = await api.newcomer(api.ours, 'bench');
    const other = await newSession(email);
    const response = await visitor.call(changePassword, {
      body: { current: password, password: 'nine slow otters swim' },
    });
    expect(response.status).toBe(204);
    expect(cookieOf(response.headers)).not.toBe('');
    expect((await other.call(listPeople)).status).toBe(401);
    expect((await visitor.call(changeOwnName, { body: { name: 'Herons still here' } })).status).toBe(200);
  });

  test('comes to the others when their owner says so, and they are listed until then', async () => {
    const { visitor, email } = await api.newcomer(api.ours, 'bench');
    const other = await newSession(email);
    const { body } = await visitor.call(listOwnSessions);
    expect((body as { items: { isThisOne: boolean }[] }).items.map(({ isThisOne }) => isThisOne).sort()).toEqual([
      false,
      true,
    ]);
    expect((await visitor.call(endOtherSessions)).status).toBe(204);
    expect((await other.call(listPeople)).status).toBe(401);
    expect((await visitor.call(listPeople)).status).toBe(200);
  });
});

test('other roles hold from the next request on', async () => {
  const { visitor, actor } = await api.newcomer(api.ours, 'bench');
  const change = { params: { id: actor.membershipId }, version: 1, body: { roles: ['owner'] } };
  expect((await owner.visitor.call(changeRoles, change)).status).toBe(200);
  const { body } = await visitor.call(listPeople);
  expect((body as { items: object[] }).items[0]).toHaveProperty('email');
});

test('a person of two workshops sees one at a time', async () => {
  const { visitor, actor } = await api.newcomer(api.ours, 'bench');
  const founded = await visitor.call(foundAnother, { body: { name: 'Second Bench', ...foundingSettings } });
  visitor.token = (founded.body as { token: string }).token;
  expect((await visitor.call(readWorkshop)).body).toMatchObject({ name: 'Second Bench' });
  const back = await visitor.call(enterWorkshop, { body: { membershipId: actor.membershipId } });
  expect(back.body).toMatchObject({ signedIn: { workshop: { name: 'Herons Carvers' }, memberships: [{}, {}] } });
  expect((await visitor.call(readWorkshop)).body).toMatchObject({ name: 'Herons Carvers' });
});
