import { seededGenerator } from '#shared/estimates/risk/seeded-generator';
import { programme } from '#shared/programme/programme';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { Project } from '#shared/programme/project';
import { projectForSpecs } from '#shared/programme/project-for-specs';
import { projectSchedule } from '#shared/programme/project-schedule';
import { isProjectPlan } from '#shared/programme/project-starts';
import {
  calendarForSpecs,
  endlessHours,
  lagForSpecs,
  personForSpecs,
  requestForSpecs,
  taskForSpecs,
} from '#shared/programme/request-for-specs';
import { exhaustiveFinish } from './exhaustive-starts';
import { middlingProject } from './middling-project';

/**
 * Random networks (seeds given, so always the same) against an independent solver: exhaustive search over all starts. The published instances UBO10 and UBO20 of
 * the generator ProGen/max are of the same kind; these are our own in its manner, since those cannot be had here.
 */
const small = Array.from({ length: 240 }, (_, seed) =>
  projectForSpecs(
    {
      activities: 3 + (seed % 3),
      resources: 1 + (seed % 3),
      longest: 3,
      order: 0.3 + 0.1 * (seed % 4),
      cycles: 0.8,
      tightness: 0.5 + 0.1 * (seed % 6),
      factor: 0.8,
      strength: 0.1 * (seed % 4),
    },
    seed,
  ),
);

describe('Small random networks', () => {
  const found = small.map((project) => ({
    project,
    schedule: projectSchedule(project),
    finish: exhaustiveFinish(project),
  }));

  it('have the least finish an exhaustive search finds, or none where it finds none', () => {
    expect(found.map(({ schedule }) => schedule.finish)).toEqual(found.map(({ finish }) => finish));
  });

  it('are told to be proven', () => {
    const expected = found.map(({ finish }) => (finish === null ? 'infeasible' : 'optimal'));
    expect(found.map(({ schedule }) => schedule.status)).toEqual(expected);
  });

  it('are of both kinds in good number', () => {
    expect(found.filter(({ finish }) => finish === null).length).toBeGreaterThan(20);
    expect(found.filter(({ finish }) => finish !== null).length).toBeGreaterThan(100);
  });

  it('name a contradiction only where the sum of its lags is above nought', () => {
    const sums = found
      .filter(({ schedule }) => schedule.cycle.length > 0)
      .map(({ schedule }) => schedule.cycle.reduce((sum, { least }) => sum + least, 0));
    expect(sums.length).toBeGreaterThan(10);
    expect(sums.filter((sum) => sum <= 0)).toEqual([]);
  });
});

describe('Networks of ten activities and five resources', () => {
  it('are each solved to the proof, the starts keeping every rule', () => {
    const projects = Array.from({ length: 40 }, (_, seed) => middlingProject(10, seed));
    const schedules = projects.map((project) => projectSchedule(project, { limit: { nodes: 200_000 } }));
    expect(schedules.filter(({ status }) => status !== 'optimal' && status !== 'infeasible')).toEqual([]);
    expect(schedules.map(({ starts }, at) => starts === null || isProjectPlan(starts, projects[at]))).not.toContain(
      false,
    );
    expect(schedules.filter(({ status }) => status === 'optimal').length).toBeGreaterThan(20);
  });
});

/** A network as tasks of people who never stop: each resource is a grade with as many people as its capacity, each activity asks for one grade. */
function asRequest(project: Project): ProgrammeRequest {
  const people = project.capacities.flatMap((capacity, k) =>
    Array.from({ length: capacity }, (_, at) => personForSpecs(`p${k}-${at}`, `grade ${k}`)),
  );
  const tasks = project.activities.map(({ duration, demands }, at) => {
    const grade = demands.findIndex((demand) => demand > 0);
    return taskForSpecs(`t${at}`, {
      handsOn_minutes: duration,
      gradeId: `grade ${grade}`,
      crew: demands[grade],
      mostPeople: demands[grade],
    });
  });
  const lags = project.lags.map(({ from, to, least }, at) =>
    least >= 0
      ? lagForSpecs(`t${from}`, `t${to}`, { id: `l${at}`, fromPoint: 'start', least })
      : lagForSpecs(`t${to}`, `t${from}`, { id: `l${at}`, fromPoint: 'start', most: -least }),
  );
  return requestForSpecs({ calendar: calendarForSpecs(endlessHours), people, tasks, lags });
}

/** Lags from start to start that ask for an order, as tasks have them, and one grade for each activity. */
function ofOneGradeEach(seed: number): Project {
  const next = seededGenerator(seed);
  const activities = Array.from({ length: 4 }, () => {
    const grade = next() % 2;
    return { duration: 1 + (next() % 3), demands: [0, 1].map((k) => (k === grade ? 1 + (next() % 2) : 0)) };
  });
  const lags = [1, 2, 3].flatMap((to) => {
    const from = next() % to;
    const least = next() % 5;
    return next() % 2 === 0
      ? [{ from, to, least }]
      : [
          { from, to, least },
          { from: to, to: from, least: -least - (next() % 2) },
        ];
  });
  return { activities, lags, capacities: [2, 2] };
}

describe('The workshop whose people never stop', () => {
  it('is planned to the same finish as the network, and as the exhaustive search', () => {
    const projects = Array.from({ length: 60 }, (_, seed) => ofOneGradeEach(seed));
    const planned = projects.map((project) => programme(asRequest(project)).finish_minutes);
    expect(planned).toEqual(projects.map(exhaustiveFinish));
    expect(planned).toEqual(projects.map((project) => projectSchedule(project).finish));
  });
});
