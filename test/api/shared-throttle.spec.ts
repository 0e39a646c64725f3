import { signIn } from '#shared/accounts/session-endpoints';
import { openApp } from '../../backend/src/app';
import { openLog } from '../../backend/src/platform/log/log';
import { openPlatform } from '../../backend/src/platform/open-platform';
import type { Platform } from '../../backend/src/platform/platform';
import { password, startApi, type Api } from './start-api';
import { Visitor } from './visitor';

/** Several servers on one database: failed sign-ins count together, and a restart forgives none (ASVS 6.3.1). */
let api: Api;
let second: Platform;
let other: () => Promise<Visitor>;

beforeAll(async () => {
  api = await startApi();
  second = openPlatform(api.platform.config, api.clock, openLog('silent', { write: () => undefined }));
  const { web } = openApp(second);
  other = () => new Visitor(web.express).arrive();
}, 60_000);
afterAll(async () => {
  await second.database.close();
  await api.stop();
});

test('what was tried too often at one server has to wait at another', async () => {
  const { email } = await api.newcomer(api.ours, 'bench');
  const guesser = await api.stranger();
  for (let guess = 0; guess < 5; guess++) await guesser.signIn(email, `wrong guess number ${guess}`);
  expect((await guesser.signIn(email, 'the sixth wrong guess')).status).toBe(429);
  const refused = await (await other()).signIn(email, password);
  expect([refused.status, refused.headers['retry-after']]).toEqual([429, '1']);
  api.clock.move({ seconds: 2 });
  expect((await (await other()).signIn(email, password)).status).toBe(200);
});

test('guesses spread over both at once are not more than those of one', async () => {
  const { email } = await api.newcomer(api.ours, 'bench');
  const visitors = [await api.stranger(), await other()];
  const answers = await Promise.all(
    Array.from({ length: 30 }, (_, at) =>
      visitors[at % 2].call(signIn, { body: { email, password: 'all wrong at once' } }),
    ),
  );
  expect(answers.filter(({ status }) => status === 403).length).toBeLessThanOrEqual(6);
  expect(answers.map(({ status }) => status)).not.toContain(500);
});

test('no address and no name stands in the counts, and they are swept when they are forgotten', async () => {
  const rows = () => api.platform.database.select<{ mark: string }>('SELECT mark FROM login_attempts');
  expect((await rows()).every(({ mark }) => /^[0-9a-f]{64}$/.test(mark))).toBe(true);
  api.clock.move({ minutes: 24 * 60 * 200 });
  await api.app.accounts.sweep();
  expect(await rows()).toEqual([]);
});
