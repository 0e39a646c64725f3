import { askForReset } from '#shared/accounts/password-endpoints';
import { askToFound } from '#shared/accounts/workshop-endpoints';
import { signIn } from '#shared/accounts/session-endpoints';
import { password, startApi, type Api } from './start-api';
import { foundingSettings } from './test-workshop';
import type { Visitor } from './visitor';

/** Guessing is held off, and nobody learns who is known here (ASVS 6.3.1, 6.3.8; OWASP on authentication). */
let api: Api;
let address = 0;
beforeAll(async () => {
  api = await startApi({ PUBLIC_URL: 'http://work.example' }, from('192.0.2.1'));
}, 60_000);
afterAll(() => api.stop());

const from = (ip: string) => ({ 'x-forwarded-for': ip, host: 'work.example' });
const somewhere = (): Promise<Visitor> => api.stranger(from(`203.0.113.${++address}`));
const known = async (): Promise<string> => (await api.newcomer(api.ours, 'bench')).email;
const median = (figures: number[]): number => [...figures].sort((a, b) => a - b)[Math.floor(figures.length / 2)] ?? NaN;

test('a hundred wrong passwords from one address are throttled, and the right one works from another', async () => {
  const email = await known();
  const guesser = await somewhere();
  const statuses: number[] = [];
  for (let guess = 0; guess < 100; guess++)
    statuses.push((await guesser.signIn(email, `wrong guess number ${guess}`)).status);
  expect(statuses.slice(0, 5)).toEqual([403, 403, 403, 403, 403]);
  expect(statuses.filter((status) => status === 429).length).toBeGreaterThan(85);
  const right = await guesser.signIn(email, password);
  expect(right.status).toBe(429);
  expect(Number(right.headers['retry-after'])).toBeGreaterThan(0);
  expect((await (await somewhere()).signIn(email, password)).status).toBe(200);
});

test('the waits double, and the right password after a wait clears them', async () => {
  const email = await known();
  const visitor = await somewhere();
  const waits: number[] = [];
  for (let guess = 0; guess < 9; guess++) {
    await visitor.signIn(email, 'always the wrong one');
    const refused = await visitor.signIn(email, 'always the wrong one');
    if (refused.status !== 429) continue;
    waits.push(Number(refused.headers['retry-after']));
    api.clock.move({ seconds: waits.at(-1) ?? 0 });
  }
  expect(waits.slice(0, 4)).toEqual([1, 2, 4, 8]);
  api.clock.move({ seconds: 60 });
  expect((await visitor.signIn(email, password)).status).toBe(200);
  expect((await visitor.signIn(email, 'a wrong one once more')).status).toBe(403);
});

test('an address spelled otherwise is the same address, to the door and to its throttle', async () => {
  const email = await known();
  const guesser = await somewhere();
  const spelled = (guess: number) =>
    `${' '.repeat(guess % 3)}${guess % 2 ? email.toUpperCase() : email}${' '.repeat(guess)}`;
  expect((await guesser.signIn(spelled(3), password)).status).toBe(200);
  const stranger = await somewhere();
  const statuses: number[] = [];
  for (let guess = 0; guess < 10; guess++)
    statuses.push((await stranger.signIn(spelled(guess), 'a wrong one every time')).status);
  expect(statuses).toEqual([...Array<number>(5).fill(403), ...Array<number>(5).fill(429)]);
});

test('many at once are no way around', async () => {
  const email = await known();
  const visitor = await somewhere();
  const all = await Promise.all(
    Array.from({ length: 40 }, () => visitor.call(signIn, { body: { email, password: 'all wrong at once' } })),
  );
  expect(all.filter(({ status }) => status === 403).length).toBeLessThanOrEqual(6);
});

test('one address against many accounts is throttled, another address is not', async () => {
  const visitor = await somewhere();
  const statuses: number[] = [];
  for (let person = 0; person < 45; person++)
    statuses.push((await visitor.signIn(`person${person}@many.example`, 'a common guess')).status);
  expect(statuses.slice(0, 20)).not.toContain(429);
  expect(statuses.slice(35)).toContain(429);
  expect((await (await somewhere()).signIn('person0@many.example', 'a common guess')).status).toBe(403);
});

