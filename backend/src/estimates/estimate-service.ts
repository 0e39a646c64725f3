import { randomInt } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { audienceOf } from '#shared/actor/role';
import type { Change } from '#shared/estimates/change-schema';
import type { Choice, Draft } from '#shared/estimates/draft';
import { draftInOrder } from '#shared/estimates/draft-in-order';
import { alternativeTotal, type AlternativeTotal } from '#shared/estimates/alternative-total';
import type { CostedEstimate, EstimateKind, KeptChanges } from '#shared/estimates/estimate-schema';
import type { Figures } from '#shared/estimates/figures';
import { isEmptyAlternative } from '#shared/estimates/is-empty-alternative';
import { startSettings } from '#shared/estimates/start-settings';
import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { WorkshopService } from '../accounts';
import type { AuditService } from '../audit';
import { jobNumber, type Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import type { PreparedAnswer } from '../platform/http/answer';
import type { RateCardService } from '../rate-cards';
import { changePlan } from './change-plan';
import type { ChangeService } from './change-service';
import type { MemberContentRow, PieceContentRow } from './content-model';
import type { ContentRepository } from './content-repository';
import type { EstimateRow } from './estimate-model';
import { presentEstimate } from './estimate-presenter';
import type { EstimateRepository } from './estimate-repository';
import type { PresenceRepository } from './presence-repository';
import type { ReadingService } from './reading-service';
import type { RiskDrawing } from './risk-drawing';
import { inputOf, type WholeEstimate } from './whole-estimate';

export interface EstimateParts {
  readonly estimates: EstimateRepository;
  readonly pieces: ContentRepository<PieceContentRow>;
  readonly members: ContentRepository<MemberContentRow>;
  readonly presences: PresenceRepository;
  readonly readings: ReadingService;
  readonly changes: ChangeService;
  readonly risks: RiskDrawing;
  readonly cards: RateCardService;
  readonly jobs: Pick<Jobs, 'job' | 'client' | 'markState' | 'touch'>;
  readonly workshops: WorkshopService;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** What an estimate is begun as. */
export interface Begun {
  readonly title: string;
  readonly kind: EstimateKind;
}

/** Drafts of estimates: beginning, reading and changing them, and the card they are worked on. */
export class EstimateService {
  constructor(private readonly parts: EstimateParts) {}

  async ofJob(workshopId: string, jobId: string): Promise<EstimateRow[]> {
    await this.parts.jobs.job(workshopId, jobId);
    return this.parts.estimates.ofJob(workshopId, jobId);
  }

  /** Begins an estimate on the card in force; the same id again finds what was begun. */
  async begin(actor: Actor, at: { jobId: string; id: string }, begun: Begun): Promise<EstimateRow> {
    const { title, kind } = begun;
    const { workshopId } = actor;
    // Touching the job holds its row, so that two estimates begun at once are numbered one after the other.
    const job = await this.parts.jobs.job(workshopId, at.jobId);
    await this.parts.jobs.touch(workshopId, at.jobId);
    const known = await this.parts.estimates.find(workshopId, at.id);
    if (known) return this.same(known, at.jobId, kind);
    const card = await this.parts.cards.inForce(workshopId);
    const { currency } = await this.parts.workshops.get(workshopId);
    const earlier = await this.parts.estimates.ofJob(workshopId, at.jobId);
    const stageIds = card.content.money.terms.stages.map(() => newId());
    const start = { title, seed: randomInt(1, 2 ** 32 - 1), restoration: job.kind === 'restoration', stageIds };
    const row = await this.parts.estimates.insert(workshopId, {
      id: at.id,
      jobId: at.jobId,
      kind,
      number: `${jobNumber(job)}-${earlier.length + 1}`,
      version: 1,
      rateCardId: card.id,
      currency,
      settings: startSettings(card.content, start),
      settingsVersion: 1,
      members: 0,
      letter: null,
      changedAt: this.parts.clock.now(),
    });
    const subject = { kind: 'estimate', id: row.id };
    await this.parts.audit.record(actor, {
      subject,
      jobId: row.jobId,
      code: kind === 'variation' ? 'history-variation-begun' : 'history-estimate-begun',
      values: { number: row.number },
    });
    await this.refresh(workshopId, row.id);
    return row;
  }

  /** Everything in an estimate, in three queries whatever its size. */
  async whole(workshopId: string, id: string): Promise<WholeEstimate> {
    const estimate = await this.parts.estimates.get(workshopId, id);
    const pieces = await this.parts.pieces.ofEstimate(workshopId, id);
    return { estimate, pieces, members: await this.parts.members.ofEstimate(workshopId, id) };
  }

  async read(actor: Actor, id: string): Promise<PreparedAnswer | ReturnType<typeof presentEstimate>> {
    const audience = audienceOf(actor.roles);
    const kept = await this.parts.readings.find(actor.workshopId, id, audience);
    if (kept) return kept;
    const whole = await this.whole(actor.workshopId, id);
    return presentEstimate(whole, await this.figures(whole), audience);
  }

  draft(whole: WholeEstimate): Draft {
    return draftInOrder(whole.estimate.settings, whole.pieces, whole.members);
  }

  async figures(whole: WholeEstimate): Promise<Figures> {
    return this.parts.risks.figures(inputOf(whole, await this.cardOf(whole)));
  }

  /** Each alternative that says anything worked by itself, and its difference to the base. */
  async alternatives(whole: WholeEstimate): Promise<AlternativeTotal[]> {
    const draft = this.draft(whole);
    const alternatives = draft.settings.alternatives.filter(({ id }) => !isEmptyAlternative(draft, id));
    if (alternatives.length === 0) return [];
    const card = await this.cardOf(whole);
    const worked = (choice: Choice) => this.parts.risks.priced(inputOf(whole, card, choice));
    const base = await worked([]);
    return Promise.all(
      alternatives.map(async (alternative) =>
        alternativeTotal({ draft, alternative }, base, await worked([alternative.id])),
      ),
    );
  }

  /** Keeps a list of changes, all or nothing, and answers the figures of record. */
  async change(actor: Actor, id: string, changes: readonly Change[]): Promise<KeptChanges> {
    const { workshopId } = actor;
    await this.parts.estimates.lock(workshopId, id);
    const before = await this.whole(workshopId, id);
    const { estimate } = before;
    const plan = changePlan(changes, before);
    await this.parts.changes.apply(actor, estimate, plan);
    const settings = plan.find(({ change }) => change.kind === 'settings');
    if (plan.length > 0)
      await this.raise(estimate, settings?.change.kind === 'settings' ? settings.change.content : null);
    const { whole, figures } = await this.refresh(workshopId, id);
    const rows = [...whole.pieces, ...whole.members, { id, version: whole.estimate.settingsVersion }];
    const versions = rows
      .filter((row) => changes.some((change) => change.id === row.id))
      .map((row) => ({ id: row.id, version: row.version }));
    return { version: whole.estimate.version, versions, figures } as KeptChanges;
  }

  /** Whether anything of a job was issued. */
  async hasIssues(workshopId: string, jobId: string): Promise<boolean> {
    return (await this.parts.estimates.ofJob(workshopId, jobId)).some((estimate) => estimate.letter !== null);
  }

  /** Removes the drafts of a job of which nothing was issued, with all that stands in them. */
  async drop(workshopId: string, jobId: string): Promise<void> {
    for (const { id } of await this.parts.estimates.ofJob(workshopId, jobId)) {
      await this.parts.presences.forget(workshopId, id);
      await this.parts.readings.forget(workshopId, id);
      await this.parts.members.removeOf(workshopId, id);
      await this.parts.pieces.removeOf(workshopId, id);
      await this.parts.estimates.remove(workshopId, id);
    }
  }

  /** Works the estimate on another card from now on: the one in force, or one that was, so that taking a card can be undone. */
  async takeCard(actor: Actor, at: { id: string; version: number }, rateCardId: string): Promise<CostedEstimate> {
    const { workshopId } = actor;
    const card = await this.parts.cards.begun(workshopId, rateCardId);
    const changedAt = this.parts.clock.now();
    const row = await this.parts.estimates.change(workshopId, at, { rateCardId: card.id, changedAt });
    const values = { number: row.number, card: card.name };
    await this.parts.audit.record(actor, {
      subject: { kind: 'estimate', id: row.id },
      jobId: row.jobId,
      code: 'history-card-taken',
      values,
    });
    const { whole, figures } = await this.refresh(workshopId, at.id);
    return presentEstimate(whole, figures, 'cost') as CostedEstimate;
  }

  /** Works a draft in another currency from now on: every price in it stays the number it is, and the card says whether it was meant so. */
  async carryOver(actor: Actor, id: string, currency: string): Promise<void> {
    const { workshopId, version } = await this.parts.estimates.lock(actor.workshopId, id);
    const changedAt = this.parts.clock.now();
    const row = await this.parts.estimates.change(workshopId, { id, version }, { currency, changedAt });
    await this.parts.audit.record(actor, {
      subject: { kind: 'estimate', id },
      jobId: row.jobId,
      code: 'history-estimate-currency',
      values: { number: row.number, currency },
    });
    await this.refresh(workshopId, id);
  }

  /** An issue raises the draft's version too, so that what was seen once is issued once. */
  async followIssue({ workshopId, id, version }: EstimateRow, letter: string): Promise<void> {
    await this.parts.estimates.change(workshopId, { id, version }, { letter, changedAt: this.parts.clock.now() });
    await this.refresh(workshopId, id);
  }

  private cardOf({ estimate }: WholeEstimate): Promise<RateCard> {
    return this.parts.cards.card(estimate.workshopId, estimate.rateCardId);
  }

  private async raise(estimate: EstimateRow, settings: EstimateRow['settings'] | null): Promise<void> {
    const { workshopId, id, version, settingsVersion } = estimate;
    const changed = settings ? { settings, settingsVersion: settingsVersion + 1 } : {};
    await this.parts.estimates.change(workshopId, { id, version }, { ...changed, changedAt: this.parts.clock.now() });
    await this.parts.jobs.touch(workshopId, estimate.jobId);
  }

  private async refresh(workshopId: string, id: string): Promise<{ whole: WholeEstimate; figures: Figures }> {
    const read = await this.whole(workshopId, id);
    const members = read.members.reduce((sum, member) => sum + member.content.count, 0);
    if (members !== read.estimate.members) await this.parts.estimates.write(workshopId, id, { members });
    const whole = { ...read, estimate: { ...read.estimate, members } };
    const figures = await this.figures(whole);
    await this.parts.readings.keep(whole, figures);
    return { whole, figures };
  }

  private same(row: EstimateRow, jobId: string, kind: EstimateKind): EstimateRow {
    if (row.jobId !== jobId || row.kind !== kind) throw new Rejection('not-found', 'problem-not-found');
    return row;
  }
}
