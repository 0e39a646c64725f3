import type { Response } from 'supertest';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles, type Role } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import type { MatrixRow } from './matrix-row';
import { allRows, clientRows } from './rows/all-rows';
import { canary, startApi, type Api, type TestPerson, type TestWorkshop } from './start-api';

/**
 * Every endpoint × every role × another workshop's row, made from the list of endpoints: who may call gets an answer, who may not is
 * refused and nothing changes, and another workshop's rows do not exist (ASVS 8.2.1, 8.2.2, 8.3.1, 8.4.1).
 */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const mayCall = ({ callers }: Endpoint, role: Role): boolean => typeof callers === 'string' || callers.includes(role);
const forClients = endpoints.filter(({ callers }) => callers === 'client');
const ofTheWorkshop = endpoints.filter(({ callers }) => callers !== 'client');
const isSafe = ({ method }: Endpoint): boolean => method === 'get';

const callerOf = (row: MatrixRow, workshop: TestWorkshop, role: Role): Promise<TestPerson> | TestPerson =>
  row.bySomebodyNew ? api.newcomer(workshop, role) : workshop.people[role];

async function historyOf(workshopId: string): Promise<{ count: number; newest: string | undefined }> {
  const rows = await api.platform.database.select<{ code: string }>(
    'SELECT code FROM audit WHERE workshop_id = :workshopId ORDER BY id DESC',
    { workshopId },
  );
  return { count: rows.length, newest: rows[0]?.code };
}

const bytesOf = (response: Response): string =>
  Buffer.isBuffer(response.body) ? response.body.toString('latin1') : (response.text ?? '');

test('every endpoint has its row, and no row is left over', () => {
  expect(Object.keys(allRows).sort()).toEqual(ofTheWorkshop.map(({ name }) => name).sort());
  expect(Object.keys(clientRows).sort()).toEqual(forClients.map(({ name }) => name).sort());
});

test('every endpoint is served, under a name of its own', () => {
  expect(new Set(endpoints.map(({ name }) => name)).size).toBe(endpoints.length);
  expect(new Set(endpoints.map(({ method, path }) => `${method} ${path}`)).size).toBe(endpoints.length);
});

describe.each(ofTheWorkshop.map((endpoint) => [endpoint.name, endpoint] as const))('%s', (name, endpoint) => {
  const row = allRows[name];
  const allowed = roles.filter((role) => mayCall(endpoint, role));
  const refused = roles.filter((role) => !mayCall(endpoint, role));
  const first = allowed[0];

  test.each(allowed)('answers %s', async (role) => {
    const caller = await callerOf(row, api.ours, role);
    const parts = await row.prepare(api.ours, api, caller);
    const visitor = endpoint.callers === 'anyone' ? await api.stranger() : caller.visitor;
    const before = await historyOf(api.ours.id);
    const response = await visitor.call(endpoint, parts);
    expect([row.status ?? 200, row.status ?? 204]).toContain(response.status);
    if (!row.history) return;
    expect(await historyOf(api.ours.id)).toEqual({ count: before.count + (row.entries ?? 1), newest: row.history });
  });

  if (refused.length > 0) {
    test.each(refused)('refuses %s, and nothing changes', async (role) => {
      const parts = await row.prepare(api.ours, api, api.ours.people[first]);
      const before = await historyOf(api.ours.id);
      const response = await api.as(role).call(endpoint, parts);
      expect(response.status).toBe(403);
      expect(await historyOf(api.ours.id)).toEqual(before);
    });
  }

  if (endpoint.callers !== 'anyone') {
    test('refuses a stranger', async () => {
      const parts = await row.prepare(api.ours, api, api.ours.people[first]);
      const response = await (await api.stranger()).call(endpoint, parts);
      expect(response.status).toBe(401);
      expect(response.headers['content-type']).toContain('application/problem+json');
    });

    test('says nothing of another workshop', async () => {
      const caller = await callerOf(row, api.ours, first);
      const theirs = await row.prepare(api.theirs, api, caller);
      const namesRows = endpoint.params !== undefined || row.namesRows === true;
      const response = await caller.visitor.call(
        endpoint,
        namesRows ? theirs : await row.prepare(api.ours, api, caller),
      );
      if (namesRows) expect(response.status).toBe(404);
      else expect([row.status ?? 200, row.status ?? 204]).toContain(response.status);
      expect(bytesOf(response)).not.toContain(canary);
    });
  }

  if (!isSafe(endpoint) && !endpoint.signature) {
    test('refuses a request that does not carry the token', async () => {
      const caller = await callerOf(row, api.ours, first);
      const parts = await row.prepare(api.ours, api, caller);
      const { visitor } = caller;
      const { token } = visitor;
      visitor.token = 'x'.repeat(43);
      const response = await visitor.call(endpoint, parts);
      visitor.token = token;
      expect(response.status).toBe(403);
    });
  }
});

/** What clients may call: their own workshop's people are strangers to it, and so is any other client. */
function clientsMayCall(endpoint: Endpoint): void {
  const row = clientRows[endpoint.name];

  test('answers the client on a visit', async () => {
    const { visitor, parts } = await row.visit(api.ours, api);
    const before = await historyOf(api.ours.id);
    const response = await visitor.call(endpoint, parts);
    expect([row.status ?? 200, row.status ?? 204]).toContain(response.status);
    if (!row.history) return;
    expect(await historyOf(api.ours.id)).toEqual({ count: before.count + (row.entries ?? 1), newest: row.history });
  });

  test.each(roles)('is not for the workshop’s own %s', async (role) => {
    const { parts } = await row.visit(api.ours, api);
    const before = await historyOf(api.ours.id);
    expect((await api.as(role).call(endpoint, parts)).status).toBe(401);
    expect(await historyOf(api.ours.id)).toEqual(before);
  });

  test('refuses a stranger', async () => {
    const { parts } = await row.visit(api.ours, api);
    expect((await (await api.stranger()).call(endpoint, parts)).status).toBe(401);
  });

  test('says nothing of another client, of this workshop or another', async () => {
    const { visitor } = await row.visit(api.ours, api);
    for (const workshop of [api.ours, api.theirs]) {
      const { parts } = await row.visit(workshop, api);
      const response = await visitor.call(endpoint, parts);
      if (endpoint.params !== undefined || row.namesRows) expect(response.status).toBe(404);
      expect(bytesOf(response)).not.toContain(canary);
    }
  });

  if (!isSafe(endpoint)) {
    test('refuses a request that does not carry the token', async () => {
      const { visitor, parts } = await row.visit(api.ours, api);
      visitor.token = 'x'.repeat(43);
      expect((await visitor.call(endpoint, parts)).status).toBe(403);
    });
  }
}

for (const endpoint of forClients) describe(endpoint.name, () => clientsMayCall(endpoint));
