import { paceProgress } from '#shared/programme/lag-progress';
import { instantOf, minutesOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { ProgrammeLag, ProgrammeRequest } from '#shared/programme/programme-request';

/** Work with what ties it together; approvals that were not given yet are still waited for. */
export interface MarkedWork extends Pick<ProgrammeRequest, 'lags' | 'paces' | 'approvals'> {
  readonly items: readonly Pick<ProgrammeItem, 'taskId' | 'handsOn_minutes'>[];
  readonly marks: readonly TaskMark[];
  readonly frame: ProgrammeFrame;
}

type Marks = ReadonlyMap<string, TaskMark>;

/** When what a lag leads from allows its task; null where that has not happened yet. */
function allowedBy(lag: ProgrammeLag, marks: Marks, { paces, frame }: MarkedWork): number | null {
  const mark = marks.get(lag.fromTaskId);
  const moment = lag.fromPoint === 'start' ? mark?.startedAt : mark?.endedAt;
  if (!moment) return null;
  const from = minutesOf(moment, frame);
  const pace = paces.find(({ id }) => id === lag.paceId);
  if (!pace) return from + lag.least;
  const progress = paceProgress(pace);
  return progress.first(progress.at(from) + lag.least);
}

function unattendedMark(taskId: string, marks: Marks, work: MarkedWork): TaskMark | null {
  const before = work.lags.filter((lag) => lag.toTaskId === taskId && lag.least >= 0);
  const isHeld = work.approvals.some((one) => one.beforeTaskId === taskId && one.given_minutes === null);
  const moments = before.map((lag) => allowedBy(lag, marks, work));
  const known = moments.filter((moment) => moment !== null);
  if (isHeld || known.length === 0 || known.length < moments.length) return null;
  const at = instantOf(Math.max(...known), work.frame);
  return { taskId, startedAt: at, endedAt: at, left_minutes: 0, leftAt: at, personIds: [] };
}

/**
 * The marks with those of work nobody has a hand in: the end of all carving of a member, a coat that is left alone. It stands on nobody's list and nobody
 * can mark it, so it is over at the moment all it waits for was done and dry.
 */
export function unattendedMarks(work: MarkedWork): TaskMark[] {
  const marks = new Map(work.marks.map((mark) => [mark.taskId, mark]));
  const unattended = work.items.filter(({ handsOn_minutes }) => handsOn_minutes === 0);
  for (let before = -1; before !== marks.size;) {
    before = marks.size;
    for (const { taskId } of unattended) {
      const found = marks.has(taskId) ? null : unattendedMark(taskId, marks, work);
      if (found) marks.set(taskId, found);
    }
  }
  return [...marks.values()];
}
