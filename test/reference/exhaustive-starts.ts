import type { Project } from '#shared/programme/project';

/**
 * The least finish of a small project by trying every start of every activity, or null where none keeps the rules. Nothing of the product's method is in it: no
 * paths, no bounds, no order; only the definition of the problem. Wherever there is a plan there is one within the sum of the longest lag or duration of each.
 */
export function exhaustiveFinish(project: Project): number | null {
  const far = project.activities.reduce((sum, { duration }, at) => {
    const lags = project.lags.filter(({ from }) => from === at).map(({ least }) => least);
    return sum + Math.max(duration, ...lags);
  }, 0);
  for (let finish = 0; finish <= far; finish += 1) if (hasStarts(project, [], finish)) return finish;
  return null;
}

function hasStarts(project: Project, starts: number[], finish: number): boolean {
  const activity = starts.length;
  if (activity === project.activities.length) return true;
  for (let start = 0; start + project.activities[activity].duration <= finish; start += 1) {
    starts.push(start);
    if (isLawful(project, starts) && hasStarts(project, starts, finish)) return true;
    starts.pop();
  }
  return false;
}

/** Whether the activities placed so far keep the lags between them, and at every moment the capacities. */
function isLawful({ activities, lags, capacities }: Project, starts: readonly number[]): boolean {
  const last = starts.length - 1;
  const isKept = lags.every(({ from, to, least }) => from > last || to > last || starts[to] - starts[from] >= least);
  if (!isKept) return false;
  for (let moment = starts[last]; moment < starts[last] + activities[last].duration; moment += 1)
    for (let k = 0; k < capacities.length; k += 1) {
      let used = 0;
      for (let at = 0; at <= last; at += 1)
        if (starts[at] <= moment && moment < starts[at] + activities[at].duration) used += activities[at].demands[k];
      if (used > capacities[k]) return false;
    }
  return true;
}
