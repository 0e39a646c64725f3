import { addDays } from '#shared/calendar/add-days';
import { weekdayOf } from '#shared/calendar/working-days';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import type { MomentSpan, Person } from '#shared/programme/shop-calendar';

const dayLength_minutes = 1440;

/** Whether somebody works at a minute: looked up minute by minute, in a calendar of days that are all of one length. */
function isAtWork(person: Person, minute: number, { calendar }: ProgrammeRequest): boolean {
  const day = addDays(calendar.firstDay, Math.floor(minute / dayLength_minutes));
  const isAway = person.away.some(({ start_minutes, end_minutes }) => start_minutes <= minute && minute < end_minutes);
  const exception = [...person.exceptions, ...calendar.exceptions].find((one) => one.day === day);
  const hours = exception?.hours ?? (person.week ?? calendar.week)[weekdayOf(day)] ?? [];
  const clock = minute % dayLength_minutes;
  return !isAway && hours.some(({ start_minutes, end_minutes }) => start_minutes <= clock && clock < end_minutes);
}

const minutesOf = (spans: readonly MomentSpan[]): number[] =>
  spans.flatMap(({ start_minutes, end_minutes }) =>
    Array.from({ length: end_minutes - start_minutes }, (_, minute) => start_minutes + minute),
  );

function brokenAlone(task: ProgrammeTask, planned: PlannedTask, request: ProgrammeRequest): string[] {
  const people = request.people.filter(({ id }) => planned.personIds.includes(id));
  const minutes = minutesOf(planned.spans);
  const [first, last] = [minutes[0], minutes[minutes.length - 1]];
  const share = (task.handsOn_minutes * task.crew) / people.length;
  const needed = Math.ceil((share * 100) / request.calendar.productiveShare_percent - 1e-9);
  const broken: string[] = [];
  if (people.length < task.crew || people.length > Math.max(task.crew, task.mostPeople)) broken.push('crew');
  if (people.some(({ gradeIds }) => !gradeIds.includes(task.gradeId))) broken.push('grade');
  if (minutes.some((minute) => people.some((person) => !isAtWork(person, minute, request)))) broken.push('hours');
  if (minutes.length !== needed) broken.push('work');
  if (first !== planned.start_minutes || last + 1 !== planned.end_minutes) broken.push('ends');
  if (first < Math.max(request.start_minutes, task.release_minutes)) broken.push('release');
  const isOneDay = Math.floor(first / dayLength_minutes) === Math.floor(last / dayLength_minutes);
  if (!task.isBreakable && !isOneDay) broken.push('broken overnight');
  return broken.map((rule) => `${task.id}: ${rule}`);
}

function isLagKept(lag: ProgrammeLag, { tasks }: Programme): boolean {
  const point = (taskId: string, at: 'start' | 'end'): number =>
    tasks.find((task) => task.taskId === taskId)?.[at === 'start' ? 'start_minutes' : 'end_minutes'] ?? NaN;
  const apart = point(lag.toTaskId, lag.toPoint) - point(lag.fromTaskId, lag.fromPoint);
  return apart >= lag.least && (lag.most === null || apart <= lag.most);
}

const areTogether = (one: MomentSpan, other: MomentSpan): boolean =>
  one.start_minutes < other.end_minutes && other.start_minutes < one.end_minutes;

function brokenTogether({ tasks }: Programme): string[] {
  return tasks.flatMap((one, at) =>
    tasks
      .slice(at + 1)
      .filter((other) => areTogether(one, other) && one.personIds.some((id) => other.personIds.includes(id)))
      .map((other) => `${one.taskId} and ${other.taskId}: people`),
  );
}

function brokenPlaces({ places, placeHolds }: ProgrammeRequest, { tasks }: Programme): string[] {
  const by = new Map(tasks.map((task) => [task.taskId, task]));
  return places.flatMap(({ id, capacity, taken }) => {
    const own = placeHolds
      .filter((hold) => hold.placeId === id)
      .map((hold) => ({
        amount: hold.amount,
        start: by.get(hold.fromTaskId)?.start_minutes ?? NaN,
        end: by.get(hold.untilTaskId)?.end_minutes ?? NaN,
      }));
    const promised = taken.map(({ amount, start_minutes: start, end_minutes: end }) => ({ amount, start, end }));
    const holds = [...own, ...promised];
    const used = (moment: number): number =>
      holds.reduce((sum, { amount, start, end }) => (start <= moment && moment < end ? sum + amount : sum), 0);
    // Where the others take more than there is, nothing of this one may be there.
    const isOwnThere = (moment: number): boolean => own.some(({ start, end }) => start <= moment && moment < end);
    return holds.some(({ start }) => isOwnThere(start) && used(start) > capacity) ? [`${id}: room`] : [];
  });
}

/**
 * What a plan breaks of a request, worked out minute by minute from the definitions and nothing of the planning, in words for a test; lags by the clock alone,
 * days of 24 hours. Empty where every rule is kept.
 */
export function brokenRulesForSpecs(request: ProgrammeRequest, plan: Programme): string[] {
  const alone = request.tasks.flatMap((task) => {
    const planned = plan.tasks.find(({ taskId }) => taskId === task.id);
    return planned ? brokenAlone(task, planned, request) : [`${task.id}: missing`];
  });
  const lags = request.lags.filter((lag) => !isLagKept(lag, plan)).map(({ id }) => `${id}: lag`);
  return [...alone, ...lags, ...brokenTogether(plan), ...brokenPlaces(request, plan)];
}
