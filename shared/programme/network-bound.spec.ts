import * as fc from 'fast-check';
import { earliestTimes } from '#shared/programme/earliest-times';
import { networkBound } from '#shared/programme/network-bound';
import { networkOf } from '#shared/programme/network-of';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { lagForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

function boundOf(request: ProgrammeRequest, finish: number): number {
  const { network } = networkOf(request, 60);
  return networkBound(network, earliestTimes(network), finish);
}

const hour = 60;
/** The hours from which a week's work can begin: from 8 to 12 and from 13 to 17, Monday to Friday. */
const hours = [0, 1, 2, 3, 4].flatMap((day) => [8, 9, 10, 11, 13, 14, 15, 16].map((at) => day * 24 + at));
const isOneStretch = (start: number, length: number): boolean => {
  const [from, to] = [start % 24, (start % 24) + length];
  return (from >= 8 && to <= 12) || (from >= 13 && to <= 17);
};

interface SmallJob {
  readonly lengths: readonly number[];
  /** Between each task and the next; in hours, as all of it is. */
  readonly lags: readonly { readonly least: number; readonly room: number | null }[];
}

/** The soonest finish for one pair of hands, in hours: every hour of a week is tried for every task. Infinity where none will do. */
function soonest({ lengths, lags }: SmallJob, starts: readonly number[] = []): number {
  const at = starts.length;
  if (at === lengths.length) return Math.max(...starts.map((start, task) => start + lengths[task]));
  const before = at === 0 ? null : starts[at - 1] + lengths[at - 1];
  const possible = hours.filter((start) => {
    if (!isOneStretch(start, lengths[at])) return false;
    if (starts.some((one, task) => start < one + lengths[task] && one < start + lengths[at])) return false;
    if (before === null) return true;
    const { least, room } = lags[at - 1];
    return start - before >= least && (room === null || start - before <= least + room);
  });
  return Math.min(Infinity, ...possible.map((start) => soonest({ lengths, lags }, [...starts, start])));
}

const requestOf = ({ lengths, lags }: SmallJob): ProgrammeRequest =>
  requestForSpecs({
    tasks: lengths.map((length, at) => taskForSpecs(`t${at}`, { handsOn_minutes: length * hour, isBreakable: false })),
    lags: lags.slice(0, lengths.length - 1).map(({ least, room }, at) =>
      lagForSpecs(`t${at}`, `t${at + 1}`, {
        least: least * hour,
        most: room === null ? null : (least + room) * hour,
      }),
    ),
  });

describe('The bound of a network', () => {
  it.each([2040, 2140, 3040, 3480, 9000])(
    'is no later than the best plan, however late the plan at hand ends: %d',
    (finish) => {
      // One from 8 to 9 on Monday, the other a day after, from 9 to 10 on Tuesday: the 2040th minute.
      const request = requestForSpecs({
        tasks: [taskForSpecs('size'), taskForSpecs('lay')],
        lags: [lagForSpecs('size', 'lay', { least: 1440 })],
      });
      expect(boundOf(request, finish)).toBe(2040);
    },
  );

  it('is never later than the best of all plans of a small job, whatever plan is at hand', () => {
    const job = fc.record({
      lengths: fc.array(fc.integer({ min: 1, max: 4 }), { minLength: 2, maxLength: 3 }),
      lags: fc.array(
        fc.record({ least: fc.integer({ min: -6, max: 30 }), room: fc.option(fc.integer({ min: 0, max: 20 })) }),
        { minLength: 2, maxLength: 2 },
      ),
    });
    let compared = 0;
    fc.assert(
      fc.property(job, fc.integer({ min: 0, max: 9000 }), (made, later) => {
        const best = soonest(made) * hour;
        if (best === Infinity) return;
        compared += 1;
        expect(boundOf(requestOf(made), best + later)).toBeLessThanOrEqual(best);
      }),
      { numRuns: 150, seed: 1 },
    );
    expect(compared).toBeGreaterThan(60);
  });
});
