import { readAgreement } from '#shared/agreements/agreement-endpoints';
import type { Decision } from '#shared/agreements/decision-schema';
import { listHistory } from '#shared/audit/history-endpoints';
import { acceptIssue, readClientOverview } from '#shared/client-page/client-issues-endpoints';
import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import { listIssues, readBenchSheet, readPaper } from '#shared/estimates/issues-endpoints';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { textOfPaper } from '../documents/paper-text';
import { acceptanceOf, clientOf, issueOf, sampleChoices } from './sample-client-visit';
import { programmeOf, told } from './sample-programme';
import { startApi, type Api } from './start-api';

/** What becomes of the alternatives a client took, once they have accepted: everything that follows goes by them. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 120_000);
afterAll(() => api.stop());

const stepsOf = async (estimateId: string): Promise<string> =>
  JSON.stringify((await programmeOf(api.ours, estimateId)).items);

it('is followed at the bench, in the leaf order, in the programme, in lists, in the history and by mail', async () => {
  const sample = await sampleChoices(api.ours, api);
  const { estimateId, issueId, jobId } = sample;
  const whole = await api.app.estimates.drafts.whole(api.ours.id, estimateId);
  const sheet = async () => {
    const params = { estimateId, pieceId: whole.pieces[0].id };
    return textOfPaper((await api.as('bench').call(readBenchSheet, { params })).body as Buffer);
  };
  const order = async () => {
    const params = { issueId, paper: 'leaf-order.csv' };
    return String((await api.as('owner').call(readPaper, { params }).responseType('blob')).body as Buffer);
  };
  const [sheetBefore, stepsBefore] = [await sheet(), await stepsOf(estimateId)];
  expect([/burnish/i.test(sheetBefore), /burnish/i.test(stepsBefore)]).toEqual([true, true]);
  const orderBefore = await order();

  const visitor = await clientOf(api.ours, api, issueId);
  const acceptance = await acceptanceOf(visitor, issueId, [sample.silver, sample.crate]);
  const { gross_minor } = acceptance.body as { gross_minor: number };
  expect((await visitor.call(acceptIssue, acceptance)).status).toBe(200);

  const sheetAfter = await sheet();
  expect([/burnish/i.test(sheetAfter), /silver/i.test(sheetAfter)]).toEqual([false, true]);
  expect(/silver/i.test(orderBefore)).toBe(false);
  expect(/silver/i.test(await order())).toBe(true);
  expect((await programmeOf(api.ours, estimateId)).inputs.choice).toEqual([sample.silver, sample.crate]);
  expect(await stepsOf(estimateId)).not.toMatch(/burnish/i);

  const names = ['Silver leaf', 'A crate'];
  const agreement = await told<{ decisions: Decision[] }>(api.as('office'), readAgreement, { params: { jobId } });
  expect(agreement.decisions.map(({ alternatives }) => alternatives)).toEqual([names]);
  const list = await told<{ items: PricedIssueSummary[] }>(api.as('office'), listIssues, { params: { estimateId } });
  expect(list.items[0].agreed).toMatchObject({ alternatives: names, gross_minor });
  expect(list.items[0].gross_minor).not.toBe(gross_minor);
  const history = await told<{ items: { code: string; values: object }[] }>(api.as('owner'), listHistory, {
    query: { jobId, limit: 100 },
  });
  const accepted = history.items.find(({ code }) => code === 'history-issue-accepted-with');
  expect(accepted?.values).toMatchObject({ letter: 'A', chosen: 'Silver leaf, A crate' });
  const notices = (await api.mails()).filter(({ text }) => text.includes('Alternatives chosen: Silver leaf, A crate.'));
  expect(notices).toHaveLength(1);

  // What is issued afterwards is not the client's before it is sent, and their list shows what was agreed.
  await issueOf(api.ours, api, estimateId);
  const overview = await told<ClientOverview>(visitor, readClientOverview);
  const shown = overview.jobs.flatMap(({ issues }) => issues);
  expect(shown.map((issue) => [issue.letter, issue.gross_minor])).toEqual([['A', gross_minor]]);
}, 240_000);
