import * as fc from 'fast-check';
import type { Project, ProjectStarts } from '#shared/programme/project';
import { projectForSpecs } from '#shared/programme/project-for-specs';
import { projectSchedule } from '#shared/programme/project-schedule';
import { isProjectPlan } from '#shared/programme/project-starts';

const activity = (duration: number, ...demands: number[]) => ({ duration, demands });

describe('A project with least and most lags', () => {
  const cases: [string, Project, object][] = [
    ['of nothing is done at once', { activities: [], lags: [], capacities: [] }, { status: 'optimal', finish: 0 }],
    [
      'takes as long as its longest path when nothing is scarce',
      { activities: [activity(3), activity(2)], lags: [{ from: 0, to: 1, least: 5 }], capacities: [] },
      { status: 'optimal', starts: [0, 5], finish: 7, lowerBound: 7, gap: 0 },
    ],
    [
      'takes all durations one after another where one resource serves all',
      { activities: [activity(3, 1), activity(2, 1), activity(4, 1)], lags: [], capacities: [1] },
      { status: 'optimal', finish: 9, lowerBound: 9 },
    ],
    [
      'starts the first later, so that the second comes within its most lag',
      {
        activities: [activity(1, 0), activity(1, 1), activity(6, 1)],
        lags: [
          { from: 1, to: 0, least: -2 },
          { from: 2, to: 1, least: 1 },
        ],
        capacities: [1],
      },
      { status: 'optimal', starts: [4, 6, 0], finish: 7 },
    ],
    [
      'is impossible where lags go round above nought',
      {
        activities: [activity(1), activity(1)],
        lags: [
          { from: 0, to: 1, least: 4 },
          { from: 1, to: 0, least: -3 },
        ],
        capacities: [],
      },
      {
        status: 'infeasible',
        starts: null,
        finish: null,
        cycle: [
          { from: 0, to: 1, least: 4 },
          { from: 1, to: 0, least: -3 },
        ],
      },
    ],
    [
      'is impossible where two must overlap and there is one to serve them',
      {
        activities: [activity(4, 1), activity(4, 1)],
        lags: [
          { from: 0, to: 1, least: 1 },
          { from: 1, to: 0, least: -3 },
        ],
        capacities: [1],
      },
      { status: 'infeasible', cycle: [] },
    ],
    [
      'is impossible where one asks for more than there is',
      { activities: [activity(1, 2)], lags: [], capacities: [1] },
      { status: 'infeasible' },
    ],
    [
      'waits for a release',
      { activities: [{ ...activity(2), release: 5 }], lags: [], capacities: [] },
      { starts: [5], finish: 7 },
    ],
  ];

  it.each(cases)('%s', (_, project, expected) => {
    const schedule = projectSchedule(project);
    // The cycle may be told from any of its lags on.
    expect({ ...schedule, cycle: [...schedule.cycle].sort((a, b) => a.from - b.from) }).toMatchObject(expected);
  });

  it('refuses figures that are not whole or below nought', () => {
    expect(() => projectSchedule({ activities: [activity(1.5)], lags: [], capacities: [] })).toThrow(RangeError);
    expect(() => projectSchedule({ activities: [activity(-1)], lags: [], capacities: [] })).toThrow(RangeError);
    expect(() => projectSchedule({ activities: [], lags: [{ from: 0, to: 1, least: 0 }], capacities: [] })).toThrow(
      RangeError,
    );
  });
});

const projects = fc.nat({ max: 100_000 }).map((seed) =>
  projectForSpecs(
    {
      activities: 8,
      resources: 2,
      longest: 6,
      order: 0.25,
      cycles: 0.5,
      tightness: 0.6,
      factor: 0.7,
      strength: 0.15,
    },
    seed,
  ),
);

const check = (law: (project: Project) => void): void =>
  fc.assert(fc.property(projects, law), { numRuns: 60, seed: 3 });

describe('Every schedule', () => {
  it('keeps lags and capacities, ends no earlier than its bound, and is the same of the same project', () => {
    check((project) => {
      const schedule = projectSchedule(project);
      expect(schedule.starts === null || isProjectPlan(schedule.starts, project)).toBe(true);
      expect(schedule.lowerBound).toBeLessThanOrEqual(schedule.finish ?? Infinity);
      expect(projectSchedule(project)).toEqual(schedule);
    });
  });

  it('ends no later with more of everything', () => {
    check((project) => {
      const more = { ...project, capacities: project.capacities.map((capacity) => capacity + 2) };
      expect(projectSchedule(more).finish ?? Infinity).toBeLessThanOrEqual(projectSchedule(project).finish ?? Infinity);
    });
  });

  it('that was stopped still keeps every rule, and says how far from its bound it may be', () => {
    check((project) => {
      const { status, starts, finish, lowerBound, nodes } = projectSchedule(project, { limit: { nodes: 1 } });
      const best = projectSchedule(project).finish ?? Infinity;
      expect(nodes).toBeLessThanOrEqual(1);
      expect(lowerBound).toBeLessThanOrEqual(best);
      expect(finish ?? Infinity).toBeGreaterThanOrEqual(best);
      expect(starts === null || isProjectPlan(starts, project)).toBe(true);
      expect(status === 'infeasible').toBe(best === Infinity && status !== 'unproven');
    });
  });

  it('tells of each better plan, and never ends later than one known before', () => {
    check((project) => {
      const told: ProjectStarts[] = [];
      const { starts, finish } = projectSchedule(project, { onBetter: (plan) => told.push(plan) });
      expect(told.map((plan) => plan.finish)).toEqual([...told.map((plan) => plan.finish)].sort((a, b) => b - a));
      expect(told.at(-1)?.finish ?? null).toBe(finish);
      if (starts) expect(projectSchedule(project, { incumbent: starts, limit: { nodes: 0 } }).finish).toBe(finish);
    });
  });
});
