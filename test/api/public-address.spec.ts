import request from 'supertest';
import { readSession } from '#shared/accounts/session-endpoints';
import { changeOwnName } from '#shared/accounts/people-endpoints';
import { startApi, type Api } from './start-api';

/** Behind a proxy under an https address: secure cookies, and the proxy alone says where a request came from (ASVS 3.3, 4.1.3). */
const proxy = { 'x-forwarded-proto': 'https', 'x-forwarded-for': '203.0.113.7', host: 'work.example' };
let api: Api;
let onLoopback: Api | undefined;
beforeAll(async () => {
  api = await startApi({ PUBLIC_URL: 'https://work.example' }, proxy);
}, 60_000);
afterAll(async () => {
  await onLoopback?.stop();
  await api.stop();
});

test('the cookie is bound to the host and to https', async () => {
  const { headers } = await request(api.app.web.express).get(readSession.path).set(proxy);
  const [cookie] = headers['set-cookie'] as unknown as string[];
  expect(cookie).toMatch(/^__Host-bolewright=s%3A[^;]+; Path=\/; HttpOnly; Secure; SameSite=Lax$/);
});

test('over plain http no cookie is given', async () => {
  const { headers } = await request(api.app.web.express).get(readSession.path);
  expect(headers['set-cookie']).toBeUndefined();
});

test.each([
  ['our own address', { origin: 'https://work.example' }, 200],
  ['another site', { origin: 'https://evil.test' }, 403],
  ['our name over http', { origin: 'http://work.example' }, 403],
  ['a page of another site, by Referer', { referer: 'https://evil.test/form' }, 403],
])('a change from %s', async (_, headers, status) => {
  const visitor = api.as('bench');
  const { token } = visitor;
  const response = await visitor
    .request('put', changeOwnName.path)
    .set({ ...proxy, ...headers, 'x-csrf-token': token })
    .send({ name: 'Herons bench' });
  expect(response.status).toBe(status);
});

test('mails lead to the public address', async () => {
  const visitor = await api.stranger(proxy);
  const response = await visitor
    .request('post', '/api/password-resets')
    .set({ ...proxy, 'x-csrf-token': visitor.token })
    .send({ email: 'owner@herons.example' });
  expect(response.status).toBe(204);
  const [mail] = await api.mails();
  expect(mail?.text).toMatch(/https:\/\/work\.example\/new-password#[\w-]{43}\n/);
});

test('the caught mails are not shown where others can reach the server', async () => {
  const response = await request(api.app.web.express).get('/development/mail').set(proxy);
  expect(response.status).toBe(404);
});

test('without a public address, nobody can claim another address by a header', async () => {
  onLoopback = await startApi({ REQUESTS_PER_MINUTE: '40' });
  const statuses: number[] = [];
  for (let count = 0; count < 45; count++) {
    const response = await request(onLoopback.app.web.express)
      .get(readSession.path)
      .set('x-forwarded-for', `198.51.100.${count}`);
    statuses.push(response.status);
  }
  expect(statuses).toContain(429);
});
