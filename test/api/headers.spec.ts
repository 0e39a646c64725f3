import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync } from 'node:zlib';
import request from 'supertest';
import { putLogo, readLogo } from '#shared/accounts/workshop-endpoints';
import { listRateCards, readRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { disposition } from '../../backend/src/platform/http/send';
import { startApi, type Api } from './start-api';

/** What every answer carries, and what none does (ASVS 3.2.1, 3.4, 4.1.1, 13.4, 14.3.2). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
  const { webFolder } = api.platform.config;
  writeFileSync(join(webFolder, 'main-ABCDEFGH.js'), 'void 0;');
  writeFileSync(join(webFolder, 'mark.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
}, 60_000);
afterAll(() => api.stop());

const get = (path: string) => request(api.app.web.express).get(path);

describe.each([
  '/',
  '/jobs',
  '/client',
  '/main-ABCDEFGH.js',
  '/api/session',
  '/api/people',
  '/api/nothing',
  '/nothing.js',
  '/healthz',
  '/api/reference',
])('the answer to %s', (path) => {
  test('tells the browser to keep to it', async () => {
    const { headers } = await get(path);
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'x-frame-options': 'DENY',
      'x-robots-tag': 'noindex, nofollow',
      'strict-transport-security': 'max-age=31536000; includeSubDomains',
    });
    expect(headers['content-security-policy']).toMatch(/frame-ancestors 'none'/);
    expect(headers['content-security-policy']).not.toMatch(/unsafe-(inline|eval)/);
    expect(headers['content-type']).toMatch(
      /^(text\/(html|javascript)|application\/(json|problem\+json)); charset=utf-8$/,
    );
    expect(headers['x-powered-by']).toBeUndefined();
  });

  test('lets no other site read it', async () => {
    for (const origin of ['https://evil.test', 'null']) {
      const { headers } = await get(path).set('origin', origin);
      expect(headers['access-control-allow-origin']).toBeUndefined();
    }
  });
});

test('a page has a nonce of its own, in its policy and in its text', async () => {
  const [first, second] = [await get('/'), await get('/')];
  const nonce = /'nonce-([^']+)'/.exec(first.headers['content-security-policy'] ?? '')?.[1] ?? '';
  expect(Buffer.from(nonce, 'base64')).toHaveLength(16);
  expect(first.text).toContain(`ngCspNonce="${nonce}"`);
  expect(second.text).not.toContain(nonce);
});

test('a page without the application may be dressed, and nothing more', async () => {
  const { headers, text } = await get('/api/reference');
  expect(headers['content-security-policy']).toBe(
    "default-src 'none'; style-src 'self'; font-src 'self'; base-uri 'none'; frame-ancestors 'none'",
  );
  expect(text).toContain('<link rel="stylesheet" href="/plain.css">');
});

test('the policy of a page allows our own files only', async () => {
  const { headers } = await get('/');
  const policy = headers['content-security-policy'] ?? '';
  expect(policy).toMatch(/default-src 'self'/);
  expect(policy).toMatch(/object-src 'none'/);
  expect(policy).toMatch(/base-uri 'self'/);
  expect(policy).toMatch(/script-src 'self';/);
  expect(policy).toMatch(/require-trusted-types-for 'script'/);
});

test('an answer of more than a kilobyte comes made smaller to whoever can read it so', async () => {
  const { body } = await api.as('owner').call(listRateCards);
  const [{ id }] = (body as { items: { id: string }[] }).items;
  const asked = (encoding: string) =>
    api
      .as('owner')
      .call(readRateCard, { params: { rateCardId: id } })
      .set('accept-encoding', encoding);
  const [smaller, plain] = [await asked('gzip'), await asked('identity')];
  expect(smaller.headers).toMatchObject({
    'content-encoding': 'gzip',
    vary: expect.stringContaining('Accept-Encoding') as string,
  });
  expect(plain.headers['content-encoding']).toBeUndefined();
  expect(plain.text.length).toBeGreaterThan(1024);
  expect(smaller.body).toEqual(plain.body);
});

test('a text of the pages comes by brotli where it was made smaller and can be read, under its own name and type', async () => {
  const smaller = brotliCompressSync('void 0;');
  writeFileSync(join(api.platform.config.webFolder, 'small-ABCDEFGH.js'), 'void 0;');
  writeFileSync(join(api.platform.config.webFolder, 'small-ABCDEFGH.js.br'), smaller);
  const asked = (encoding: string) => get('/small-ABCDEFGH.js').set('accept-encoding', encoding);
  const [brotli, plain] = [await asked('gzip, br'), await asked('identity')];
  expect(brotli.headers).toMatchObject({
    ...{ 'content-encoding': 'br', 'content-length': String(smaller.length), vary: 'Accept-Encoding' },
    ...{ 'content-type': 'text/javascript; charset=utf-8', 'cache-control': 'public, max-age=31536000, immutable' },
  });
  expect([plain.headers['content-encoding'], plain.text]).toEqual([undefined, 'void 0;']);
  expect(plain.headers['vary']).toBe('Accept-Encoding');
  expect((await get('/main-ABCDEFGH.js').set('accept-encoding', 'br')).headers['content-encoding']).not.toBe('br');
});

test('a file under a hashed name is kept for ever, the page and the API never', async () => {
  expect((await get('/main-ABCDEFGH.js')).headers['cache-control']).toBe('public, max-age=31536000, immutable');
  const files = ['chunk-b0wn1ke0.js', 'small-sans-400.woff2'];
  for (const file of files) writeFileSync(join(api.platform.config.webFolder, file), '');
  expect((await get('/chunk-b0wn1ke0.js')).headers['cache-control']).toBe('public, max-age=31536000, immutable');
  expect((await get('/small-sans-400.woff2')).headers['cache-control']).toBe('no-cache');
  expect((await get('/mark.svg')).headers['cache-control']).toBe('no-cache');
  expect((await get('/')).headers['cache-control']).toBe('no-store');
  expect((await get('/api/session')).headers['cache-control']).toBe('no-store');
  expect((await api.as('owner').request('get', '/api/people')).headers['cache-control']).toBe('no-store');
});

test.each([
  '/.git/config',
  '/.env',
  '/package.json',
  '/../package.json',
  '/%2e%2e/package.json',
  '/index.html.bak',
  '/api-docs',
  '/metrics',
  '/server-status',
])('%s is not served', async (path) => {
  const response = await get(path);
  expect(response.status).toBe(404);
  expect(response.text).not.toContain('bolewright"');
});

test.each(['TRACE', 'TRACK', 'CONNECT', 'PROPFIND'])(
  'a header that asks for the method %s instead is not listened to',
  async (method) => {
    const status = await request(api.app.web.express)
      .get('/api/people')
      .set('x-http-method-override', method)
      .then((response) => response.status);
    expect(status).toBe(401);
  },
);

test('on loopback the cookie is HttpOnly, lax, without a domain', async () => {
  const { headers } = await get('/api/session');
  const [cookie] = headers['set-cookie'] as unknown as string[];
  expect(cookie).toMatch(/^bolewright=s%3A[^;]+; Path=\/; HttpOnly; SameSite=Lax$/);
});

test('a file of a user is an attachment or a picture, and may run nothing', async () => {
  const owner = api.as('owner');
  const bytes = Buffer.from(
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
    'base64',
  );
  const put = await owner.call(putLogo, { version: 1, file: { name: 'mein “Wappen”.png', bytes } });
  expect(put.status).toBe(200);
  const { headers, status } = await owner.call(readLogo);
  expect(status).toBe(200);
  expect(headers['content-type']).toBe('image/png');
  expect(headers['content-security-policy']).toBe("default-src 'none'; sandbox");
  expect(headers['content-disposition']).toBe(
    'inline; filename="mein _Wappen_.png"; filename*=UTF-8\'\'mein%20%E2%80%9CWappen%E2%80%9D.png',
  );
});

test.each([
  ['a quote', 'a"b.pdf', 'attachment; filename="a_b.pdf"; filename*=UTF-8\'\'a%22b.pdf'],
  [
    'a line break',
    'a\r\nSet-Cookie: x=1.pdf',
    'attachment; filename="aSet-Cookie: x=1.pdf"; filename*=UTF-8\'\'aSet-Cookie%3A%20x%3D1.pdf',
  ],
  ['an umlaut', 'Höhe.pdf', 'attachment; filename="H_he.pdf"; filename*=UTF-8\'\'H%C3%B6he.pdf'],
  ['a mark that turns the direction', 'a\u202Efdp.exe', 'attachment; filename="afdp.exe"; filename*=UTF-8\'\'afdp.exe'],
  ['a folder', '../../etc/x', 'attachment; filename="..-..-etc-x"; filename*=UTF-8\'\'..-..-etc-x'],
  ['a percent sign', '100%.pdf', 'attachment; filename="100_.pdf"; filename*=UTF-8\'\'100%25.pdf'],
])('a file name with %s makes one header (RFC 6266, RFC 8187)', (_, name, header) => {
  expect(disposition(name)).toBe(header);
});
