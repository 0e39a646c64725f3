import ICAL from 'ical.js';
import { v7 as newId } from 'uuid';
import {
  listFeeds,
  makeFeed,
  markAsPlanned,
  markTask,
  readBenchDay,
  readBoard,
  readFeed,
  revokeFeed,
} from '#shared/programme/board-endpoints';
import type { BenchDay } from '#shared/programme/bench-day-schema';
import type { BenchTask } from '#shared/programme/bench-task';
import type { BoardAnswer } from '#shared/programme/board-schema';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { startOfDay_ms } from '#shared/programme/odd-days';
import { programme as planAgain } from '#shared/programme/programme';
import { planDifferences } from '#shared/programme/plan-differences';
import type { Programme } from '#shared/programme/programme-plan';
import { readIssue } from '#shared/estimates/issues-endpoints';
import { removeJob } from '#shared/jobs/jobs-endpoints';
import {
  holdSlot,
  keepPlan,
  keepProgramme,
  keepShop,
  readProgramme,
  readShop,
  readSolution,
  readWhatIf,
  solveProgramme,
  stopSolution,
} from '#shared/programme/programme-endpoints';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import type { ShopAnswer } from '#shared/programme/shop-schema';
import type { SolutionAnswer } from '#shared/programme/solution-schema';
import type { WhatIfAnswer } from '#shared/programme/what-if-schema';
import {
  acceptedSample,
  everyGrade,
  keptPlan,
  keptShop,
  markedIssue,
  plannedSample,
  programmeOf,
  shopOf,
  shopWith,
  solved,
  told,
  wednesdayAfter,
} from './sample-programme';
import { workIdOf } from '#shared/programme/work-id-of';
import { sampleEstimate } from './sample-estimate';
import { password, startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

/** What is promised about programmes: kept and refused in words, planned on the server, around other work, at the bench, in calendars. */
let api: Api;
let owner: Visitor;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
beforeEach(async () => {
  // Planned twice is planned from the same minute.
  api.clock.stand(new Date());
  await api.another();
  owner = api.as('owner');
});
afterAll(() => api.stop());

const at = (estimateId: string) => ({ params: { estimateId } });
const instant = (answer: ProgrammeAnswer, minutes: number) => Date.parse(answer.startsAt) + minutes * 60_000;

describe('What the workshop has to work with', () => {
  test('is assumed from the rate card until it is entered, and then kept by version', async () => {
    const assumed = await told<ShopAnswer>(owner, readShop);
    expect(assumed.version).toBe(0);
    expect(assumed.content.people.map(({ gradeIds }) => gradeIds)).toEqual(everyGrade.map((id) => [id]));
    const content = shopOf('Herons', api.ours.people.bench.actor.membershipId);
    expect((await owner.call(keepShop, { version: 0, body: content })).body.version).toBe(1);
    // A second press of the same button is the same thing said twice.
    expect((await owner.call(keepShop, { version: 0, body: content })).body.version).toBe(1);
    const stale = await owner.call(keepShop, { version: 0, body: { ...content, productiveShare_percent: 70 } });
    expect(stale.status).toBe(412);
    expect(stale.body.current).toMatchObject({ version: 1, content: { productiveShare_percent: 80 } });
  });

  test('takes no sign-in of another workshop, no grade nobody knows, and no hours that end before they begin', async () => {
    const theirs = shopOf('Herons', api.theirs.people.bench.actor.membershipId);
    const stranger = await owner.call(keepShop, { version: 0, body: theirs });
    expect(stranger.status).toBe(400);
    expect(stranger.body.errors).toMatchObject([{ message: 'Choose somebody who works here.' }]);
    const [first] = theirs.people;
    const unknown = { ...theirs, people: [{ ...first, membershipId: null, gradeIds: ['gilder', 'turner'] }] };
    expect((await owner.call(keepShop, { version: 0, body: unknown })).body.errors).toMatchObject([
      { message: 'The rate card in force has no such grade.' },
    ]);
    const backwards = shopOf('Herons', null, {
      hours: Array.from({ length: 7 }, () => [{ start_minutes: 600, end_minutes: 500 }]),
    });
    expect((await owner.call(keepShop, { version: 0, body: backwards })).body.errors[0].message).toBe(
      'Hours end after they begin.',
    );
  });
});

/** A session ends after a while, whoever moved the clock. */
const signInAgain = async () => {
  await owner.arrive();
  expect((await owner.signIn(api.ours.people.owner.email, password)).status).toBe(200);
};

/** The clock stands at a time of the wall on the coming Wednesday. */
async function standAt(estimateId: string, minutes: number): Promise<void> {
  const { timeZone } = await programmeOf(api.ours, estimateId);
  const day = wednesdayAfter(dayOfInstant(api.clock.now().getTime(), timeZone));
  api.clock.stand(new Date(startOfDay_ms(day, timeZone) + minutes * 60_000 + 20_000));
  await signInAgain();
}

describe('A programme', () => {
  test('is kept by version, once however often it is sent', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const { inputs } = await programmeOf(api.ours, estimateId);
    const body = { ...inputs, inHand_days: 5 };
    const first = await owner.call(keepProgramme, { ...at(estimateId), version: 0, body });
    expect(first.body).toMatchObject({ version: 1, inputs: { inHand_days: 5 } });
    expect((await owner.call(keepProgramme, { ...at(estimateId), version: 0, body })).body.version).toBe(1);
    const other = await owner.call(keepProgramme, { ...at(estimateId), version: 0, body: { ...body, inHand_days: 9 } });
    expect(other.status).toBe(412);
    expect(other.body.current).toMatchObject({ version: 1, inputs: { inHand_days: 5 } });
  });

  test('keeps a plan from a browser, describes it anew, and says what it promises', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const { request, version } = await programmeOf(api.ours, estimateId);
    const plan = solved(request);
    // What a browser says of ends, slack and reasons is not believed; starts and people are checked.
    const forged = {
      ...plan,
      tasks: plan.tasks.map((task) => ({ ...task, end_minutes: task.start_minutes, slack_minutes: 9 })),
    };
    const kept = await told<ProgrammeAnswer>(owner, keepPlan, { ...at(estimateId), version, body: forged });
    expect(kept).toMatchObject({ version: 1, isCurrent: true, broken: [], hold: null });
    expect(kept.plan?.tasks).toEqual(plan.tasks);
    expect(kept.dates?.offeredOn && kept.dates.offeredOn > (kept.dates.finishesOn ?? '')).toBe(true);
    const repeated = await owner.call(keepPlan, { ...at(estimateId), version, body: forged });
    expect(repeated.body.version).toBe(1);
  });

  test('refuses a plan in words: a window missed, hands asked for twice, a task left out', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    // In the morning, so that whatever is moved to its beginning can be done in one go.
    await standAt(estimateId, 9 * 60);
    const { request, version } = await programmeOf(api.ours, estimateId);
    const plan = solved(request);
    const refuse = async (tasks: typeof plan.tasks) => {
      const answer = await owner.call(keepPlan, { ...at(estimateId), version, body: { ...plan, tasks } });
      expect(answer.status).toBe(422);
      return (answer.body.errors as { message: string }[]).map(({ message }) => message);
    };
    expect(await refuse(plan.tasks.slice(1))).toEqual([`${request.tasks[0].name} is not in the plan.`]);
    const weekLater = plan.tasks.map((task) =>
      /\/burnish\//.test(task.taskId) ? { ...task, start_minutes: task.start_minutes + 7 * 1440 } : task,
    );
    expect(await refuse(weekLater)).toContainEqual(
      expect.stringMatching(/^Burnish \((.+)\) comes too late after Wet and lay \(\1\): the window has closed\.$/),
    );
    const atOnce = plan.tasks.map((task) => ({ ...task, start_minutes: plan.tasks[0].start_minutes }));
    expect(await refuse(atOnce)).toContainEqual(
      expect.stringMatching(/^Gesso 1\/4 \((.+)\) starts before Size coat \(\1\) lets it\.$/),
    );
    // A start of the next century holds nobody up, and is refused for what it is.
    const far = plan.tasks.map((task, place) => (place === 0 ? { ...task, start_minutes: 49_000_000 } : task));
    const before = process.cpuUsage();
    expect(await refuse(far)).toEqual([
      `${request.tasks[0].name} begins more than ten years after the programme does. Please plan it nearer.`,
    ]);
    expect(process.cpuUsage(before).user / 1000).toBeLessThan(1000);
    expect((await programmeOf(api.ours, estimateId)).plan).toBeNull();
  });

  test('is no more current once somebody is away whom it counts on, and says why', async () => {
    const { estimateId, programme } = await plannedSample(api.ours, api.ours.people.bench);
    const { content } = await told<ShopAnswer>(owner, readShop);
    const away = { id: newId(), firstDay: programme.firstDay, lastDay: '2099-01-01', note: '' };
    const [first, ...others] = content.people;
    await keptShop(api.ours, { ...content, people: [{ ...first, absences: [away] }, ...others] });
    const now = await programmeOf(api.ours, estimateId);
    expect(now.isCurrent).toBe(false);
    expect(now.broken.map(({ code }) => code)).toContain('programme-breaks-hours');
    expect(now.plan?.finish_minutes).toBe(programme.plan?.finish_minutes);
  });

  test('cannot be planned while nobody has a grade it needs', async () => {
    const [, second] = shopOf('Herons', null).people;
    await keptShop(api.ours, shopOf('Herons', null, { people: [second] }));
    const { estimateId } = await sampleEstimate(api.ours);
    const refused = await owner.call(solveProgramme, { ...at(estimateId), body: { seconds: 1, keepsPlan: false } });
    expect(refused.status).toBe(422);
    expect(refused.body.errors[0].message).toMatch(/^Nobody here does the work of Carver/);
  });

  test('takes two at once for one step, and for carving, where that is entered; too few are said', async () => {
    const [first, second] = shopOf('Herons', null).people;
    const both = { ...second, gradeIds: ['gilder', 'carver'] };
    await keptShop(api.ours, shopOf('Herons', null, { people: [first, both] }));
    const { estimateId } = await sampleEstimate(api.ours);
    const { inputs, items } = await programmeOf(api.ours, estimateId);
    const smooth = items.find(({ kind }) => kind === 'smooth');
    const carving = items.find(({ kind, gradeId }) => kind === 'carving' && gradeId === 'carver');
    if (!smooth || !carving) throw new Error('the sample is smoothed and carved');
    const hands = [smooth, carving].map((item) => ({ workId: workIdOf(item), crew: 2 }));
    const keep = (version: number, more: object) =>
      owner.call(keepProgramme, { ...at(estimateId), version, body: { ...inputs, ...more } });
    const kept = (await keep(0, { hands })).body as ProgrammeAnswer;
    const wanted = items.filter((item) => hands.some(({ workId }) => workId === workIdOf(item)));
    const pairs = kept.request.tasks.filter(({ crew }) => crew === 2).map(({ id }) => id);
    expect(pairs).toEqual(wanted.map(({ taskId }) => taskId));
    const hands_minutes = wanted.reduce((sum, { handsOn_minutes }) => sum + handsOn_minutes, 0);
    expect(kept.findings).toContainEqual(
      expect.objectContaining({ kind: 'note', code: 'programme-hands-beyond', values: { hands_minutes } }),
    );
    const plan = solved(kept.request);
    for (const { taskId, personIds } of plan.tasks)
      expect([taskId, personIds.length >= 2]).toEqual([taskId, pairs.includes(taskId) || personIds.length >= 2]);
    expect(plan.tasks.filter(({ taskId }) => pairs.includes(taskId)).map((task) => task.personIds.length)).toEqual(
      pairs.map(() => 2),
    );
    const three = (await keep(1, { hands: [{ ...hands[1], crew: 3 }] })).body as ProgrammeAnswer;
    expect(three.findings.map(({ code }) => code)).toContain('programme-crew-short');
    const twice = await keep(2, { hands: [hands[0], hands[0]] });
    expect([twice.status, twice.body.errors[0].path]).toEqual([400, ['hands', 1]]);
  });

  test('goes with its job', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { jobId, estimateId } = await sampleEstimate(api.ours);
    await keptPlan(api.ours, estimateId);
    const { version } = await api.app.jobs.service.get(api.ours.id, jobId);
    expect((await owner.call(removeJob, { params: { jobId }, version })).status).toBe(204);
    expect((await owner.call(readProgramme, at(estimateId))).status).toBe(404);
  });
});

