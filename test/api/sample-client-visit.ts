import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { giveAccess } from '#shared/agreements/accesses-endpoints';
import { addDays } from '#shared/calendar/add-days';
import { acceptIssue, reviewClientChoice } from '#shared/client-page/client-issues-endpoints';
import { beginClientVisit } from '#shared/client-page/visits-endpoints';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { issueEstimate } from '#shared/estimates/issues-endpoints';
import type { Alternative, ExtraLine } from '#shared/estimates/settings';
import { sampleEstimate, type SampleEstimate } from './sample-estimate';
import { onceInWhatStandsStill } from './standing-still';
import type { Api, TestWorkshop } from './start-api';
import type { Parts, Visitor } from './visitor';

async function done<T>(call: PromiseLike<{ status: number; text: string; body: unknown }>): Promise<T> {
  const response = await call;
  if (response.status >= 300) throw new Error(`the sample could not be made: ${response.status} ${response.text}`);
  return response.body as T;
}

/** Freezes the next issue of an estimate; answers its id. */
export async function issueOf(workshop: TestWorkshop, api: Api, estimateId: string): Promise<string> {
  const { version } = (await api.app.estimates.drafts.whole(workshop.id, estimateId)).estimate;
  const body = { version, note: workshop.mark, acceptsOldCard: false };
  const { visitor } = workshop.people.owner;
  const call = visitor.call(issueEstimate, { params: { estimateId }, body, key: randomUUID() });
  return (await done<{ id: string }>(call)).id;
}

/** An estimate that was issued. */
export interface SampleIssue extends SampleEstimate {
  readonly issueId: string;
}

async function newIssue(workshop: TestWorkshop, api: Api): Promise<SampleIssue> {
  const sample = await sampleEstimate(workshop);
  return { ...sample, issueId: await issueOf(workshop, api, sample.estimateId) };
}

export const sampleIssue = onceInWhatStandsStill(newIssue);

/** The alternatives of a sample: two ways of gilding of which one may be chosen, and a crate that may be ticked. */
export interface SampleChoices extends SampleIssue {
  readonly oil: string;
  readonly silver: string;
  readonly crate: string;
}

/** An issue with alternatives: the frieze in other ways, and something more besides. */
export async function sampleChoices(workshop: TestWorkshop, api: Api): Promise<SampleChoices> {
  const sample = await sampleEstimate(workshop);
  const { estimateId, memberId, member } = sample;
  const [zone] = member.zones;
  const [oil, silver, crate] = [newId(), newId(), newId()];
  const zones = [
    zone,
    { ...zone, id: newId(), buildUpId: 'oil-12-hour', alternativeId: oil },
    { ...zone, id: newId(), buildUpId: 'silver-oil', leafId: 'silver-loose', alternativeId: silver },
  ];
  const way = (id: string, name: string): Alternative => ({ id, name, group: 'Frieze', note: '', replaces: [zone.id] });
  const { settings } = (await api.app.estimates.drafts.whole(workshop.id, estimateId)).estimate;
  const extra: ExtraLine = {
    ...{ id: newId(), name: `${workshop.mark} crate`, taxCategoryId: settings.taxCategoryId, memberId: null },
    ...{ alternativeId: crate, kind: 'price', price: '180.00' },
  };
  const alternatives = [
    way(oil, 'Oil gilding'),
    way(silver, 'Silver leaf'),
    { id: crate, name: 'A crate', group: '', note: '', replaces: [] },
  ];
  const content = { ...settings, alternatives, extras: [...settings.extras, extra] };
  const changes = [
    { kind: 'settings', id: estimateId, version: 1, content },
    { kind: 'member', id: memberId, version: 1, content: { ...member, zones } },
  ];
  await done(workshop.people.owner.visitor.call(changeEstimate, { params: { estimateId }, body: { changes } }));
  return { ...sample, oil, silver, crate, issueId: await issueOf(workshop, api, estimateId) };
}

/** Gives the client of an issue a link; answers its secret and the id of the access. */
export async function linkTo(
  workshop: TestWorkshop,
  api: Api,
  issueId: string,
): Promise<{ token: string; accessId: string }> {
  const endsOn = addDays(await api.app.rateCards.service.today(workshop.id), 60);
  const body = { endsOn, send: false, note: '' };
  const call = workshop.people.owner.visitor.call(giveAccess, { params: { issueId }, body });
  const { access, link } = await done<{ access: { id: string }; link: string }>(call);
  return { token: link.split('#')[1] ?? '', accessId: access.id };
}

/** A client on a visit by the secret of a link. */
export async function visitBy(api: Api, token: string): Promise<Visitor> {
  const visitor = await api.stranger();
  await done(visitor.call(beginClientVisit, { body: { token } }));
  return visitor;
}

/** The client of an issue, on a visit. */
export async function clientOf(workshop: TestWorkshop, api: Api, issueId: string): Promise<Visitor> {
  return visitBy(api, (await linkTo(workshop, api, issueId)).token);
}

/** What a client sends who accepts what they have just reviewed. */
export async function acceptanceOf(visitor: Visitor, issueId: string, choice: readonly string[] = []): Promise<Parts> {
  const params = { issueId };
  const call = visitor.call(reviewClientChoice, { params, body: { choice } });
  const review = await done<{ price: { gross_minor: number }; pdfSha256: string }>(call);
  const { price, pdfSha256 } = review;
  const body = { typedName: 'Helena Marsh', agrees: true, choice, gross_minor: price.gross_minor, pdfSha256 };
  return { params, body, key: randomUUID() };
}

/** An issue whose client has accepted it on the page. */
export const acceptedIssue = onceInWhatStandsStill(
  async (workshop, api): Promise<SampleIssue & { visitor: Visitor }> => {
    const sample = await newIssue(workshop, api);
    const visitor = await clientOf(workshop, api, sample.issueId);
    await done(visitor.call(acceptIssue, await acceptanceOf(visitor, sample.issueId)));
    return { ...sample, visitor };
  },
);
