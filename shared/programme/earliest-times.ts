import {
  pointOf,
  type Crew,
  type NetworkArc,
  type NetworkTask,
  type TaskNetwork,
} from '#shared/programme/task-network';

/** How early the points of every task can be if people had nothing else to do; `failed` names an arc that leads beyond all hours there are. */
export interface EarliestTimes {
  readonly starts: readonly number[];
  readonly ends: readonly number[];
  readonly failed: NetworkArc | null;
}

/** The first position of a crew whose start and end are not before two moments; null where their hours have none. */
export function firstPosition(
  { isBreakable }: Pick<NetworkTask, 'isBreakable'>,
  { spans, work }: Crew,
  from: { readonly start: number; readonly end: number },
): { readonly start: number; readonly end: number } | null {
  if (work === 0) {
    const moment = Math.max(from.start, from.end);
    return { start: moment, end: moment };
  }
  let start = from.start;
  if (from.end > start) start = Math.max(start, spans.startFor(from.end, work));
  start = isBreakable ? spans.startAt(start) : spans.unbrokenStart(start, work);
  if (start === Infinity) return null;
  const end = spans.endOf(start, work);
  return end === Infinity ? null : { start, end };
}

/** The earliest start and the earliest end any crew gives; they may be those of different crews. */
function soonest(task: NetworkTask, from: { start: number; end: number }): { start: number; end: number } {
  let [start, end] = [Infinity, Infinity];
  for (const crew of task.crews) {
    const found = firstPosition(task, crew, from);
    if (!found) continue;
    start = Math.min(start, found.start);
    end = Math.min(end, found.end);
  }
  return { start, end };
}

/** A task is put off this often, and four times for every task, before its lags are held to lead nowhere. */
const mostRounds = 2000;

/**
 * The earliest times of all tasks by lags and calendars alone: the least solution of inequalities that all rise with their moments, found by putting off
 * whatever is too early (label correcting; longest paths where work never stops). Moments in minutes.
 */
export function earliestTimes(network: TaskNetwork): EarliestTimes {
  const { tasks, arcsFrom } = network;
  const found = tasks.map((task) => task.anchor ?? soonest(task, { start: task.release, end: -Infinity }));
  const times = found.map(({ start, end }) => ({ start, end }));
  const rounds = tasks.map(() => 0);
  const queue = tasks.map((_, at) => at);
  const isQueued = tasks.map(() => true);
  let failed: NetworkArc | null = null;
  for (let at = 0; at < queue.length && !failed; at += 1) {
    const from = queue[at];
    isQueued[from] = false;
    for (const arc of arcsFrom[from]) {
      if (!isPutOff(network, times, arc)) continue;
      rounds[arc.to] += 1;
      if (times[arc.to].end === Infinity || rounds[arc.to] > mostRounds + 4 * tasks.length) failed = arc;
      if (!isQueued[arc.to]) queue.push(arc.to);
      isQueued[arc.to] = true;
    }
  }
  return { starts: times.map(({ start }) => start), ends: times.map(({ end }) => end), failed };
}

function isPutOff({ tasks }: TaskNetwork, times: { start: number; end: number }[], arc: NetworkArc): boolean {
  const needed = arc.shift.later(pointOf(times[arc.from], arc.fromPoint));
  const task = tasks[arc.to];
  if (needed <= pointOf(times[arc.to], arc.toPoint) || task.anchor) return false;
  const { start, end } = times[arc.to];
  const later = arc.toPoint === 'start' ? { start: needed, end } : { start, end: needed };
  const now = soonest(task, later);
  times[arc.to] = { start: Math.max(start, now.start), end: Math.max(end, now.end) };
  return true;
}
