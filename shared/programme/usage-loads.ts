import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project } from '#shared/programme/project';
import type { ApartPair } from '#shared/programme/keeps-apart';

/** Work that has to go through a capacity: for each activity its duration × what it takes. */
export interface UsageLoad {
  readonly capacity: number;
  readonly energies: readonly number[];
}

const loadOf = ({ activities }: Project, capacity: number, taken: (activity: number) => number): UsageLoad => ({
  capacity,
  energies: activities.map(({ duration }, at) => duration * taken(at)),
});

/**
 * What no two of fit beside counts whole, what fits beside anything counts nothing: a demand above capacity − ε is raised to the capacity, one below ε falls
 * to 0 (dual feasible function of Fekete and Schepers, from memory).
 */
function dualLoads(project: Project, k: number): UsageLoad[] {
  const capacity = project.capacities[k];
  const demands = project.activities.map((one) => one.demands[k]);
  const thresholds = [...new Set(demands)].filter((demand) => demand > 0 && demand * 2 <= capacity);
  const raised = (demand: number, least: number): number =>
    demand > capacity - least ? capacity : demand < least ? 0 : demand;
  const half = demands.some((demand) => demand * 2 > capacity) ? [Math.floor(capacity / 2) + 1] : [];
  return [0, ...thresholds, ...half].map((least) => loadOf(project, capacity, (at) => raised(demands[at], least)));
}

/** Groups in which no two may be at work together, grown one after another from each pair that is in none. */
function cliques(project: Project, pairs: readonly ApartPair[]): number[][] {
  const apart = new Set(pairs.flatMap(([one, other]) => [`${one} ${other}`, `${other} ${one}`]));
  const covered = new Set<string>();
  const found: number[][] = [];
  for (const [one, other] of pairs) {
    if (covered.has(`${one} ${other}`)) continue;
    const group = [one, other];
    project.activities.forEach((_, at) => {
      if (!group.includes(at) && group.every((member) => apart.has(`${at} ${member}`))) group.push(at);
    });
    for (const first of group) for (const second of group) covered.add(`${first} ${second}`);
    found.push(group);
  }
  return found;
}

/** Everything of a project that has to go through a capacity, with what follows from it. */
export function usageLoads(project: Project, pairs: readonly ApartPair[]): UsageLoad[] {
  const groups = cliques(project, pairs).filter((group) => group.length > 2);
  const loads = [
    ...project.capacities.flatMap((capacity, k) => (capacity > 0 ? dualLoads(project, k) : [])),
    ...groups.map((group) => loadOf(project, 1, (at) => Number(group.includes(at)))),
  ];
  return [...new Map(loads.map((load) => [`${load.capacity} ${load.energies.join(' ')}`, load])).values()];
}

/** Activities by their latest end, with the window of each in that order. */
interface Windows {
  readonly order: readonly number[];
  readonly starts: Float64Array;
  readonly ends: Float64Array;
}

function windowsOf({ activities }: Project, matrix: LagMatrix): Windows {
  const ends = activities.map(({ duration }, at) => matrix.latest(at) + duration);
  const order = ends.map((_, at) => at).sort((a, b) => ends[a] - ends[b]);
  return {
    order,
    starts: Float64Array.from(order, (at) => matrix.earliest(at)),
    ends: Float64Array.from(order, (at) => ends[at]),
  };
}

/** Whether a load has room in every span from the earliest start of one activity to the latest end of another. */
function hasRoom({ capacity, energies }: UsageLoad, { order, starts, ends }: Windows): boolean {
  const count = order.length;
  const loads = new Float64Array(count);
  for (let at = 0; at < count; at += 1) loads[at] = energies[order[at]];
  for (let first = 0; first < count; first += 1) {
    if (loads[first] === 0) continue;
    const from = starts[first];
    let energy = 0;
    for (let at = 0; at < count; at += 1) {
      if (starts[at] < from) continue;
      energy += loads[at];
      if (energy > capacity * (ends[at] - from)) return false;
    }
  }
  return true;
}

/** Whether all loads have room; the one that had none is asked first the next time. */
export function keepsLoads(project: Project, matrix: LagMatrix, loads: UsageLoad[]): boolean {
  const windows = windowsOf(project, matrix);
  const full = loads.findIndex((load) => !hasRoom(load, windows));
  if (full > 0) loads.unshift(...loads.splice(full, 1));
  return full < 0;
}
