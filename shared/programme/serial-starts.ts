import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project } from '#shared/programme/project';

/** Activities are taken in the order of these figures, least first, among those whose predecessors have their place. */
export type Priorities = readonly number[];

/** How often activities may be taken out again before an order is given up. */
const mostRemovals = 60;

interface Placing {
  readonly project: Project;
  readonly matrix: LagMatrix;
  /** Who has to be placed before each. */
  readonly before: readonly (readonly number[])[];
  readonly starts: (number | null)[];
  /** How early each may start by the lags and by what was put off, and by what is placed too. */
  readonly lasting: number[];
  readonly earliest: number[];
}

/** Whether one activity has to start before another, or together with it and comes first. */
function isBefore(matrix: LagMatrix, one: number, other: number): boolean {
  const forth = matrix.at(one, other);
  return one !== other && (forth > 0 || (forth === 0 && (matrix.at(other, one) < 0 || one < other)));
}

/** For each activity those that have to be placed before it. */
export const placedBefore = ({ activities }: Project, matrix: LagMatrix): readonly (readonly number[])[] =>
  activities.map((_, other) => activities.flatMap((_activity, one) => (isBefore(matrix, one, other) ? [one] : [])));

function nextActivity({ starts, before }: Placing, priorities: Priorities): number | null {
  let next: number | null = null;
  for (let one = 0; one < starts.length; one += 1) {
    if (starts[one] !== null || (next !== null && priorities[next] <= priorities[one])) continue;
    if (before[one].every((other) => starts[other] !== null)) next = one;
  }
  return next;
}

/** Whether an activity finds no room at a moment, and when the first of those in its way ends. */
function fullUntil({ project, starts }: Placing, activity: number, moment: number): number | null {
  const { activities, capacities } = project;
  const { demands } = activities[activity];
  let ends = Infinity;
  const used = [...demands];
  for (let other = 0; other < starts.length; other += 1) {
    const start = starts[other];
    if (start === null || start > moment || moment >= start + activities[other].duration) continue;
    ends = Math.min(ends, start + activities[other].duration);
    for (let k = 0; k < used.length; k += 1) used[k] += activities[other].demands[k];
  }
  return used.some((amount, k) => demands[k] > 0 && amount > capacities[k]) ? ends : null;
}

/** The end of the first activity in the way of one that starts at a moment; null where there is room. */
function inTheWay(placing: Placing, activity: number, start: number): number | null {
  const end = start + placing.project.activities[activity].duration;
  const now = fullUntil(placing, activity, start);
  if (now !== null) return now;
  for (const begun of placing.starts) {
    if (begun === null || begun <= start || begun >= end) continue;
    const until = fullUntil(placing, activity, begun);
    if (until !== null) return until;
  }
  return null;
}

function firstRoom(placing: Placing, activity: number): number {
  let start = placing.earliest[activity];
  if (placing.project.activities[activity].duration === 0) return start;
  for (let end = inTheWay(placing, activity, start); end !== null; end = inTheWay(placing, activity, start))
    start = end;
  return start;
}

function latestOf({ matrix, starts }: Placing, activity: number): number {
  return starts.reduce<number>((latest, start, other) => {
    return start === null ? latest : Math.min(latest, start - matrix.at(activity, other));
  }, matrix.latest(activity));
}

/** Raises bounds by an activity that starts at a moment or later. */
function raise(bounds: number[], matrix: LagMatrix, [activity, start]: readonly [number, number]): void {
  for (let other = 0; other < bounds.length; other += 1) {
    const reached = start + matrix.at(activity, other);
    if (reached > bounds[other]) bounds[other] = reached;
  }
}

/** Takes out what keeps an activity from starting when there is room for it, puts that off by as much, and takes out all that starts after it. */
function unschedule(placing: Placing, activity: number, start: number): boolean {
  const { starts, earliest, lasting, matrix } = placing;
  const keepers = starts.flatMap((begun, other) =>
    begun !== null && begun - matrix.at(activity, other) < start ? [other] : [],
  );
  if (keepers.length === 0) return false;
  const first = Math.min(...keepers.map((other) => starts[other] ?? 0));
  for (const other of keepers) {
    const reached = start + matrix.at(activity, other);
    if (reached > matrix.latest(other)) return false;
    raise(lasting, matrix, [other, reached]);
  }
  lasting.forEach((bound, other) => (earliest[other] = bound));
  starts.forEach((begun, other) => {
    if (begun === null) return;
    if (keepers.includes(other) || begun > first) starts[other] = null;
    else raise(earliest, matrix, [other, begun]);
  });
  return true;
}

/** What serial plans of one project have in common. */
export interface SerialBase {
  readonly project: Project;
  readonly matrix: LagMatrix;
  readonly before: readonly (readonly number[])[];
}

/**
 * Starts by serial generation: one activity after another as early as there is room; where that is too late for a lag to one placed already, that one is
 * taken out and put off (Franck, Neumann, Schwindt 2001, from memory). Null where the order leads nowhere; units of the project.
 */
export function serialStarts(base: SerialBase, priorities: Priorities): readonly number[] | null {
  const { project, matrix } = base;
  const starts: (number | null)[] = project.activities.map(() => null);
  const lasting = project.activities.map((_, at) => matrix.earliest(at));
  const placing: Placing = { ...base, starts, lasting, earliest: [...lasting] };
  let removals = 0;
  for (let one = nextActivity(placing, priorities); one !== null; one = nextActivity(placing, priorities)) {
    const start = firstRoom(placing, one);
    if (start <= latestOf(placing, one)) {
      starts[one] = start;
      raise(placing.earliest, matrix, [one, start]);
    } else {
      removals += 1;
      if (removals > mostRemovals || !unschedule(placing, one, start)) return null;
    }
  }
  return starts.map((start) => start ?? 0);
}
