import { v7 as newId } from 'uuid';
import type { Endpoint } from '#shared/actor/endpoint';
import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import { weekdayOf } from '#shared/calendar/working-days';
import { issueEstimate, markIssue } from '#shared/estimates/issues-endpoints';
import { programme } from '#shared/programme/programme';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { keepPlan, keepShop, readProgramme, readShop } from '#shared/programme/programme-endpoints';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import type { ShopAnswer, ShopContent } from '#shared/programme/shop-schema';
import { randomUUID } from 'node:crypto';
import { sampleEstimate, type SampleEstimate } from './sample-estimate';
import type { Api, TestPerson, TestWorkshop } from './start-api';
import type { Parts, Visitor } from './visitor';

const allDay = [
  { start_minutes: 480, end_minutes: 720 },
  { start_minutes: 750, end_minutes: 1020 },
];

/** Somebody who does everything there is to do on the start card. */
export const everyGrade = ['master-carver', 'carver', 'gilder', 'improver', 'finisher'];

/** A workshop of two people open from Monday to Friday; the first of them signs in, where a membership is given. */
export const shopOf = (mark: string, membershipId: string | null, more: Partial<ShopContent> = {}): ShopContent => ({
  hours: [allDay, allDay, allDay, allDay, allDay, [], []],
  productiveShare_percent: 80,
  overtime_percent: 50,
  days: [],
  climates: [],
  places: [{ id: newId(), name: `${mark} rack`, kind: 'rack', capacity: 2 }],
  people: [
    { ...{ id: newId(), name: `${mark} first hand`, gradeIds: everyGrade }, hours: null, absences: [], membershipId },
    {
      ...{ id: newId(), name: `${mark} second hand`, gradeIds: ['gilder'] },
      hours: null,
      absences: [],
      membershipId: null,
    },
  ],
  ...more,
});

/** The next Wednesday after a day. */
export const wednesdayAfter = (day: Day): Day => addDays(day, 7 - ((weekdayOf(day) + 4) % 7));

/** Calls an endpoint and answers its body; whatever is refused fails the test that wanted it. */
export async function told<Body>(visitor: Visitor, endpoint: Endpoint, parts: Parts = {}): Promise<Body> {
  const response = await visitor.call(endpoint, parts);
  if (response.status >= 300) throw new Error(`${endpoint.name}: ${response.status} ${response.text}`);
  return response.body as Body;
}

/** Keeps a shop over whatever stands; answers it as it is kept. */
export async function keptShop({ people }: TestWorkshop, content: ShopContent): Promise<ShopAnswer> {
  const { visitor } = people.owner;
  const { version } = await told<ShopAnswer>(visitor, readShop);
  return told<ShopAnswer>(visitor, keepShop, { version, body: content });
}

/** A shop whose first hand is the caller. */
export const shopWith = (workshop: TestWorkshop, { actor }: TestPerson): Promise<ShopAnswer> =>
  keptShop(workshop, shopOf(workshop.mark, actor.membershipId));

export const programmeOf = ({ people }: TestWorkshop, estimateId: string): Promise<ProgrammeAnswer> =>
  told<ProgrammeAnswer>(people.owner.visitor, readProgramme, { params: { estimateId } });

/** What a browser would work out of a programme. */
export const solved = (request: ProgrammeRequest) =>
  JSON.parse(JSON.stringify(programme(request, { limit: { nodes: 2 } }))) as NonNullable<ProgrammeAnswer['plan']>;

/** A plan of an estimate, kept. */
export async function keptPlan(workshop: TestWorkshop, estimateId: string): Promise<ProgrammeAnswer> {
  const { request, version } = await programmeOf(workshop, estimateId);
  const parts = { params: { estimateId }, version, body: solved(request) };
  return told<ProgrammeAnswer>(workshop.people.owner.visitor, keepPlan, parts);
}

/** Issues an estimate and marks the issue. */
export async function markedIssue(
  workshop: TestWorkshop,
  api: Api,
  at: { estimateId: string; state: 'sent' | 'accepted' },
) {
  const { visitor } = workshop.people.owner;
  const { estimate } = await api.app.estimates.drafts.whole(workshop.id, at.estimateId);
  const body = { version: estimate.version, note: '', acceptsOldCard: false };
  const parts = { params: { estimateId: at.estimateId }, body, key: randomUUID() };
  const issue = await told<{ id: string; letter: string; validUntil: string }>(visitor, issueEstimate, parts);
  const day = await api.app.rateCards.service.today(workshop.id);
  await told(visitor, markIssue, { params: { issueId: issue.id }, body: { state: at.state, day, note: '' } });
  return issue;
}

export interface PlannedSample extends SampleEstimate {
  readonly programme: ProgrammeAnswer;
}

/** An estimate with a plan that was kept; the caller is the workshop's first hand. */
export async function plannedSample(workshop: TestWorkshop, caller: TestPerson): Promise<PlannedSample> {
  await shopWith(workshop, caller);
  const sample = await sampleEstimate(workshop);
  return { ...sample, programme: await keptPlan(workshop, sample.estimateId) };
}

/** The same with its job accepted: it is worked at the bench. */
export async function acceptedSample(workshop: TestWorkshop, api: Api, caller: TestPerson): Promise<PlannedSample> {
  const planned = await plannedSample(workshop, caller);
  await markedIssue(workshop, api, { estimateId: planned.estimateId, state: 'accepted' });
  return planned;
}
