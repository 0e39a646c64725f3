/** An activity in whole units of time: how long it lasts, how much it takes of each resource, and how early it may start (0 where not said). */
export interface ProjectActivity {
  readonly duration: number;
  readonly demands: readonly number[];
  readonly release?: number;
}

/**
 * A lag from start to start: `to` starts `least` or more after `from`. A most lag of m from i to j is the lag from j to i of −m. Activities go by
 * their place in the list.
 */
export interface ProjectLag {
  readonly from: number;
  readonly to: number;
  readonly least: number;
}

/** The published problem RCPSP/max: activities that are not broken, lags from start to start, resources that are free again at the end. */
export interface Project {
  readonly activities: readonly ProjectActivity[];
  readonly lags: readonly ProjectLag[];
  readonly capacities: readonly number[];
}

/** When a search ends: after so many nodes, or when somebody says so; without either it goes on to the proof. */
export interface SearchLimit {
  readonly nodes?: number;
  readonly shouldStop?: () => boolean;
}

/** Starts of all activities with the finish, in the units of the project. */
export interface ProjectStarts {
  readonly starts: readonly number[];
  readonly finish: number;
}

/** How a project is searched: the limit, starts known already (used where they keep every rule), and whom to tell of each better plan. */
export interface ProjectSearch {
  readonly limit?: SearchLimit;
  readonly incumbent?: readonly number[];
  readonly onBetter?: (plan: ProjectStarts) => void;
}

/**
 * What is known at the end: `optimal` is proven best, `feasible` keeps every rule, `infeasible` is proven to have no plan, `unproven` found none
 * before the limit.
 */
export type ProjectStatus = 'optimal' | 'feasible' | 'infeasible' | 'unproven';

/** A schedule with its proof: no plan finishes before `lowerBound`; `gap` is (finish − lowerBound) ÷ lowerBound; `cycle` names lags that contradict each other. */
export interface ProjectSchedule {
  readonly status: ProjectStatus;
  readonly starts: readonly number[] | null;
  readonly finish: number | null;
  readonly lowerBound: number;
  readonly gap: number | null;
  readonly nodes: number;
  readonly cycle: readonly ProjectLag[];
}
