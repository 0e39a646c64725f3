import type { Actor } from '#shared/actor/actor';
import { canonicalJson } from '#shared/estimates/canonical-json';
import { Rejection } from '#shared/problems/rejection';
import type { SnapshotProgramme } from '#shared/estimates/snapshot';
import { datesOfProgramme } from '#shared/programme/dates-of-programme';
import { frozenProgramme } from '#shared/programme/frozen-programme';
import { programmeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { EstimateProgramme } from '#shared/programme/programme-of-estimate';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { verifiedPlan } from '#shared/programme/verified-plan';
import type { Finding } from '#shared/words/finding';
import type { Audit, Doer } from '../audit';
import type { Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import { refuseStale } from '../platform/database/keeping';
import { type KeptPlan, packed, planIn, unpackedPlan } from './kept-plan';
import { refuseFarInputs } from './refuse-far-inputs';
import { firstDayOf, programmeIn, type ProgrammeContext, type ProgrammeContexts } from './programme-context';
import type { ProgrammeRow } from './programme-model';
import { holdOf, presentProgramme } from './programme-presenter';
import type { ProgrammeRepository } from './programme-repository';
import type { Estimates } from '../estimates';

export interface ProgrammeParts {
  readonly programmes: ProgrammeRepository;
  readonly contexts: ProgrammeContexts;
  readonly estimates: Estimates;
  readonly jobs: Pick<Jobs, 'touch'>;
  readonly audit: Audit['service'];
  readonly clock: Clock;
}

/** What is done to a programme is written in the history of its job. */
type ProgrammeDeed = Omit<Parameters<Audit['service']['record']>[1], 'subject' | 'jobId'>;

const isSame = (one: unknown, other: unknown): boolean => canonicalJson(one) === canonicalJson(other);

/** Sent twice: what was kept says this already, as the version seen or the next. */
const isRepeat = (row: ProgrammeRow, version: number): boolean =>
  row.version === version || row.version === version + 1;

/** Whether a programme has this plan already, however often and whenever it was kept. */
function isSamePlan({ kept: bytes }: ProgrammeRow, { revision, keptAt, ...plan }: KeptPlan): boolean {
  return bytes !== null && isSame({ ...unpackedPlan(bytes), revision, keptAt }, { ...plan, revision, keptAt });
}

/** Programmes of estimates: read, entered, and their plans kept. */
export class ProgrammeService {
  constructor(private readonly parts: ProgrammeParts) {}

  async read(workshopId: string, estimateId: string): Promise<ProgrammeAnswer> {
    return this.answer(await this.parts.contexts.of(workshopId, estimateId));
  }

  /** Keeps what was entered; lots, tasks and approvals that are not there any more are kept too, and do no harm. */
  async keep(actor: Actor, at: { id: string; version: number }, inputs: ProgrammeInputs): Promise<ProgrammeAnswer> {
    const { workshopId } = actor;
    const { programmes, contexts, clock } = this.parts;
    const row = await programmes.hold(workshopId, at.id);
    if (row && isSame(row.inputs, inputs) && isRepeat(row, at.version)) return this.read(workshopId, at.id);
    if (row) refuseStale(row, at.version);
    const before = await contexts.of(workshopId, at.id);
    refuseFarInputs(inputs, { today: before.today, timeZone: before.frame.timeZone });
    if (!row && at.version !== 0) throw new Rejection('not-found', 'problem-not-found');
    const known = { known: row?.firstDay ?? before.today, timeZone: before.frame.timeZone };
    const content = { inputs, firstDay: firstDayOf(inputs, before.marks, known), changedAt: clock.now() };
    if (row) await programmes.change(workshopId, at, content);
    else await this.begin(workshopId, { id: at.id, version: 1 }, content);
    const { number } = before.whole.estimate;
    const entry = { before: row?.inputs ?? null, after: inputs };
    await this.record(actor, before, { code: 'history-programme-changed', values: { number }, ...entry, merges: true });
    return this.read(workshopId, at.id);
  }

  /** Keeps a plan somebody brings, in the minutes of the programme as it was read at this version; refused where it breaks a rule. */
  async keepPlan(actor: Actor, at: { id: string; version: number }, plan: Programme): Promise<ProgrammeAnswer> {
    const { workshopId } = actor;
    const row = await this.lock(workshopId, at.id);
    const context = await this.parts.contexts.of(workshopId, at.id);
    const programme = programmeIn(context, broughtFrom(plan, context));
    const { plan: found, broken } = verifiedPlan(plan, programme.request);
    const kept = found && this.keptPlan(context, programme, found);
    const isAgain = kept !== null && row.version === at.version + 1 && isSamePlan(row, kept);
    if (isAgain) return this.answer(context);
    refuseStale(row, at.version);
    if (!kept) throw notKept(broken);
    refuseWhereStopped(programme);
    refusePast(kept.plan, programme, context);
    await this.store(actor, context, kept);
    return this.read(workshopId, at.id);
  }

  /** Keeps a plan made here, if the programme still is as it was planned; answers whether it is. */
  async keepSolved(actor: Doer, at: { id: string; version: number }, plan: Programme): Promise<boolean> {
    const row = await this.parts.programmes.hold(actor.workshopId, at.id);
    if (row?.version !== at.version) return false;
    const context = await this.parts.contexts.of(actor.workshopId, at.id);
    const programme = programmeIn(context, plan.from_minutes);
    const { plan: found } = verifiedPlan(plan, programme.request);
    if (!found) return false;
    await this.store(actor, context, this.keptPlan(context, programme, found));
    return true;
  }

  /** The programme's row, begun with what is assumed where there is none (version 0, as nobody entered it); held until the transaction ends. */
  async lock(workshopId: string, estimateId: string): Promise<ProgrammeRow> {
    const known = await this.parts.programmes.hold(workshopId, estimateId);
    if (known) return known;
    const { inputs, frame } = await this.parts.contexts.of(workshopId, estimateId);
    const content = { inputs, firstDay: frame.firstDay, changedAt: this.parts.clock.now() };
    return this.begin(workshopId, { id: estimateId, version: 0 }, content);
  }

  /** The programme as an issue freezes it; null where there is no plan, or one that no longer holds. */
  async frozen(workshopId: string, estimateId: string): Promise<SnapshotProgramme | null> {
    const context = await this.parts.contexts.of(workshopId, estimateId);
    const kept = context.row?.kept ? unpackedPlan(context.row.kept) : null;
    // An issue speaks of the base; dates of another choice of alternatives are not its own.
    if (!kept?.dates || context.inputs.choice.length > 0) return null;
    const frame = programmeFrame(kept.firstDay, kept.timeZone);
    const plan = planIn(kept, context.frame);
    const { broken } = verifiedPlan(plan, programmeIn(context, plan.from_minutes).request);
    return broken.length > 0 ? null : frozenProgramme({ ...kept, dates: kept.dates, frame });
  }

  async record(actor: Doer, { whole }: Pick<ProgrammeContext, 'whole'>, deed: ProgrammeDeed): Promise<void> {
    const { id, jobId } = whole.estimate;
    await this.parts.audit.record(actor, { subject: { kind: 'programme', id }, jobId, ...deed });
    await this.parts.jobs.touch(actor.workshopId, jobId);
  }

  private begin(
    workshopId: string,
    at: { id: string; version: number },
    content: Pick<ProgrammeRow, 'inputs' | 'firstDay' | 'changedAt'>,
  ): Promise<ProgrammeRow> {
    const nothing = { kept: null, holdIssueId: null, holdUntil: null };
    return this.parts.programmes.insert(workshopId, { ...at, ...nothing, ...content });
  }

  private keptPlan(context: ProgrammeContext, programme: EstimateProgramme, plan: Programme): KeptPlan {
    const { frame, inputs, shop, promised, row } = context;
    const { request, items, approvals } = programme;
    const { lags, paces, placeHolds } = request;
    const dates = datesOfProgramme({ plan, request, approvals, inputs, shop, frame, promisedJobs: promised.length });
    const { firstDay, timeZone } = frame;
    const made = { firstDay, timeZone, plan, items, approvals, lags, paces, placeHolds, dates };
    const revision = row?.kept ? unpackedPlan(row.kept).revision + 1 : 0;
    return { ...made, revision, keptAt: this.parts.clock.now().toISOString() };
  }

  private async store(actor: Doer, context: ProgrammeContext, kept: KeptPlan): Promise<void> {
    const { workshopId, whole, row } = context;
    const { id, number } = whole.estimate;
    const change = { kept: packed(kept), firstDay: kept.firstDay, changedAt: this.parts.clock.now() };
    await this.parts.programmes.change(workshopId, { id, version: row?.version ?? 0 }, change);
    const values = { number, starts: kept.dates?.startsOn ?? '', finishes: kept.dates?.finishesOn ?? '' };
    await this.record(actor, context, { code: 'history-plan-kept', values });
  }

  private async answer(context: ProgrammeContext): Promise<ProgrammeAnswer> {
    const { workshopId, whole, row, today, frame, now_minutes } = context;
    const issues = await this.parts.estimates.issues.ofEstimate(workshopId, whole.estimate.id);
    const written = row?.kept ? unpackedPlan(row.kept) : null;
    const kept = written && { dates: written.dates, plan: planIn(written, frame) };
    return presentProgramme(context, {
      ...{ planned: programmeIn(context, now_minutes), kept },
      standing: kept && programmeIn(context, kept.plan.from_minutes),
      hold: holdOf(row, issues, today),
      isAccepted: issues.some(({ state }) => state === 'accepted'),
    });
  }
}

function notKept(broken: readonly Finding[]): Rejection {
  const complaints = broken.map(({ code, values, about }) => ({ path: about ? [about] : [], code, values }));
  return new Rejection('unprocessable', 'programme-plan-broken', { complaints });
}

/** The clock of whoever planned what is brought may differ, and it may have been planned a while ago: by a day at most. */
const broughtWithin_minutes = 1440;

/** The moment a plan that is brought was planned from, as far as that can be. */
function broughtFrom({ from_minutes }: Programme, { now_minutes }: ProgrammeContext): number {
  const [first, last] = [now_minutes - broughtWithin_minutes, now_minutes + broughtWithin_minutes];
  return Math.min(last, Math.max(first, from_minutes));
}

/** So much of a plan may have gone by until somebody who has looked at it keeps it. */
const lookedAt_minutes = 60;

/** Refuses a plan in which work that nobody has begun lies in the past. */
function refusePast({ tasks }: Programme, { request }: EstimateProgramme, { now_minutes }: ProgrammeContext): void {
  const begun = new Set(request.tasks.filter(({ happened }) => happened).map(({ id }) => id));
  const past = tasks.filter(
    ({ taskId, start_minutes }) => start_minutes < now_minutes - lookedAt_minutes && !begun.has(taskId),
  );
  if (past.length === 0) return;
  const names = new Map(request.tasks.map(({ id, name }) => [id, name]));
  throw notKept(
    past.map(({ taskId: about }) => {
      const values = { task: names.get(about) ?? about };
      return { kind: 'refuse', code: 'programme-breaks-past', values, about };
    }),
  );
}

/** What stands in the way of any plan stands in the way of this one. */
export function refuseWhereStopped({ findings }: EstimateProgramme): void {
  const stopping = findings.filter(({ kind }) => kind === 'refuse');
  if (stopping.length > 0) throw notKept(stopping);
}
