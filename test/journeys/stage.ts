import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { Response } from 'supertest';
import { keepLetterTemplate } from '#shared/agreements/letters-endpoints';
import { invite } from '#shared/accounts/people-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import type { Change } from '#shared/estimates/change-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { issueEstimate } from '#shared/estimates/issues-endpoints';
import { makeFeed } from '#shared/programme/board-endpoints';
import { draftCard } from '../api/sample-card';
import { sampleEstimate, sampleMember, type SampleEstimate } from '../api/sample-estimate';
import { linkTo, sampleIssue, type SampleIssue } from '../api/sample-client-visit';
import { sampleDraft, sampleInvoice } from '../api/sample-invoice';
import { sampleClient, sampleJob } from '../api/sample-job';
import type { Parts } from '../api/visitor';
import type { Person, Walk } from './walk';

/** Something of everything there is, so that every page, dialog and menu can be opened on it. */
export interface Stage {
  readonly walk: Walk;
  /** Two pieces with three members; nothing of it was issued. */
  readonly sample: SampleEstimate;
  readonly furtherMemberIds: readonly string[];
  /** One that was issued. */
  readonly issued: SampleEstimate & { readonly issueId: string };
  /** Two more that went to their clients, with the secrets of their links. */
  readonly sent: readonly (SampleIssue & { readonly token: string })[];
  /** A draft and two papers that were issued, the last to the client of the last link, who has begun to pay it. */
  readonly books: StageBooks;
  readonly jobClientId: string;
  readonly bareClientId: string;
  readonly bareJobId: string;
  readonly rateCardId: string;
}

interface StageBooks {
  readonly draftId: string;
  readonly issuedId: string;
  readonly clientId: string;
  readonly sentId: string;
  readonly checkoutId: string;
}

/** A stage with somebody on it. */
export interface Scene extends Stage {
  readonly person: Person;
}

/** Asks as the owner, and answers only what succeeded. */
export async function done({ api }: Walk, endpoint: Endpoint, parts: Parts): Promise<Response> {
  const response = await api.as('owner').call(endpoint, parts);
  if (response.status >= 300) throw new Error(`${endpoint.name}: ${response.status} ${response.text}`);
  return response;
}

async function secondPiece(walk: Walk, { estimateId }: SampleEstimate): Promise<string[]> {
  const pieceId = newId();
  const members = ['Second frieze', 'Third frieze'].map((name) => ({
    id: newId(),
    content: sampleMember(pieceId, name),
  }));
  const changes: Change[] = [
    { kind: 'piece', id: pieceId, version: 0, content: { name: 'Second piece', place: 2, note: '' } },
    ...members.map((member): Change => ({ kind: 'member', version: 0, ...member })),
  ];
  await done(walk, changeEstimate, { params: { estimateId }, body: { changes } });
  return members.map(({ id }) => id);
}

export async function issueOf(walk: Walk, { estimateId }: SampleEstimate, note = ''): Promise<string> {
  const { version } = (await walk.api.app.estimates.drafts.whole(walk.api.ours.id, estimateId)).estimate;
  const body = { version, note, acceptsOldCard: true };
  const response = await done(walk, issueEstimate, { params: { estimateId }, body, key: randomUUID() });
  return (response.body as { id: string }).id;
}

async function sentIssue({ api }: Walk): Promise<SampleIssue & { token: string }> {
  const issue = await sampleIssue(api.ours, api);
  return { ...issue, token: (await linkTo(api.ours, api, issue.issueId)).token };
}

async function booksOf({ api }: Walk, { jobId }: SampleIssue): Promise<StageBooks> {
  const { ours, app, platform } = api;
  const { clientId } = await app.jobs.job(ours.id, jobId);
  const [draft, issued] = [await sampleDraft(ours), await sampleInvoice(ours)];
  const sent = await sampleInvoice(ours, { clientId, jobId });
  const payer = { accessId: newId(), name: 'Herons payer', email: '', returnUrl: () => 'http://127.0.0.1/' };
  const checkout = await platform.database.transaction(() =>
    app.invoices.checkouts.begin(ours.id, sent.invoiceId, payer),
  );
  return {
    ...{ draftId: draft.invoiceId, issuedId: issued.invoiceId, clientId: issued.clientId },
    ...{ sentId: sent.invoiceId, checkoutId: checkout.id },
  };
}

export async function setStage(walk: Walk): Promise<Stage> {
  const { ours, app } = walk.api;
  const [sample, other] = [await sampleEstimate(ours), await sampleEstimate(ours)];
  const furtherMemberIds = await secondPiece(walk, sample);
  await done(walk, invite, {
    body: { name: 'Herons guest', email: 'guest@herons.example', roles: ['bench'] },
    key: randomUUID(),
  });
  const words = { kind: 'receipt', subject: 'Received', text: 'Thank you.' };
  await done(walk, keepLetterTemplate, { version: 0, body: words });
  await done(walk, makeFeed, { params: { feedId: newId() }, body: { name: 'The whole workshop', personId: null } });
  const sent = [await sentIssue(walk), await sentIssue(walk)];
  return {
    walk,
    sample,
    furtherMemberIds,
    sent,
    books: await booksOf(walk, sent[1]),
    issued: { ...other, issueId: await issueOf(walk, other) },
    jobClientId: (await app.jobs.job(ours.id, sample.jobId)).clientId,
    bareClientId: await sampleClient(ours),
    bareJobId: await sampleJob(ours),
    rateCardId: (await draftCard(ours)).id,
  };
}
