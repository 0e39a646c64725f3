import fc from 'fast-check';
import { cumulativeParts } from '#shared/money/cumulative-parts';
import { D } from '#shared/money/decimal';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { stagePayments } from '#shared/money/stage-payments';
import { sumMinor } from '#shared/money/sum-minor';

describe('splitting by largest remainder', () => {
  it.each([
    [10, [1, 1, 1], [4, 3, 3], 'ties go to the earlier'],
    [-10, [1, 1, 1], [-4, -3, -3], 'a negative total is split as its absolute value'],
    [10, [0, 1, 0], [0, 10, 0], 'no weight, no part'],
    [0, [0, 0], [0, 0], 'nothing is split into nothings'],
    [7, [0.1, 0.2], [2, 5], 'weights may be fractions'],
    [100, [3, -1], [150, -50], 'a line of its own sign keeps it'],
    [1, [1, 1, -1], [1, 1, -1], 'parts of both signs still sum up'],
  ])('%d over %j gives %j: %s', (total, weights, expected) => {
    expect(splitByLargestRemainder(total, weights)).toEqual(expected);
  });

  it('refuses to split something over nothing', () => {
    expect(() => splitByLargestRemainder(1, [])).toThrow(RangeError);
    expect(() => splitByLargestRemainder(1, [0, 0])).toThrow(RangeError);
  });

  it('sums to the whole in 10,000 random cases, each part within one minor unit of its exact share', () => {
    const weights = fc.array(fc.integer({ min: 0, max: 1_000_000 }), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(fc.integer({ min: -1e12, max: 1e12 }), weights, (total, parts) => {
        const sum = parts.reduce((before, part) => before + part, 0);
        fc.pre(sum > 0);
        const split = splitByLargestRemainder(total, parts);
        expect(sumMinor(split)).toBe(total);
        split.forEach((part, place) => {
          const exact = new D(total).times(parts[place]).div(sum);
          expect(exact.minus(part).abs().lessThan(1)).toBe(true);
        });
      }),
      { numRuns: 10_000 },
    );
  });

  it('sums to the whole when some weights are negative too', () => {
    const weights = fc.array(fc.integer({ min: -1000, max: 1000 }), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(fc.integer({ min: -1e6, max: 1e6 }), weights, (total, parts) => {
        fc.pre(parts.reduce((before, part) => before + part, 0) !== 0);
        expect(sumMinor(splitByLargestRemainder(total, parts))).toBe(total);
      }),
    );
  });
});

describe('stages of payment', () => {
  it('are differences of rounded cumulative amounts', () => {
    expect(cumulativeParts(100, ['33.333', '66.667', '100'])).toEqual([33, 34, 33]);
  });

  it('recover the deposit pro rata and hold the retention back', () => {
    const plan = { deposit_percent: 30, stages_percent: [40, 40, 20], retention_percent: 5 };
    expect(stagePayments(1_000_00, plan)).toEqual({
      deposit_minor: 300_00,
      stages: [
        { work_minor: 400_00, recovered_minor: 120_00, retained_minor: 20_00, paid_minor: 260_00 },
        { work_minor: 400_00, recovered_minor: 120_00, retained_minor: 20_00, paid_minor: 260_00 },
        { work_minor: 200_00, recovered_minor: 60_00, retained_minor: 10_00, paid_minor: 130_00 },
      ],
      releases_minor: [25_00, 25_00],
    });
  });

  it('give the odd cent of the retention back first', () => {
    const plan = { deposit_percent: 0, stages_percent: [100], retention_percent: 5 };
    expect(stagePayments(101_00, plan).releases_minor).toEqual([253, 252]);
  });

  it('are refused when they are not 100 %, or more is withheld than there is', () => {
    expect(() => stagePayments(100, { deposit_percent: 0, stages_percent: [30, 60], retention_percent: 0 })).toThrow(
      RangeError,
    );
    expect(() => stagePayments(100, { deposit_percent: 0, stages_percent: [], retention_percent: 0 })).toThrow(
      RangeError,
    );
    expect(() => stagePayments(100, { deposit_percent: 60, stages_percent: [100], retention_percent: 50 })).toThrow(
      RangeError,
    );
  });

  it('sum to the contract to the last cent, whatever the contract and the plan', () => {
    const shares = fc.array(fc.integer({ min: 1, max: 100 }), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1e10 }),
        shares,
        fc.integer({ min: 0, max: 60 }),
        fc.integer({ min: 0, max: 40 }),
        (contract, parts, deposit, retention) => {
          const sum = parts.reduce((before, part) => before + part, 0);
          const whole = parts.map((part) => Math.floor((part * 10_000) / sum));
          whole[0] += 10_000 - whole.reduce((before, part) => before + part, 0);
          const stages_percent = whole.map((part) => part / 100);
          const paid = stagePayments(contract, {
            deposit_percent: deposit,
            stages_percent,
            retention_percent: retention,
          });
          const stages = paid.stages.map((stage) => stage.paid_minor);
          expect(sumMinor([paid.deposit_minor, ...stages, ...paid.releases_minor])).toBe(contract);
          expect(sumMinor(paid.stages.map((stage) => stage.recovered_minor))).toBe(paid.deposit_minor);
          expect(paid.releases_minor[0] - paid.releases_minor[1]).toBeLessThanOrEqual(1);
        },
      ),
    );
  });
});