test('many addresses against one account are throttled, but not where its owner has signed in before', async () => {
  const email = await known();
  const own = from('198.51.100.200');
  expect((await (await api.stranger(own)).signIn(email, password)).status).toBe(200);
  let last = 0;
  for (let guess = 0; guess < 70; guess++)
    last = (await (await api.stranger(from(`198.51.100.${guess}`))).signIn(email, 'guess from afar')).status;
  expect(last).toBe(429);
  expect((await (await api.stranger(own)).signIn(email, password)).status).toBe(200);
});

describe('an unknown address', () => {
  test('is answered like a wrong password, to the letter and in time', async () => {
    const times: Record<'known' | 'unknown', number[]> = { known: [], unknown: [] };
    const bodies = new Set<string>();
    for (let round = 0; round < 200; round++) {
      for (const kind of ['known', 'unknown'] as const) {
        const email = kind === 'known' ? 'owner@herons.example' : `nobody${round}@herons.example`;
        const visitor = await api.stranger(from(`203.0.${round}.${kind === 'known' ? 1 : 2}`));
        if (kind === 'known') api.clock.move({ minutes: 61 });
        await visitor.arrive();
        const began = performance.now();
        const response = await visitor.signIn(email, 'not the right password');
        times[kind].push(performance.now() - began);
        expect(response.status).toBe(403);
        bodies.add(response.text.replace(/urn:request:[0-9a-f-]+/, ''));
      }
    }
    expect(bodies.size).toBe(1);
    expect(Math.abs(median(times.known) - median(times.unknown))).toBeLessThan(10);
  }, 120_000);

  test('is answered alike when a new password is asked for', async () => {
    const answers = new Set<string>();
    for (const email of ['owner@herons.example', 'nobody@herons.example']) {
      const { status, text, headers } = await (await somewhere()).call(askForReset, { body: { email } });
      answers.add(JSON.stringify([status, text, headers['content-length']]));
    }
    expect(answers.size).toBe(1);
    const mails = await api.mails();
    expect(mails.filter(({ headers }) => headers.includes('owner@herons.example'))).toHaveLength(1);
    expect(mails.filter(({ headers }) => headers.includes('nobody@herons.example'))).toHaveLength(0);
  });

  test('is answered alike when a workshop is founded; only the mail tells them apart', async () => {
    const answers = new Set<string>();
    for (const email of ['office@herons.example', 'newcomer@elsewhere.example']) {
      const body = { name: 'A Founder', email, workshop: { name: 'Third Carvers', ...foundingSettings } };
      const { status, text } = await (await somewhere()).call(askToFound, { body });
      answers.add(JSON.stringify([status, text]));
    }
    expect(answers.size).toBe(1);
    const mails = await api.mails();
    expect(mails.find(({ headers }) => headers.includes('office@herons.example'))?.text).toContain(
      'you already have an account',
    );
    expect(mails.find(({ headers }) => headers.includes('newcomer@elsewhere.example'))?.text).toContain(
      'choose a password',
    );
  });
});

test('passwords are kept as argon2id with at least 19 MiB and two rounds', async () => {
  const rows = await api.platform.database.select<{ kept: string }>('SELECT password_hash AS kept FROM accounts');
  for (const { kept } of rows) {
    const [, memory, rounds] = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=\d+\$/.exec(kept) ?? [];
    expect(Number(memory)).toBeGreaterThanOrEqual(19_456);
    expect(Number(rounds)).toBeGreaterThanOrEqual(2);
  }
});

test('each refusal is logged once, with its number and without what was entered', () => {
  const refusals = api.logLines.filter((line) => line.includes('sign-in-refused'));
  const numbers = refusals.map((line) => (JSON.parse(line) as { requestId: string }).requestId);
  expect(refusals.length).toBeGreaterThan(50);
  expect(new Set(numbers).size).toBe(numbers.length);
  const log = api.logLines.join('');
  for (const secret of [password, 'wrong guess number', 'not the right password', 'guess from afar', 'argon2id'])
    expect(log).not.toContain(secret);
});
