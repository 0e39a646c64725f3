import * as fc from 'fast-check';
import { seededGenerator } from '#shared/estimates/risk/seeded-generator';
import { brokenRulesForSpecs } from '#shared/programme/broken-rules-for-specs';
import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { randomRequestForSpecs } from '#shared/programme/random-request-for-specs';
import { requestFrom } from '#shared/programme/request-from';
import { personForSpecs } from '#shared/programme/request-for-specs';

const requests = fc.nat({ max: 1_000_000 }).map((seed) => randomRequestForSpecs(seed, 4));
const quick = { limit: { nodes: 6 } };

/** Requests with a plan of each; those that have none are left out. */
const planned = requests
  .map((request) => ({ request, plan: programme(request, quick) }))
  .filter(({ plan }) => plan.finish_minutes !== null);

const check = (runs: number, law: (made: { request: ProgrammeRequest; plan: Programme }) => void): void =>
  fc.assert(fc.property(planned, law), { numRuns: runs, seed: 1, endOnFailure: true });

/** The same with the rack promised elsewhere, one place of it for one to three stretches of a few days. */
function withPromisedRack(request: ProgrammeRequest, seed: number): ProgrammeRequest {
  const next = seededGenerator(seed + 7);
  const taken = Array.from({ length: 1 + (next() % 3) }, () => {
    const start_minutes = next() % 12_000;
    return { start_minutes, end_minutes: start_minutes + 600 + (next() % 4000), amount: 1 };
  });
  return { ...request, places: request.places.map((place) => ({ ...place, taken })) };
}

const finishOf = ({ finish_minutes }: Programme): number => finish_minutes ?? Infinity;
const placesOf = ({ tasks }: Programme) =>
  tasks.map(({ taskId, start_minutes, end_minutes, personIds }) => [taskId, start_minutes, end_minutes, personIds]);

