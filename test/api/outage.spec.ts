import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';
import { invite, listInvitations, listPeople } from '#shared/accounts/people-endpoints';
import { askForReset } from '#shared/accounts/password-endpoints';
import { readSession } from '#shared/accounts/session-endpoints';
import { changeWorkshop, readWorkshop } from '#shared/accounts/workshop-endpoints';
import { randomUUID } from 'node:crypto';
import { stopListening } from '../../backend/src/platform/listen';
import { startApi, type Api } from './start-api';
import { Visitor } from './visitor';
import { foundingSettings } from './test-workshop';

/** What fails around us fails closed, says so blandly, and leaves no half step (ASVS 2.3.3, 16.5.1 to 16.5.3). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const settings = {
  name: 'Herons Carvers',
  ...foundingSettings,
  addressLines: [],
  telephone: '',
  email: '',
  taxRegistration: '',
  defaultTaxCategory: 'S',
};

test('a step that fails after any of its statements has not happened', async () => {
  const { database } = api.platform;
  const query = database.sequelize.query.bind(database.sequelize) as (...all: unknown[]) => Promise<unknown>;
  const state = () => database.select('CHECKSUM TABLE workshops, audit, invitations, tasks, idempotency_keys');
  const before = await state();
  let failedAt = 0;
  for (let at = 1; ; at++) {
    let count = 0;
    database.sequelize.query = ((...all: unknown[]) => {
      const text = typeof all[0] === 'string' ? all[0] : (all[0] as { query: string }).query;
      const isWriting = /^\s*(INSERT|UPDATE|DELETE|SET STATEMENT)/i.test(text) && !text.includes('sessions');
      if (isWriting && ++count === at) return query(...all).then(() => Promise.reject(new Error('fault injected')));
      return query(...all);
    }) as typeof database.sequelize.query;
    const response = await api
      .as('owner')
      .call(invite, { body: { name: 'Half Way', email: 'half@way.example', roles: ['bench'] }, key: randomUUID() });
    database.sequelize.query = query as typeof database.sequelize.query;
    if (response.status === 200) break;
    failedAt = at;
    expect(response.status).toBe(500);
    expect(await state()).toEqual(before);
  }
  expect(failedAt).toBe(5);
});

test('a fault of ours is one bland sentence with a number, and the log has the rest', async () => {
  const { workshops } = api.app.accounts;
  const get = workshops.get.bind(workshops);
  workshops.get = () => Promise.reject(new Error('secret inner detail'));
  const response = await api.as('owner').call(readWorkshop);
  workshops.get = get;
  expect(response.status).toBe(500);
  expect(response.text).not.toMatch(/secret inner|at .*\.ts|node_modules/);
  const number = /urn:request:([0-9a-f-]{36})/.exec(response.text)?.[1] ?? 'none';
  expect(api.logLines.filter((line) => line.includes(number) && line.includes('secret inner detail'))).toHaveLength(1);
});

test('an answer that holds more than its audience may have is not sent', async () => {
  const { workshops } = api.app.accounts;
  const get = workshops.get.bind(workshops);
  workshops.get = async (id) => ({ ...(await get(id)), currency: 42 as unknown as string });
  const response = await api.as('bench').call(readWorkshop);
  workshops.get = get;
  expect(response.status).toBe(500);
  expect(response.text).not.toContain('Herons');
});

test('line breaks in what people enter make no line of their own in the log', async () => {
  const before = api.logLines.length;
  await api.as('bench').request('get', '/api/people%0d%0a{"level":60,"msg":"forged"}');
  expect(api.logLines.length).toBeGreaterThan(before);
  for (const line of api.logLines.slice(before)) {
    expect(line.match(/\n/g)).toHaveLength(1);
    expect(JSON.parse(line)).not.toMatchObject({ msg: 'forged' });
  }
});

test('while the database does not answer, requests are told to come back, and then they are served', async () => {
  const { sequelize } = api.platform.database;
  const manager = sequelize.connectionManager as unknown as {
    pool: unknown;
    getConnection: (...all: unknown[]) => Promise<unknown>;
  };
  const getConnection = manager.getConnection.bind(manager);
  const { ConnectionRefusedError } = await import('sequelize');
  manager.getConnection = () => Promise.reject(new ConnectionRefusedError(new Error('connect ECONNREFUSED')));
  const down = await api.as('owner').call(listPeople);
  const ready = await api.as('owner').request('get', '/readyz');
  const alive = await api.as('owner').request('get', '/healthz');
  const begun = await new Visitor(api.app.web.express).call(readSession);
  manager.getConnection = getConnection;
  expect([down.status, ready.status, alive.status, begun.status]).toEqual([503, 503, 200, 503]);
  expect(Number(down.headers['retry-after'])).toBeGreaterThan(0);
  expect((await api.as('owner').call(listPeople)).status).toBe(200);
});

test('while the mail server does not answer, mail waits', async () => {
  api.platform.mailbox.connect('smtp://127.0.0.1:1', false);
  const visitor = await api.stranger();
  expect((await visitor.call(askForReset, { body: { email: 'owner@herons.example' } })).status).toBe(204);
  await api.platform.tasks.runDue();
  const waiting = await api.platform.database.select<{ kind: string; attempts: number }>(
    'SELECT kind, attempts FROM tasks WHERE kind = :kind',
    { kind: 'mail' },
  );
  expect(waiting.length).toBeGreaterThan(0);
  expect(waiting.every(({ attempts }) => attempts > 0)).toBe(true);
});

test('stopping lets every running request finish, and says beforehand that no more are wanted', async () => {
  const other = await startApi();
  const server: Server = createServer(other.app.web.express);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const base = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const { workshops } = other.app.accounts;
  const get = workshops.get.bind(workshops);
  let arrived = 0;
  workshops.get = async (id) => {
    arrived += 1;
    await pause(1_500);
    return get(id);
  };
  const { cookie } = other.as('owner');
  const running = Array.from({ length: 40 }, () => fetch(`${base}${readWorkshop.path}`, { headers: { cookie } }));
  while (arrived < running.length) await pause(10);
  const began = performance.now();
  const stopped = stopListening(server, other.app.web);
  expect((await other.as('owner').request('get', '/readyz')).status).toBe(503);
  const answers = await Promise.all(running);
  await stopped;
  expect(answers.map(({ status }) => status)).toEqual(running.map(() => 200));
  expect(performance.now() - began).toBeLessThan(10_000);
  await expect(fetch(`${base}/healthz`)).rejects.toThrow();
  await other.stop();
}, 60_000);

test('settings changed while the answer was lost are there once', async () => {
  const { version } = (await api.as('owner').call(readWorkshop)).body as { version: number };
  const send = () => api.as('owner').call(changeWorkshop, { version, body: { ...settings, telephone: '333' } });
  expect([(await send()).status, (await send()).status]).toEqual([200, 412]);
  expect((await api.as('owner').call(listInvitations)).status).toBe(200);
});
