import { v7 as newId } from 'uuid';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import { allRows } from './rows/all-rows';
import { sampleEstimate } from './sample-estimate';
import { cardInForce } from './sample-card';
import { canary, startApi, type Api } from './start-api';
import { sumsOfRows } from './sums-of-rows';
import type { Parts } from './visitor';

/**
 * Another workshop's ids where the matrix does not look: in every entry of a body in turn, and in every query. They are answered like
 * ids that nobody has, nothing of theirs comes back, and nothing of theirs changes (ASVS 8.2.2, 8.4.1).
 */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

type Path = readonly (string | number)[];
type Node = Record<string | number, unknown>;

const isId = (value: unknown): boolean => typeof value === 'string' && /^[0-9a-f]{8}-[0-9a-f-]{27}$/.test(value);

function idsIn(value: unknown, path: Path = []): Path[] {
  if (isId(value)) return [path];
  if (value === null || typeof value !== 'object') return [];
  const entries = Array.isArray(value) ? [...value.entries()] : Object.entries(value);
  return entries.flatMap(([name, inner]) => idsIn(inner, [...path, name]));
}

/** One path of each kind: what stands for the first row of a list stands for the others. */
const firstOfEachKind = (paths: readonly Path[]): readonly Path[] => [
  ...new Map(
    paths.toReversed().map((path) => [path.filter((part) => typeof part === 'string').join('.'), path]),
  ).values(),
];

const at = (value: unknown, path: Path): unknown =>
  path.reduce<unknown>((inner, name) => (inner as Node | undefined)?.[name], value);

function withId(body: unknown, path: Path, id: unknown): unknown {
  const copy = structuredClone(body);
  (at(copy, path.slice(0, -1)) as Node)[path.at(-1)!] = id;
  return copy;
}

const theirRows = () => sumsOfRows(api.platform.database, api.theirs.id);

const mayCall = ({ callers }: Endpoint) => roles.find((role) => typeof callers !== 'string' && callers.includes(role))!;
const ofRoles = endpoints.filter(({ callers }) => typeof callers !== 'string');
const withBody = ofRoles.filter(({ body, upload }) => body && !upload);

test('in a body', async () => {
  const foreign = new Map<Endpoint, Parts>();
  for (const endpoint of withBody) {
    const person = api.ours.people[mayCall(endpoint)];
    foreign.set(endpoint, await allRows[endpoint.name].prepare(api.theirs, api, person));
  }
  const before = await theirRows();
  let tried = 0;
  for (const [endpoint, theirs] of foreign) {
    const person = api.ours.people[mayCall(endpoint)];
    const ours = await allRows[endpoint.name].prepare(api.ours, api, person);
    for (const path of firstOfEachKind(idsIn(ours.body))) {
      tried += 1;
      const mine = await allRows[endpoint.name].prepare(api.ours, api, person);
      const body = withId(mine.body, path, at(theirs.body, path) ?? at(theirs.params, ['estimateId']));
      const response = await person.visitor.call(endpoint, { ...mine, body });
      const again = await allRows[endpoint.name].prepare(api.ours, api, person);
      const unknown = { ...again, body: withId(again.body, path, newId()) };
      const { status } = await person.visitor.call(endpoint, unknown);
      expect([endpoint.name, path, response.status]).toEqual([endpoint.name, path, status]);
      expect(status).toBeLessThan(500);
      expect(response.text).not.toContain(canary);
    }
  }
  expect(tried).toBeGreaterThan(5);
  expect(await theirRows()).toEqual(before);
}, 120_000);

test('a change of one letter in one of their rows would be seen', async () => {
  await sampleEstimate(api.theirs);
  const before = await theirRows();
  expect(Object.keys(before).length).toBeGreaterThan(15);
  const change = "UPDATE jobs SET title = CONCAT(title, '.') WHERE workshop_id = :id LIMIT 1";
  await api.platform.database.execute(change, { id: api.theirs.id });
  const after = await theirRows();
  expect(after['jobs']).not.toEqual(before['jobs']);
  expect({ ...after, jobs: null }).toEqual({ ...before, jobs: null });
});

test('in a query', async () => {
  const { jobId, estimateId, memberId } = await sampleEstimate(api.theirs);
  const { clientId } = await api.app.jobs.job(api.theirs.id, jobId);
  const ids = [jobId, estimateId, memberId, clientId, (await cardInForce(api.theirs)).id];
  let tried = 0;
  for (const endpoint of ofRoles.filter(({ query, media }) => query !== undefined && media === undefined)) {
    const person = api.ours.people[mayCall(endpoint)];
    const parts = await allRows[endpoint.name].prepare(api.ours, api, person);
    const takesIds = Object.entries(endpoint.query!.shape).filter(([, field]) => isTakingIds(field, jobId));
    for (const [name] of takesIds) {
      for (const id of ids) {
        tried += 1;
        const response = await person.visitor.call(endpoint, { ...parts, query: { [name]: id } });
        expect(response.text).not.toContain(canary);
        const { items } = response.body as { items?: unknown[] };
        expect([endpoint.name, name, response.status === 404 || items?.length === 0]).toEqual([
          endpoint.name,
          name,
          true,
        ]);
      }
    }
  }
  expect(tried).toBeGreaterThan(10);
}, 60_000);

const isTakingIds = (field: unknown, id: string): boolean => {
  const { safeParse } = field as { safeParse(value: unknown): { success: boolean } };
  return safeParse(id).success && !safeParse('x').success;
};
