import type { Project } from '#shared/programme/project';
import { projectSchedule } from '#shared/programme/project-schedule';
import { isProjectPlan } from '#shared/programme/project-starts';
import published from './published-networks.json';

/**
 * Networks J10-33, J20-34 and J20-35 of R. Kolisch, C. Schwindt and A. Sprecher, "Benchmark Instances for Project Scheduling Problems" (in J. Węglarz, ed.,
 * Project Scheduling, 1999), made by ProGen/max: ten or twenty activities that share five resources of five units each. The figures are those of the
 * MiniZinc benchmark collection (`rcpsp-max`: psp_j10_33, psp_j20_34, psp_j20_35); a lag (i, d, j) says that j starts d or more after i. The best
 * finishes were proven by a constraint solver of another house (`deterministic_makespan.csv` beside the paper "pstn-for-rcpsp-max", 2025), which took
 * 5.1 and 1.2 seconds for the two of twenty, among the longest of that set.
 */
const projectOf = ({ durations, demands, lags }: (typeof published)[number]): Project => ({
  activities: durations.map((duration, at) => ({ duration, demands: demands.map((ofResource) => ofResource[at]) })),
  lags: lags.map(([from, least, to]) => ({ from: from - 1, to: to - 1, least: least })),
  capacities: demands.map(() => 5),
});

describe.each(published.map((network) => [network.name, network] as const))(
  'The published network %s',
  (_, network) => {
    const project = projectOf(network);
    /** Twice as many nodes as the proof takes; ten seconds hold about this number. */
    const schedule = projectSchedule(project, { limit: { nodes: 100_000 } });

    it('is planned to the best finish known, with the proof', () => {
      expect(schedule).toMatchObject({ status: 'optimal', finish: network.best, lowerBound: network.best });
    });

    it('has a plan that keeps every rule', () => {
      expect(isProjectPlan(schedule.starts!, project)).toBe(true);
    });
  },
);
