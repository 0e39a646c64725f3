import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { benchTaskOf, type BenchJob } from '#shared/programme/bench-day-of';
import type { MarkEntry } from '#shared/programme/bench-day-schema';
import type { BenchTask } from '#shared/programme/bench-task';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { WordCode } from '#shared/words/word-code';
import { Rejection } from '#shared/problems/rejection';
import type { Audit } from '../audit';
import type { Estimates } from '../estimates';
import { ownPerson, type Bench, type BenchService } from './bench-service';
import type { BenchParts } from './bench-service';
import type { MarkRow } from './mark-model';
import { refuseFarMark } from './refuse-far-inputs';
import type { ProgrammeRepository } from './programme-repository';

interface Parts extends BenchParts {
  readonly bench: BenchService;
  readonly programmes: ProgrammeRepository;
  readonly estimates: Estimates;
  readonly audit: Audit['service'];
}

/** What is marked: the task as it is planned, when, by whom. */
interface Marking {
  readonly entry: MarkEntry;
  readonly item: ProgrammeItem;
  readonly at: Date;
  readonly personIds: readonly string[];
}

type Stand = Pick<MarkRow, 'startedAt' | 'endedAt' | 'leftMinutes' | 'personIds'>;

const codes: Record<MarkEntry['mark'], WordCode> = {
  started: 'history-task-started',
  finished: 'history-task-finished',
  'not-started': 'history-task-unmarked',
};

const ofInstant = (code: WordCode): Rejection =>
  new Rejection('invalid', 'problem-invalid', { complaints: [{ path: ['at'], code, values: {} }] });

/** Where a task stands once it is marked; a start that was marked before stays, and so do the people at it. */
function standAfter({ entry, item, at, personIds }: Marking, before: MarkRow | undefined): Stand {
  const startedAt = before?.startedAt ?? at;
  const people = before ? before.personIds : personIds;
  if (entry.mark === 'started') {
    const begunAgain = before?.endedAt ? at : startedAt;
    const left = entry.left_minutes ?? before?.leftMinutes ?? item.handsOn_minutes;
    return { startedAt: before?.endedAt ? begunAgain : startedAt, endedAt: null, leftMinutes: left, personIds: people };
  }
  if (at < startedAt) throw ofInstant('programme-mark-before-start');
  return { startedAt, endedAt: at, leftMinutes: 0, personIds: people };
}

/** Said already: a second press of the same button changes nothing. */
function saysAlready(before: MarkRow | undefined, { mark, at, left_minutes }: MarkEntry): boolean {
  if (mark === 'not-started') return before === undefined;
  if (!before || at !== null || left_minutes !== null) return false;
  return mark === 'started' ? before.endedAt === null : before.endedAt !== null;
}

/** Tasks marked at the bench: started, finished, or neither after all. */
export class MarkService {
  constructor(private readonly parts: Parts) {}

  async mark(actor: Actor, estimateId: string, entry: MarkEntry): Promise<BenchTask> {
    const { workshopId } = actor;
    const { estimate } = await this.parts.estimates.drafts.whole(workshopId, estimateId);
    await this.parts.programmes.hold(workshopId, estimateId);
    const bench = await this.parts.bench.bench(workshopId);
    const job = bench.jobs.find((one) => one.estimateId === estimateId);
    if (!job) throw new Rejection('conflict', 'programme-mark-not-on-board');
    const marking = this.marking(actor, entry, { bench, job });
    const before = await this.parts.marks.ofTask(workshopId, { programmeId: estimateId, taskId: entry.taskId });
    if (!saysAlready(before, entry)) {
      await this.write(workshopId, estimateId, { marking, before });
      await this.record(actor, marking, { estimateId, jobId: estimate.jobId });
    }
    return this.read(workshopId, estimateId, entry.taskId);
  }

  /** Who marks a task is at it; where nobody at the bench bears the sign-in, those it was planned for are. */
  private marking(actor: Actor, entry: MarkEntry, { bench, job }: { bench: Bench; job: BenchJob }): Marking {
    const item = job.items.find(({ taskId }) => taskId === entry.taskId);
    const planned = job.plan.tasks.find(({ taskId }) => taskId === entry.taskId);
    if (!item || !planned) throw new Rejection('not-found', 'programme-task-unknown');
    const now = this.parts.clock.now();
    const at = entry.at === null ? now : new Date(entry.at);
    if (at > now) throw ofInstant('programme-mark-future');
    refuseFarMark(at, { today: bench.today, timeZone: bench.frame.timeZone });
    const own = ownPerson(bench.shop, actor);
    const personIds = own && !planned.personIds.includes(own.id) ? [own.id] : planned.personIds;
    return { entry, item, at, personIds };
  }

  private async write(
    workshopId: string,
    programmeId: string,
    { marking, before }: { marking: Marking; before: MarkRow | undefined },
  ): Promise<void> {
    const { marks } = this.parts;
    const { taskId, mark } = marking.entry;
    if (mark === 'not-started') return void (before && (await marks.remove(workshopId, before.id)));
    const stand = standAfter(marking, before);
    if (before) await marks.write(workshopId, before.id, stand);
    else await marks.insert(workshopId, { id: newId(), programmeId, taskId, ...stand });
  }

  private async record(
    actor: Actor,
    { entry, item }: Marking,
    { estimateId, jobId }: { estimateId: string; jobId: string },
  ): Promise<void> {
    const values = { name: actor.name, task: item.name, lot: item.lot };
    await this.parts.audit.record(actor, {
      subject: { kind: 'programme', id: estimateId },
      jobId,
      code: codes[entry.mark],
      values,
    });
  }

  private async read(workshopId: string, estimateId: string, taskId: string): Promise<BenchTask> {
    const bench = await this.parts.bench.bench(workshopId);
    const job = bench.jobs.find((one) => one.estimateId === estimateId);
    const asked = this.parts.bench.asked(
      bench,
      null,
      dayOfInstant(this.parts.clock.now().getTime(), bench.frame.timeZone),
    );
    const task = job && benchTaskOf(job, taskId, asked);
    if (!task) throw new Rejection('not-found', 'programme-task-unknown');
    return task;
  }
}