describe('Planned in the afternoon', () => {
  const nowIn = (answer: { startsAt: string }) =>
    Math.ceil((api.clock.now().getTime() - Date.parse(answer.startsAt)) / 60_000);
  const starts = (plan: ProgrammeAnswer['plan']) => (plan?.tasks ?? []).map(({ start_minutes }) => start_minutes);

  test('nothing is placed before 15:07: read, asked what if, and worked out by the server', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    await standAt(estimateId, 15 * 60 + 6);
    const asRead = await programmeOf(api.ours, estimateId);
    const whatIf = { day: null, climate: null, furtherGradeIds: [], lots: [] };
    const asked = await told<WhatIfAnswer>(owner, readWhatIf, { ...at(estimateId), body: whatIf });
    expect([asRead.request.start_minutes, asked.request.start_minutes]).toEqual([nowIn(asRead), nowIn(asked)]);
    await told(owner, solveProgramme, { ...at(estimateId), body: { seconds: 1, keepsPlan: false } });
    await api.platform.tasks.runDue();
    const kept = await programmeOf(api.ours, estimateId);
    expect(Math.min(...starts(kept.plan))).toBe(nowIn(kept));
    expect(Math.min(...starts(solved(asRead.request)))).toBe(nowIn(asRead));
  });

  test('after closing time its waits are the same as planned, as kept and as read two days later', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    await standAt(estimateId, 19 * 60);
    const { request, version } = await programmeOf(api.ours, estimateId);
    const plan = solved(request);
    const kept = await told<ProgrammeAnswer>(owner, keepPlan, { ...at(estimateId), version, body: plan });
    expect(kept.plan?.tasks).toEqual(plan.tasks);
    api.clock.move({ minutes: 2 * 1440 });
    await signInAgain();
    const later = await programmeOf(api.ours, estimateId);
    expect([later.isCurrent, later.plan, later.dates]).toEqual([true, kept.plan, kept.dates]);
    // What is planned anew starts two days later; a plan made before is not taken once what it begins with is past.
    expect(later.request.start_minutes).toBe(request.start_minutes + 2 * 1440);
    const body = { ...plan, plans: plan.plans + 1 };
    const refused = await owner.call(keepPlan, { ...at(estimateId), version: kept.version, body });
    expect(refused.status).toBe(422);
  });

  test('a plan brought after somebody looked at it for half an hour is kept, after two hours it is past', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    await standAt(estimateId, 10 * 60);
    const { request, version } = await programmeOf(api.ours, estimateId);
    const plan = solved(request);
    api.clock.move({ minutes: 120 });
    await signInAgain();
    const refused = await owner.call(keepPlan, { ...at(estimateId), version, body: plan });
    const first = request.tasks.find(
      ({ id }) => id === plan.tasks.find(({ start_minutes }) => start_minutes === request.start_minutes)?.taskId,
    );
    expect(refused.body.errors).toContainEqual(
      expect.objectContaining({ message: `${first?.name ?? ''} would begin in the past.` }),
    );
    api.clock.move({ minutes: -90 });
    await signInAgain();
    const kept = await told<ProgrammeAnswer>(owner, keepPlan, { ...at(estimateId), version, body: plan });
    expect(kept.plan?.tasks).toEqual(plan.tasks);
  });
});

