import type { Project, ProjectLag } from '#shared/programme/project';

/** The lag by which each start was last put later, and one that is still moving after as many rounds as there are activities. */
function relaxed({ activities, lags }: Project): {
  readonly by: (ProjectLag | null)[];
  readonly moving: ProjectLag | null;
} {
  const starts = activities.map(() => 0);
  const by: (ProjectLag | null)[] = activities.map(() => null);
  let moving: ProjectLag | null = null;
  for (let round = 0; round <= activities.length; round += 1) {
    moving = null;
    for (const lag of lags) {
      if (starts[lag.from] + lag.least <= starts[lag.to]) continue;
      starts[lag.to] = starts[lag.from] + lag.least;
      by[lag.to] = lag;
      moving = lag;
    }
    if (!moving) break;
  }
  return { by, moving };
}

/** The activity so many steps back along the lags that put it later. */
function stepsBack(by: readonly (ProjectLag | null)[], from: number): number {
  let at = from;
  for (let step = 0; step < by.length; step += 1) at = by[at]?.from ?? at;
  return at;
}

/**
 * The lags that contradict each other, in the order they follow one another: a cycle whose sum is above nought (Bellman–Ford; none where the lags
 * can all be kept).
 */
export function contradictingLags(project: Project): readonly ProjectLag[] {
  const { by, moving } = relaxed(project);
  if (!moving) return [];
  const on = stepsBack(by, moving.to);
  const cycle: ProjectLag[] = [];
  for (let lag = by[on]; lag; lag = lag.from === on ? null : by[lag.from]) cycle.unshift(lag);
  return cycle;
}
