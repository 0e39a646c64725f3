import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { invite } from '#shared/accounts/people-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import { askClientQuestion } from '#shared/client-page/client-issues-endpoints';
import { endpoints } from '#shared/endpoints';
import { beginEstimate } from '#shared/estimates/estimates-endpoints';
import { readJob } from '#shared/jobs/jobs-endpoints';
import { makeFeed } from '#shared/programme/board-endpoints';
import { dayAhead, draftCard, workOut } from './sample-card';
import { acceptedIssue, issueOf, linkTo, sampleIssue } from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import { sampleInvoice, samplePayment, sayWho, stageInvoice } from './sample-invoice';
import { keptPlan, markedIssue, shopWith, told } from './sample-programme';
import { acceptedVariation } from './sample-variation';
import { allRows } from './rows/all-rows';
import { password, startApi, type Api } from './start-api';
import { Visitor, type Parts } from './visitor';

/** Whoever reads a list costs the database as many queries with many rows as with few, whichever list it is. */
let api: Api;

interface Schema {
  readonly _zod: { readonly def: { readonly type: string; readonly shape?: Readonly<Record<string, Schema>> } };
}
const answersRows = ({ method, answers }: Endpoint): boolean =>
  method === 'get' &&
  (Object.values(answers) as unknown as Schema[]).some(({ _zod: { def } }) =>
    Object.values(def.shape ?? {}).some((field) => field._zod.def.type === 'array'),
  );

/** What answers with arrays and is no list of rows. */
const oneThing: Readonly<Record<string, string>> = {
  readWorkshop: 'the lines of one address',
  listLetterTemplates: 'as many as there are kinds of letters',
  readAlternatives: 'worked out of one estimate',
  readEstimate: 'one estimate; estimates.spec.ts counts its members',
  readIssue: 'one frozen issue',
  readClientIssue: 'one frozen issue',
  readDifferences: 'worked out of two issues',
  readCardDifferences: 'worked out of two cards',
  readInvoice: 'one invoice',
  readProgramme: 'one programme',
  readShop: 'one record of the workshop',
};

const lists = endpoints.filter((endpoint) => answersRows(endpoint) && !(endpoint.name in oneThing));

/** What stands before anything is counted: something of each kind whose rows are counted. */
async function ground() {
  const { ours } = api;
  const { owner } = ours.people;
  await sayWho(ours);
  const { content } = await shopWith(ours, owner);
  const contract = await acceptedIssue(ours, api);
  const job = await told<{ clientId: string }>(owner.visitor, readJob, { params: { jobId: contract.jobId } });
  const { estimateId } = await sampleIssue(ours, api);
  const card = await draftCard(ours);
  return { contract, clientId: job.clientId, estimateId, card, personId: content.people[0].id };
}
type Ground = Awaited<ReturnType<typeof ground>>;

async function morePeople(): Promise<void> {
  const { owner } = api.ours.people;
  await api.newcomer(api.ours, 'bench');
  await new Visitor(api.app.web.express).signIn(owner.email, password);
  const body = { name: 'A Guest', email: `${randomUUID()}@guests.example`, roles: ['bench'] };
  await told(owner.visitor, invite, { body, key: randomUUID() });
}

async function moreOfOneJob({ contract, estimateId, personId }: Ground, round: number): Promise<void> {
  const { visitor } = api.ours.people.owner;
  const { jobId, issueId } = contract;
  await told(visitor, beginEstimate, { params: { jobId, estimateId: newId() }, body: { title: `Other ${round}` } });
  await issueOf(api.ours, api, estimateId);
  await linkTo(api.ours, api, issueId);
  await told(contract.visitor, askClientQuestion, { params: { issueId }, body: { text: `And ${round}?` } });
  await acceptedVariation(api.ours, api, { jobId, price: '80.00', visitor: contract.visitor });
  const [from, to] = [round * 10, round * 10 + 10];
  await stageInvoice(api.ours, contract, { of: 'work', from_percent: `${from}`, to_percent: `${to}` });
  await told(visitor, makeFeed, { params: { feedId: newId() }, body: { name: `Calendar ${round}`, personId } });
}

