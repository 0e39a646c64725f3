import type { Response } from 'supertest';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import { readFeed } from '#shared/programme/board-endpoints';
import { allRows, clientRows } from './rows/all-rows';
import { startApi, type Api } from './start-api';
import type { Parts, Visitor } from './visitor';

/**
 * Every reading there is, from the list of endpoints, asked once by whoever may and once by a stranger: what each answer carries, whether
 * it is what it says, and that nothing changed and no secret was logged by it (ASVS 3.2.1, 3.3, 3.4, 3.5.3, 4.1.1, 14.2.1, 14.3.2).
 */
let api: Api;
const answers: { readonly endpoint: Endpoint; readonly response: Response }[] = [];
const refusals: { readonly endpoint: Endpoint; readonly response: Response }[] = [];
const sums: unknown[] = [];

/** Sessions are marked as used, which is no change of anything. */
const notWatched = ['sessions'];

async function sumsOfAllTables(): Promise<unknown> {
  const tables = await api.platform.database.select<{ name: string }>(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE'",
  );
  const watched = tables.map(({ name }) => name).filter((name) => !notWatched.includes(name));
  expect(watched.length).toBeGreaterThan(15);
  return api.platform.database.select('CHECKSUM TABLE ' + watched.sort().join(', '));
}

async function callOf({ name, callers }: Endpoint): Promise<{ visitor: Visitor; parts: Parts }> {
  if (callers === 'client') return clientRows[name].visit(api.ours, api);
  const person = api.ours.people[roles.find((role) => typeof callers === 'string' || callers.includes(role))!];
  return { visitor: person.visitor, parts: await allRows[name].prepare(api.ours, api, person) };
}

const reading = endpoints.filter(({ method }) => method === 'get');
const fromElsewhere = ['origin', 'https://evil.test'] as const;

beforeAll(async () => {
  api = await startApi();
  const calls: { endpoint: Endpoint; visitor: Visitor; parts: Parts }[] = [];
  for (const endpoint of reading) calls.push({ endpoint, ...(await callOf(endpoint)) });
  const stranger = await api.stranger();
  // A calendar is marked as read, at most once an hour: here before anything is watched.
  for (const { endpoint, visitor, parts } of calls.filter(({ endpoint: { name } }) => name === readFeed.name)) {
    await visitor.call(endpoint, parts);
  }
  sums.push(await sumsOfAllTables());
  for (const { endpoint, visitor, parts } of calls) {
    answers.push({ endpoint, response: await visitor.call(endpoint, parts).set(...fromElsewhere) });
  }
  sums.push(await sumsOfAllTables());
  for (const { endpoint, parts } of calls.filter(({ endpoint: { callers } }) => callers !== 'anyone')) {
    refusals.push({ endpoint, response: await stranger.call(endpoint, parts).set(...fromElsewhere) });
  }
}, 180_000);
afterAll(() => api.stop());

/** What an answer should be and is not. */
function faultsOf(endpoint: Endpoint, { status, headers }: Response): string[] {
  const isFile = endpoint.media !== undefined && status === 200;
  const kind = isFile ? endpoint.media : status < 300 ? 'application/json' : 'application/problem+json';
  const type = String(headers['content-type']);
  const policy = String(headers['content-security-policy']);
  const cookies = (headers['set-cookie'] ?? []) as unknown as string[];
  const asked: Record<string, boolean> = {
    [`content type ${type}`]: isOfType(type, kind),
    nosniff: headers['x-content-type-options'] === 'nosniff',
    referrer: headers['referrer-policy'] === 'no-referrer',
    frames: headers['x-frame-options'] === 'DENY' || /frame-ancestors 'none'|sandbox/.test(policy),
    'kept to https': headers['strict-transport-security'] === 'max-age=31536000; includeSubDomains',
    [`policy ${policy}`]: /default-src 'none'/.test(policy) && !/unsafe/.test(policy),
    'file without a sandbox or a name': !isFile || (/sandbox/.test(policy) && /filename\*=/.test(disposition(headers))),
    'file opened in the page': !isFile || kind === 'image/png' || /^attachment;/.test(disposition(headers)),
    'given to another site': headers['access-control-allow-origin'] === undefined,
    'kept by the browser': headers['cache-control'] === 'no-store',
    'says what serves it': headers['x-powered-by'] === undefined,
    cookie: cookies.every((line) => /; HttpOnly/.test(line) && /; SameSite=Lax/.test(line) && !/; Domain/i.test(line)),
  };
  return Object.entries(asked).flatMap(([what, holds]) => (holds ? [] : [`${endpoint.name}: ${what}`]));
}

/** The papers of one address may be of several types, none of which a browser would run. */
const isOfType = (type: string, kind: string): boolean =>
  kind === 'application/octet-stream'
    ? /^(application\/(pdf|xml|vnd\.[\w.-]+)|text\/csv)(; charset=utf-8)?$/.test(type)
    : type === (/^(image|application\/(pdf|vnd))/.test(kind) ? kind : `${kind}; charset=utf-8`);

const disposition = (headers: Record<string, unknown>): string => String(headers['content-disposition']);

test('every reading was asked, and answered as its row says', () => {
  expect(answers.length).toBe(reading.length);
  expect(answers.length).toBeGreaterThan(45);
  const expected = ({ name }: Endpoint) => [200, (allRows[name] ?? clientRows[name])?.status];
  const others = answers.filter(({ endpoint, response }) => !expected(endpoint).includes(response.status));
  expect(others.map(({ endpoint, response }) => [endpoint.name, response.status])).toEqual([]);
  expect(refusals.filter(({ response }) => response.status !== 401).map(({ endpoint }) => endpoint.name)).toEqual([]);
});

test('each answer is what it says it is, for nobody else and nowhere kept', () => {
  expect(answers.flatMap(({ endpoint, response }) => faultsOf(endpoint, response))).toEqual([]);
});

test('so is each refusal', () => {
  expect(refusals.length).toBeGreaterThan(40);
  expect(refusals.flatMap(({ endpoint, response }) => faultsOf(endpoint, response))).toEqual([]);
});

test('no reading changes anything, in any table', () => {
  expect(sums[1]).toEqual(sums[0]);
});

test('the log names the path of each request and nothing of its query', () => {
  const requests = api.logLines.map((line) => JSON.parse(line) as { msg: string; path?: string });
  const paths = requests.filter(({ msg }) => msg === 'request').map(({ path }) => path ?? '');
  expect(paths.length).toBeGreaterThan(200);
  expect(paths.filter((path) => /[?#]|secret=|[\w-]{43}/.test(path))).toEqual([]);
});
