import { programme } from '#shared/programme/programme';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import type { Project } from '#shared/programme/project';
import { projectSchedule } from '#shared/programme/project-schedule';
import {
  calendarForSpecs,
  endlessHours,
  lagForSpecs,
  personForSpecs,
  requestForSpecs,
  taskForSpecs,
} from '#shared/programme/request-for-specs';

/**
 * The small network of carving and gilding: one carver, one gilder; for each item carve 4 days, gesso 3, recut 2, gild 2; the carver carves and recuts, the
 * gilder lays gesso and gilds; gesso starts 1 day or more after carving ends, recutting 2 to 5 days after the gesso, gilding any time after recutting, and no
 * later than M days after the gesso. Source of the figures: own, worked beforehand by exhaustive search over all starts.
 */
const shortest = [
  { items: 1, most: 6, days: 14 },
  { items: 1, most: 4, days: 14 },
  { items: 2, most: 6, days: 18 },
  { items: 2, most: 4, days: 18 },
  { items: 3, most: 6, days: 22 },
  { items: 3, most: 4, days: 26 },
];

const durations = [4, 3, 2, 2];

/** Starts of one item: carve, gesso, recut, gild. */
function daysProject(items: number, most: number): Project {
  const demands = [
    [1, 0],
    [0, 1],
    [1, 0],
    [0, 1],
  ];
  const each = Array.from({ length: items }, (_, item) => item * 4);
  return {
    activities: each.flatMap(() => durations.map((duration, at) => ({ duration, demands: demands[at] }))),
    capacities: [1, 1],
    lags: each.flatMap((carve) => [
      { from: carve, to: carve + 1, least: 4 + 1 },
      { from: carve + 1, to: carve + 2, least: 3 + 2 },
      { from: carve + 2, to: carve + 1, least: -(3 + 5) },
      { from: carve + 2, to: carve + 3, least: 2 },
      { from: carve + 3, to: carve + 1, least: -(3 + most) },
    ]),
  };
}

const day = 1440;

function itemTasks(item: number): ProgrammeTask[] {
  return ['carve', 'gesso', 'recut', 'gild'].map((name, at) =>
    taskForSpecs(`${name} ${item}`, {
      gradeId: at % 2 === 0 ? 'carver' : 'gilder',
      handsOn_minutes: durations[at] * day,
    }),
  );
}

function itemLags(item: number, most: number): ProgrammeLag[] {
  const [carve, gesso, recut, gild] = ['carve', 'gesso', 'recut', 'gild'].map((name) => `${name} ${item}`);
  return [
    lagForSpecs(carve, gesso, { least: day }),
    lagForSpecs(gesso, recut, { least: 2 * day, most: 5 * day }),
    lagForSpecs(recut, gild),
    lagForSpecs(gesso, gild, { most: most * day }),
  ];
}

function daysRequest(items: number, most: number): ProgrammeRequest {
  const each = Array.from({ length: items }, (_, item) => item + 1);
  return requestForSpecs({
    calendar: calendarForSpecs(endlessHours),
    people: [personForSpecs('carver', 'carver'), personForSpecs('gilder', 'gilder')],
    tasks: each.flatMap(itemTasks),
    lags: each.flatMap((item) => itemLags(item, most)),
  });
}

describe('The small network of carving and gilding', () => {
  it.each(shortest)('$items items, gilt within $most days of their gesso, take $days days', ({ items, most, days }) => {
    expect(projectSchedule(daysProject(items, most))).toMatchObject({
      status: 'optimal',
      finish: days,
      lowerBound: days,
    });
  });

  it.each(shortest)(
    'as tasks of people who never stop: $items items, $most days, take $days days',
    ({ items, most, days }) => {
      expect(programme(daysRequest(items, most))).toMatchObject({ status: 'optimal', finish_minutes: days * day });
    },
  );

  it('cannot be done within 3 days of the gesso: the lags go round and come out one day above nought', () => {
    const { status, starts, cycle } = projectSchedule(daysProject(1, 3));
    expect({ status, starts }).toEqual({ status: 'infeasible', starts: null });
    expect(cycle.reduce((sum, { least }) => sum + least, 0)).toBe(1);
    expect(new Set(cycle.map(({ from }) => from))).toEqual(new Set([1, 2, 3]));
  });

  it('says so in the words of its tasks', () => {
    const { status, cycle, findings } = programme(daysRequest(1, 3));
    expect(status).toBe('infeasible');
    expect(new Set(cycle)).toEqual(new Set(['gesso 1-recut 1', 'recut 1-gild 1', 'gesso 1-gild 1']));
    expect(findings).toEqual([
      expect.objectContaining({
        kind: 'refuse',
        code: 'programme-contradiction',
        values: expect.objectContaining({ over_minutes: day }),
      }),
    ]);
  });
});
