import { connect, type AddressInfo } from 'node:net';
import { createServer, type Server } from 'node:http';
import { listPeople } from '#shared/accounts/people-endpoints';
import { changeOwnName } from '#shared/accounts/people-endpoints';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { startApi, type Api } from './start-api';

/** Too much, too often, and not quite HTTP (ASVS 2.4.1, 4.2.1, 1.5.2, 15.3.5 to 15.3.7). */
let api: Api;
let server: Server;
beforeAll(async () => {
  api = await startApi({ REQUESTS_PER_MINUTE: '120' });
  server = createServer(api.app.web.express);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
}, 60_000);
afterAll(async () => {
  await new Promise((resolve) => server.close(resolve));
  await api.stop();
});

test('somebody who asks too often is told to wait, and nobody else is', async () => {
  const statuses: number[] = [];
  for (let count = 0; count < 140; count++) statuses.push((await api.as('estimator').call(listPeople)).status);
  expect(statuses.slice(0, 100)).not.toContain(429);
  const refused = await api.as('estimator').call(listPeople);
  expect(refused.status).toBe(429);
  expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
  expect(refused.body).toMatchObject({ title: expect.stringContaining('Please wait') as string, status: 429 });
  expect((await api.as('owner').call(listPeople)).status).toBe(200);
});

const raw = (text: string): Promise<string> =>
  new Promise((resolve) => {
    const socket = connect((server.address() as AddressInfo).port, '127.0.0.1');
    let answer = '';
    socket.on('data', (part: Buffer) => (answer += part.toString()));
    socket.on('close', () => resolve(answer)).on('error', () => resolve(answer));
    socket.write(text);
    setTimeout(() => socket.destroy(), 2_000).unref();
  });

test.each([
  [
    'a length and chunks at once',
    'POST /api/session HTTP/1.1\r\nHost: x\r\nContent-Length: 4\r\nTransfer-Encoding: chunked\r\n\r\n0\r\n\r\nGET / HTTP/1.1\r\nHost: x\r\n\r\n',
  ],
  ['two lengths', 'POST /api/session HTTP/1.1\r\nHost: x\r\nContent-Length: 4\r\nContent-Length: 5\r\n\r\nabcd'],
  [
    'a chunk of no size',
    'POST /api/session HTTP/1.1\r\nHost: x\r\nTransfer-Encoding: chunked\r\n\r\nZZ\r\nabc\r\n0\r\n\r\n',
  ],
  ['a header of 100 kB', `GET / HTTP/1.1\r\nHost: x\r\nX-Long: ${'a'.repeat(100_000)}\r\n\r\n`],
])('a request with %s is refused and its connection closed', async (_, text) => {
  const answer = await raw(text);
  expect(answer).toMatch(/^HTTP\/1\.1 4\d\d /);
  expect(answer.match(/HTTP\/1\.1 2\d\d/g)).toBeNull();
});

const put = (body: string | Buffer, headers: Record<string, string> = {}) =>
  api
    .as('bench')
    .request('put', changeOwnName.path)
    .set({ 'content-type': 'application/json', 'x-csrf-token': api.as('bench').token, ...headers })
    .send(body);

test.each([
  ['not JSON', '{"name": ', 400],
  ['a list', '["name"]', 400],
  ['a text', '"name"', 400],
  ['nothing', '', 400],
  ['over two megabytes', JSON.stringify({ name: 'x'.repeat(2_100_000) }), 413],
  ['a prototype', '{"name":"Herons bench","__proto__":{"isAdmin":true}}', 400],
  ['a constructor', '{"name":"Herons bench","constructor":{"prototype":{"isAdmin":true}}}', 400],
  ['another person’s id', '{"name":"Herons bench","accountId":"00000000-0000-4000-8000-000000000000"}', 400],
  ['roles', '{"name":"Herons bench","roles":["owner"]}', 400],
])('a body that is or holds %s is refused', async (_, body, status) => {
  const response = await put(body);
  expect(response.status).toBe(status);
  expect(response.headers['content-type']).toContain('application/problem+json');
  expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined();
});

test.each([110_000, 190_000])('a body of %i entries nobody asked for is refused in a few words', async (count) => {
  const surplus = Array.from({ length: count }, (_, at) => `"${at.toString(36)}":1`);
  const response = await put(`{${surplus.join(',')}}`);
  expect(response.status).toBe(400);
  expect(response.text.length).toBeLessThan(20_000);
  expect((response.body as { errors: unknown[] }).errors).toContainEqual({
    path: [],
    message: `${(count - 99).toLocaleString('en')} more entries need another look.`,
  });
});

test('a body of more wrong entries than can be listed is refused', async () => {
  const typed = Object.fromEntries(Array.from({ length: 150_000 }, (_, at) => [at.toString(36), 1]));
  const params = { estimateId: '00000000-0000-4000-8000-000000000000' };
  const member = { kind: 'member', id: params.estimateId, version: 1, content: { typed } };
  const response = await api.as('owner').call(changeEstimate, { params, body: { changes: [member] } });
  expect(response.status).toBe(400);
  expect(response.text.length).toBeLessThan(20_000);
});

test.each([
  ['a text', '{"name":"a\\ud800b"}', ['name']],
  ['a name nobody asked for', '{"name":"Herons bench","a\\udc00":1}', ['a\udc00']],
  ['a text nobody asked for', '{"name":"Herons bench","more":{"deep":["\\ud83d"]}}', ['more', 'deep', 0]],
])('half a pair of surrogates in %s is refused where it stands', async (_, body, path) => {
  const response = await put(body);
  expect(response.status).toBe(400);
  const { errors } = response.body as { errors: { path: unknown[] }[] };
  expect(errors.filter((one) => JSON.stringify(one.path) === JSON.stringify(path))).toHaveLength(1);
});

test('a body nested as deep as it is long is refused', async () => {
  const response = await put(`{"name":${'['.repeat(900_000)}${']'.repeat(900_000)}}`);
  expect(response.status).toBe(400);
});

test('a body in an encoding we do not read is refused', async () => {
  expect((await put('{"name":"Herons bench"}', { 'content-encoding': 'compress' })).status).toBe(415);
  expect((await put('{"name":"Herons bench"}', { 'content-type': 'application/json; charset=latin1' })).status).toBe(
    415,
  );
});

test.each(['?limit=1&limit=2', '?limit[]=1', '?limit[$gt]=1', '?unknown=1', '?limit=1e308', '?limit=-1', '?limit=NaN'])(
  'a query of %s is refused',
  async (query) => {
    const response = await api.as('office').request('get', `/api/history${query}`);
    expect(response.status).toBe(400);
  },
);

test.each(["'", '1 OR 1=1', '../people', '%00', 'a'.repeat(5_000), '[object Object]'])(
  'an id of %j is refused',
  async (id) => {
    const response = await api
      .as('owner')
      .request('delete', `/api/invitations/${encodeURIComponent(id)}`)
      .set('x-csrf-token', api.as('owner').token);
    expect([400, 404]).toContain(response.status);
  },
);
