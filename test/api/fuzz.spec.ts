import type { Response } from 'supertest';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles, type Role } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import type { ClientCall } from './matrix-row';
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
/** FUZZ_REQUESTS=10000 asks as much as ASVS's reviewers would; every run of the tests asks a spread of it. */
const most = { requestsInAll: Number(process.env['FUZZ_REQUESTS'] ?? 2_400), entriesOfOneBody: 40 };

const nasty: readonly (readonly [string, Json])[] = [
  ['null', null],
  ['a figure too large', 1e308],
  ['minus zero', -0],
  ['a figure past 2^53', 2 ** 53 + 2],
  ['a long text', 'x'.repeat(70_000)],
  ['a text that is a figure of 40 places', '1234567890123456789012345678901234567890'],
  ['an object', { $gt: '' }],
  ['a list', [[[]]]],
  ['a truth', true],
  ['a nasty text', "'; DROP TABLE accounts; -- \u0000 <script> javascript:alert(1) ${7*7} =1+1"],
  ['an empty text', ''],
];

/** The paths of all entries of a body, the outermost first. */
function pathsOf(value: Json, path: readonly (string | number)[] = []): (readonly (string | number)[])[] {
  const inner = Array.isArray(value)
    ? value.slice(0, 2).map((one, at) => [at, one] as const)
    : value && typeof value === 'object'
      ? Object.entries(value)
      : [];
  return inner.flatMap(([name, one]) => [[...path, name], ...pathsOf(one, [...path, name])]);
}

/** A copy of the body in which one entry is another value, or is gone where none is given. */
function changed(body: Json, path: readonly (string | number)[], value?: Json): Json {
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

const withBody = endpoints.filter((endpoint) => endpoint.body && !endpoint.upload);
const perEndpoint = Math.floor(most.requestsInAll / withBody.length);

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

test.each(withBody.map((endpoint) => [endpoint.name, endpoint] as const))(
  '%s',
  async (_name, endpoint) => {
    const { visitor, parts } = await validCall(endpoint);
    const body = parts.body as Json;
    const paths = pathsOf(body).slice(0, most.entriesOfOneBody);
    const bodies = [
      ...paths.map((path) => [`without ${path.join('.')}`, changed(body, path)] as const),
      ...nasty.flatMap(([what, value]) =>
        paths.map((path) => [`${path.join('.')} as ${what}`, changed(body, path, value)] as const),
      ),
    ];
    const step = Math.max(1, Math.ceil(bodies.length / perEndpoint));
    const faults: string[] = [];
    for (const [what, sent] of bodies.filter((_, at) => at % step === 0)) {
      const response = await visitor.call(endpoint, { ...parts, body: sent });
      if (!isRefusedWithWords(response)) faults.push(`${what}: ${response.status} ${response.text.slice(0, 200)}`);
    }
    expect(faults).toEqual([]);
  },
  600_000,
);

test.each(withBody.map((endpoint) => [endpoint.name, endpoint] as const))(
  '%s refuses an entry nobody asked for',
  async (_name, endpoint) => {
    const { visitor, parts } = await validCall(endpoint);
    for (const surplus of ['workshopId', 'id2', 'status', 'total_minor', 'isAdmin']) {
      const response = await visitor.call(endpoint, { ...parts, body: { ...(parts.body as object), [surplus]: 'x' } });
      expect(response.status).toBe(400);
      expect(response.body).toMatchObject({
        errors: expect.arrayContaining([expect.objectContaining({ path: [surplus] })]) as unknown,
      });
    }
  },
);