describe('Planning on the server', () => {
  const begin = (estimateId: string, seconds: number) =>
    told<SolutionAnswer>(owner, solveProgramme, { ...at(estimateId), body: { seconds, keepsPlan: false } });
  const read = (id: string) => told<SolutionAnswer>(owner, readSolution, { params: { solutionId: id } });

  test('is asked for once however often it is pressed, runs in a thread, and its plan is kept', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const first = await begin(estimateId, 1);
    expect(first.state).toBe('waiting');
    expect((await begin(estimateId, 1)).id).toBe(first.id);
    await api.platform.tasks.runDue();
    const done = await read(first.id);
    expect(done.state).toBe('done');
    const { plan, version, isCurrent } = await programmeOf(api.ours, estimateId);
    expect([version, isCurrent, plan?.finish_minutes]).toEqual([1, true, done.finish_minutes]);
  });

  test('is stopped in the midst of it, and keeps the best so far', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const { id } = await begin(estimateId, 60);
    const began = performance.now();
    const working = api.platform.tasks.runDue();
    for (;;) {
      const { state, plan } = await read(id);
      if (state !== 'waiting' && plan) break;
      await new Promise((resolve) => setTimeout(resolve, 100));
      if (performance.now() - began > 30_000) throw new Error('no plan was told of');
    }
    await told(owner, stopSolution, { params: { solutionId: id } });
    await working;
    expect(performance.now() - began).toBeLessThan(45_000);
    const ended = await read(id);
    expect(['stopped', 'done']).toContain(ended.state);
    expect((await programmeOf(api.ours, estimateId)).plan?.finish_minutes).toBe(ended.finish_minutes);
  });

  test('keeping the plan moves nothing that need not move', async () => {
    const { estimateId, programme } = await plannedSample(api.ours, api.ours.people.bench);
    const tone = programme.plan?.tasks.find(({ taskId }) => taskId.includes('/tone/'));
    const later = new Date(instant(programme, (tone?.start_minutes ?? 0) + 7 * 1440)).toISOString();
    const pins = [{ taskId: tone?.taskId ?? '', at: later }];
    const body = { ...programme.inputs, pins };
    const { version } = await told<ProgrammeAnswer>(owner, keepProgramme, {
      ...at(estimateId),
      version: programme.version,
      body,
    });
    const asked = { ...at(estimateId), body: { seconds: 2, keepsPlan: true } };
    const { id } = await told<SolutionAnswer>(owner, solveProgramme, asked);
    await api.platform.tasks.runDue();
    expect((await read(id)).state).toBe('done');
    const now = await programmeOf(api.ours, estimateId);
    expect([now.version, now.isCurrent]).toEqual([version + 1, true]);
    const moved = planDifferences(programme.plan as Programme, now.plan as Programme).map(({ taskId }) => taskId);
    const after = programme.items
      .slice(programme.items.findIndex(({ taskId }) => taskId === tone?.taskId))
      .map(({ taskId }) => taskId);
    expect(moved.length).toBeGreaterThan(0);
    expect(moved.filter((taskId) => !after.includes(taskId))).toEqual([]);
  });

  test('of a programme that was changed meanwhile is not kept', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const { id } = await begin(estimateId, 1);
    const { inputs, version } = await programmeOf(api.ours, estimateId);
    await told(owner, keepProgramme, { ...at(estimateId), version, body: { ...inputs, inHand_days: 2 } });
    await api.platform.tasks.runDue();
    expect((await read(id)).state).toBe('outdated');
    expect((await programmeOf(api.ours, estimateId)).plan).toBeNull();
  });
});

