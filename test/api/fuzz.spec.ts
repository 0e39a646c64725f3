import type { Response } from 'supertest';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles, type Role } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import type { ClientCall } from './matrix-row';
import { noteSecretsOf } from './faults-of-log';
import { allRows, clientRows } from './rows/all-rows';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

/**
 * Every body taken apart: each entry in turn missing, of another type, far too long, out of range, or beside one nobody asked for.
 * Whatever is sent, the answer is a refusal with words or a success, never a fault of ours (ASVS 1.4.2, 2.2.1, 15.3.3).
 */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

type Json = null | boolean | number | string | Json[] | { [name: string]: Json };
type Path = readonly (string | number)[];

/** So many are under way at once. */
const atOnce = 12;
const requestsInAll = 10_000;

/** JSON can say it, but nothing writes it: it stands for itself until the body is a text. */
const minusNought = 'minus nought';
const textOf = (body: Json): string => JSON.stringify(body).replaceAll(`"${minusNought}"`, '-0');

const nasty: readonly (readonly [string, Json])[] = [
  ['null', null],
  ['a figure too large', 1e308],
  ['minus nought', minusNought],
  ['a figure next to nothing', 1e-300],
  ['the least figure there is', 5e-324],
  ['a figure past 2^53', 2 ** 53 + 2],
  ['a long text', 'x'.repeat(70_000)],
  ['a text that is a figure of 40 places', '1234567890123456789012345678901234567890'],
  ['an object', { $gt: '' }],
  ['a list', [[[]]]],
  ['a truth', true],
  ['a nasty text', "'; DROP TABLE accounts; -- \u0000 <script> javascript:alert(1) ${7*7} =1+1"],
  ['an empty text', ''],
];

/** The paths of all entries of a body, the outermost first; of the rows of a list the first two stand for all. */
function pathsOf(value: Json, path: Path = []): Path[] {
  const inner = Array.isArray(value)
    ? value.slice(0, 2).map((one, at) => [at, one] as const)
    : value && typeof value === 'object'
      ? Object.entries(value)
      : [];
  return inner.flatMap(([name, one]) => [[...path, name], ...pathsOf(one, [...path, name])]);
}

/** A copy of the body in which one entry is another value, or is gone where none is given. */
function changed(body: Json, path: Path, value?: Json): Json {
  const copy = structuredClone(body);
  const parent = path.slice(0, -1).reduce<Json>((at, name) => (at as Record<string, Json>)[name]!, copy) as Record<
    string,
    Json
  >;
  const last = path.at(-1)!;
  if (value === undefined) delete parent[last];
  else parent[last] = value;
  return copy;
}

interface Change {
  readonly what: string;
  readonly path: Path;
  readonly value?: Json;
}

/** Each entry once missing and once as each nasty value. */
const changesOf = (body: Json): Change[] =>
  pathsOf(body).flatMap((path): Change[] => [
    { what: `without ${path.join('.')}`, path },
    ...nasty.map(([what, value]) => ({ what: `${path.join('.')} as ${what}`, path, value })),
  ]);

const isInside = (outer: Path, inner: Path): boolean => outer.every((name, depth) => inner[depth] === name);

interface Taken {
  readonly what: string;
  readonly body: Json;
}

/** So many bodies, the same in every run: spread over all single changes, and beyond those two changes at once. */
function bodiesOf(body: Json, count: number): Taken[] {
  const single = changesOf(body);
  const step = Math.max(1, single.length / count);
  const singleAt = (index: number): Change => single[Math.floor(index) % single.length];
  return Array.from({ length: count }, (_, index) => {
    const one = singleAt(index * step);
    const once = { what: one.what, body: changed(body, one.path, one.value) };
    const other = singleAt(index * 7919 + 31);
    if (index * step < single.length || isInside(one.path, other.path) || isInside(other.path, one.path)) return once;
    return { what: `${one.what}, ${other.what}`, body: changed(once.body, other.path, other.value) };
  });
}

