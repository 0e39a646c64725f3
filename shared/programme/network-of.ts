import { addDays, daysBetween } from '#shared/calendar/add-days';
import { calendarDays, exceptionsByDay, hoursOf, type CalendarDay } from '#shared/programme/calendar-days';
import { crewAtWork, crewsOf, type CrewHours } from '#shared/programme/crews';
import { firstPosition } from '#shared/programme/earliest-times';
import {
  clockProgress,
  dayProgress,
  paceProgress,
  workProgress,
  type LagProgress,
} from '#shared/programme/lag-progress';
import { lagShift } from '#shared/programme/lag-shift';
import { personSpans, shopSpans } from '#shared/programme/person-spans';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import {
  taskNetwork,
  type NetworkArc,
  type NetworkTask,
  type Position,
  type TaskNetwork,
} from '#shared/programme/task-network';

/** A request as a network, and over how many days of its calendar. */
export interface NetworkOverDays {
  readonly network: TaskNetwork;
  readonly days: number;
}

type ProgressOf = (lag: Pick<ProgrammeLag, 'time' | 'paceId'>) => LagProgress;

function crewHours({ calendar, people }: ProgrammeRequest, dates: readonly CalendarDay[]): CrewHours {
  return {
    people,
    spans: people.map((person) => personSpans(dates, person, calendar)),
    shop: shopSpans(dates, calendar),
    productiveShare_percent: calendar.productiveShare_percent,
    common: new Map(),
  };
}

function progressOf(
  { calendar, paces }: ProgrammeRequest,
  hours: CrewHours,
  dates: readonly CalendarDay[],
): ProgressOf {
  const byPace = new Map(paces.map((pace) => [pace.id, paceProgress(pace)]));
  const exceptions = exceptionsByDay(calendar.exceptions);
  const byDay = dayProgress(dates, (at) => hoursOf(dates[at].day, calendar.week, exceptions).length > 0);
  const byWork = workProgress(hours.shop);
  return ({ time, paceId }) => {
    if (time === 'work') return byWork;
    if (time === 'working-days') return byDay;
    const pace = paceId === null ? clockProgress : byPace.get(paceId);
    if (!pace) throw new RangeError(`the pace ${paceId} is not in the request`);
    return pace;
  };
}

/** Where a task stands that has happened, is being worked on, or is pinned by somebody. */
function anchorOf(task: ProgrammeTask, { start_minutes }: ProgrammeRequest, hours: CrewHours): Position | null {
  const { happened, pinned_minutes, isBreakable } = task;
  if (happened) {
    const crew = crewAtWork(happened.personIds, happened.left_minutes, hours);
    if (happened.left_minutes === 0)
      return { start: happened.start_minutes, end: happened.end_minutes, busyFrom: happened.start_minutes, crew };
    const rest = firstPosition({ isBreakable: true }, crew, { start: start_minutes, end: -Infinity });
    return rest && { start: happened.start_minutes, end: rest.end, busyFrom: rest.start, crew };
  }
  if (pinned_minutes === null) return null;
  for (const crew of crewsOf(task, hours)) {
    const found = firstPosition({ isBreakable }, crew, { start: pinned_minutes, end: -Infinity });
    if (found?.start === pinned_minutes) return { ...found, busyFrom: found.start, crew };
  }
  return null;
}

function networkTask(task: ProgrammeTask, request: ProgrammeRequest, hours: CrewHours): NetworkTask {
  return {
    crews: crewsOf(task, hours),
    isBreakable: task.isBreakable,
    release: Math.max(request.start_minutes, task.release_minutes),
    anchor: anchorOf(task, request, hours),
  };
}

const placeIn = (request: ProgrammeRequest): ((taskId: string) => number) => {
  const places = new Map(request.tasks.map((task, at) => [task.id, at]));
  return (taskId) => {
    const at = places.get(taskId);
    if (at === undefined) throw new RangeError(`the task ${taskId} is not in the request`);
    return at;
  };
};

