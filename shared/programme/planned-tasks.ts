import { latestStarts } from '#shared/programme/latest-starts';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import { pointOf, type Position } from '#shared/programme/task-network';
import { taskWaits, type PlanOfRequest } from '#shared/programme/task-waits';

function spansOf({ start, end, busyFrom, crew }: Position): MomentSpan[] {
  if (end === start) return [];
  const begun = busyFrom > start ? [{ start_minutes: start, end_minutes: busyFrom }] : [];
  const spans = crew.spans.between(busyFrom, end);
  return spans.length === 0 ? [{ start_minutes: start, end_minutes: end }] : [...begun, ...spans];
}

/** Lags that are waited out by the clock, as drying is, by their ids. */
const clockLags = ({ lags }: ProgrammeRequest): ReadonlySet<string> =>
  new Set(lags.filter((lag) => lag.time === 'clock' && lag.least > 0).map((lag) => lag.id));

/** When the longest drying of a task is over. */
function dryUntil({ network, positions }: PlanOfRequest, task: number, byClock: ReadonlySet<string>): number | null {
  const moments = network.arcsFrom[task]
    .filter((arc) => arc.side === 'least' && byClock.has(arc.sourceId))
    .map((arc) => arc.shift.later(pointOf(positions[task], arc.fromPoint)));
  return moments.length > 0 ? Math.max(...moments) : null;
}

/** When the first window a task opens closes. */
function windowUntil({ network, positions }: PlanOfRequest, task: number): number | null {
  const moments = network.arcsTo[task]
    .filter((arc) => arc.side === 'most')
    .map((arc) => arc.shift.earlier(pointOf(positions[task], arc.toPoint)));
  return moments.length > 0 ? Math.min(...moments) : null;
}

/** The tasks of a plan with all there is to tell of each, in the order of the request; minutes. */
export function plannedTasks(plan: PlanOfRequest, finish: number): PlannedTask[] {
  const latest = latestStarts(plan.network, plan.positions, finish);
  const byClock = clockLags(plan.request);
  return plan.positions.map((position, task) => {
    const slack_minutes = latest[task] - position.start;
    return {
      taskId: plan.request.tasks[task].id,
      start_minutes: position.start,
      end_minutes: position.end,
      spans: spansOf(position),
      personIds: position.crew.people.map((person) => plan.request.people[person].id),
      dryUntil_minutes: dryUntil(plan, task, byClock),
      windowUntil_minutes: windowUntil(plan, task),
      slack_minutes,
      isCritical: slack_minutes === 0,
      waits: taskWaits(plan, task),
    };
  });
}
