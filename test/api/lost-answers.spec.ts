import { fork, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import type { Endpoint } from '#shared/actor/endpoint';
import { endpoints } from '#shared/endpoints';
import { builtProgram } from '../programs/built-program';
import { allRows } from './rows/all-rows';
import { startApi, type Api } from './start-api';
import { sumsOfRows } from './sums-of-rows';
import type { Parts } from './visitor';

/**
 * A server is killed after its commit and before its answer, on a database it shares with another. Whoever asks there again with the
 * same key is given the answer that was lost, and nothing is done twice (draft-ietf-httpapi-idempotency-key-header-07).
 */
let api: Api;
let settings: string[];
const url = process.env['TEST_DATABASE_SERVER'];
beforeAll(async () => {
  api = await startApi();
  const { databaseUrl, dataFolder, sessionSecret, webFolder } = api.platform.config;
  settings = [
    `DATABASE_URL=${databaseUrl}`,
    `DATA_DIR=${dataFolder}`,
    `SESSION_SECRET=${sessionSecret}`,
    `WEB_DIR=${webFolder}`,
  ];
  expect(databaseUrl.startsWith(url ?? 'none')).toBe(true);
}, 60_000);
afterAll(() => api.stop());

interface Doomed {
  readonly child: ChildProcess;
  readonly port: number;
}

async function startDoomed(): Promise<Doomed> {
  const child = fork(builtProgram('serve-until-committed'), settings);
  const [port] = (await once(child, 'message')) as [number];
  return { child, port };
}

/** Asks the server that is going to die; answers how the asking and the server ended. */
async function askDoomed({ child, port }: Doomed, { path, method }: Endpoint, parts: Parts) {
  const { cookie, token } = api.as('owner');
  const headers = {
    cookie,
    'x-csrf-token': token,
    'idempotency-key': parts.key ?? '',
    'content-type': 'application/json',
  };
  const filled = path.replace(/:(\w+)/g, (_, name: string) => parts.params?.[name] ?? '');
  const ended = once(child, 'exit');
  const asking = fetch(`http://127.0.0.1:${port}${filled}`, { method, headers, body: JSON.stringify(parts.body) });
  const answer = await asking.then((response) => response.text()).catch(() => 'cut off');
  const [, signal] = (await ended) as [number | null, string | null];
  return { answer, signal };
}

test.each(['invite', 'issueEstimate', 'issueInvoice', 'recordPayment'])(
  '%s: the lost answer comes with the same key, and it was done once',
  async (name) => {
    const endpoint = endpoints.find((one) => one.name === name) as Endpoint;
    const parts = await allRows[name].prepare(api.ours, api, api.ours.people.owner);
    const before = await sumsOfRows(api.platform.database, api.ours.id);
    expect(await askDoomed(await startDoomed(), endpoint, parts)).toEqual({ answer: 'cut off', signal: 'SIGKILL' });
    const done = await sumsOfRows(api.platform.database, api.ours.id);
    expect(done).not.toEqual(before);
    const again = await api.as('owner').call(endpoint, parts);
    expect([200, 204]).toContain(again.status);
    expect((await api.as('owner').call(endpoint, parts)).text).toBe(again.text);
    expect(await sumsOfRows(api.platform.database, api.ours.id)).toEqual(done);
    const other = await api.as('owner').call(endpoint, { ...parts, body: { ...(parts.body as object), surplus: 1 } });
    expect([400, 422]).toContain(other.status);
  },
  60_000,
);
