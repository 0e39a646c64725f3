import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { benchTaskOf, type BenchJob } from '#shared/programme/bench-day-of';
import type { MarkEntry } from '#shared/programme/bench-day-schema';
import type { BenchTask } from '#shared/programme/bench-task';
import { millisecondsOf, minutesOf } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import { standAsPlanned } from '#shared/programme/stand-as-planned';
import { unmarkedTasks } from '#shared/programme/unmarked-tasks';
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
  readonly now: Date;
  readonly personIds: readonly string[];
}

type Stand = Pick<MarkRow, 'startedAt' | 'endedAt' | 'leftMinutes' | 'leftAt' | 'personIds'>;

const codes: Record<MarkEntry['mark'], WordCode> = {
  started: 'history-task-started',
  finished: 'history-task-finished',
  'not-started': 'history-task-unmarked',
};

const ofInstant = (code: WordCode): Rejection =>
  new Rejection('invalid', 'problem-invalid', { complaints: [{ path: ['at'], code, values: {} }] });

/** Where a task stands once it is marked; a start that was marked before stays, and so do the people at it. */
function standAfter({ entry, item, at, now, personIds }: Marking, before: MarkRow | undefined): Stand {
  const startedAt = before?.startedAt ?? at;
  const people = before ? before.personIds : personIds;
  if (entry.mark === 'started') {
    const begun = { startedAt: before?.endedAt ? at : startedAt, endedAt: null, personIds: people };
    if (entry.left_minutes !== null) return { ...begun, leftMinutes: entry.left_minutes, leftAt: now };
    const left = before?.leftMinutes ?? item.handsOn_minutes;
    return { ...begun, leftMinutes: left, leftAt: before?.leftAt ?? null };
  }
  if (at < startedAt) throw ofInstant('programme-mark-before-start');
  return { startedAt, endedAt: at, leftMinutes: 0, leftAt: null, personIds: people };
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
    const { jobId, bench, job } = await this.worked(workshopId, estimateId);
    const marking = this.marking(actor, entry, { bench, job });
    const before = await this.parts.marks.ofTask(workshopId, { programmeId: estimateId, taskId: entry.taskId });
    if (!saysAlready(before, entry)) {
      await this.write(workshopId, estimateId, { marking, before });
      await this.record(actor, marking, { estimateId, jobId });
    }
    return this.read(workshopId, estimateId, entry.taskId);
  }

  /** Says of tasks that they went as they were planned up to now, by those they were planned for. */
  async asPlanned(actor: Actor, estimateId: string, taskIds: readonly string[]): Promise<{ marked: number }> {
    const { workshopId } = actor;
    const { jobId, bench, job } = await this.worked(workshopId, estimateId);
    const now_minutes = minutesOf(this.parts.clock.now().toISOString(), bench.frame);
    const asked = new Set(taskIds);
    const due = unmarkedTasks({ plan: job.plan, marks: job.marks, now_minutes }).filter((taskId) => asked.has(taskId));
    const items = due.flatMap((taskId) => job.items.find((item) => item.taskId === taskId) ?? []);
    for (const item of items) await this.insertAsPlanned(workshopId, item, { bench, job, now_minutes });
    if (items.length === 0) return { marked: 0 };
    const values = { name: actor.name, tasks: items.length, task: items[0].name, lot: items[0].lot };
    const subject = { kind: 'programme', id: estimateId } as const;
    await this.parts.audit.record(actor, { subject, jobId, code: 'history-tasks-as-planned', values });
    return { marked: items.length };
  }

  private async insertAsPlanned(
    workshopId: string,
    { taskId, handsOn_minutes }: ProgrammeItem,
    { bench, job, now_minutes }: { bench: Bench; job: BenchJob; now_minutes: number },
  ): Promise<void> {
    const task = job.plan.tasks.find((one) => one.taskId === taskId);
    const stand = task && standAsPlanned(task, now_minutes);
    if (!stand) return;
    const instant = (minutes: number): Date => new Date(millisecondsOf(minutes, bench.frame));
    const endedAt = stand.end_minutes === null ? null : instant(stand.end_minutes);
    await this.parts.marks.insert(workshopId, {
      ...{ id: newId(), programmeId: job.estimateId, taskId, startedAt: instant(stand.start_minutes), endedAt },
      ...{ leftMinutes: endedAt ? 0 : handsOn_minutes, leftAt: null, personIds: task.personIds },
    });
  }

  /** The job as it is worked at the bench, its programme held until the transaction ends. */
  private async worked(workshopId: string, estimateId: string) {
    const { estimate } = await this.parts.estimates.drafts.whole(workshopId, estimateId);
    await this.parts.programmes.hold(workshopId, estimateId);
    const bench = await this.parts.bench.bench(workshopId);
    const job = bench.jobs.find((one) => one.estimateId === estimateId);
    if (!job) throw new Rejection('conflict', 'programme-mark-not-on-board');
    return { jobId: estimate.jobId, bench, job };
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
    return { entry, item, at, now, personIds };
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
