import { inPortions, tasksTiedTo } from '#shared/programme/in-portions';
import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import type { OtherSize, ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';
import type { DayHours, WeekHours } from '#shared/programme/shop-calendar';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** A change that was tried: what it is in words, the request with it, and what came of planning that; no finish where it does not help. */
export interface Remedy {
  readonly code: WordCode;
  readonly values: WordValues;
  readonly request: ProgrammeRequest;
  readonly plan: Programme;
}

/** What may be changed for a task: the sizes there are instead, and how planning goes. */
export interface RemedyChoices {
  readonly otherSizes: readonly OtherSize[];
  readonly search?: ProgrammeSearch;
}

type Tried = Omit<Remedy, 'plan'>;

const midnight_minutes = 1440;

const longerDay = (hours: DayHours, by_minutes: number): DayHours =>
  hours.map((span, at) =>
    at === hours.length - 1
      ? { ...span, end_minutes: Math.min(midnight_minutes, span.end_minutes + by_minutes) }
      : span,
  );

const longerWeek = (week: WeekHours, by_minutes: number): WeekHours =>
  Object.fromEntries(Object.entries(week).map(([day, hours]) => [day, longerDay(hours, by_minutes)]));

/** Everybody stays so much longer on every day of their week. */
function withLongerDay(request: ProgrammeRequest, by_minutes: number): Tried {
  const calendar = { ...request.calendar, week: longerWeek(request.calendar.week, by_minutes) };
  const people = request.people.map((one) => ({ ...one, week: one.week && longerWeek(one.week, by_minutes) }));
  return { code: 'programme-remedy-longer-day', values: { by_minutes }, request: { ...request, calendar, people } };
}

/** One more of a grade, as many hours as the workshop has. */
function withFurtherHands(request: ProgrammeRequest, gradeId: string): Tried {
  const further = { id: `further ${gradeId}`, gradeIds: [gradeId], week: null, exceptions: [], away: [] };
  // Whoever comes shares what a grade of two can share: the work of a window is halved.
  const tasks = request.tasks.map((task) =>
    task.gradeId === gradeId && task.mostPeople > 1 ? { ...task, mostPeople: task.mostPeople + 1 } : task,
  );
  const people = [...request.people, further];
  return { code: 'programme-remedy-further-hands', values: { grade: gradeId }, request: { ...request, people, tasks } };
}

function withOtherSize(request: ProgrammeRequest, { name, lags }: OtherSize): Tried {
  const other = new Map(lags.map((lag) => [lag.id, lag]));
  const changed = { ...request, lags: request.lags.map((lag) => other.get(lag.id) ?? lag) };
  return { code: 'programme-remedy-other-size', values: { size: name }, request: changed };
}

/** By how much a day is made longer, one after another, and into how many portions work is parted. */
const longer_minutes = [60, 120, 180];
const portionCounts = [2, 3, 4, 5, 6, 7, 8, 10, 12, 16];

function changes(request: ProgrammeRequest, taskId: string, { otherSizes }: RemedyChoices): (() => Tried)[][] {
  const tied = tasksTiedTo(request, taskId);
  const task = request.tasks.find(({ id }) => id === taskId);
  const grades = [
    ...new Set(request.tasks.filter(({ id }) => tied.has(id) || id === taskId).map(({ gradeId }) => gradeId)),
  ];
  const portioned = (portions: number): Tried => ({
    code: 'programme-remedy-portions',
    values: { task: task?.name ?? '', portions },
    request: inPortions(request, taskId, portions),
  });
  return [
    ...otherSizes.map((size) => [() => withOtherSize(request, size)]),
    portionCounts.map((portions) => () => portioned(portions)),
    longer_minutes.map((by_minutes) => () => withLongerDay(request, by_minutes)),
    ...grades.map((gradeId) => [() => withFurtherHands(request, gradeId)]),
  ];
}

/** What may be changed where all of it comes too late: hands of every grade there is work for, and the length of the day. */
function changesOfAll(request: ProgrammeRequest): (() => Tried)[][] {
  const hands = request.tasks.filter(({ crew, happened }) => crew > 0 && !happened).map(({ gradeId }) => gradeId);
  return [
    longer_minutes.map((by_minutes) => () => withLongerDay(request, by_minutes)),
    ...[...new Set(hands)].map((gradeId) => [() => withFurtherHands(request, gradeId)]),
  ];
}

/**
 * What would help a task that finds no time, each tried by planning anew: another size, smaller lots, a longer day (the least of each that helps, else the most),
 * further hands; of all of it (null) hands and days alone; soonest finish first, what does not help last. Costs are reckoned elsewhere. Minutes.
 */
export function programmeRemedies(request: ProgrammeRequest, taskId: string | null, choices: RemedyChoices): Remedy[] {
  const search = choices.search ?? { limit: { nodes: 0 } };
  const tries = taskId === null ? changesOfAll(request) : changes(request, taskId, choices);
  const remedies = tries.flatMap((steps) => {
    let last: Remedy | null = null;
    for (const step of steps) {
      const tried = step();
      last = { ...tried, plan: programme(tried.request, search) };
      if (last.plan.finish_minutes !== null) break;
    }
    return last ?? [];
  });
  const finish = ({ plan }: Remedy): number => plan.finish_minutes ?? Infinity;
  return remedies.sort((a, b) => (finish(a) === finish(b) ? 0 : finish(a) - finish(b)));
}
