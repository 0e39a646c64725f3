import type { BoardAnswer, BoardJob } from '#shared/programme/board-schema';
import { instantOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { JobName } from './job-names';
import type { UnplannedRow } from './programme-repository';
import type { PromisedJob } from './promised-jobs';

interface BoardAt {
  readonly name: JobName | undefined;
  readonly frame: ProgrammeFrame;
  readonly marks: readonly TaskMark[];
}

const instants = ({ start_minutes, end_minutes }: MomentSpan, frame: ProgrammeFrame) => ({
  startsAt: instantOf(start_minutes, frame),
  endsAt: instantOf(end_minutes, frame),
});

function stateOf(mark: TaskMark | undefined): BoardJob['tasks'][number]['state'] {
  if (!mark) return 'planned';
  return mark.endedAt ? 'finished' : 'started';
}

function presentTask(item: ProgrammeItem, task: PlannedTask, { frame, marks }: BoardAt): BoardJob['tasks'][number] {
  const { taskId, lot, name, kind, gradeId } = item;
  const { dryUntil_minutes: dry } = task;
  return {
    ...{ taskId, lot, name, kind, gradeId, personIds: [...task.personIds] },
    ...instants(task, frame),
    spans: task.spans.map((span) => instants(span, frame)),
    dryAt: dry === null ? null : instantOf(dry, frame),
    state: stateOf(marks.find((mark) => mark.taskId === taskId)),
  };
}

/** A job that was accepted and is not planned yet. */
export const presentUnplanned = (
  { jobId, estimateId }: UnplannedRow,
  name: JobName | undefined,
): BoardAnswer['unplanned'][number] => {
  const { number = '', title = '', clientName = '' } = name ?? {};
  return { jobId, estimateId, number, title, clientName };
};

/** One job on the board: its tasks in the order of its lots, with where they stand. */
export function presentBoardJob(job: PromisedJob, at: BoardAt): BoardJob {
  const { jobId, estimateId, standing, plan, items } = job;
  const { number = '', title = '', clientName = '' } = at.name ?? {};
  const byId = new Map(plan.tasks.map((task) => [task.taskId, task]));
  const tasks = items.flatMap((item) => {
    const task = byId.get(item.taskId);
    return task ? [presentTask(item, task, at)] : [];
  });
  return {
    ...{ jobId, estimateId, number, title, clientName, standing },
    heldUntil: standing === 'held' ? job.holdUntil : null,
    startsAt: instantOf(plan.start_minutes, at.frame),
    finishesAt: instantOf(plan.finish_minutes ?? plan.start_minutes, at.frame),
    tasks,
  };
}
