import type { Project, ProjectSchedule } from '#shared/programme/project';
import { projectSchedule } from '#shared/programme/project-schedule';
import { isProjectPlan } from '#shared/programme/project-starts';
import { middlingProject } from './middling-project';

/**
 * The best finishes known of ninety networks of twenty activities and five resources, by their seeds; null where it is proven that there is no plan. These
 * values are our own (`project-published.spec.ts` has those of others): 83 are proven best (or impossible) by the search run to its end. Of the seven
 * of `unproven` the proof does not end; four are known to lie within 5 % of a bound that no plan beats, and three (22, 27 and 75) are the best of up to
 * 300,000 serial plans from seeded orders, made without bounds and without the exact search.
 */
const bestFinishes: readonly (number | null)[] = [
  ...[52, 44, 47, 25, 104, null, 34, 28, null, 55, 47, 36, 70, 46, 59, 30, 91, null, 37, 34],
  ...[null, 53, 41, 56, 55, 56, null, 22, 131, null, 39, 45, null, 58, 62, 41, 48, 46, 50, 22],
  ...[104, null, 43, 35, null, 42, 46, null, 64, 64, 60, 24, 105, null, 37, 44, null, 57, 50, 56],
  ...[62, 55, null, 23, 98, null, 32, 50, null, 60, 37, 48, 61, 54, 47, 25, 103, null, 46, 39],
  ...[null, 56, 42, 49, 47, 63, null, 25, 100, null],
];
const unproven: readonly number[] = [3, 21, 22, 27, 60, 69, 75];

const isNear = ({ finish, status }: ProjectSchedule, best: number | null): boolean =>
  best === null ? status === 'infeasible' : finish !== null && finish <= best * 1.05;

/** Ten seconds hold some 200,000 nodes; as many as it takes to come near are asked for, so that the test is short. */
function nearSchedule(project: Project, best: number | null): ProjectSchedule {
  const tries = [2_000, 20_000];
  for (const nodes of tries) {
    const schedule = projectSchedule(project, { limit: { nodes } });
    if (isNear(schedule, best)) return schedule;
  }
  return projectSchedule(project, { limit: { nodes: 100_000 } });
}

describe('Networks of twenty activities and five resources', () => {
  const found = bestFinishes.map((best, seed) => {
    const project = middlingProject(20, seed);
    return { seed, best, project, schedule: nearSchedule(project, best) };
  });

  it('are each planned to within 5 % of the best known, or proven to have no plan, well within ten seconds', () => {
    expect(found.filter(({ schedule, best }) => !isNear(schedule, best)).map(({ seed }) => seed)).toEqual([]);
  });

  it('have plans that keep every rule, and none below a bound or a best that is proven', () => {
    for (const { seed, best, project, schedule } of found) {
      const { starts, finish, lowerBound } = schedule;
      expect(starts === null || isProjectPlan(starts, project)).toBe(true);
      expect(lowerBound).toBeLessThanOrEqual(best ?? Infinity);
      if (best !== null && !unproven.includes(seed)) expect(finish).toBeGreaterThanOrEqual(best);
    }
  });
});
