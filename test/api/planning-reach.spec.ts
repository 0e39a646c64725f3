import { v7 as newId } from 'uuid';
import { markTask, readBenchDay, readBoard } from '#shared/programme/board-endpoints';
import {
  keepProgramme,
  keepShop,
  readShop,
  readProgramme,
  readWhatIf,
  solveProgramme,
  stopSolution,
} from '#shared/programme/programme-endpoints';
import { sampleEstimate } from './sample-estimate';
import { acceptedSample, plannedSample, programmeOf, shopOf } from './sample-programme';
import { startApi, type Api } from './start-api';

/** Calendars are laid out day by day: a day centuries away, from whomever it comes, must not occupy the server. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const complained = (response: { body: unknown }) =>
  (response.body as { errors?: { pointer?: string }[] }).errors ?? response.body;

test.each(['1000-01-01T00:00:00Z', '1900-01-01T00:00:00Z'])('somebody at the bench marks nothing of %s', async (at) => {
  const { estimateId, programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
  const params = { estimateId };
  const taskId = programme.plan?.tasks[0]?.taskId ?? '';
  const marked = { taskId, mark: 'started', at, left_minutes: null };
  const response = await api.as('bench').call(markTask, { params, body: marked });
  expect(response.status).toBe(400);
  expect(response.text).toContain('five years back');
  expect((await api.as('owner').call(readProgramme, { params })).status).toBe(200);
});

test.each(['0001-01-01', '1900-01-01', '9999-12-31'])('no programme is planned from or for %s', async (day) => {
  const { estimateId } = await plannedSample(api.ours, api.ours.people.bench);
  const params = { estimateId };
  for (const direction of ['forward', 'backward']) {
    const { inputs, version } = await programmeOf(api.ours, estimateId);
    const response = await api
      .as('owner')
      .call(keepProgramme, { params, version, body: { ...inputs, day, direction } });
    expect([direction, response.status]).toEqual([direction, 400]);
  }
  const asked = { day, climate: null, furtherGradeIds: [], lots: [] };
  expect((await api.as('owner').call(readWhatIf, { params, body: asked })).status).toBe(400);
});

test('a pin or an approval as far away is refused beside its entry', async () => {
  const { estimateId, programme } = await plannedSample(api.ours, api.ours.people.bench);
  const { inputs, version } = await programmeOf(api.ours, estimateId);
  const taskId = programme.plan?.tasks[0]?.taskId ?? '';
  const far = '1900-01-01T00:00:00Z';
  const body = { ...inputs, pins: [{ taskId, at: far }], approvals: [{ approvalId: 'any', at: far }] };
  const response = await api.as('owner').call(keepProgramme, { params: { estimateId }, version, body });
  expect(response.status).toBe(400);
  expect(JSON.stringify(complained(response))).toContain('approvals');
  expect(JSON.stringify(complained(response))).toContain('pins');
});

test('days no calendar has are refused in what is read and in the hours of the workshop', async () => {
  const owner = api.as('owner');
  expect((await owner.call(readBoard, { query: { from: '9999-12-31', weeks: 104 } })).status).toBe(400);
  expect((await owner.call(readBenchDay, { query: { day: '9999-12-31' } })).status).toBe(400);
  const { version } = (await owner.call(readShop)).body as { version: number };
  for (const [firstDay, lastDay, says] of [
    ['0001-01-01', '9999-12-31', '2199'],
    ['2026-01-01', '2027-01-02', 'more than a year'],
  ]) {
    const days = [{ id: newId(), name: 'Closed', firstDay, lastDay, hours: [] }];
    const response = await owner.call(keepShop, { version, body: shopOf('Herons', null, { days }) });
    expect([response.status, response.text]).toEqual([400, expect.stringContaining(says)]);
  }
});

test('of one workshop three programmes are planned at once, however many are asked for', async () => {
  const { estimateId } = await plannedSample(api.ours, api.ours.people.bench);
  const more = await Promise.all(Array.from({ length: 5 }, () => sampleEstimate(api.ours)));
  const body = { seconds: 60, keepsPlan: false };
  const asked = [estimateId, ...more.map((sample) => sample.estimateId)];
  const answers = await Promise.all(
    asked.map((id) => api.as('owner').call(solveProgramme, { params: { estimateId: id }, body })),
  );
  expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 200, 200, 429, 429, 429]);
  const begun = answers.filter(({ status }) => status === 200).map((answer) => (answer.body as { id: string }).id);
  for (const solutionId of begun) await api.as('owner').call(stopSolution, { params: { solutionId } });
  await api.platform.tasks.runDue();
  const again = await api.as('owner').call(solveProgramme, { params: { estimateId: asked.at(-1) ?? '' }, body });
  expect(again.status).toBe(200);
});