describe('The board', () => {
  const board = (visitor = owner) => told<BoardAnswer>(visitor, readBoard, { query: { weeks: 26 } });

  test('plans a second job around the first, and shows who is promised to what', async () => {
    const first = await acceptedSample(api.ours, api, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const second = await keptPlan(api.ours, estimateId);
    expect(second.dates?.assumptions).toContainEqual(
      expect.objectContaining({ code: 'programme-assumes-promised', values: { jobs: 1 } }),
    );
    const busy = (first.programme.plan?.tasks ?? []).flatMap(({ spans, personIds }) =>
      personIds.flatMap((id) =>
        spans.map((span) => ({
          id,
          from: instant(first.programme, span.start_minutes),
          to: instant(first.programme, span.end_minutes),
        })),
      ),
    );
    const overlaps = (second.plan?.tasks ?? []).flatMap(({ spans, personIds }) =>
      personIds.flatMap((id) =>
        spans.filter((span) =>
          busy.some(
            (one) =>
              one.id === id &&
              instant(second, span.start_minutes) < one.to &&
              instant(second, span.end_minutes) > one.from,
          ),
        ),
      ),
    );
    expect(busy.length).toBeGreaterThan(0);
    expect(overlaps).toEqual([]);
    expect(Date.parse(second.startsAt) + (second.plan?.finish_minutes ?? 0) * 60_000).toBeGreaterThan(
      Date.parse(first.programme.startsAt) + (first.programme.plan?.finish_minutes ?? 0) * 60_000,
    );
    await markedIssue(api.ours, api, { estimateId, state: 'accepted' });
    const shown = await board();
    expect(shown.jobs.map(({ standing }) => standing)).toEqual(['accepted', 'accepted']);
    expect(shown.clashes).toEqual([]);
    const gilding = shown.load.filter(({ gradeId }) => gradeId === 'gilder');
    expect(gilding.some(({ work_minutes }) => work_minutes > 0)).toBe(true);
    expect(
      gilding.every(({ work_minutes, capacity_minutes, isOver }) => isOver === work_minutes > capacity_minutes),
    ).toBe(true);
  });

  test('says what is promised twice: two jobs planned without knowing of each other', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const [one, other] = [await sampleEstimate(api.ours), await sampleEstimate(api.ours)];
    await keptPlan(api.ours, one.estimateId);
    await keptPlan(api.ours, other.estimateId);
    for (const { estimateId } of [one, other]) await markedIssue(api.ours, api, { estimateId, state: 'accepted' });
    const { clashes, people } = await board();
    const hands = clashes.filter(({ kind }) => kind === 'person');
    expect(hands.length).toBeGreaterThan(0);
    expect(people.map(({ name }) => name)).toContain(hands[0].name);
    expect(hands[0].estimateIds).toEqual([one.estimateId, other.estimateId].sort());
    expect((await programmeOf(api.ours, other.estimateId)).isCurrent).toBe(false);
  });

  test('names what was accepted without a plan, until it is planned', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { jobId, estimateId } = await sampleEstimate(api.ours);
    expect((await board()).unplanned).toEqual([]);
    await markedIssue(api.ours, api, { estimateId, state: 'accepted' });
    const { unplanned, jobs } = await board();
    expect(unplanned).toMatchObject([{ jobId, estimateId }]);
    expect(unplanned[0].title).not.toBe('');
    expect(jobs).toEqual([]);
    expect((await board(api.theirs.people.owner.visitor)).unplanned).toEqual([]);
    await keptPlan(api.ours, estimateId);
    const planned = await board();
    expect([planned.unplanned, planned.jobs.map((job) => job.estimateId)]).toEqual([[], [estimateId]]);
  });

  test('holds a slot for an offer that was sent until its validity ends, and no longer', async () => {
    const { estimateId } = await plannedSample(api.ours, api.ours.people.bench);
    expect((await owner.call(holdSlot, at(estimateId))).body.title).toBe(
      'A slot is held for an issue that was sent. Mark the issue as sent first.',
    );
    const { letter, validUntil } = await markedIssue(api.ours, api, { estimateId, state: 'sent' });
    const held = await told<ProgrammeAnswer>(owner, holdSlot, at(estimateId));
    expect(held.hold).toMatchObject({ letter, until: validUntil });
    expect((await told<ProgrammeAnswer>(owner, holdSlot, at(estimateId))).version).toBe(held.version);
    expect((await board()).jobs).toMatchObject([{ estimateId, standing: 'held', heldUntil: validUntil }]);
    const days = Math.round((Date.parse(validUntil) - Date.now()) / 86_400_000);
    api.clock.move({ minutes: (days + 2) * 1440 });
    const later = await api.stranger();
    await later.signIn(api.ours.people.owner.email, password);
    expect((await board(later)).jobs).toEqual([]);
    expect((await told<ProgrammeAnswer>(later, readProgramme, at(estimateId))).hold).toBeNull();
  });
});

