import fc from 'fast-check';
import { inverseDistribution } from '#shared/estimates/risk/inverse-distribution';
import { normalTable } from '#shared/estimates/risk/normal-table';
import { percentileOf } from '#shared/estimates/risk/percentile-of';
import { pertPlace, pertTable } from '#shared/estimates/risk/pert-table';
import { quantile, shareBelow } from '#shared/estimates/risk/quantile-table';
import { seededGenerator, xoshiro128StarStar } from '#shared/estimates/risk/seeded-generator';

const shares = fc.double({ min: 1e-4, max: 1 - 1e-4, noNaN: true });

describe('the generator', () => {
  it('is xoshiro128**: ten words from the state 1, 2, 3, 4', () => {
    // Produced with the authors' reference implementation 1.1; printed in the tests of the Rust crate rand_xoshiro.
    const expected = [
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ];
    const next = xoshiro128StarStar([1, 2, 3, 4]);
    expect(expected.map(() => next())).toEqual(expected);
  });

  it('gives the same from the same seed, and something else from its neighbour', () => {
    const words = (seed: number) => Array.from({ length: 8 }, seededGenerator(seed));
    expect(words(7)).toEqual(words(7));
    expect(words(7)).not.toEqual(words(8));
    expect(new Set([...words(0), ...words(1)]).size).toBe(16);
  });

  it('refuses a state of zeros and a seed that is not whole', () => {
    expect(() => xoshiro128StarStar([0, 0, 0, 0])).toThrow(RangeError);
    expect(() => seededGenerator(1.5)).toThrow(RangeError);
  });
});

describe('the normal distribution by table', () => {
  // Quantiles as every statistical table prints them.
  it.each([
    [0.5, 0],
    [0.8, 0.841621],
    [0.9, 1.281552],
    [0.975, 1.959964],
    [0.999, 3.090232],
    [0.05, -1.644854],
  ])('%d of all cases stay below %d', (share, place) => {
    expect(Math.abs(quantile(normalTable, share) - place)).toBeLessThan(2e-4);
    expect(Math.abs(shareBelow(normalTable, place) - share)).toBeLessThan(5e-6);
  });

  it('undoes itself', () => {
    fc.assert(
      fc.property(shares, (share) => {
        expect(shareBelow(normalTable, quantile(normalTable, share))).toBeCloseTo(share, 12);
      }),
    );
  });
});

describe('PERT by table', () => {
  // Where α and β are whole, the beta distribution is a polynomial. Straight lines between 1,024 cells stay within h²/8·max F″ = 3.6e-6 of it.
  it.each<[number, string, (x: number) => number]>([
    [0, '1 − (1 − x)⁵', (x) => 1 - (1 - x) ** 5],
    [0.25, '1 − (1 − x)⁴·(1 + 4x)', (x) => 1 - (1 - x) ** 4 * (1 + 4 * x)],
    [0.5, 'x³·(10 − 15x + 6x²)', (x) => x ** 3 * (10 - 15 * x + 6 * x * x)],
    [0.75, 'x⁴·(5 − 4x)', (x) => x ** 4 * (5 - 4 * x)],
    [1, 'x⁵', (x) => x ** 5],
  ])('with its mode at %d is %s', (mode, _formula, below) => {
    const table = pertTable(mode);
    fc.assert(
      fc.property(shares, (share) => {
        expect(Math.abs(below(pertPlace(quantile(table, share))) - share)).toBeLessThan(4e-6);
      }),
    );
  });

  it('has the mean (low + 4·likely + high) ÷ 6, wherever the mode', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (mode) => {
        const table = pertTable(mode);
        let sum = 0;
        for (let part = 0; part < 4000; part += 1) sum += pertPlace(quantile(table, (part + 0.5) / 4000));
        expect(Math.abs(sum / 4000 - (4 * mode + 1) / 6)).toBeLessThan(2e-5);
      }),
      { numRuns: 30 },
    );
  });
});

describe('the inverse of a triple', () => {
  const triples = fc
    .tuple(fc.nat(1000), fc.nat(1000), fc.nat(1000))
    .map((figures) => figures.sort((one, other) => one - other))
    .map(([low, likely, high]) => ({ low, likely, high }));

  it('stays within the triple and never falls', () => {
    fc.assert(
      fc.property(triples, fc.constantFrom('triangular', 'pert'), shares, shares, (triple, shape, one, other) => {
        const inverse = inverseDistribution(triple, shape);
        expect(inverse(one)).toBeGreaterThanOrEqual(triple.low);
        expect(inverse(one)).toBeLessThanOrEqual(triple.high);
        const [smaller, larger] = one < other ? [one, other] : [other, one];
        expect(inverse(smaller)).toBeLessThanOrEqual(inverse(larger) + 1e-9);
      }),
    );
  });

  it('of one point is that point', () => {
    expect(inverseDistribution({ low: 5, likely: 5, high: 5 }, 'pert')(0.9)).toBe(5);
  });

  it('is refused when it does not rise', () => {
    expect(() => inverseDistribution({ low: 5, likely: 4, high: 6 }, 'pert')).toThrow(RangeError);
    expect(() => inverseDistribution({ low: 1, likely: NaN, high: 6 }, 'triangular')).toThrow(RangeError);
  });
});

describe('a percentile', () => {
  it.each([
    [80, 4],
    [81, 5],
    [20, 1],
    [0.1, 1],
    [100, 5],
  ])('of %d among five is the %dth smallest', (percentile, expected) => {
    expect(percentileOf(Float64Array.of(1, 2, 3, 4, 5), percentile)).toBe(expected);
  });

  it('is refused at nought and beyond a hundred', () => {
    expect(() => percentileOf(Float64Array.of(1), 0)).toThrow(RangeError);
    expect(() => percentileOf(Float64Array.of(1), 101)).toThrow(RangeError);
    expect(() => percentileOf(new Float64Array(0), 50)).toThrow(RangeError);
  });
});