/** Further jobs of other clients, from an open estimate to a payment. */
async function moreJobs(): Promise<void> {
  const planned = await sampleEstimate(api.ours);
  await keptPlan(api.ours, planned.estimateId);
  await markedIssue(api.ours, api, { estimateId: planned.estimateId, state: 'accepted' });
  await acceptedIssue(api.ours, api);
  await samplePayment(api.ours, api);
  await sampleInvoice(api.ours);
  await sampleEstimate(api.ours);
}

async function moreOfAll(base: Ground, round: number): Promise<void> {
  await morePeople();
  await draftCard(api.ours);
  await moreJobs();
  await moreOfOneJob(base, round);
  await allRows['listGivenUpLetters']?.prepare(api.ours, api, api.ours.people.owner);
  await api.platform.database.execute(
    "INSERT INTO payment_events (id, kind, content, received_at) VALUES (:id, 'invoice.sang_a_song', '{}', :now)",
    { id: newId(), now: api.clock.now() },
  );
  await workOut(api.ours, api, base.card.id);
}

function partsFor(endpoint: Endpoint, base: Ground, benchDay: string): Parts {
  const { jobId } = base.contract;
  const ids = { jobId, estimateId: base.estimateId, clientId: base.clientId, rateCardId: base.card.id };
  const params = Object.fromEntries(Object.entries(ids).filter(([name]) => endpoint.path.includes(`:${name}`)));
  const years = { from: '2020-01-01', to: '2099-12-31' };
  const queries: Readonly<Record<string, Record<string, string>>> = {
    readStatement: years,
    readJournal: years,
    readBenchDay: { day: benchDay },
  };
  return { params, query: queries[endpoint.name] ?? {} };
}

const rowsIn = (value: unknown): number => {
  if (typeof value !== 'object' || value === null) return 0;
  const own = Array.isArray(value) ? value.length : 0;
  return Object.values(value).reduce((sum: number, part) => sum + rowsIn(part), own);
};

interface Reading {
  readonly queries: number;
  readonly rows: number;
}

/** Reads each list twice, since the first reading may note that somebody was here, and looks at the second. */
async function readAll(base: Ground): Promise<Record<string, Reading>> {
  const readings: Record<string, Reading> = {};
  const benchDay = await dayAhead(api.ours, api, 5);
  for (const endpoint of lists) {
    const visitor = endpoint.callers === 'client' ? base.contract.visitor : api.as('owner');
    const parts = partsFor(endpoint, base, benchDay);
    await told(visitor, endpoint, parts);
    const before = api.platform.database.statements;
    const body = await told<unknown>(visitor, endpoint, parts);
    readings[endpoint.name] = { queries: api.platform.database.statements - before, rows: rowsIn(body) };
  }
  return readings;
}

let few: Record<string, Reading>;
let many: Record<string, Reading>;
beforeAll(async () => {
  api = await startApi();
  const base = await ground();
  await moreOfAll(base, 1);
  few = await readAll(base);
  for (const round of [2, 3, 4]) await moreOfAll(base, round);
  many = await readAll(base);
}, 180_000);
afterAll(() => api.stop());

test('what answers with arrays is a list that is counted, or is named as one thing', () => {
  const named = endpoints.filter(answersRows).map(({ name }) => name);
  expect(named).toEqual(expect.arrayContaining(Object.keys(oneThing)));
  expect(lists.length).toBeGreaterThan(20);
});

test.each(lists.map(({ name }) => name))('%s asks the database as often for many rows as for few', (name) => {
  expect(many[name].rows).toBeGreaterThan(few[name].rows);
  expect(many[name].queries).toBe(few[name].queries);
});
