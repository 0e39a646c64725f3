import fc from 'fast-check';
import { surfaceOf } from '#shared/measure/surface-of';

const cabriole = (length_mm: number, girths_mm: readonly number[]) =>
  surfaceOf({ kind: 'cabriole', length_mm, girths_mm });

const stations = (pairs: readonly (readonly [number, number])[]) =>
  surfaceOf({ kind: 'stations', stations: pairs.map(([at_mm, girth_mm]) => ({ at_mm, girth_mm })) });

/** A leg whose radius swells and shrinks like a wave: 20 + 6·sin(2πs/400), over 400 mm. */
const waveRadius = (at: number) => 20 + 6 * Math.sin((2 * Math.PI * at) / 400);
const waveGirths = (count: number) =>
  Array.from({ length: count }, (_, index) => 2 * Math.PI * waveRadius((400 * index) / (count - 1)));

/** Its surface, by very many frustums. */
function waveArea(): number {
  let sum = 0;
  for (let step = 0; step < 40_000; step += 1) {
    const [r, q] = [waveRadius(step / 100), waveRadius((step + 1) / 100)];
    sum += Math.PI * (r + q) * Math.hypot(q - r, 0.01);
  }
  return sum;
}

describe('A leg by its girths', () => {
  it('of one girth throughout is a straight tube', () => {
    const tube = cabriole(400, [150, 150, 150, 150, 150]);
    expect(tube.area_mm2).toBeCloseTo(60_000, 8);
    expect(tube.uncertainty_mm2).toBeCloseTo(0, 8);
  });

  it('tapering evenly is a frustum: radii 6 and 3, height 4', () => {
    const girths = [12, 9, 6].map((part) => part * Math.PI);
    expect(cabriole(4, girths).area_mm2).toBeCloseTo(141.3716694, 6);
    expect(
      stations([
        [0, girths[0]],
        [2, girths[1]],
        [4, girths[2]],
      ]).area_mm2,
    ).toBeCloseTo(141.3716694, 6);
  });

  it('comes ever closer to the integral, and says how far off it may be', () => {
    const exact = waveArea();
    const errors = [5, 9, 17, 33].map((count) => {
      const leg = cabriole(400, waveGirths(count));
      return { off: Math.abs(leg.area_mm2 - exact), told: leg.uncertainty_mm2 ?? 0 };
    });
    // A whole wave on an even grid is the kindest case for the rule; from nine stations on it is within 1e-4 of the value.
    expect(errors[1].off / exact).toBeLessThan(1e-4);
    expect(errors[2].off / exact).toBeLessThan(1e-5);
    expect(errors[3].off / exact).toBeLessThan(1e-6);
    expect(errors.every(({ off, told }) => off <= 20 * told + 1e-3)).toBe(true);
  });

  it('agrees with itself taken at uneven stations', () => {
    const places = [0, 15, 35, 50, 80, 100, 130, 150, 185, 200, 230, 260, 285, 300, 330, 345, 370, 385, 400];
    const uneven = stations(places.map((at) => [at, 2 * Math.PI * waveRadius(at)]));
    expect(uneven.area_mm2 / waveArea()).toBeCloseTo(1, 4);
  });

  it('tells an uncertainty of |S(h) − S(2h)|/15, worked by hand on level-sided girths', () => {
    // Girths 600, 600, 960, 600, 600 at steps of 1000 m, so long that no slope counts.
    // S(h) = (600 + 4·600 + 2·960 + 4·600 + 600)/3 = 2640 steps, S(2h) = 2·(600 + 4·960 + 600)/3 = 3360; the difference over 15 is 48.
    const leg = cabriole(4e6, [600, 600, 960, 600, 600]);
    expect(leg.area_mm2 / 1e6).toBeCloseTo(2640, 4);
    expect((leg.uncertainty_mm2 ?? 0) / 1e6).toBeCloseTo(48, 4);
  });

  it('of no length is nothing', () => {
    expect(cabriole(0, [100, 90, 80])).toMatchObject({ area_mm2: 0, girth_mm: 0, run_mm: 0 });
  });

  it('has a mean girth that gives its area along its run', () => {
    const leg = cabriole(400, waveGirths(9));
    expect((leg.girth_mm ?? 0) * 400).toBeCloseTo(leg.area_mm2, 6);
  });
});

type Pairs = readonly (readonly [number, number])[];

/** The frusta between stations, each as a round section of its girth. */
const frusta = (pairs: Pairs): number =>
  pairs.slice(1).reduce((sum, [at, girth], index) => {
    const [from, before] = pairs[index];
    return sum + ((girth + before) / 2) * Math.hypot(at - from, (girth - before) / (2 * Math.PI));
  }, 0);

