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
    // Girths 0, 0, 960, 0, 0 at steps of 1: no slope counts where the girth is nothing, and none at the crown.
    // S(h) = (4·0 + 2·960 + 4·0)/3 = 640, S(2h) = 2·(4·960)/3 = 2560; the difference over 15 is 128.
    expect(cabriole(4, [0, 0, 960, 0, 0])).toMatchObject({ area_mm2: 640 });
    expect(cabriole(4, [0, 0, 960, 0, 0]).uncertainty_mm2).toBeCloseTo(128, 9);
  });

  it('of no length is nothing', () => {
    expect(cabriole(0, [100, 90, 80])).toMatchObject({ area_mm2: 0, girth_mm: 0, run_mm: 0 });
  });

  it('has a mean girth that gives its area along its run', () => {
    const leg = cabriole(400, waveGirths(9));
    expect((leg.girth_mm ?? 0) * 400).toBeCloseTo(leg.area_mm2, 6);
  });
});
