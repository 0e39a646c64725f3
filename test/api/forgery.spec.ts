import { changeOwnName } from '#shared/accounts/people-endpoints';
import { endOtherSessions } from '#shared/accounts/session-endpoints';
import { startApi, type Api } from './start-api';

/** Another site cannot make a browser change anything here (ASVS 3.5.1, 3.5.2; OWASP on Fetch Metadata and synchroniser tokens). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const nameOf = async (): Promise<string> => {
  const { body } = await api.as('bench').request('get', '/api/session');
  return (body as { signedIn: { name: string } }).signedIn.name;
};

const send = (headers: Record<string, string>, body: string | object = { name: 'Forged Name' }) => {
  const test = api.as('bench').request('put', changeOwnName.path).set(headers);
  return test.send(body);
};
const own = () => ({ 'x-csrf-token': api.as('bench').token });

test.each([
  ['without a token', () => ({})],
  ['with an empty token', () => ({ 'x-csrf-token': '' })],
  ['with the token of another session', () => ({ 'x-csrf-token': api.as('owner').token })],
  ['from another site', () => ({ ...own(), 'sec-fetch-site': 'cross-site' })],
  ['from a sister site', () => ({ ...own(), 'sec-fetch-site': 'same-site' })],
  ['typed into the address bar', () => ({ ...own(), 'sec-fetch-site': 'none' })],
  ['with a foreign Origin', () => ({ ...own(), origin: 'https://evil.test' })],
  ['with an Origin that says nothing', () => ({ ...own(), origin: 'null' })],
  ['with a foreign Referer', () => ({ ...own(), referer: 'https://evil.test/page' })],
])('a change %s is refused and nothing changes', async (_, headers) => {
  const response = await send(headers());
  expect(response.status).toBe(403);
  expect(response.headers['content-type']).toContain('application/problem+json');
  expect(response.headers['vary']).toMatch(/Sec-Fetch-Site/);
  expect(await nameOf()).toBe('Herons bench');
});

test.each(['text/plain', 'application/x-www-form-urlencoded', 'application/xml'])(
  'a body of %s is refused',
  async (type) => {
    const response = await send({ ...own(), 'content-type': type }, '{"name":"Forged Name"}');
    expect(response.status).toBe(403);
    expect(await nameOf()).toBe('Herons bench');
  },
);

test('our own page may change something', async () => {
  const response = await send({ ...own(), 'sec-fetch-site': 'same-origin' }, { name: 'Herons bench' });
  expect(response.status).toBe(200);
});

test('after a session has ended, a change is answered with a request to sign in, so that the page can ask for it', async () => {
  const { visitor } = await api.newcomer(api.ours, 'bench');
  api.clock.move({ minutes: 31 });
  const response = await visitor.call(changeOwnName, { body: { name: 'Herons late' } });
  api.clock.move({ minutes: -31 });
  expect(response.status).toBe(401);
});

test('a reading stays one, whatever method a header asks for instead', async () => {
  const response = await api.as('bench').request('get', endOtherSessions.path).set('x-http-method-override', 'DELETE');
  expect(response.status).toBe(200);
});
