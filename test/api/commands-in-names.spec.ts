import * as childProcess from 'node:child_process';
import { existsSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Workbook } from 'exceljs';
import { randomUUID } from 'node:crypto';
import { giveAccess } from '#shared/agreements/accesses-endpoints';
import { addDays } from '#shared/calendar/add-days';
import { readBenchSheet, readPaper } from '#shared/estimates/issues-endpoints';
import { readJournalList } from '#shared/invoices/owed-endpoints';
import { keepClient } from '#shared/jobs/clients-endpoints';
import { keepJob } from '#shared/jobs/jobs-endpoints';
import { textOfPaper } from '../documents/paper-text';
import { issueOf } from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import { sampleInvoice } from './sample-invoice';
import { clientNamed, jobTitled } from './sample-job';
import { startApi, type Api } from './start-api';
import type { Parts } from './visitor';

/** Names that a shell would take for commands reach papers, mails, workbooks and lists as letters, and nothing runs (ASVS 1.2.5). */
const mark = `ran-${randomUUID().slice(0, 6)}`;
const traces = [join(tmpdir(), mark), join(process.cwd(), mark)];
const [absolute] = traces;
/** A command for each way into one, told apart by what it would leave. */
const client = `Heron; touch ${absolute}`;
const contact = `$(touch ${absolute})`;
const title = `Base && touch ${mark} | cat`;
const reference = `\`touch ${absolute}\``;

let api: Api;
const ways = ['spawn', 'spawnSync', 'exec', 'execSync', 'execFile', 'execFileSync', 'fork'] as const;
let started: jest.SpyInstance[];
beforeAll(async () => {
  started = ways.map((name) => jest.spyOn(childProcess, name));
  api = await startApi();
}, 60_000);
afterAll(async () => {
  for (const spy of started) spy.mockRestore();
  await api.stop();
});

const commands = () => started.reduce((sum, spy) => sum + spy.mock.calls.length, 0);

const binary = (response: NodeJS.ReadableStream, done: (error: Error | null, body: Buffer) => void): void => {
  const parts: Buffer[] = [];
  response.on('data', (part: Buffer) => parts.push(part));
  response.on('end', () => done(null, Buffer.concat(parts)));
};

async function fileOf(endpoint: Parameters<ReturnType<Api['as']>['call']>[0], parts: Parts): Promise<Buffer> {
  const response = await api
    .as('owner')
    .call(endpoint, parts)
    .buffer(true)
    .parse(binary as never);
  expect(response.status).toBe(200);
  return response.body as Buffer;
}

/** A job of a client, both named by commands, with an issue and its link sent by mail. */
async function issuedSample() {
  const owner = api.as('owner');
  const { jobId, estimateId, pieceId } = await sampleEstimate(api.ours);
  const { clientId } = await api.app.jobs.job(api.ours.id, jobId);
  const named = clientNamed(client, { contact, email: 'heron@quay.example', address: contact });
  expect((await owner.call(keepClient, { params: { clientId }, version: 1, body: named })).status).toBe(200);
  const body = jobTitled(title, clientId, { reference });
  expect((await owner.call(keepJob, { params: { jobId }, version: 1, body })).status).toBe(200);
  const issueId = await issueOf(api.ours, api, estimateId);
  const endsOn = addDays(await api.app.rateCards.service.today(api.ours.id), 30);
  const sent = await owner.call(giveAccess, { params: { issueId }, body: { endsOn, send: true, note: contact } });
  expect(sent.status).toBeLessThan(300);
  await sampleInvoice(api.ours, { clientId });
  return { issueId, estimateId, pieceId };
}

test('a command would be counted', () => {
  const before = commands();
  childProcess.execFileSync('true');
  expect(commands()).toBe(before + 1);
});

test('papers, mails, the workbook and the lists bear them to the letter, and no command runs', async () => {
  const before = commands();
  const { issueId, estimateId, pieceId } = await issuedSample();
  const paper = (name: string) => fileOf(readPaper, { params: { issueId, paper: name } });
  const [pdf, order, list] = [
    await paper('estimate.pdf'),
    await paper('leaf-order.pdf'),
    await paper('leaf-order.csv'),
  ];
  const workbook = new Workbook();
  await workbook.xlsx.load((await paper('estimate.xlsx')) as never);
  const sheet = await fileOf(readBenchSheet, { params: { estimateId, pieceId } });
  const wide = { from: '2020-01-01', to: '2099-12-31' };
  const journal = (await fileOf(readJournalList, { query: wide })).toString('utf8');
  const [mail] = (await api.mails()).filter(({ headers }) => headers.includes('heron@quay.example'));
  expect(commands()).toBe(before);

  // Reading a paper is the first program that runs.
  const text = textOfPaper(pdf);
  for (const one of [client, contact, reference]) expect(text).toContain(one);
  expect([order, sheet].map(textOfPaper).every((other) => other.includes('Base && touch'))).toBe(true);
  expect(list.length).toBeGreaterThan(20);
  expect(journal).toContain(client);
  expect(mail.text).toContain(contact);
  const cells = workbook.worksheets.flatMap((one) =>
    one.getSheetValues().flatMap((row) => (Array.isArray(row) ? row : [])),
  );
  expect(cells.some((cell) => typeof cell === 'string' && cell.includes('touch'))).toBe(true);
  expect(traces.filter(existsSync)).toEqual([]);
}, 300_000);
