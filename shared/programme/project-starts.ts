import type { Project, ProjectStarts } from '#shared/programme/project';

const isWhole = (starts: readonly number[], { activities }: Project): boolean =>
  starts.length === activities.length &&
  starts.every((start, at) => Number.isFinite(start) && start >= (activities[at].release ?? 0));

function keepsCapacities(starts: readonly number[], { activities, capacities }: Project): boolean {
  return starts.every((moment) => {
    const there = activities.filter(({ duration }, at) => starts[at] <= moment && moment < starts[at] + duration);
    return capacities.every((capacity, k) => there.reduce((sum, { demands }) => sum + demands[k], 0) <= capacity);
  });
}

/** Whether starts keep every lag, release and capacity of a project. */
export const isProjectPlan = (starts: readonly number[], project: Project): boolean =>
  isWhole(starts, project) &&
  project.lags.every(({ from, to, least }) => starts[to] >= starts[from] + least) &&
  keepsCapacities(starts, project);

/** The starts with the moment the last activity ends, 0 for none. */
export const projectStarts = (starts: readonly number[], { activities }: Project): ProjectStarts => ({
  starts,
  finish: activities.reduce((finish, { duration }, at) => Math.max(finish, starts[at] + duration), 0),
});
