import { contradictingLags } from '#shared/programme/contradicting-lags';
import { ImprovedStarts } from '#shared/programme/improved-starts';
import { LagMatrix } from '#shared/programme/lag-matrix';
import { OrderSearch } from '#shared/programme/order-search';
import type { Project, ProjectSchedule, ProjectSearch, ProjectStarts } from '#shared/programme/project';
import { isProjectPlan, projectStarts } from '#shared/programme/project-starts';

/** If there is a plan at all there is one that finishes by then: every activity after the last with its longest lag (from memory: Bartusch and others 1988). */
function farEnough({ activities, lags }: Project, matrix: LagMatrix): number {
  const longest = activities.map(({ duration }) => duration);
  for (const { from, least } of lags) longest[from] = Math.max(longest[from], least);
  const starts = activities.map((_, at) => matrix.earliest(at));
  return Math.max(0, ...starts) + longest.reduce((sum, length) => sum + length, 0);
}

/** The earliest finish that is not disproved by bounds alone, found by halving; the far end where even that is. */
function provenBound(search: OrderSearch, matrix: LagMatrix, far: number): number {
  let [low, high] = [0, far];
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    if (search.settle(matrix.copy(), middle)) high = middle;
    else low = middle + 1;
  }
  return low;
}

const none = { starts: null, finish: null, gap: null };

interface Found {
  best: ProjectStarts | null;
}

function concluded(found: Found, search: OrderSearch, bound: number): ProjectSchedule {
  const { nodes, isStopped } = search;
  if (!found.best) {
    const status = isStopped ? 'unproven' : 'infeasible';
    return { status, ...none, lowerBound: bound, nodes, cycle: [] };
  }
  const { starts, finish } = found.best;
  const lowerBound = isStopped ? Math.min(bound, finish) : finish;
  const gap = lowerBound > 0 ? (finish - lowerBound) / lowerBound : 0;
  return { status: finish === lowerBound ? 'optimal' : 'feasible', starts, finish, lowerBound, gap, nodes, cycle: [] };
}

const impossible = (cycle: ProjectSchedule['cycle']): ProjectSchedule => ({
  status: 'infeasible',
  ...none,
  lowerBound: Infinity,
  nodes: 0,
  cycle,
});

const isTooMuch = ({ activities, capacities }: Project): boolean =>
  activities.some(({ duration, demands }) => duration > 0 && demands.some((demand, k) => demand > capacities[k]));

/** The better of what is known already and what the constructive methods find. */
function firstPlan(
  project: Project,
  serial: ImprovedStarts,
  known: { incumbent?: readonly number[]; bound: number },
): ProjectStarts | null {
  const { incumbent, bound } = known;
  const kept = incumbent && isProjectPlan(incumbent, project) ? projectStarts(incumbent, project) : null;
  if (kept?.finish === bound) return kept;
  const made = serial.first(bound);
  return kept && made ? (made.finish < kept.finish ? made : kept) : (kept ?? made);
}

/**
 * A schedule of RCPSP/max that finishes soonest, in whole units of the project: optimal or infeasible with proof, or the best found before the limit. Nothing
 * but its arguments counts, so the same project gives the same schedule. RangeError for figures that are not whole or a duration or demand below 0.
 */
export function projectSchedule(
  project: Project,
  { limit = {}, incumbent, onBetter }: ProjectSearch = {},
): ProjectSchedule {
  checkProject(project);
  const cycle = contradictingLags(project);
  const matrix = cycle.length > 0 || isTooMuch(project) ? null : LagMatrix.of(project);
  if (!matrix) return impossible(cycle);
  const found: Found = { best: null };
  const take = (plan: ProjectStarts): void => {
    found.best = plan;
    onBetter?.(plan);
  };
  const search = new OrderSearch(project, limit, take);
  const far = farEnough(project, matrix);
  if (!search.settle(matrix.copy(), far)) return impossible([]);
  const bound = provenBound(search, matrix, far);
  const serial = new ImprovedStarts(project, matrix);
  const first = firstPlan(project, serial, { incumbent, bound });
  if (first) take(first);
  if (first?.finish !== bound) search.run(matrix, { finish: first ? first.finish - 1 : far, bound, serial });
  return concluded(found, search, Math.max(bound, search.bound));
}

function checkProject({ activities, lags, capacities }: Project): void {
  const isCount = (figure: number): boolean => Number.isSafeInteger(figure) && figure >= 0;
  const isSound =
    capacities.every(isCount) &&
    lags.every(({ least, from, to }) => Number.isSafeInteger(least) && activities[from] && activities[to]) &&
    activities.every((one) => isCount(one.duration) && isCount(one.release ?? 0) && one.demands.every(isCount));
  if (!isSound)
    throw new RangeError('durations, lags, demands and capacities are whole, durations and demands not below 0');
}
