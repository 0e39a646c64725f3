import type { Response } from 'supertest';
import type { Endpoint } from '#shared/actor/endpoint';
import { roles, type Role } from '#shared/actor/role';
import { refusalsOf, whoIs } from './logged-refusals';
import type { ClientCall, MatrixRow } from './matrix-row';
import { allRows, clientRows } from './rows/all-rows';
import { canary, startApi, type Api, type TestPerson, type TestWorkshop } from './start-api';
import { standingStill } from './standing-still';
import type { Parts, Visitor } from './visitor';

/**
 * Every endpoint × every role × another workshop's row: who may call gets an answer, who may not is refused and nothing changes, and
 * another workshop's rows do not exist (ASVS 8.2.1, 8.2.2, 8.3.1, 8.4.1). One call is made ready for each endpoint: everybody who may
 * not is refused with it first, and then it is answered for whoever may, so a refusal was never one for another reason.
 */
let api: Api;

/** What is planted where nothing changes: for those who only read of ours, of another client, and of another workshop. */
let still: Readonly<Record<'ours' | 'others' | 'theirs', TestWorkshop>>;

const mayCall = ({ callers }: Endpoint, role: Role): boolean => typeof callers === 'string' || callers.includes(role);
const isSafe = ({ method }: Endpoint): boolean => method === 'get';

const callerOf = (row: MatrixRow, workshop: TestWorkshop, role: Role): Promise<TestPerson> | TestPerson =>
  row.bySomebodyNew ? api.newcomer(workshop, role) : workshop.people[role];

async function historyOf(workshopId: string): Promise<{ count: number; newest: string | undefined }> {
  const [row] = await api.platform.database.select<{ count: number; newest: string | null }>(
    `SELECT COUNT(*) AS count, (SELECT code FROM audit WHERE workshop_id = :workshopId ORDER BY id DESC LIMIT 1) AS newest
     FROM audit WHERE workshop_id = :workshopId`,
    { workshopId },
  );
  return { count: Number(row?.count), newest: row?.newest ?? undefined };
}

const bytesOf = (response: Response): string =>
  Buffer.isBuffer(response.body) ? response.body.toString('latin1') : (response.text ?? '');

type Row = Pick<MatrixRow, 'history' | 'entries' | 'status'>;

/** Makes a call that is to be answered, and looks at the history it leaves. */
async function answered(row: Row, call: () => PromiseLike<Response>): Promise<void> {
  const before = await historyOf(api.ours.id);
  const response = await call();
  expect([row.status ?? 200, row.status ?? 204]).toContain(response.status);
  if (!row.history) return;
  expect(await historyOf(api.ours.id)).toEqual({ count: before.count + (row.entries ?? 1), newest: row.history });
}

async function unchanged(status: number, call: () => PromiseLike<Response>): Promise<Response> {
  const before = await historyOf(api.ours.id);
  const response = await call();
  expect(response.status).toBe(status);
  expect(await historyOf(api.ours.id)).toEqual(before);
  return response;
}

/** One call of an endpoint and who may make it; known once the tests of the endpoint begin. */
interface Ready {
  readonly caller: TestPerson;
  readonly parts: Parts;
}

/** What is asked of one endpoint for people of a workshop, or for anybody. */
interface Asked {
  readonly endpoint: Endpoint;
  readonly row: MatrixRow;
  readonly allowed: readonly Role[];
  readonly ready: () => Ready;
}

const rolesOf = (endpoint: Endpoint, may: boolean): Role[] => roles.filter((role) => mayCall(endpoint, role) === may);

async function madeReady({ endpoint, row }: Pick<Asked, 'endpoint' | 'row'>, role: Role): Promise<Ready> {
  const caller = await callerOf(row, api.ours, role);
  return { caller, parts: await row.prepare(isSafe(endpoint) ? still.ours : api.ours, api, caller) };
}

/** Whoever may not call is refused, and each refusal is one event of the log with who it was (ASVS 16.2.1, 16.3.2). */
function refusals({ endpoint, ready }: Asked): void {
  const refused = rolesOf(endpoint, false);
  if (refused.length > 0) {
    test.each(refused)('refuses %s, and nothing changes', async (role) => {
      const response = await unchanged(403, () => api.as(role).call(endpoint, ready().parts));
      expect(refusalsOf(api, response)).toEqual([{ ...whoIs(api.ours.people[role]), status: 403 }]);
    });
  }

  if (endpoint.callers !== 'anyone') {
    test('refuses a stranger', async () => {
      const stranger = await api.stranger();
      const response = await unchanged(401, () => stranger.call(endpoint, ready().parts));
      expect(response.headers['content-type']).toContain('application/problem+json');
      expect(refusalsOf(api, response)).toEqual([{ status: 401 }]);
    });
  }

  if (!isSafe(endpoint) && !endpoint.signature) {
    test('refuses a request that does not carry the token', async () => {
      const response = await unchanged(403, () => withoutToken(ready().caller.visitor, endpoint, ready().parts));
      expect(refusalsOf(api, response)).toMatchObject([{ status: 403 }]);
    });
  }
}

async function withoutToken(visitor: Visitor, endpoint: Endpoint, parts: Parts): Promise<Response> {
  const { token } = visitor;
  visitor.token = 'x'.repeat(43);
  const response = await visitor.call(endpoint, parts);
  visitor.token = token;
  return response;
}

