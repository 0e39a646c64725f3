import { randomUUID } from 'node:crypto';
import { invite, listInvitations } from '#shared/accounts/people-endpoints';
import { startApi, type Api } from './start-api';

/** A request that makes something may be sent again (draft-ietf-httpapi-idempotency-key-header-07). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const bodyFor = (email: string) => ({ name: 'Ada Invited', email, roles: ['bench'] });
const send = (key: string | undefined, email: string) =>
  api.as('owner').call(invite, { body: bodyFor(email), ...(key === undefined ? {} : { key }) });
const openInvitations = async (email: string): Promise<number> => {
  const { body } = await api.as('owner').call(listInvitations);
  return (body as { items: { email: string }[] }).items.filter((one) => one.email === email).length;
};

test('forty keys, each sent fifty times at once: forty things, and the same answer for each', async () => {
  for (let count = 0; count < 40; count++) {
    const [key, email] = [randomUUID(), `${randomUUID()}@keys.example`];
    const answers = await Promise.all(Array.from({ length: 50 }, () => send(key, email)));
    const done = answers.filter(({ status }) => status === 200);
    expect(done.length).toBeGreaterThan(0);
    expect(answers.filter(({ status }) => status !== 200 && status !== 409)).toEqual([]);
    expect(new Set(done.map(({ text }) => text)).size).toBe(1);
    const again = await send(key, email);
    expect(again.text).toBe(done[0]?.text);
    expect(await openInvitations(email)).toBe(1);
  }
}, 120_000);

test('the same key with other content is refused', async () => {
  const key = randomUUID();
  expect((await send(key, 'first@keys.example')).status).toBe(200);
  expect((await send(key, 'second@keys.example')).status).toBe(422);
  expect(await openInvitations('second@keys.example')).toBe(0);
});

test('the same key of somebody else is another key', async () => {
  const key = randomUUID();
  expect((await send(key, 'same@keys.example')).status).toBe(200);
  const theirs = await api.theirs.people.owner.visitor.call(invite, { key, body: bodyFor('same@keys.example') });
  expect(theirs.status).toBe(200);
});

test.each([undefined, '', 'short', 'x'.repeat(81), 'with spaces in the key'])('the key %j is refused', async (key) => {
  expect((await send(key, 'none@keys.example')).status).toBe(400);
});

test('a refused request leaves its key free', async () => {
  const key = randomUUID();
  expect((await send(key, 'bench@herons.example')).status).toBe(409);
  expect((await send(key, 'later@keys.example')).status).toBe(200);
});

test('a key is forgotten after a day', async () => {
  const key = randomUUID();
  expect((await send(key, 'today@keys.example')).status).toBe(200);
  api.clock.move({ minutes: 24 * 60 + 1 });
  await api.app.web.sweep();
  api.clock.move({ minutes: -(24 * 60 + 1) });
  const rows = await api.platform.database.select('SELECT key_hash FROM idempotency_keys');
  expect(rows).toEqual([]);
});
