import request from 'supertest';
import { startApi, type Api } from './start-api';

/** The page of a machine without a mail server: what was caught is read there, and nothing of it is run. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

test('a caught mail shows its text, its HTML as it is written, and what came with it by name', async () => {
  const { database, files, mailbox } = api.platform;
  const bytes = Buffer.from('%PDF-1.7 accepted');
  const file = await files.save(api.ours.id, { name: 'estimate <A>.pdf', media: 'application/pdf', bytes });
  await database.transaction(() =>
    mailbox.post(api.ours.id, {
      to: { name: 'Ada', email: 'ada@guests.example' },
      subject: 'Accepted',
      text: 'Dear Ada, <script>alert(1)</script>',
      html: '<p>Dear Ada, <img src=x onerror=alert(1)></p>',
      enclosures: [{ fileId: file.id }],
    }),
  );
  await api.mails();
  const page = await request(api.app.web.express).get('/development/mail');
  expect(page.status).toBe(200);
  expect(page.text).toContain('Dear Ada, &lt;script&gt;alert(1)&lt;/script&gt;');
  expect(page.text).toContain('&lt;p&gt;Dear Ada, &lt;img src=x onerror=alert(1)&gt;&lt;/p&gt;');
  expect(page.text).toContain('<li>estimate &lt;A&gt;.pdf, application/pdf, 17 bytes</li>');
  expect(page.text).not.toMatch(/<script|<img/);
});

test.each([
  ['127.0.0.1:3000', 200],
  ['127.0.0.1', 200],
  ['localhost:3000', 200],
  ['LOCALHOST', 200],
  ['[::1]:3000', 200],
  ['rebound.example', 404],
  ['rebound.example:3000', 404],
  ['127.0.0.1.rebound.example:3000', 404],
  ['localhost.rebound.example', 404],
  ['192.168.1.20:3000', 404],
])('asked for as %s it answers %i, for other names may lead here too', async (host, status) => {
  const page = await request(api.app.web.express).get('/development/mail').set('host', host);
  expect(page.status).toBe(status);
});