/** The two sides of a lag as inequalities; what has happened is not asked to be otherwise, nor a window that has closed meanwhile. */
function arcsOf(
  lag: ProgrammeLag,
  at: { readonly from: number; readonly to: number },
  progress: LagProgress,
): NetworkArc[] {
  const { fromPoint, toPoint, id: sourceId } = lag;
  const least: NetworkArc = {
    ...at,
    fromPoint,
    toPoint,
    shift: lagShift(progress, lag.least),
    sourceId,
    side: 'least',
  };
  if (lag.most === null) return [least];
  const shift = lagShift(progress, -lag.most);
  return [least, { from: at.to, fromPoint: toPoint, to: at.from, toPoint: fromPoint, shift, sourceId, side: 'most' }];
}

/** An approval as a lag, and how early its task may start where it does not follow another or is given already. */
function approvalLags({ approvals }: ProgrammeRequest): ProgrammeLag[] {
  return approvals.flatMap(({ id, afterTaskId, beforeTaskId, usual_days, given_minutes }): ProgrammeLag[] => {
    if (afterTaskId === null || given_minutes !== null) return [];
    const points = { fromTaskId: afterTaskId, fromPoint: 'end', toTaskId: beforeTaskId, toPoint: 'start' } as const;
    return [{ id, ...points, least: usual_days, most: null, time: 'working-days', paceId: null }];
  });
}

function releases(request: ProgrammeRequest, progress: LagProgress): ReadonlyMap<string, number> {
  const found = new Map<string, number>();
  for (const { afterTaskId, beforeTaskId, usual_days, given_minutes } of request.approvals) {
    if (afterTaskId !== null && given_minutes === null) continue;
    const until = given_minutes ?? lagShift(progress, usual_days).later(request.start_minutes);
    found.set(beforeTaskId, Math.max(found.get(beforeTaskId) ?? 0, until));
  }
  return found;
}

function placesOf(request: ProgrammeRequest, at: (taskId: string) => number): TaskNetwork['places'] {
  return request.places.map(({ id, capacity, taken }) => ({
    capacity,
    taken: taken.map(({ start_minutes, end_minutes, amount }) => ({ start: start_minutes, end: end_minutes, amount })),
    holds: request.placeHolds
      .filter((hold) => hold.placeId === id)
      .map(({ amount, fromTaskId, untilTaskId }) => ({ amount, from: at(fromTaskId), until: at(untilTaskId) })),
  }));
}

/** A request as a network over so many days of its calendar; RangeError where it names a task or a pace it does not have. */
export function networkOf(request: ProgrammeRequest, days: number): NetworkOverDays {
  const dates = calendarDays(request.calendar, days);
  const hours = crewHours(request, dates);
  const progress = progressOf(request, hours, dates);
  const at = placeIn(request);
  const early = releases(request, progress({ time: 'working-days', paceId: null }));
  const tasks = request.tasks.map((task) =>
    networkTask({ ...task, release_minutes: Math.max(task.release_minutes, early.get(task.id) ?? 0) }, request, hours),
  );
  const arcs = [...request.lags, ...approvalLags(request)]
    .flatMap((lag) => arcsOf(lag, { from: at(lag.fromTaskId), to: at(lag.toTaskId) }, progress(lag)))
    .filter((arc) => !request.tasks[arc.to].happened && !isMissed(arc, tasks, request));
  return { days, network: taskNetwork({ tasks, arcs, places: placesOf(request, at), people: request.people.length }) };
}

/** A most lag from what has happened to what has not yet may have closed before anybody could start. */
function isMissed(arc: NetworkArc, tasks: readonly NetworkTask[], request: ProgrammeRequest): boolean {
  return arc.side === 'most' && request.tasks[arc.to].happened !== null && tasks[arc.from].anchor === null;
}

/** Days of the calendar up to a moment, with a year beyond it at the least. */
export const daysUntil = ({ calendar }: ProgrammeRequest, moment_minutes: number): number =>
  daysBetween(calendar.firstDay, addDays(calendar.firstDay, Math.ceil(moment_minutes / 1440))) + 400;
