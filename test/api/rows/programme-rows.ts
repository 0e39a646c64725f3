import { v7 as newId } from 'uuid';
import { makeFeed } from '#shared/programme/board-endpoints';
import { solveProgramme } from '#shared/programme/programme-endpoints';
import type { MatrixRows } from '../matrix-row';
import { sampleEstimate } from '../sample-estimate';
import {
  acceptedSample,
  markedIssue,
  plannedSample,
  programmeOf,
  shopOf,
  shopWith,
  solved,
  told,
} from '../sample-programme';
import type { Api, TestPerson, TestWorkshop } from '../start-api';

const oneEstimate = async (workshop: TestWorkshop) => {
  const { estimateId } = await sampleEstimate(workshop);
  return { params: { estimateId } };
};

/** A shop of the workshop with the caller in it, where they are of it; another workshop's caller is nobody there. */
const ownCaller = (workshop: TestWorkshop, caller: TestPerson): TestPerson =>
  caller.actor.workshopId === workshop.id ? caller : workshop.people.bench;

async function shopVersion(workshop: TestWorkshop, api: Api): Promise<number> {
  return (await api.app.programme.shops.read(workshop.id)).version;
}

/** Nothing plans behind the scenes here, so what was asked for before is put aside: only so many wait at once. */
const nothingWaiting = ({ id }: TestWorkshop, { platform }: Api): Promise<number> =>
  platform.database.execute("UPDATE programme_solutions SET state = 'done' WHERE workshop_id = :id", { id });

async function oneSolution(workshop: TestWorkshop, api: Api) {
  await nothingWaiting(workshop, api);
  const { params } = await oneEstimate(workshop);
  const body = { seconds: 1, keepsPlan: false };
  const { id } = await told<{ id: string }>(workshop.people.owner.visitor, solveProgramme, { params, body });
  return { params: { solutionId: id } };
}

async function feedEntry(workshop: TestWorkshop, caller: TestPerson) {
  const { content } = await shopWith(workshop, ownCaller(workshop, caller));
  return { params: { feedId: newId() }, body: { name: `${workshop.mark} calendar`, personId: content.people[0].id } };
}

async function heldSlot(workshop: TestWorkshop, api: Api) {
  const { estimateId } = await plannedSample(workshop, workshop.people.bench);
  await markedIssue(workshop, api, { estimateId, state: 'sent' });
  return { params: { estimateId } };
}

export const programmeRows: MatrixRows = {
  readShop: { prepare: () => ({}) },
  keepShop: {
    prepare: async (workshop, api) => ({
      version: await shopVersion(workshop, api),
      body: shopOf(workshop.mark, null),
    }),
    history: 'history-shop-changed',
  },
  readProgramme: { prepare: oneEstimate },
  keepProgramme: {
    prepare: async (workshop) => {
      const { params } = await oneEstimate(workshop);
      const { inputs, version } = await programmeOf(workshop, params.estimateId);
      return { params, version, body: { ...inputs, inHand_days: 3 } };
    },
    history: 'history-programme-changed',
  },
  keepPlan: {
    prepare: async (workshop) => {
      const { estimateId } = await plannedSample(workshop, workshop.people.bench);
      const { request, version } = await programmeOf(workshop, estimateId);
      const plan = solved({ ...request, start_minutes: request.start_minutes + 7 * 1440 });
      return { params: { estimateId }, version, body: plan };
    },
    history: 'history-plan-kept',
  },
  solveProgramme: {
    prepare: async (workshop, api) => {
      await nothingWaiting(workshop, api);
      return { ...(await oneEstimate(workshop)), body: { seconds: 1, keepsPlan: false } };
    },
  },
  readSolution: { prepare: oneSolution },
  stopSolution: { prepare: oneSolution },
  readWhatIf: {
    prepare: async (workshop) => ({
      ...(await oneEstimate(workshop)),
      body: { day: null, climate: { temperature_celsius: 14, humidity_percent: 60 }, furtherGradeIds: [], lots: [] },
    }),
  },
  holdSlot: { prepare: heldSlot, history: 'history-slot-held' },
  releaseSlot: {
    prepare: async (workshop, api) => {
      const { params } = await heldSlot(workshop, api);
      await api.platform.database.transaction(() =>
        api.app.programme.holds.hold(workshop.people.owner.actor, params.estimateId),
      );
      return { params };
    },
    history: 'history-slot-released',
  },
  readBoard: { prepare: () => ({ query: { weeks: 4 } }) },
  readBenchDay: {
    prepare: async (workshop, api, caller) => {
      await acceptedSample(workshop, api, ownCaller(workshop, caller));
      return { query: { day: '2030-01-07' } };
    },
    ofTheCaller: true,
  },
  markTask: {
    prepare: async (workshop, api, caller) => {
      const { estimateId, programme } = await acceptedSample(workshop, api, ownCaller(workshop, caller));
      const { taskId } = programme.items[0];
      return { params: { estimateId }, body: { taskId, mark: 'started', at: null, left_minutes: null } };
    },
    history: 'history-task-started',
  },
  // Of a plan that was just made nothing should have begun yet, so nothing is marked.
  markAsPlanned: {
    prepare: async (workshop, api, caller) => {
      const { estimateId, programme } = await acceptedSample(workshop, api, ownCaller(workshop, caller));
      return { params: { estimateId }, body: { taskIds: [programme.items[0].taskId] } };
    },
  },
  listFeeds: { prepare: () => ({}) },
  makeFeed: {
    prepare: (workshop, _api, caller) => feedEntry(workshop, caller),
    history: 'history-feed-made',
  },
  revokeFeed: {
    prepare: async (workshop, _api, caller) => {
      const { params, body } = await feedEntry(workshop, caller);
      await told(ownCaller(workshop, caller).visitor, makeFeed, { params, body });
      return { params };
    },
    history: 'history-feed-revoked',
  },
  readFeed: {
    prepare: async (workshop) => {
      const { params, body } = await feedEntry(workshop, workshop.people.owner);
      const { address } = await told<{ address: string }>(workshop.people.owner.visitor, makeFeed, { params, body });
      return { query: { secret: new URL(address).searchParams.get('secret') ?? '' } };
    },
  },
};
