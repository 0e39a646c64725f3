import { D, type MinorUnits } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';
import { exactMinor } from '#shared/money/minor-of';
import { roundMinor } from '#shared/money/round-minor';
import { calendarDays } from '#shared/programme/calendar-days';
import { costOfFurtherHands, type FurtherHandsAsked } from '#shared/programme/cost-of-further-hands';
import { dayOfMinutes } from '#shared/programme/programme-frame';
import { daysUntil } from '#shared/programme/network-of';
import { personSpans } from '#shared/programme/person-spans';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { Remedy } from '#shared/programme/programme-remedies';
import type { ProgrammeTask } from '#shared/programme/programme-request';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { WorkingSpans } from '#shared/programme/working-spans';

/** What a remedy is reckoned with: the request as it was before it, the rates of the card, and what the estimate says another size makes of its cost. */
export interface RemedyCostAsked extends FurtherHandsAsked {
  /** What an hour beyond a person's own costs more than one within them; the workshop's own value. */
  readonly overtime_percent: number;
  /** In minor units; 0 where no other size is tried. */
  readonly sizeDifference_minor: MinorUnits;
}

type RateOf = (gradeId: string) => D;

const rateOf =
  ({ rates, digits }: RemedyCostAsked): RateOf =>
  (gradeId) =>
    exactMinor(rates.find((rate) => rate.gradeId === gradeId)?.costPerHour ?? '0', digits);

interface Worked {
  readonly planned: PlannedTask;
  readonly task: ProgrammeTask;
}

const workedIn = ({ request, plan }: Remedy): Worked[] => {
  const tasks = new Map(request.tasks.map((task) => [task.id, task]));
  return plan.tasks.flatMap((planned) => {
    const task = tasks.get(planned.taskId);
    return task ? [{ planned, task }] : [];
  });
};

const minutesBeyond = (spans: readonly MomentSpan[], own: WorkingSpans | undefined): number =>
  own
    ? spans.reduce(
        (sum, { start_minutes: start, end_minutes: end }) =>
          sum + end - start - own.workedBy(end) + own.workedBy(start),
        0,
      )
    : 0;

/** What it costs that people of the workshop are at it outside the hours they had before; who was not there before has none. */
function overtime(remedy: Remedy, asked: RemedyCostAsked): D {
  const { calendar, people } = asked.request;
  const premium = exactFigure(asked.overtime_percent);
  const days = calendarDays(calendar, daysUntil(asked.request, remedy.plan.finish_minutes ?? 0));
  const spansOf = new Map(people.map((person) => [person.id, personSpans(days, person, calendar)]));
  const beyond = ({ spans, personIds }: PlannedTask): number =>
    personIds.reduce((sum, personId) => sum + minutesBeyond(spans, spansOf.get(personId)), 0);
  return workedIn(remedy).reduce(
    (cost, { planned, task }) =>
      cost.plus(rateOf(asked)(task.gradeId).times(beyond(planned)).times(premium).dividedBy(6000)),
    new D(0),
  );
}

/** A portion is set up on its own day: a step in three portions on three days is set up twice more than one done on one. */
function furtherSetUps(remedy: Remedy, asked: RemedyCostAsked): D {
  const steps = new Map<string, { readonly task: ProgrammeTask; readonly days: Set<string> }>();
  for (const { planned, task } of workedIn(remedy)) {
    const [stepId, portion] = task.id.split('#');
    if (portion === undefined || asked.request.tasks.some(({ id }) => id === task.id)) continue;
    const step = steps.get(stepId) ?? { task, days: new Set<string>() };
    for (const { start_minutes } of planned.spans) step.days.add(dayOfMinutes(start_minutes, asked.frame));
    steps.set(stepId, step);
  }
  return [...steps.values()].reduce((cost, { task, days }) => {
    const hours = exactFigure(asked.setUp_hours).times(task.crew * Math.max(0, days.size - 1));
    return cost.plus(rateOf(asked)(task.gradeId).times(hours));
  }, new D(0));
}

/**
 * What a remedy costs beyond the estimate, in minor units: set-up of people beyond each crew and of portions on days of their own, overtime at its premium,
 * and what another size makes of hands-on time and material. Null where the remedy has no plan. House rules, no source.
 */
export function costOfRemedy(remedy: Remedy, asked: RemedyCostAsked): MinorUnits | null {
  if (remedy.plan.finish_minutes === null) return null;
  const hands_minor = costOfFurtherHands(remedy.plan, { ...asked, request: remedy.request });
  const more = roundMinor(overtime(remedy, asked).plus(furtherSetUps(remedy, asked)));
  return hands_minor + more + asked.sizeDifference_minor;
}