describe('An issue that was made with a plan', () => {
  test('tells the office the dates its client sees and what they assume; one without a plan has none', async () => {
    const { estimateId, programme } = await plannedSample(api.ours, api.ours.people.bench);
    const { id } = await markedIssue(api.ours, api, { estimateId, state: 'sent' });
    const dates = (await told<{ dates: unknown }>(api.as('office'), readIssue, { params: { issueId: id } })).dates;
    expect(dates).toEqual(programme.dates);
    expect(programme.dates?.assumptions.length).toBeGreaterThan(0);
    const other = await sampleEstimate(api.ours);
    const unplanned = await markedIssue(api.ours, api, { estimateId: other.estimateId, state: 'sent' });
    const frozen = await owner.call(readIssue, { params: { issueId: unplanned.id } });
    expect((frozen.body as { dates: unknown }).dates).toBeNull();
  });
});

describe('The bench', () => {
  test('reads its own day in order, marks what it starts and ends, and never sees a cost', async () => {
    const { estimateId, programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
    const bench = api.as('bench');
    const [task] = [...(programme.plan?.tasks ?? [])].sort((one, next) => one.start_minutes - next.start_minutes);
    const day = new Date(instant(programme, task.start_minutes)).toISOString().slice(0, 10);
    const answer = await bench.call(readBenchDay, { query: { day } });
    const read = answer.body as BenchDay;
    expect(read.person?.name).toBe(`${api.ours.mark} first hand`);
    expect(read.people).toHaveLength(1);
    expect(read.tasks.map(({ startsAt }) => startsAt)).toEqual(read.tasks.map(({ startsAt }) => startsAt).sort());
    expect(read.tasks[0]).toMatchObject({ taskId: task.taskId, state: 'ready', kind: 'carving' });
    expect(answer.text).not.toMatch(/cost|price|rate|margin|minor/i);
    const mark = (kind: string) =>
      bench.call(markTask, {
        ...at(estimateId),
        body: { taskId: task.taskId, mark: kind, at: null, left_minutes: null },
      });
    const started = (await mark('started')).body as BenchTask;
    expect(started.state).toBe('started');
    api.clock.move({ minutes: 5 });
    expect((await mark('started')).body).toEqual(started);
    const finished = await mark('finished');
    expect((finished.body as BenchTask).state).toBe('finished');
    expect(finished.text).not.toMatch(/cost|price|rate|margin|minor/i);
    const { marks, request } = await programmeOf(api.ours, estimateId);
    expect(marks).toMatchObject([{ taskId: task.taskId, left_minutes: 0, personIds: [read.person?.id] }]);
    expect(request.tasks.find(({ id }) => id === task.taskId)?.happened).toMatchObject({ left_minutes: 0 });
    expect(((await mark('not-started')).body as BenchTask).state).toBe('ready');
  });

  test('goes on from carving to the size coat: several grades end it together, and an approval given meanwhile is known', async () => {
    const { estimateId, programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
    const bench = api.as('bench');
    const { items, inputs, approvals, version } = programme;
    const carving = items.filter(({ kind }) => kind === 'carving').map(({ taskId }) => taskId);
    const size = items.find(({ kind }) => kind === 'size-coat')?.taskId ?? '';
    expect([carving.length > 1, items.some(({ kind }) => kind === 'carved')]).toEqual([true, true]);
    const stateOf = async (taskId: string) => {
      const { plan } = await programmeOf(api.ours, estimateId);
      const planned = plan?.tasks.find((task) => task.taskId === taskId);
      const day = new Date(instant(programme, planned?.start_minutes ?? 0)).toISOString().slice(0, 10);
      const query = { day, personId: planned?.personIds[0] ?? '' };
      const read = await told<BenchDay>(owner, readBenchDay, { query });
      return read.tasks.find((task) => task.taskId === taskId)?.state;
    };
    for (const taskId of carving)
      for (const mark of ['started', 'finished'])
        await told(bench, markTask, { ...at(estimateId), body: { taskId, mark, at: null, left_minutes: null } });
    expect(await stateOf(size)).toBe('waiting');
    const given = approvals.map(({ approvalId }) => ({ approvalId, at: api.clock.now().toISOString() }));
    const { version: current } = await programmeOf(api.ours, estimateId);
    expect(current).toBe(version);
    const body = { ...inputs, approvals: given };
    await told(owner, keepProgramme, { ...at(estimateId), version: current, body });
    expect(await stateOf(size)).toBe('ready');
    const { request } = await programmeOf(api.ours, estimateId);
    const carved = request.tasks.find(({ id }) => id.endsWith('/carved'));
    expect(carved?.happened).toMatchObject({ left_minutes: 0, personIds: [] });
  });

  test('says once of work nobody marked that it went as planned: then a plan that is made again leaves it where it was', async () => {
    const { estimateId, programme: before } = await acceptedSample(api.ours, api, api.ours.people.bench);
    expect(before.isAccepted).toBe(false);
    const start = Math.min(...(before.plan?.tasks ?? []).map(({ start_minutes }) => start_minutes));
    api.clock.stand(new Date(instant(before, start) + 4 * 1440 * 60_000));
    for (const visitor of [owner, api.as('bench')]) await visitor.arrive();
    expect((await owner.signIn(api.ours.people.owner.email, password)).status).toBe(200);
    const unmarked = await programmeOf(api.ours, estimateId);
    expect([unmarked.isAccepted, unmarked.isCurrent]).toEqual([true, true]);
    const { plan, request } = unmarked;
    const now = request.start_minutes;
    const due = (plan?.tasks ?? []).filter((task) => task.start_minutes < now && task.personIds.length > 0);
    const [first] = due;
    const again = (answer: ProgrammeAnswer) =>
      planAgain(answer.request, { previous: answer.plan as Programme }).tasks.find(
        ({ taskId }) => taskId === first.taskId,
      );
    expect(due.length).toBeGreaterThan(0);
    expect(again(unmarked)?.start_minutes).toBeGreaterThanOrEqual(now);
    const mark = () =>
      told<{ marked: number }>(owner, markAsPlanned, {
        ...at(estimateId),
        body: { taskIds: [...due.map(({ taskId }) => taskId), 'another/task'] },
      });
    expect(await mark()).toEqual({ marked: due.length });
    expect(await mark()).toEqual({ marked: 0 });
    const marked = await programmeOf(api.ours, estimateId);
    expect([marked.isCurrent, marked.plan, marked.marks.length]).toEqual([true, plan, due.length]);
    const { start_minutes, end_minutes, personIds } = first;
    expect(again(marked)).toMatchObject({ start_minutes, end_minutes, personIds });
  });

  test('reads nobody else’s day, and of an unknown sign-in nothing', async () => {
    const { content } = await shopWith(api.ours, api.ours.people.bench);
    const bench = api.as('bench');
    const other = await bench.call(readBenchDay, { query: { personId: content.people[1].id } });
    expect(other.status).toBe(403);
    expect((await api.as('estimator').call(readBenchDay, { query: {} })).body).toMatchObject({
      person: null,
      tasks: [],
    });
    expect((await owner.call(readBenchDay, { query: { personId: content.people[1].id } })).body.person.name).toBe(
      `${api.ours.mark} second hand`,
    );
    expect((await owner.call(readBenchDay, { query: { personId: newId() } })).status).toBe(404);
  });

  test('works only what was accepted', async () => {
    const { estimateId, programme } = await plannedSample(api.ours, api.ours.people.bench);
    const body = { taskId: programme.items[0].taskId, mark: 'started', at: null, left_minutes: null };
    const refused = await api.as('bench').call(markTask, { ...at(estimateId), body });
    expect([refused.status, refused.body.title]).toEqual([
      409,
      'The job is not accepted, so nothing of it is worked yet.',
    ]);
  });
});

describe('A calendar for other programs', () => {
  const feed = async (visitor: Visitor, personId: string | null) => {
    const params = { feedId: newId() };
    const made = await told<{ address: string }>(visitor, makeFeed, {
      params,
      body: { name: 'On the telephone', personId },
    });
    return { params, secret: new URL(made.address).searchParams.get('secret') ?? '' };
  };
  const read = async (secret: string) => (await api.stranger()).call(readFeed, { query: { secret } });

  test('is read by its secret address alone, holds the work as it is planned, and is taken back', async () => {
    const { programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
    const { params, secret } = await feed(owner, null);
    const answer = await read(secret);
    expect(answer.headers['content-type']).toBe('text/calendar; charset=utf-8');
    const calendar = new ICAL.Component(ICAL.parse(answer.text));
    const events = calendar.getAllSubcomponents('vevent').map((one) => new ICAL.Event(one));
    const spans = (programme.plan?.tasks ?? [])
      .filter(({ personIds }) => personIds.length > 0)
      .flatMap((task) => task.spans);
    expect(events.map((event) => event.startDate.toJSDate().getTime()).sort()).toEqual(
      spans.map((span) => instant(programme, span.start_minutes)).sort(),
    );
    expect(new Set(events.map(({ uid }) => uid)).size).toBe(events.length);
    expect(answer.text).not.toMatch(/cost|price|margin/i);
    expect(api.logLines.join('\n')).not.toContain(secret);
    const [row] = await api.platform.database.select<{ hash: string }>(
      'SELECT secret_hash AS hash FROM calendar_feeds',
    );
    expect(row.hash).toMatch(/^[0-9a-f]{64}$/);
    await told(owner, revokeFeed, { params });
    expect((await read(secret)).status).toBe(404);
  });

  test('says of which plan it is: SEQUENCE rises with each plan kept anew, and with nothing else', async () => {
    const { estimateId, programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
    const { secret } = await feed(owner, null);
    const saying = async () => {
      const calendar = new ICAL.Component(ICAL.parse((await read(secret)).text));
      const events = calendar.getAllSubcomponents('vevent').map((one) => new ICAL.Event(one));
      const modified = events.map(({ component }) => String(component.getFirstPropertyValue('last-modified')));
      return { sequences: [...new Set(events.map(({ sequence }) => sequence))], modified: [...new Set(modified)] };
    };
    const second = (at: Date) => `${at.toISOString().slice(0, 19)}Z`;
    const keptAt = api.clock.now();
    expect(await saying()).toEqual({ sequences: [0], modified: [second(keptAt)] });
    api.clock.move({ minutes: 20 });
    const inputs = { ...programme.inputs, inHand_days: 3 };
    await told(owner, keepProgramme, { ...at(estimateId), version: programme.version, body: inputs });
    expect(await saying()).toEqual({ sequences: [0], modified: [second(keptAt)] });
    await keptPlan(api.ours, estimateId);
    expect(await saying()).toEqual({ sequences: [1], modified: [second(api.clock.now())] });
  });

  test('of a person holds their work only; the bench makes and sees its own alone', async () => {
    const { programme } = await acceptedSample(api.ours, api, api.ours.people.bench);
    const [first, second] = programme.request.people;
    const bench = api.as('bench');
    const { secret } = await feed(bench, first.id);
    const calendar = new ICAL.Component(ICAL.parse((await read(secret)).text));
    const own = (programme.plan?.tasks ?? [])
      .filter(({ personIds }) => personIds.includes(first.id))
      .flatMap(({ spans }) => spans);
    expect(calendar.getAllSubcomponents('vevent')).toHaveLength(own.length);
    const others = await bench.call(makeFeed, {
      params: { feedId: newId() },
      body: { name: 'Another', personId: second.id },
    });
    expect(others.status).toBe(403);
    await feed(owner, null);
    expect((await bench.call(listFeeds)).body.items).toMatchObject([{ personId: first.id }]);
    expect((await owner.call(listFeeds)).body.items).toHaveLength(2);
  });

  test('is not there any more for somebody whose access has ended', async () => {
    const { actor, visitor } = api.ours.people.bench;
    const { content } = await shopWith(api.ours, api.ours.people.bench);
    const { secret } = await feed(visitor, content.people[0].id);
    expect((await read(secret)).status).toBe(200);
    const manager = await api.newcomer(api.ours, 'office');
    const { secret: ofAll } = await feed(manager.visitor, null);
    expect((await read(ofAll)).status).toBe(200);
    const people = await api.app.accounts.people.list(api.ours.id);
    const version = people.find(({ id }) => id === actor.membershipId)?.version ?? 0;
    await api.platform.database.transaction(() =>
      api.app.accounts.people.changeAccess(api.ours.people.owner.actor, { id: actor.membershipId, version }, true),
    );
    expect((await read(secret)).status).toBe(404);
    const managing = (await api.app.accounts.people.list(api.ours.id)).find(
      ({ id }) => id === manager.actor.membershipId,
    );
    await api.platform.database.transaction(() =>
      api.app.accounts.people.changeAccess(
        api.ours.people.owner.actor,
        { id: manager.actor.membershipId, version: managing?.version ?? 0 },
        true,
      ),
    );
    expect((await read(ofAll)).status).toBe(404);
  });

  test('given another address leads nowhere by the old one', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { params, secret } = await feed(owner, null);
    await told(owner, makeFeed, { params, body: { name: 'On the telephone', personId: null } });
    expect((await read(secret)).status).toBe(404);
  });
});

describe('What if', () => {
  test('there were a second gilder, another size, 14 °C: what is solved and what it costs, and nothing is kept', async () => {
    await shopWith(api.ours, api.ours.people.bench);
    const { estimateId } = await sampleEstimate(api.ours);
    const before = await programmeOf(api.ours, estimateId);
    const ask = (more: object) =>
      told<WhatIfAnswer>(owner, readWhatIf, {
        ...at(estimateId),
        body: { day: null, climate: null, furtherGradeIds: [], lots: [], ...more },
      });
    const cold = await ask({ climate: { temperature_celsius: 14, humidity_percent: 50 } });
    expect([cold.costDifference_minor, cold.grossDifference_minor]).toEqual([0, 0]);
    expect(cold.request.paces.find(({ id }) => id === 'oil')?.stretches[0].factor).toBeCloseTo(2 ** 0.6, 9);
    const hands = await ask({ furtherGradeIds: ['gilder'] });
    expect(hands.request.people).toHaveLength(before.request.people.length + 1);
    const lotId = before.items.find(({ kind }) => kind === 'lay')?.lotId ?? '';
    const size = await ask({ lots: [{ lotId, buildUpId: 'oil-12-hour' }] });
    expect(size.costDifference_minor).not.toBe(0);
    expect(size.items.map(({ kind }) => kind)).toContain('oil-size');
    // A lot in water has no size to be changed; a lot in oil keeps its build-up but for that one step.
    const onlySize = (buildUpId: string, of = lotId) => ({ lots: [{ lotId: of, buildUpId, onlySize: true }] });
    const refused = await owner.call(readWhatIf, {
      ...at(estimateId),
      body: { day: null, climate: null, furtherGradeIds: [], ...onlySize('oil-12-hour') },
    });
    expect(refused.status).toBe(400);
    expect(
      (
        await owner.call(readWhatIf, {
          ...at(estimateId),
          body: { day: null, climate: null, furtherGradeIds: [], lots: [{ lotId, buildUpId: 'none' }] },
        })
      ).status,
    ).toBe(400);
    expect(await programmeOf(api.ours, estimateId)).toEqual(before);
  });
});