/** Whoever may call is answered: the first of them with the very call the others were refused with. */
function answers(asked: Asked): void {
  const { endpoint, row, allowed, ready } = asked;
  const readyFor = async (role: Role): Promise<Ready> => {
    if (role === allowed[0]) return ready();
    return isSafe(endpoint) && !row.ofTheCaller
      ? { ...ready(), caller: api.ours.people[role] }
      : madeReady(asked, role);
  };

  test.each(allowed)('answers %s', async (role) => {
    const { caller, parts } = await readyFor(role);
    const visitor = endpoint.callers === 'anyone' ? await api.stranger() : caller.visitor;
    await answered(row, () => visitor.call(endpoint, parts));
  });
}

function keepsWorkshopsApart({ endpoint, row, allowed, ready }: Asked): void {
  const namesRows = endpoint.params !== undefined || row.namesRows === true;

  test('says nothing of another workshop', async () => {
    const caller = await callerOf(row, api.ours, allowed[0]);
    const theirs = await row.prepare(still.theirs, api, caller);
    const own = async () => (isSafe(endpoint) ? ready().parts : row.prepare(api.ours, api, caller));
    const response = await caller.visitor.call(endpoint, namesRows ? theirs : await own());
    expect(bytesOf(response)).not.toContain(canary);
    if (!namesRows) return expect([row.status ?? 200, row.status ?? 204]).toContain(response.status);
    expect(response.status).toBe(404);
    expect(refusalsOf(api, response)).toEqual([{ ...whoIs(caller), status: 404 }]);
  });
}

/** What a workshop's own people may call, or anybody. */
function peopleMayCall(endpoint: Endpoint): void {
  const row = allRows[endpoint.name];
  const allowed = rolesOf(endpoint, true);
  let ready: Ready;
  beforeAll(async () => {
    ready = await madeReady({ endpoint, row }, allowed[0]);
  });
  const asked = { endpoint, row, allowed, ready: () => ready };

  refusals(asked);
  answers(asked);
  if (endpoint.callers !== 'anyone') keepsWorkshopsApart(asked);
}

/** How a link closes: it ends by its day, or is taken back. */
const closings = [
  ['ended', 'UPDATE client_accesses SET ends_at = DATE_SUB(ends_at, INTERVAL 10 YEAR) WHERE workshop_id = :workshopId'],
  ['was taken back', 'UPDATE client_accesses SET revoked_at = created_at WHERE workshop_id = :workshopId'],
] as const;

/** Every link of ours is closed while it is asked, and open again afterwards, so that whoever is refused is the one who is answered. */
async function withLinksClosed<T>(closing: string, ask: () => Promise<T>): Promise<T> {
  const { database } = api.platform;
  const own = { workshopId: api.ours.id };
  const kept = await database.select<{ id: string; endsAt: Date; revokedAt: Date | null }>(
    'SELECT id, ends_at AS endsAt, revoked_at AS revokedAt FROM client_accesses WHERE workshop_id = :workshopId',
    own,
  );
  await database.execute(closing, own);
  try {
    return await ask();
  } finally {
    for (const access of kept)
      await database.execute(
        'UPDATE client_accesses SET ends_at = :endsAt, revoked_at = :revokedAt WHERE workshop_id = :workshopId AND id = :id',
        { ...own, ...access },
      );
  }
}

/** What clients may call: their own workshop's people are strangers to it, and so is any other client. */
function clientsMayCall(endpoint: Endpoint): void {
  const row = clientRows[endpoint.name];
  let ready: ClientCall;
  beforeAll(async () => {
    ready = await row.visit(isSafe(endpoint) ? still.ours : api.ours, api);
  });

  test.each(roles)('is not for the workshop’s own %s', async (role) => {
    await unchanged(401, () => api.as(role).call(endpoint, ready.parts));
  });

  test('refuses a stranger', async () => {
    const stranger = await api.stranger();
    await unchanged(401, () => stranger.call(endpoint, ready.parts));
  });

  test('says nothing of another client, of this workshop or another', async () => {
    for (const workshop of [still.others, still.theirs]) {
      const { parts } = await row.visit(workshop, api);
      const response = await ready.visitor.call(endpoint, parts);
      if (endpoint.params !== undefined || row.namesRows) expect(response.status).toBe(404);
      expect(bytesOf(response)).not.toContain(canary);
    }
  });

  test.each(closings)('refuses whoever came by a link that %s, and nothing changes', async (_, closing) => {
    const response = await withLinksClosed(closing, () =>
      unchanged(401, () => ready.visitor.call(endpoint, ready.parts)),
    );
    expect(bytesOf(response)).not.toContain(api.ours.mark);
  });

  if (!isSafe(endpoint)) {
    test('refuses a request that does not carry the token', async () => {
      await unchanged(403, () => withoutToken(ready.visitor, endpoint, ready.parts));
    });
  }

  test('answers the client on a visit', () => answered(row, () => ready.visitor.call(endpoint, ready.parts)));
}

/** Lays out the matrix of some endpoints, on a server of their own. */
export function matrixOf(some: readonly Endpoint[]): void {
  beforeAll(async () => {
    api = await startApi();
    const { ours, theirs } = api;
    still = { ours: standingStill(ours), others: standingStill(ours), theirs: standingStill(theirs) };
  }, 60_000);
  afterAll(() => api.stop());

  for (const endpoint of some) {
    describe(endpoint.name, () => (endpoint.callers === 'client' ? clientsMayCall : peopleMayCall)(endpoint));
  }
}
