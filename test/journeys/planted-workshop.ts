import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { answerQuestion } from '#shared/agreements/questions-endpoints';
import { beginVariation } from '#shared/agreements/agreement-endpoints';
import { acceptIssue, askClientQuestion, declineIssue } from '#shared/client-page/client-issues-endpoints';
import { giveAccess } from '#shared/agreements/accesses-endpoints';
import { addDays } from '#shared/calendar/add-days';
import { acceptanceOf, visitBy } from '../api/sample-client-visit';
import { acceptInvitation, changeOwnName, invite } from '#shared/accounts/people-endpoints';
import { askToFound, changeWorkshop, foundAnother } from '#shared/accounts/workshop-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import { beginEstimate, changeEstimate, takeRateCard } from '#shared/estimates/estimates-endpoints';
import { issueEstimate, markIssue } from '#shared/estimates/issues-endpoints';
import type { MemberContent } from '#shared/estimates/member';
import type { MeasuredWork } from '#shared/estimates/price/measured-work';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { keepClient } from '#shared/jobs/clients-endpoints';
import { keepJob } from '#shared/jobs/jobs-endpoints';
import {
  copyRateCard,
  keepRateCard,
  putRateCardInForce,
  workCardEffects,
} from '#shared/rate-cards/rate-cards-endpoints';
import { cardInForce, wholeCard } from '../api/sample-card';
import { clientNamed, jobTitled } from '../api/sample-job';
import type { Parts, Visitor } from '../api/visitor';
import { foundingSettings } from '../api/test-workshop';
import { PlantedBooks } from './planted-books';
import { Planting } from './planting';
import { done, type Stage } from './stage';

/** A workshop whose every text is hostile, and what was put where. */
export class PlantedWorkshop {
  readonly planting = new Planting();

  readonly books: PlantedBooks;

  constructor(private readonly stage: Stage) {
    this.books = new PlantedBooks(stage, this.planting);
  }

  async plant(): Promise<void> {
    await this.plantPeople();
    await this.books.plantLetters();
    await this.plantCard();
    await this.plantJobs();
    await this.plantDrafts();
    await this.plantIssues();
    await this.plantAgreements();
    await this.books.plant();
  }

  private send(endpoint: Endpoint, parts: Parts) {
    const body = this.planting.into(endpoint, parts.body);
    return done(this.stage.walk, endpoint, { ...parts, body });
  }

  private async plantPeople(): Promise<void> {
    const { api } = this.stage.walk;
    await this.send(changeOwnName, { body: { name: 'x' } });
    const body = { name: 'x', email: 'guest@evil.example', roles: ['bench'] };
    await this.send(invite, { body, key: randomUUID() });
    await this.send(invite, { body: { ...body, email: 'other@evil.example' }, key: randomUUID() });
    const mail = (await api.mails()).find(({ headers }) => headers.includes('other@evil.example'));
    const token = /#(\S+)/.exec(mail?.text ?? '')?.[1] ?? '';
    const joining = { token, name: 'x', password: 'nine slow otters swim' };
    const joined = { body: this.planting.into(acceptInvitation, joining) as typeof joining };
    await (
      await api.stranger()
    ).call(acceptInvitation, { body: { ...joined.body, token, password: joining.password } });
    const workshop = { name: 'x', ...foundingSettings };
    const founding = { name: 'x', email: 'founder@evil.example', workshop };
    await (await api.stranger()).call(askToFound, { body: this.planting.into(askToFound, founding) });
    const { version } = await api.app.accounts.workshops.get(api.ours.id);
    const letterhead = {
      addressLines: ['x', 'y'],
      telephone: 'x',
      email: '',
      taxRegistration: 'x',
      defaultTaxCategory: 'S',
    };
    await this.send(changeWorkshop, { version, body: { ...workshop, ...letterhead } });
  }

  /** Founding another enters it; the others of the account are chosen from a menu. */
  async plantAnotherWorkshop(): Promise<void> {
    const { app, ours, platform } = this.stage.walk.api;
    const { accountId, name } = ours.people.owner.actor;
    const body = this.planting.into(foundAnother, { name: 'x', ...foundingSettings }) as { name: string };
    await platform.database.transaction(() =>
      app.accounts.workshops.found({ accountId, name }, { ...foundingSettings, name: body.name }),
    );
  }

