import { addDays, daysBetween } from '#shared/calendar/add-days';
import { calendarDays, exceptionsByDay, hoursOn, type CalendarDay } from '#shared/programme/calendar-days';
import { crewAtWork, crewsOf, type CrewHours } from '#shared/programme/crews';
import { isHeldByPin } from '#shared/programme/is-held-by-pin';
import { firstPosition } from '#shared/programme/earliest-times';
import {
  clockProgress,
  dayProgress,
  paceProgress,
  workProgress,
  type LagProgress,
} from '#shared/programme/lag-progress';
import { lagShift } from '#shared/programme/lag-shift';
import { peopleSpans, shopSpans } from '#shared/programme/person-spans';
import type { Happened, ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import {
  taskNetwork,
  type Crew,
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
  const shop = shopSpans(dates, calendar);
  return {
    people,
    spans: peopleSpans(dates, { people, calendar }, shop),
    shop,
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
  const byDay = dayProgress(dates, (at) => hoursOn(dates[at], calendar.week, exceptions).length > 0);
  const byWork = workProgress(hours.shop);
  return ({ time, paceId }) => {
    if (time === 'work') return byWork;
    if (time === 'working-days') return byDay;
    const pace = paceId === null ? clockProgress : byPace.get(paceId);
    if (!pace) throw new RangeError(`the pace ${paceId} is not in the request`);
    return pace;
  };
}

/** A crew with what is left to it: the hours since that was said are worked, and what should be over by now ends at once. */
function withWorkLeft(crew: Crew, { leftAt_minutes }: Happened, from: number): Crew {
  if (leftAt_minutes === undefined) return crew;
  const worked = Math.max(0, crew.spans.workedBy(from) - crew.spans.workedBy(leftAt_minutes));
  return { ...crew, work: Math.max(1, crew.work - worked) };
}

/** Where a task stands that has happened or is being worked on. */
function happenedPosition(task: ProgrammeTask, { start_minutes }: ProgrammeRequest, hours: CrewHours): Position | null {
  const { happened } = task;
  if (!happened) return null;
  const crew = crewAtWork(happened.personIds, happened.left_minutes, hours);
  if (happened.left_minutes === 0)
    return { start: happened.start_minutes, end: happened.end_minutes, busyFrom: happened.start_minutes, crew };
  // What is left of it comes after its start, also where a plan is judged from an earlier moment.
  const from = Math.max(start_minutes, happened.start_minutes);
  const left = withWorkLeft(crew, happened, from);
  const rest = firstPosition({ isBreakable: true }, left, { start: from, end: -Infinity });
  return rest && { start: happened.start_minutes, end: rest.end, busyFrom: rest.start, crew: left };
}

const clash = (one: Position, other: Position): boolean =>
  one.busyFrom < other.end &&
  other.busyFrom < one.end &&
  one.crew.people.some((person) => other.crew.people.includes(person));

/** Where a task stands that is held by its pin: with the first who can begin then and are not held by what stands already; null where there are none. */
function pinnedPosition(
  { pinned_minutes, isBreakable }: ProgrammeTask,
  crews: NetworkTask['crews'],
  standing: readonly Position[],
): Position | null {
  if (pinned_minutes === null) return null;
  for (const crew of crews) {
    const found = firstPosition({ isBreakable }, crew, { start: pinned_minutes, end: -Infinity });
    const position = found && { ...found, busyFrom: found.start, crew };
    if (position?.start === pinned_minutes && !standing.some((other) => clash(position, other))) return position;
  }
  return null;
}

/** The tasks with their crews; first what has happened finds its place, then what is pinned. */
function networkTasks(
  request: ProgrammeRequest,
  hours: CrewHours,
  released: ReadonlyMap<string, number>,
): NetworkTask[] {
  const anchors = request.tasks.map((task) => happenedPosition(task, request, hours));
  const crews = request.tasks.map((task) => crewsOf(task, hours));
  const standing = anchors.filter((anchor) => anchor !== null);
  request.tasks.forEach((task, at) => {
    const pinned = isHeldByPin(task, request) ? pinnedPosition(task, crews[at], standing) : null;
    if (pinned) standing.push(pinned);
    anchors[at] ??= pinned;
  });
  return request.tasks.map(({ id, isBreakable, release_minutes }, at) => ({
    crews: crews[at],
    isBreakable,
    release: Math.max(request.start_minutes, release_minutes, released.get(id) ?? 0),
    anchor: anchors[at],
  }));
}

const placeIn = (request: ProgrammeRequest): ((taskId: string) => number) => {
  const places = new Map(request.tasks.map((task, at) => [task.id, at]));
  return (taskId) => {
    const at = places.get(taskId);
    if (at === undefined) throw new RangeError(`the task ${taskId} is not in the request`);
    return at;
  };
};

/** The two sides of a lag as inequalities. */
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

/** What has happened is not asked to be otherwise, nor a window to be kept that is known to be missed. */
function isAsked(arc: NetworkArc, { tasks }: ProgrammeRequest, missed: ReadonlySet<string>): boolean {
  if (!tasks[arc.to].happened) return true;
  return arc.side === 'most' && !tasks[arc.from].happened && !missed.has(arc.sourceId);
}

/**
 * A request as a network over so many days of its calendar, without windows that are missed (by their lags' ids); RangeError where it names a task or a pace
 * it does not have. Minutes.
 */
export function networkOf(
  request: ProgrammeRequest,
  days: number,
  missed: ReadonlySet<string> = new Set(),
): NetworkOverDays {
  const dates = calendarDays(request.calendar, days);
  const hours = crewHours(request, dates);
  const progress = progressOf(request, hours, dates);
  const at = placeIn(request);
  const tasks = networkTasks(request, hours, releases(request, progress({ time: 'working-days', paceId: null })));
  const arcs = [...request.lags, ...approvalLags(request)]
    .flatMap((lag) => arcsOf(lag, { from: at(lag.fromTaskId), to: at(lag.toTaskId) }, progress(lag)))
    .filter((arc) => isAsked(arc, request, missed));
  return { days, network: taskNetwork({ tasks, arcs, places: placesOf(request, at), people: request.people.length }) };
}

/** Days of the calendar up to a moment, with a year beyond it at the least. */
export const daysUntil = ({ calendar }: ProgrammeRequest, moment_minutes: number): number =>
  daysBetween(calendar.firstDay, addDays(calendar.firstDay, Math.ceil(moment_minutes / 1440))) + 400;
