import { addDays } from '#shared/calendar/add-days';
import { type Day, dayNumber } from '#shared/calendar/day';
import { weekdayOf } from '#shared/calendar/working-days';
import { calendarDays } from '#shared/programme/calendar-days';
import { personSpans } from '#shared/programme/person-spans';
import { minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { PromisedPlan } from '#shared/programme/promised-plan';
import type { MomentSpan, Person, ShopCalendar } from '#shared/programme/shop-calendar';

/** Work of one grade in one week against the hands there are, in working minutes by the clock; `week` is its Monday. */
export interface GradeLoad {
  readonly gradeId: string;
  readonly grade: string;
  readonly week: Day;
  readonly work_minutes: number;
  readonly capacity_minutes: number;
  readonly isOver: boolean;
}

/** What load is reckoned over: whole weeks from a Monday on, against the people as they are there, whatever is promised. */
export interface LoadAsked {
  readonly plans: readonly PromisedPlan[];
  readonly people: readonly Person[];
  readonly grades: readonly { readonly id: string; readonly name: string }[];
  readonly calendar: ShopCalendar;
  readonly frame: ProgrammeFrame;
  readonly monday: Day;
  readonly weeks: number;
}

/** The Monday of a day's week. */
export const mondayOf = (day: Day): Day => addDays(day, 1 - weekdayOf(day));

const minutesIn = (spans: readonly MomentSpan[], from: number, to: number): number =>
  spans.reduce(
    (sum, span) => sum + Math.max(0, Math.min(span.end_minutes, to) - Math.max(span.start_minutes, from)),
    0,
  );

interface Demand extends MomentSpan {
  readonly gradeId: string;
  readonly personId: string;
}

const demandsOf = ({ plan, items }: PromisedPlan): Demand[] => {
  const grades = new Map(items.map(({ taskId, gradeId }) => [taskId, gradeId]));
  return plan.tasks.flatMap(({ taskId, personIds, spans }) =>
    personIds.flatMap((personId) => spans.map((span) => ({ ...span, personId, gradeId: grades.get(taskId) ?? '' }))),
  );
};

/** The hands of a grade in a week: of somebody with several grades, what their other grades do not take. */
function capacity(gradeId: string, hours: ReadonlyMap<Person, number>, taken: (personId: string) => number): number {
  let minutes = 0;
  for (const [person, own] of hours)
    if (person.gradeIds.includes(gradeId)) minutes += Math.max(0, own - taken(person.id));
  return minutes;
}

/**
 * Work by grade and week against capacity, in working minutes: a person with several grades counts for each with whatever their work in the others
 * leaves. Grades nobody has and nobody works are left out.
 */
export function gradeLoads({ plans, people, grades, calendar, frame, monday, weeks }: LoadAsked): GradeLoad[] {
  const days = calendarDays(calendar, dayNumber(addDays(monday, weeks * 7)) - dayNumber(calendar.firstDay) + 1);
  const spans = people.map((person) => [person, personSpans(days, person, calendar).spans] as const);
  const demands = plans.flatMap(demandsOf);
  const used = grades.filter(
    ({ id }) => people.some(({ gradeIds }) => gradeIds.includes(id)) || demands.some(({ gradeId }) => gradeId === id),
  );
  return Array.from({ length: weeks }, (_, at) => addDays(monday, at * 7)).flatMap((week) => {
    const [from, to] = [minutesOfDay(week, frame), minutesOfDay(addDays(week, 7), frame)];
    const hours = new Map(spans.map(([person, own]) => [person, minutesIn(own, from, to)]));
    const inWeek = demands.filter(({ start_minutes, end_minutes }) => start_minutes < to && end_minutes > from);
    return used.map(({ id: gradeId, name: grade }) => {
      const own = inWeek.filter((demand) => demand.gradeId === gradeId);
      const others = inWeek.filter((demand) => demand.gradeId !== gradeId);
      const work_minutes = minutesIn(own, from, to);
      const taken = (personId: string) =>
        minutesIn(
          others.filter((demand) => demand.personId === personId),
          from,
          to,
        );
      const capacity_minutes = capacity(gradeId, hours, taken);
      return { gradeId, grade, week, work_minutes, capacity_minutes, isOver: work_minutes > capacity_minutes };
    });
  });
}
