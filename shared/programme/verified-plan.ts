import { daysUntil, networkOf } from '#shared/programme/network-of';
import { planBreaches, type PlanBreach } from '#shared/programme/plan-breaches';
import { plannedTasks } from '#shared/programme/planned-tasks';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { positionsOf } from '#shared/programme/standing-positions';
import type { Position } from '#shared/programme/task-network';
import type { Finding } from '#shared/words/finding';

/** A plan described anew from its starts and people alone, and what of the request it breaks; without a plan where it breaks anything. */
export interface VerifiedPlan {
  readonly plan: Programme | null;
  readonly broken: readonly Finding[];
}

function finding(breach: PlanBreach, { tasks, places }: ProgrammeRequest): Finding {
  const { id: about, name: task } = tasks[breach.task];
  switch (breach.kind) {
    case 'hours':
      return { kind: 'refuse', code: 'programme-breaks-hours', values: { task }, about };
    case 'release':
      return { kind: 'refuse', code: 'programme-breaks-start', values: { task }, about };
    case 'people':
      return {
        ...{ kind: 'refuse', code: 'programme-breaks-people', about },
        values: { task, other: tasks[breach.other].name },
      };
    case 'place':
      return {
        kind: 'refuse',
        code: 'programme-breaks-place',
        values: { task, place: places[breach.place].name },
        about,
      };
    case 'lag': {
      const [first, then] = [tasks[breach.arc.from].name, tasks[breach.arc.to].name];
      // A most lag is the lag back: what is late is the task it leads from.
      const code = breach.arc.side === 'most' ? 'programme-breaks-window' : 'programme-breaks-lag';
      const values = code === 'programme-breaks-window' ? { task: first, before: then } : { task: then, before: first };
      const late = code === 'programme-breaks-window' ? tasks[breach.arc.from].id : about;
      return { kind: 'refuse', code, values, about: late };
    }
  }
}

/** Each sentence once, whichever of several lags says it. */
const toldOnce = (findings: readonly Finding[]): Finding[] => [
  ...new Map(findings.map((one) => [JSON.stringify(one), one])).values(),
];

function tasksMissing(plan: Programme, { tasks }: ProgrammeRequest): Finding[] {
  const known = new Set(plan.tasks.map(({ taskId }) => taskId));
  return tasks
    .filter(({ id }) => !known.has(id))
    .map(({ id, name }) => ({ kind: 'refuse', code: 'programme-breaks-missing', values: { task: name }, about: id }));
}

function tasksUnknown(plan: Programme, { tasks }: ProgrammeRequest): Finding[] {
  const known = new Set(tasks.map(({ id }) => id));
  const unknown = plan.tasks.filter(({ taskId }) => !known.has(taskId)).length;
  return unknown === 0 ? [] : [{ kind: 'refuse', code: 'programme-breaks-unknown', values: { tasks: unknown } }];
}

/** No plan is checked whose work begins more than ten years after its programme: calendars are laid out day by day as far as it reaches. */
const reach_minutes = 3653 * 1440;

/** What begins beyond the reach of a plan. */
function tasksFar(plan: Programme, { tasks, start_minutes }: ProgrammeRequest): Finding[] {
  const far = new Set(
    plan.tasks.filter((task) => task.start_minutes > start_minutes + reach_minutes).map(({ taskId }) => taskId),
  );
  return tasks
    .filter(({ id }) => far.has(id))
    .map(({ id, name }) => ({ kind: 'refuse', code: 'programme-breaks-far', values: { task: name }, about: id }));
}

function bounded(plan: Programme, request: ProgrammeRequest, finish: number) {
  const lowerBound_minutes = Math.min(Math.max(plan.lowerBound_minutes, request.start_minutes), finish);
  const whole = lowerBound_minutes - request.start_minutes;
  return { lowerBound_minutes, gap: whole > 0 ? (finish - lowerBound_minutes) / whole : 0 };
}

/**
 * Checks a plan of whatever origin against a request: every task there, in its people's hours, every lag and window kept, nobody and no place promised
 * twice. Starts and people are taken from it, everything else is worked out again; the bound is the asker's. Minutes of the request's calendar.
 */
export function verifiedPlan(plan: Programme, request: ProgrammeRequest): VerifiedPlan {
  const strange = [...tasksMissing(plan, request), ...tasksUnknown(plan, request), ...tasksFar(plan, request)];
  if (strange.length > 0) return { plan: null, broken: strange };
  const last = plan.tasks.reduce((latest, task) => Math.max(latest, task.start_minutes), request.start_minutes);
  const { network } = networkOf(request, daysUntil(request, last));
  const positions = positionsOf({ request, network }, plan);
  const broken = toldOnce(planBreaches(network, positions).map((breach) => finding(breach, request)));
  if (broken.length > 0) return { plan: null, broken };
  const found = positions as readonly Position[];
  const finish = found.reduce((end, position) => Math.max(end, position.end), request.start_minutes);
  const whole = {
    ...{
      status: plan.status,
      tasks: plannedTasks({ request, network, positions: found }, finish),
      finish_minutes: finish,
    },
    from_minutes: request.start_minutes,
    start_minutes: found.reduce((start, position) => Math.min(start, position.start), finish),
    ...{ ...bounded(plan, request, finish), plans: plan.plans, findings: plan.findings, cycle: [] },
  };
  return { plan: whole, broken: [] };
}
