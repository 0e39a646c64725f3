import { continuousProject, positionsOfStarts } from '#shared/programme/continuous-project';
import { backwardProgramme } from '#shared/programme/backward-programme';
import { improvedPlan, networkPlan, type NetworkPlan } from '#shared/programme/improved-plan';
import { networkBound } from '#shared/programme/network-bound';
import { daysUntil, networkOf } from '#shared/programme/network-of';
import { planBreaches } from '#shared/programme/plan-breaches';
import { programmeContradiction } from '#shared/programme/programme-contradiction';
import {
  programmeFailure,
  missedWindows,
  passedPins,
  pinClashes,
  requestRefusals,
} from '#shared/programme/programme-failure';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';
import { projectSchedule } from '#shared/programme/project-schedule';
import { describedProgramme, noPlan } from '#shared/programme/described-programme';
import { firstResult, type RequestNetwork } from '#shared/programme/request-network';
import { replannedFrom, worth_minutes } from '#shared/programme/replanned-from';
import { positionsOf } from '#shared/programme/standing-positions';
import type { Position, TaskNetwork } from '#shared/programme/task-network';

/** A plan known already, where it still keeps every rule. */
function keptPlan(ready: RequestNetwork, plan: Programme | undefined): NetworkPlan | null {
  if (!plan) return null;
  const positions = positionsOf(ready, plan);
  return planBreaches(ready.network, positions).length === 0 ? networkPlan(positions as Position[]) : null;
}

/** The proven best where the request is the published problem, or what came of it before the limit; null where it is another. */
function exactProgramme(ready: RequestNetwork, first: NetworkPlan | null, search: ProgrammeSearch): Programme | null {
  const { request, network } = ready;
  const project = continuousProject(request, network);
  if (!project) return null;
  const from_minutes = request.start_minutes;
  const incumbent = first?.positions.map(({ start }) => start - from_minutes);
  const limit = { nodes: usualNodes, ...search.limit };
  const { starts, status, lowerBound, nodes } = projectSchedule(project, { limit, incumbent });
  if (status === 'infeasible') {
    const about = request.tasks[0]?.id;
    return noPlan(request, status, [{ kind: 'refuse', code: 'programme-impossible', values: {}, about }]);
  }
  const positions = starts && positionsOfStarts(network, project, { starts, from_minutes });
  const plan =
    positions && describedProgramme(ready, networkPlan(positions), { bound: from_minutes + lowerBound, plans: nodes });
  if (plan) search.onBetter?.(plan);
  return plan;
}

/** Nodes of the search that proves the best, where nobody sets a limit. */
const usualNodes = 20_000;

const better = (one: NetworkPlan | null, other: NetworkPlan | null): NetworkPlan | null =>
  one && other ? (other.finish < one.finish ? other : one) : (one ?? other);

/** Where much has to move anyway it is tried so often to end sooner all the same, unless the asker sets a limit. */
const triesForStable = 5;

function planned(ready: RequestNetwork, first: NetworkPlan, search: ProgrammeSearch): Programme {
  const kept = keptPlan(ready, search.incumbent);
  const stable = search.previous ? replannedFrom(ready, search.previous) : null;
  const start = better(kept, stable?.plan ?? first) ?? first;
  const bound = networkBound(ready.network, ready.earliest, start.finish);
  if (stable && start.finish <= (search.previous?.finish_minutes ?? 0) + worth_minutes)
    return describedProgramme(ready, start, { bound, plans: 1 });
  const onBetter = (plan: NetworkPlan): void => search.onBetter?.(describedProgramme(ready, plan, { bound, plans: 0 }));
  onBetter(start);
  const improving = {
    first: start,
    bound,
    limit: search.limit ?? (stable ? { nodes: triesForStable } : {}),
    hints: stable?.hints,
    seed: search.seed ?? 1,
    lots: ready.request.tasks.map(({ lotId }) => lotId),
    onBetter,
  };
  const { plan, plans } = improvedPlan(ready, improving);
  return describedProgramme(ready, plan, { bound, plans });
}

/** What stops a request before anything is planned. */
function refusal(request: ProgrammeRequest, network: TaskNetwork): Programme | null {
  const refusals = requestRefusals(request, network);
  if (refusals.length > 0) return noPlan(request, 'infeasible', refusals);
  const contradiction = programmeContradiction(request, network);
  return contradiction && { ...noPlan(request, 'infeasible', [contradiction.finding]), cycle: contradiction.lagIds };
}

const isForward = ({ previous, backwardFrom_minutes }: ProgrammeSearch): boolean =>
  !previous && backwardFrom_minutes === undefined;

/**
 * The dated plan of a request: every task in its calendar with its people, every lag and window kept, finishing as soon as is found (or everything as late as
 * it still ends by `backwardFrom_minutes`). Same request and search, same plan, as long as the limit counts plans. Minutes from the start of the calendar's
 * first day; RangeError where the request names what it does not have.
 */
export function programme(request: ProgrammeRequest, search: ProgrammeSearch = {}): Programme {
  if (request.tasks.length === 0)
    return { ...noPlan(request, 'optimal', []), finish_minutes: request.start_minutes, gap: 0 };
  const until_minutes = Math.max(request.start_minutes, search.backwardFrom_minutes ?? 0);
  const refused = refusal(request, networkOf(request, daysUntil(request, until_minutes)).network);
  if (refused) return refused;
  // Round a plan there is already, one that shows whether there is any is enough.
  const found = firstResult(request, { until_minutes, result: search.previous ? 'any' : 'best' });
  const { ready, result, missed } = found;
  const first = result.positions && networkPlan(result.positions);
  const clashes = first ? pinClashes(request, ready.network, first.positions) : [];
  if (clashes.length > 0) return noPlan(request, 'infeasible', clashes);
  const exact = isForward(search)
    ? exactProgramme(ready, better(first, keptPlan(ready, search.incumbent)), search)
    : null;
  if (exact) return exact;
  if (!first) return noPlan(request, found.endless ? 'infeasible' : 'unproven', [programmeFailure(request, found)]);
  const plan =
    search.backwardFrom_minutes === undefined ? planned(ready, first, search) : backwardProgramme(ready, first, search);
  return { ...plan, findings: [...plan.findings, ...passedPins(request), ...missedWindows(request, missed)] };
}