/** What holds for a whole workshop comes last, since all else is made ready under it. */
const isOfAll = ({ method, params }: Endpoint): boolean => method === 'put' && params === undefined;
/** Guesses of a stranger are counted against the address all come from, so they are made when nobody needs to be let in any more. */
const isOfStrangers = ({ callers }: Endpoint): boolean => callers === 'anyone';
const turnOf = (endpoint: Endpoint): number => (isOfAll(endpoint) ? 2 : isOfStrangers(endpoint) ? 1 : 0);
const withBody = endpoints
  .filter((endpoint) => endpoint.body && !endpoint.upload)
  .sort((one, other) => turnOf(one) - turnOf(other));
const perEndpoint = Math.ceil(requestsInAll / withBody.length);

const callerOf = async (endpoint: Endpoint): Promise<{ visitor: Visitor; role: Role }> => {
  const role = roles.find((one) => typeof endpoint.callers === 'string' || endpoint.callers.includes(one))!;
  const isOthers = allRows[endpoint.name]?.bySomebodyNew;
  if (endpoint.callers === 'anyone') return { role, visitor: await api.stranger() };
  return { role, visitor: isOthers ? (await api.newcomer(api.ours, role)).visitor : api.as(role) };
};

/** Who calls an endpoint, and a valid call of theirs. */
const validCall = async (endpoint: Endpoint): Promise<ClientCall> => {
  if (endpoint.callers === 'client') return clientRows[endpoint.name].visit(api.ours, api);
  const { visitor, role } = await callerOf(endpoint);
  const caller = { ...api.ours.people[role], visitor };
  return { visitor, parts: await allRows[endpoint.name].prepare(api.ours, api, caller) };
};

const isRefusedWithWords = ({ status, headers, body }: Response): boolean =>
  status < 400 ||
  (status < 500 &&
    String(headers['content-type']).startsWith('application/problem+json') &&
    typeof (body as { title?: unknown }).title === 'string');

/** Works through a list with so many under way at once. */
async function together<T>(list: readonly T[], work: (one: T) => Promise<void>): Promise<void> {
  const left = list.values();
  const inTurn = async () => {
    for (const one of left) await work(one);
  };
  await Promise.all(Array.from({ length: atOnce }, inTurn));
}

let sent = 0;
const statuses = new Map<number, number>();

describe.each(withBody.map((endpoint) => [endpoint.name, endpoint] as const))('%s', (_name, endpoint) => {
  let call: ClientCall;
  beforeAll(async () => {
    call = await validCall(endpoint);
  });

  test('refuses an entry nobody asked for', async () => {
    const { visitor, parts } = call;
    for (const surplus of ['workshopId', 'id2', 'status', 'total_minor', 'isAdmin']) {
      const response = await visitor.call(endpoint, { ...parts, body: { ...(parts.body as object), [surplus]: 'x' } });
      expect(response.status).toBe(400);
      expect(response.body).toMatchObject({
        errors: expect.arrayContaining([expect.objectContaining({ path: [surplus] })]) as unknown,
      });
    }
  });

  test('refuses or takes whatever a body is made of', async () => {
    const { visitor, parts } = call;
    const faults: string[] = [];
    await together(bodiesOf(parts.body as Json, perEndpoint), async ({ what, body }) => {
      noteSecretsOf(body);
      const { body: _, ...others } = parts;
      const response = await visitor.call(endpoint, others).type('json').send(textOf(body));
      sent += 1;
      statuses.set(response.status, (statuses.get(response.status) ?? 0) + 1);
      if (!isRefusedWithWords(response)) faults.push(`${what}: ${response.status} ${response.text.slice(0, 200)}`);
    });
    expect(faults).toEqual([]);
  }, 120_000);
});

test('ten thousand requests were made, most of them looked into', () => {
  expect(sent).toBeGreaterThanOrEqual(requestsInAll);
  const ofBodies = statuses.get(400) ?? 0;
  expect(ofBodies).toBeGreaterThan(sent / 2);
});
