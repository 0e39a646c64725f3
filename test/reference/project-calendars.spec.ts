import { seededGenerator } from '#shared/estimates/risk/seeded-generator';
import { programme } from '#shared/programme/programme';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import {
  calendarForSpecs,
  lagForSpecs,
  personForSpecs,
  requestForSpecs,
  taskForSpecs,
} from '#shared/programme/request-for-specs';

/**
 * Small jobs in a calendar against exhaustive search, in whole hours: a week of two four-hour days, two people, three or four tasks of whole hours that are not
 * broken overnight. Every start is an hour, since all figures are, and each is tried; nothing of the product's method is in it.
 */
const hour = 60;
const openDays = [0, 1, 7, 8, 14, 15];
const openHours = openDays.flatMap((day) => [8, 9, 10, 11].map((at) => day * 24 + at));

interface SmallTask {
  readonly hours: number;
  readonly grade: 0 | 1;
}

interface SmallLag {
  readonly from: number;
  readonly to: number;
  readonly least: number;
  readonly most: number | null;
}

interface SmallJob {
  readonly tasks: readonly SmallTask[];
  readonly lags: readonly SmallLag[];
}

function smallJob(seed: number): SmallJob {
  const next = seededGenerator(seed);
  const draw = (from: number, to: number): number => from + (next() % (to - from + 1));
  const tasks = Array.from({ length: draw(3, 4) }, (): SmallTask => ({
    hours: draw(1, 3),
    grade: draw(0, 1) as 0 | 1,
  }));
  const lags = tasks.slice(1).map((_, before): SmallLag => {
    const least = [0, 1, 2, 14, 20][draw(0, 4)];
    return {
      from: draw(0, before),
      to: before + 1,
      least,
      most: draw(0, 1) === 0 ? null : least + [0, 1, 2, 8][draw(0, 3)],
    };
  });
  return { tasks, lags };
}

const isOnOneDay = (start: number, hours: number): boolean => openHours.includes(start) && (start % 24) + hours <= 12;

/** The least hour by which all is done, trying every hour for every task; null where there is none in three weeks. */
function exhaustiveEnd({ tasks, lags }: SmallJob, starts: readonly number[] = []): number | null {
  const at = starts.length;
  const endOf = (task: number): number => starts[task] + tasks[task].hours;
  if (at === tasks.length) return Math.max(...tasks.map((_, task) => endOf(task)));
  let best: number | null = null;
  for (const start of openHours.filter((one) => isOnOneDay(one, tasks[at].hours))) {
    const isFree = starts.every((begun, other) => {
      const apart = begun >= start + tasks[at].hours || endOf(other) <= start;
      return apart || tasks[other].grade !== tasks[at].grade;
    });
    const isKept = lags
      .filter(({ to }) => to === at)
      .every(({ from, least, most }) => start - endOf(from) >= least && (most === null || start - endOf(from) <= most));
    if (!isFree || !isKept) continue;
    const end = exhaustiveEnd({ tasks, lags }, [...starts, start]);
    if (end !== null && (best === null || end < best)) best = end;
  }
  return best;
}

function asRequest({ tasks, lags }: SmallJob): ProgrammeRequest {
  const open = [{ start_minutes: 8 * hour, end_minutes: 12 * hour }];
  return requestForSpecs({
    calendar: calendarForSpecs({ 1: open, 2: open }),
    people: [personForSpecs('carl', 'grade 0'), personForSpecs('gina', 'grade 1')],
    tasks: tasks.map(({ hours, grade }, at) =>
      taskForSpecs(`t${at}`, { handsOn_minutes: hours * hour, gradeId: `grade ${grade}`, isBreakable: false }),
    ),
    lags: lags.map(({ from, to, least, most }, at) =>
      lagForSpecs(`t${from}`, `t${to}`, {
        id: `l${at}`,
        least: least * hour,
        most: most === null ? null : most * hour,
      }),
    ),
  });
}

describe('Small jobs in a calendar', () => {
  const found = Array.from({ length: 120 }, (_, seed) => {
    const job = smallJob(seed);
    return { end: exhaustiveEnd(job), plan: programme(asRequest(job), { limit: { nodes: 30 } }) };
  });
  const possible = found.filter(({ end }) => end !== null);

  it('are of both kinds in good number', () => {
    expect(possible.length).toBeGreaterThan(50);
    expect(found.length - possible.length).toBeGreaterThan(10);
  });

  it('never end sooner than any search finds, and their bound is one', () => {
    for (const { end, plan } of possible) {
      expect(plan.lowerBound_minutes).toBeLessThanOrEqual((end ?? 0) * hour);
      expect(plan.finish_minutes ?? Infinity).toBeGreaterThanOrEqual((end ?? 0) * hour);
    }
  });

  it('are best where they say so', () => {
    const proven = possible.filter(({ plan }) => plan.status === 'optimal');
    expect(proven.length).toBeGreaterThan(40);
    expect(proven.map(({ plan }) => plan.finish_minutes)).toEqual(proven.map(({ end }) => (end ?? 0) * hour));
  });

  it('are told to be impossible only where they are', () => {
    const told = found.filter(({ plan }) => plan.status === 'infeasible');
    expect(told.length).toBeGreaterThan(10);
    expect(told.map(({ end }) => end)).toEqual(told.map(() => null));
  });

  it('have a plan, and the best one, nearly always where there is one', () => {
    const best = possible.filter(({ end, plan }) => plan.finish_minutes === (end ?? 0) * hour);
    expect(possible.filter(({ plan }) => plan.finish_minutes === null)).toEqual([]);
    expect(best.length / possible.length).toBeGreaterThan(0.95);
  });
});