describe('Every programme', () => {
  it('keeps hours, grades, crews, lags, racks: nobody is at two places at once', () => {
    check(80, ({ request, plan }) => expect(brokenRulesForSpecs(request, plan)).toEqual([]));
  });

  it('comes to an end between what a rack is promised for elsewhere, and has room there', () => {
    const most = 40;
    const plans = Array.from({ length: 60 }, (_, seed) => {
      const request = withPromisedRack(randomRequestForSpecs(seed, 5), seed);
      return { request, plan: programme(request, { limit: { nodes: most } }) };
    });
    const found = plans.filter(({ plan }) => plan.finish_minutes !== null);
    expect(found.length).toBeGreaterThan(40);
    expect(found.flatMap(({ request, plan }) => brokenRulesForSpecs(request, plan))).toEqual([]);
  });

  it('ends no earlier than its bound, and is best where it meets it', () => {
    check(60, ({ plan }) => {
      expect(plan.lowerBound_minutes).toBeLessThanOrEqual(finishOf(plan));
      expect(plan.status === 'optimal').toBe(plan.lowerBound_minutes === finishOf(plan));
      expect(Math.max(...plan.tasks.map(({ end_minutes }) => end_minutes))).toBe(finishOf(plan));
    });
  });

  it('is the same of the same request', () => {
    check(25, ({ request, plan }) => expect(programme(request, quick)).toEqual(plan));
  });

  it('leaves slack that is there: what is critical lies on a path to the finish', () => {
    check(60, ({ plan }) => {
      expect(
        plan.tasks.filter(({ slack_minutes, isCritical }) => slack_minutes < 0 || isCritical !== (slack_minutes === 0)),
      ).toEqual([]);
      const latest = plan.tasks.filter(({ end_minutes }) => end_minutes === finishOf(plan));
      expect(latest.some(({ isCritical }) => isCritical)).toBe(true);
    });
  });

  it('ends no later with more people than the best plan already found', () => {
    check(30, ({ request, plan }) => {
      const more = { ...request, people: [...request.people, personForSpecs('new', 'gilder', 'carver')] };
      expect(finishOf(programme(more, { ...quick, incumbent: plan }))).toBeLessThanOrEqual(finishOf(plan));
    });
  });

  it('ends no later with more room than the best plan already found', () => {
    check(20, ({ request, plan }) => {
      const more = { ...request, places: request.places.map((place) => ({ ...place, capacity: place.capacity + 1 })) };
      expect(finishOf(programme(more, { ...quick, incumbent: plan }))).toBeLessThanOrEqual(finishOf(plan));
    });
  });

  it('ends no later with wider windows or shorter drying than the best plan already found', () => {
    check(30, ({ request, plan }) => {
      const wider = request.lags.map((lag) => ({ ...lag, most: lag.most === null ? null : lag.most + 300 }));
      const shorter = request.lags.map((lag) => ({ ...lag, least: Math.floor(lag.least / 2) }));
      for (const lags of [wider, shorter])
        expect(finishOf(programme({ ...request, lags }, { ...quick, incumbent: plan }))).toBeLessThanOrEqual(
          finishOf(plan),
        );
    });
  });

  it('stands as it is when nothing has changed', () => {
    check(40, ({ request, plan }) => expect(placesOf(programme(request, { previous: plan }))).toEqual(placesOf(plan)));
  });

  it('moves nothing that comes before a change, and keeps every rule after it', () => {
    check(60, ({ request, plan }) => {
      const changed = plan.tasks[plan.tasks.length - 1];
      const longer = (task: ProgrammeRequest['tasks'][number]) =>
        task.id === changed.taskId ? { ...task, handsOn_minutes: task.handsOn_minutes + 20 } : task;
      const request2 = { ...request, tasks: request.tasks.map(longer) };
      const again = programme(request2, { previous: plan });
      fc.pre(again.finish_minutes !== null);
      expect(brokenRulesForSpecs(request2, again)).toEqual([]);
      const tied = new Set(
        request.lags.filter(({ most }) => most !== null).flatMap((lag) => [lag.fromTaskId, lag.toTaskId]),
      );
      const before = plan.tasks.filter(
        ({ end_minutes, taskId }) => end_minutes <= changed.start_minutes && !tied.has(taskId),
      );
      const now = new Map(again.tasks.map((task) => [task.taskId, task.start_minutes]));
      expect(before.filter(({ taskId, start_minutes }) => now.get(taskId) !== start_minutes)).toEqual([]);
    });
  });

  it('begins nothing that has not happened before the moment it is planned from', () => {
    fc.assert(
      fc.property(planned, fc.nat({ max: 9000 }), fc.nat({ max: 3 }), ({ request, plan }, later, happened) => {
        const done = new Set(plan.tasks.slice(0, happened).map(({ taskId }) => taskId));
        const tasks = request.tasks.map((task, at) => {
          const { start_minutes, end_minutes, personIds } = plan.tasks[at];
          if (!done.has(task.id)) return task;
          return { ...task, happened: { start_minutes, end_minutes, personIds, left_minutes: 0 } };
        });
        const from = requestFrom({ ...request, tasks }, request.start_minutes + later);
        for (const search of [quick, { ...quick, previous: plan }, { ...quick, incumbent: plan }]) {
          const again = programme(from, search);
          expect(again.from_minutes).toBe(request.start_minutes + later);
          const early = again.tasks.filter((task) => task.start_minutes < again.from_minutes);
          expect(early.filter(({ taskId }) => !done.has(taskId))).toEqual([]);
        }
      }),
      { numRuns: 60, seed: 1, endOnFailure: true },
    );
  });

  it('that ends by a day wanted keeps every rule too', () => {
    check(40, ({ request, plan }) => {
      const wanted = finishOf(plan) + 5000;
      const late = programme(request, { ...quick, backwardFrom_minutes: wanted });
      expect(brokenRulesForSpecs(request, late)).toEqual([]);
      expect(finishOf(late)).toBeLessThanOrEqual(wanted);
      expect(late.start_minutes).toBeGreaterThanOrEqual(request.start_minutes);
    });
  });
});