  private async plantCard(): Promise<void> {
    const { walk, rateCardId } = this.stage;
    const { ours, app } = walk.api;
    const { version, content } = await wholeCard(ours, rateCardId);
    await this.send(keepRateCard, { params: { rateCardId }, version, body: { name: 'x', content } });
    const id = newId();
    await this.send(copyRateCard, { params: { rateCardId }, body: { id, name: 'x' } });
    const card = await wholeCard(ours, id);
    const body = { from: await app.rateCards.service.today(ours.id) };
    await done(walk, workCardEffects, { params: { rateCardId: id }, version: card.version });
    await walk.api.platform.tasks.runDue();
    await done(walk, putRateCardInForce, { params: { rateCardId: id }, version: card.version, body });
    if ((await cardInForce(ours)).id !== id) throw new Error('the planted card is not in force');
  }

  private async plantJobs(): Promise<void> {
    const { jobClientId, bareClientId, bareJobId, sample } = this.stage;
    for (const clientId of [jobClientId, bareClientId]) {
      await this.send(keepClient, { params: { clientId }, version: 1, body: clientNamed('x') });
    }
    for (const jobId of [sample.jobId, bareJobId]) {
      const { version } = await this.stage.walk.api.app.jobs.job(this.stage.walk.api.ours.id, jobId);
      await this.send(keepJob, { params: { jobId }, version, body: jobTitled('x', jobClientId) });
    }
    await this.send(beginEstimate, { params: { jobId: bareJobId, estimateId: newId() }, body: { title: 'x' } });
  }

  private async plantDrafts(): Promise<void> {
    for (const { estimateId } of [this.stage.sample, this.stage.issued]) await this.plantDraft(estimateId);
  }

  private async plantDraft(estimateId: string): Promise<void> {
    const { app, ours } = this.stage.walk.api;
    const { estimate, pieces, members } = await app.estimates.drafts.whole(ours.id, estimateId);
    const body = { rateCardId: (await cardInForce(ours)).id };
    await done(this.stage.walk, takeRateCard, { params: { estimateId }, version: estimate.version, body });
    const now = await app.estimates.drafts.whole(ours.id, estimateId);
    const seen = ({ id, version }: { id: string; version: number }) => ({ id, version });
    const changes = [
      ...pieces.map((piece) => ({
        kind: 'piece',
        ...seen(piece),
        content: { ...piece.content, name: 'x', note: 'x' },
      })),
      ...members.map((member, at) => ({
        kind: 'member',
        ...seen(member),
        content: fullMember(member.content, at),
      })),
      {
        kind: 'settings',
        id: estimateId,
        version: now.estimate.settingsVersion,
        content: fullSettings(now.estimate.settings),
      },
    ];
    await this.send(changeEstimate, { params: { estimateId }, body: { changes } });
  }

  /** One client asks and accepts, another declines; the owner answers and begins a variation. */
  private async plantAgreements(): Promise<void> {
    const { walk, sent } = this.stage;
    const { api } = walk;
    const [accepted, declined] = sent;
    if (!accepted || !declined) throw new Error('nothing was sent');
    const endsOn = addDays(await api.app.rateCards.service.today(api.ours.id), 60);
    await this.send(giveAccess, { params: { issueId: accepted.issueId }, body: { endsOn, send: true, note: 'x' } });
    const [first, second] = [await visitBy(api, accepted.token), await visitBy(api, declined.token)];
    const ask = async (visitor: Visitor, endpoint: Endpoint, parts: Parts) => {
      const body = this.planting.into(endpoint, parts.body);
      const response = await visitor.call(endpoint, { ...parts, body, key: randomUUID() });
      if (response.status >= 300) throw new Error(`${endpoint.name}: ${response.status} ${response.text}`);
    };
    await ask(first, askClientQuestion, { params: { issueId: accepted.issueId }, body: { text: 'x' } });
    const answer = { issueId: accepted.issueId, text: 'x' };
    await this.send(answerQuestion, { params: { jobId: accepted.jobId }, body: answer });
    await ask(first, acceptIssue, await acceptanceOf(first, accepted.issueId));
    await ask(second, declineIssue, { params: { issueId: declined.issueId }, body: { reason: 'x' } });
    await this.send(beginVariation, { params: { jobId: accepted.jobId }, body: { id: newId(), title: 'x' } });
  }

