import type { Endpoint } from '#shared/actor/endpoint';
import { roles } from '#shared/actor/role';
import { endpoints } from '#shared/endpoints';
import { refusalsOf, whoIs } from './logged-refusals';
import { allRows } from './rows/all-rows';
import { startApi, type Api, type TestPerson } from './start-api';
import type { Parts } from './visitor';

/** Each refusal leaves one event: when in UTC, who, in which workshop, under the number the answer bears (ASVS 16.2.1, 16.3.1 to 16.3.3). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

interface Attempt {
  readonly endpoint: Endpoint;
  readonly may: TestPerson;
  readonly parts: Parts;
}

async function attemptAt(name: string): Promise<Attempt> {
  const endpoint: Endpoint = endpoints.find((one) => one.name === name) ?? endpoints[0];
  const may = api.ours.people[roles.find((role) => endpoint.callers.includes(role)) ?? 'owner'];
  return { endpoint, may, parts: await allRows[name].prepare(api.ours, api, may) };
}

const sample = ['keepInvoice', 'invite', 'keepShop', 'keepJob', 'answerQuestion', 'changeEstimate', 'keepRateCard'];

test.each(sample)(
  '%s refused for its role, to a stranger, without the token, and where it is another’s',
  async (name) => {
    const { endpoint, may, parts } = await attemptAt(name);
    const other = roles.find((role) => !endpoint.callers.includes(role)) ?? 'bench';
    const role = await api.as(other).call(endpoint, parts);
    expect(refusalsOf(api, role)).toEqual([{ ...whoIs(api.ours.people[other]), status: 403 }]);
    const nobody = await (await api.stranger()).call(endpoint, parts);
    expect(refusalsOf(api, nobody)).toEqual([{ status: 401 }]);
    const { token } = may.visitor;
    may.visitor.token = 'x'.repeat(43);
    const forged = await may.visitor.call(endpoint, parts);
    may.visitor.token = token;
    expect(refusalsOf(api, forged)).toEqual([{ ...whoIs(may), status: 403 }]);
    if (!endpoint.params) return;
    const theirs = await allRows[name].prepare(api.theirs, api, may);
    expect(refusalsOf(api, await may.visitor.call(endpoint, theirs))).toEqual([{ ...whoIs(may), status: 404 }]);
  },
);

test.each(sample)('%s refused for its body, once and without what was entered', async (name) => {
  const { endpoint, may, parts } = await attemptAt(name);
  const surplus = { ...(parts.body as object), surplus: 'nobody asked for this' };
  const response = await may.visitor.call(endpoint, { ...parts, body: surplus });
  expect(refusalsOf(api, response)).toEqual([{ ...whoIs(may), status: 400 }]);
  expect(api.logLines.join('')).not.toContain('nobody asked for this');
});

test('a wrong password is told with nobody’s name, and a guess at an address with none', async () => {
  const visitor = await api.stranger();
  const response = await visitor.signIn(api.ours.people.bench.email, 'not this one at all');
  expect(refusalsOf(api, response)).toEqual([{ status: 403 }]);
  expect(refusalsOf(api, await visitor.request('get', '/api/nothing'))).toEqual([{ status: 404 }]);
});
