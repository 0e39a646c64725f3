import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import type { BenchState, BenchTask } from '#shared/programme/bench-task';
import { paceProgress } from '#shared/programme/lag-progress';
import {
  dayOfMinutes,
  instantOf,
  minutesOf,
  minutesOfDay,
  type ProgrammeFrame,
} from '#shared/programme/programme-frame';
import type { TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { ProgrammeLag, ProgrammeRequest, TaskPoint } from '#shared/programme/programme-request';
import type { PromisedPlan } from '#shared/programme/promised-plan';
import { unattendedMarks } from '#shared/programme/unattended-marks';

/** A job as the bench works it: its plan in the minutes of the frame, what was asked of it, where its tasks stand. */
export interface BenchJob extends PromisedPlan {
  readonly number: string;
  readonly title: string;
  readonly lags: ProgrammeRequest['lags'];
  readonly paces: ProgrammeRequest['paces'];
  readonly approvals: ProgrammeRequest['approvals'];
  readonly marks: readonly TaskMark[];
  /** How often its plan was kept anew, and when it was last (ISO 8601; null: not known). */
  readonly revision: number;
  readonly keptAt: string | null;
}

/** Whose day it is (null: everybody's), which one, and what time it is now. */
export interface BenchAsked {
  readonly personId: string | null;
  readonly day: Day;
  readonly now_minutes: number;
  readonly frame: ProgrammeFrame;
  readonly nameOf: (personId: string) => string;
}

interface Known {
  readonly job: BenchJob;
  readonly planned: ReadonlyMap<string, PlannedTask>;
  readonly marks: ReadonlyMap<string, TaskMark>;
}

interface At {
  readonly known: Known;
  readonly frame: ProgrammeFrame;
}

const knownOf = (job: BenchJob, frame: ProgrammeFrame): Known => ({
  job,
  planned: new Map(job.plan.tasks.map((task) => [task.taskId, task])),
  marks: new Map(unattendedMarks({ ...job, frame }).map((mark) => [mark.taskId, mark])),
});

/** A moment of a task: as marked, else as planned. */
function momentOf(taskId: string, point: TaskPoint, { known, frame }: At): number | null {
  const mark = known.marks.get(taskId);
  const marked = point === 'start' ? mark?.startedAt : mark?.endedAt;
  const planned = known.planned.get(taskId);
  if (marked) return minutesOf(marked, frame);
  return (point === 'start' ? planned?.start_minutes : planned?.end_minutes) ?? null;
}

/** So many minutes after a moment of the task before, slower or faster at the pace it dries at. */
function after(lag: ProgrammeLag, minutes: number, at: At): number | null {
  const moment = momentOf(lag.fromTaskId, lag.fromPoint, at);
  if (moment === null) return null;
  const pace = at.known.job.paces.find(({ id }) => id === lag.paceId);
  if (!pace) return moment + minutes;
  const progress = paceProgress(pace);
  return progress.first(progress.at(moment) + minutes);
}

const lagsTo = (taskId: string, { known }: At): ProgrammeLag[] =>
  known.job.lags.filter((lag) => lag.toTaskId === taskId);

const found = (moments: readonly (number | null)[]): number[] => moments.filter((moment) => moment !== null);

/** When the last of the coats it goes on is dry. */
function readyAt(taskId: string, at: At): number | null {
  const dry = lagsTo(taskId, at)
    .filter((lag) => lag.toPoint === 'start' && lag.least > 0)
    .map((lag) => after(lag, lag.least, at));
  return found(dry).length > 0 ? Math.max(...found(dry)) : null;
}

/** The first moment at which one of the windows it has to keep closes. */
function windowCloses(taskId: string, at: At): number | null {
  const closes = lagsTo(taskId, at).map((lag) => (lag.most === null ? null : after(lag, lag.most, at)));
  return found(closes).length > 0 ? Math.min(...found(closes)) : null;
}

const isFinished = (taskId: string, { marks }: Known): boolean => Boolean(marks.get(taskId)?.endedAt);

function isWaiting(taskId: string, { job, ...known }: Known): boolean {
  const before = job.lags.filter(
    (lag) => lag.toTaskId === taskId && lag.toPoint === 'start' && lag.fromPoint === 'end',
  );
  const approvals = job.approvals.filter((approval) => approval.beforeTaskId === taskId);
  return (
    before.some(({ fromTaskId, least }) => least >= 0 && !isFinished(fromTaskId, { job, ...known })) ||
    approvals.some(({ given_minutes }) => given_minutes === null)
  );
}

function stateOf(taskId: string, known: Known, at: { ready: number | null; now: number }): BenchState {
  const mark = known.marks.get(taskId);
  if (mark) return mark.endedAt ? 'finished' : 'started';
  if (isWaiting(taskId, known)) return 'waiting';
  return at.ready !== null && at.ready > at.now ? 'drying' : 'ready';
}

const instantOrOpen = (minutes: number | null, frame: ProgrammeFrame): string | null =>
  minutes === null ? null : instantOf(minutes, frame);

function benchTask(
  item: ProgrammeItem,
  task: PlannedTask,
  { known, asked }: { known: Known; asked: BenchAsked },
): BenchTask {
  const { frame, personId, nameOf } = asked;
  const { job, marks } = known;
  const ready = readyAt(item.taskId, { known, frame });
  const { taskId, piece, lot, kind, name, coat, coats, portion, portions, grade, handsOn_minutes } = item;
  return {
    ...{ estimateId: job.estimateId, taskId, jobNumber: job.number, jobTitle: job.title },
    ...{ piece, lot, kind, name, coat, coats, portion, portions, grade, handsOn_minutes },
    with: task.personIds.filter((id) => id !== personId).map(nameOf),
    startsAt: marks.get(taskId)?.startedAt ?? instantOf(task.start_minutes, frame),
    endsAt: marks.get(taskId)?.endedAt ?? instantOf(task.end_minutes, frame),
    state: stateOf(taskId, known, { ready, now: asked.now_minutes }),
    readyAt: instantOrOpen(ready, frame),
    windowClosesAt: instantOrOpen(windowCloses(taskId, { known, frame }), frame),
    waits: [...task.waits],
  };
}

/** One task of a job as the bench reads it; null where the plan does not hold it. */
export function benchTaskOf(job: BenchJob, taskId: string, asked: BenchAsked): BenchTask | null {
  const known = knownOf(job, asked.frame);
  const item = job.items.find((one) => one.taskId === taskId);
  const task = known.planned.get(taskId);
  return item && task ? benchTask(item, task, { known, asked }) : null;
}

/** The day of one person in order, coats dry now or in the course of it, and windows that close in it. */
export interface BenchDayLists {
  readonly tasks: BenchTask[];
  readonly coatsReady: BenchTask[];
  readonly windowsClosing: BenchTask[];
  /** The next day after it on which there is work for them; null where none is planned. */
  readonly nextDay: Day | null;
}

const within = (instant: string | null, from: string, to: string): boolean =>
  instant !== null && instant >= from && instant < to;

const byInstant = (of: (task: BenchTask) => string | null) => (one: BenchTask, other: BenchTask) =>
  (of(one) ?? '').localeCompare(of(other) ?? '') || one.taskId.localeCompare(other.taskId);

/** The first day from a moment on that has a span of somebody's work. */
function nextWorkDay(tasks: readonly PlannedTask[], from: number, frame: ProgrammeFrame): Day | null {
  const starts = tasks
    .flatMap(({ spans }) => spans)
    .flatMap(({ start_minutes }) => (start_minutes >= from ? [start_minutes] : []));
  return starts.length > 0
    ? dayOfMinutes(
        starts.reduce((one, other) => Math.min(one, other)),
        frame,
      )
    : null;
}

const isOpen = ({ state }: BenchTask): boolean => state !== 'finished' && state !== 'started';

/**
 * What somebody does on a day: their tasks planned or begun then, and such of earlier days as are not finished, in order; besides, whoever goes on
 * with them, coats that are dry by the end of the day, windows that close in it, and the next day with work.
 */
export function benchDayOf(jobs: readonly BenchJob[], asked: BenchAsked): BenchDayLists {
  const { day, frame, personId } = asked;
  const [from, to] = [minutesOfDay(day, frame), minutesOfDay(addDays(day, 1), frame)];
  const [fromInstant, toInstant] = [instantOf(from, frame), instantOf(to, frame)];
  const all = jobs.flatMap((job) => {
    const known = knownOf(job, frame);
    return job.items.flatMap((item) => {
      const task = known.planned.get(item.taskId);
      return task && item.kind !== 'carved' ? [{ planned: task, task: benchTask(item, task, { known, asked }) }] : [];
    });
  });
  const isMine = ({ personIds }: PlannedTask) => personId === null || personIds.includes(personId);
  const own = all.filter(({ planned, task }) => {
    const isToday = planned.spans.some((span) => span.start_minutes < to && span.end_minutes > from);
    const isLeft = planned.end_minutes <= from && task.state !== 'finished' && from <= asked.now_minutes;
    return (
      isMine(planned) &&
      planned.personIds.length > 0 &&
      (isToday || isLeft || within(task.endsAt, fromInstant, toInstant))
    );
  });
  const open = all.map(({ task }) => task).filter(isOpen);
  const later = all
    .filter(({ planned, task }) => isMine(planned) && task.state !== 'finished')
    .map(({ planned }) => planned);
  return {
    nextDay: nextWorkDay(later, to, frame),
    tasks: own.map(({ task }) => task).sort(byInstant((task) => task.startsAt)),
    coatsReady: open
      .filter(({ state, readyAt: dry }) => state !== 'waiting' && dry !== null && dry < toInstant)
      .sort(byInstant((task) => task.readyAt)),
    windowsClosing: open
      .filter(({ windowClosesAt }) => within(windowClosesAt, fromInstant, toInstant))
      .sort(byInstant((task) => task.windowClosesAt)),
  };
}