  private async plantIssues(): Promise<void> {
    const { walk, issued } = this.stage;
    const { ours, app } = walk.api;
    const { version } = (await app.estimates.drafts.whole(ours.id, issued.estimateId)).estimate;
    const asked = { params: { estimateId: issued.estimateId }, key: randomUUID() };
    const response = await this.send(issueEstimate, { ...asked, body: { version, note: 'x', acceptsOldCard: true } });
    const issueId = (response.body as { id: string }).id;
    const day = await app.rateCards.service.today(ours.id);
    await this.send(markIssue, { params: { issueId }, body: { state: 'sent', day, note: 'x' } });
    Object.assign(issued, { issueId });
  }
}

const measured = { kind: 'measured', area_mm2: 100, uncertainty_mm2: 1, note: 'x', isTrueSurface: false } as const;

const moulding = {
  kind: 'moulding',
  profile: [{ id: 'x', element: 'ovolo', height_mm: 20, projection_mm: 18, going: 'out' }],
  plan: { form: 'straight', sides_mm: [900], returns_mm: [] },
  measuredAt: 'back',
  facing: 'outward',
} as const;

/** Shapes with a text of their own for the members after the first. */
const worded: readonly Partial<MemberContent>[] = [
  {},
  { shape: { ...measured, area_mm2: 100_000 }, ornaments: [] },
  { shape: moulding, ornaments: [] },
];

const fullMember = (content: MemberContent, at: number): MemberContent => ({
  ...content,
  ...{ name: 'x', lot: 'x', note: 'x', typed: { 'shape.length_mm': '1200' } },
  openings: [{ id: newId(), shape: measured, count: 1 }],
  ...worded[at],
  zones: at === 2 ? content.zones.map((zone) => ({ ...zone, take: { way: 'parts', parts: ['x'] } })) : content.zones,
});

const anyExtra = () => ({ id: newId(), name: 'x', taxCategoryId: '', memberId: null, alternativeId: null });

const unmeasured = { count: 1, length_mm: null, girth_mm: null, area_mm2: null, sides: 1, worth: 1 } as const;

/** A line whose quantity of 2 m² is reckoned from what was measured. */
const measuredExtra = (taxCategoryId: string, measured: MeasuredWork): ExtraLine => ({
  ...anyExtra(),
  ...{ taxCategoryId, kind: 'paid-quantity', rule: 'x', quantity: '2', unit: 'm²', price: '3', measured },
});

const extrasOf = (taxCategoryId: string): ExtraLine[] => [
  { ...anyExtra(), taxCategoryId, kind: 'paid-quantity', rule: 'x', quantity: '2', unit: 'x', price: '3' },
  measuredExtra(taxCategoryId, {
    rule: 'plain-area',
    measures: [1, 3].map((count) => ({ ...unmeasured, count, length_mm: 500, girth_mm: 1000 })),
    typed: { 'measures.0.length_mm': 'x', 'measures.0.girth_mm': 'x' },
  }),
  measuredExtra(taxCategoryId, {
    rule: 'weighted',
    measures: [{ ...unmeasured, area_mm2: 2_000_000 }],
    typed: { 'measures.0.area_mm2': 'x' },
  }),
  { ...anyExtra(), taxCategoryId, kind: 'bought-in', cost: '10' },
];

const fullSettings = (settings: EstimateSettings): EstimateSettings => ({
  ...settings,
  ...{ title: 'x', introduction: 'x', included: 'x', excluded: 'x', terms: 'x' },
  extras: extrasOf(settings.taxCategoryId),
  alternatives: [{ id: newId(), name: 'x', group: 'x', note: 'x', replaces: [] }],
  stages: { ...settings.stages, parts: [{ id: newId(), name: 'x', percent: 100 }] },
});