const meanOf = (pairs: Pairs) => stations(pairs).girth_mm ?? NaN;

const spread = fc
  .array(fc.tuple(fc.integer({ min: 1, max: 600 }), fc.integer({ min: 20, max: 600 })), { minLength: 2, maxLength: 9 })
  .map((steps): Pairs => {
    let at_mm = 0;
    return steps.map(([step_mm, girth_mm], index) => [index === 0 ? 0 : (at_mm += step_mm), girth_mm]);
  });

describe('A leg by girths that jump', () => {
  it.each<[string, Pairs]>([
    [
      'a block at the end of a long taper',
      [
        [0, 200],
        [300, 160],
        [640, 130],
        [660, 240],
        [700, 240],
      ],
    ],
    [
      'a long waist and a short foot',
      [
        [0, 240],
        [640, 120],
        [700, 260],
      ],
    ],
    [
      'three stations within the foot',
      [
        [0, 220],
        [650, 130],
        [690, 250],
        [700, 250],
      ],
    ],
    [
      'a short knee and a long taper',
      [
        [0, 300],
        [60, 220],
        [700, 120],
      ],
    ],
    [
      'a block between equal spaces',
      [
        [0, 200],
        [175, 160],
        [350, 130],
        [525, 240],
        [700, 240],
      ],
    ],
  ])('%s: near its frusta, its mean between the girths, and in doubt by less than a sixth', (_what, pairs) => {
    const leg = stations(pairs);
    const girths = pairs.map(([, girth]) => girth);
    expect(Math.abs(leg.area_mm2 / frusta(pairs) - 1)).toBeLessThan(0.03);
    expect(meanOf(pairs)).toBeGreaterThan(Math.min(...girths));
    expect(meanOf(pairs)).toBeLessThan(Math.max(...girths));
    expect((leg.uncertainty_mm2 ?? NaN) / leg.area_mm2).toBeLessThan(1 / 6);
  });

  it('is in doubt where frusta stand for the rule, by hand', () => {
    // Frusta 0…60 and 60…700: 260·√(60² + (80/2π)²) + 170·√(640² + (100/2π)²) = 15 948.5 + 108 833.6 (rounded); one from end to end
    // 210·√(700² + (180/2π)²) = 147 123.1; a third of the difference is 7 447.
    const leg = stations([
      [0, 300],
      [60, 220],
      [700, 120],
    ]);
    expect(leg.area_mm2).toBeCloseTo(124_781, 0);
    expect(leg.uncertainty_mm2).toBeGreaterThanOrEqual(7_440);
  });

  it('at equal spaces so short that the rule would double the area is its frusta', () => {
    const pairs: Pairs = [200, 160, 130, 240, 240].map((girth, index) => [10 * index, girth]);
    const girths = pairs.map(([, girth]) => girth);
    expect(cabriole(40, girths).area_mm2 / frusta(pairs)).toBeCloseTo(1, 9);
  });

  it('is never less than its least girth along its run, and lies near its frusta', () => {
    fc.assert(
      fc.property(spread, (pairs) => {
        const { area_mm2, run_mm = NaN } = stations(pairs);
        const least = Math.min(...pairs.map(([, girth]) => girth));
        expect(area_mm2).toBeGreaterThanOrEqual(least * run_mm * (1 - 1e-9));
        expect(area_mm2 / frusta(pairs)).toBeGreaterThanOrEqual(0.8 - 1e-9);
        expect(area_mm2 / frusta(pairs)).toBeLessThanOrEqual(1.25 + 1e-9);
      }),
      { numRuns: 1000 },
    );
  });

  it('gives four times the area at twice the size', () => {
    fc.assert(
      fc.property(spread, (pairs) => {
        const twice = pairs.map(([at, girth]) => [2 * at, 2 * girth] as const);
        expect(stations(twice).area_mm2 / stations(pairs).area_mm2).toBeCloseTo(4, 9);
      }),
    );
  });

  it('tapering straight is the one frustum, wherever its stations fall', () => {
    fc.assert(
      fc.property(spread, fc.integer({ min: 20, max: 600 }), fc.integer({ min: 20, max: 600 }), (pairs, top, foot) => {
        const run = pairs[pairs.length - 1][0];
        const straight = pairs.map(([at]) => [at, top + ((foot - top) * at) / run] as const);
        const whole = frusta([
          [0, top],
          [run, foot],
        ]);
        expect(stations(straight).area_mm2 / whole).toBeCloseTo(1, 9);
      }),
    );
  });
});
