import fc from 'fast-check';
import type { BandShape } from '#shared/measure/band-shape';
import { bandStretches } from '#shared/measure/band-stretches';

const band = (length_mm: number, stretch_mm?: number): BandShape => ({
  kind: 'band',
  length: { by: 'tape', length_mm },
  height_mm: 100,
  closed: false,
  stretch_mm,
});

describe('The stretches of a band', () => {
  it.each<[string, BandShape, number, number]>([
    ['2,000 in stretches of 600: three, and 200', band(2000, 600), 3, 200],
    ['an exact fit leaves nothing', band(1800, 600), 3, 0],
    ['an exact fit in inches leaves nothing: 247 in by 13 in', band(247 * 25.4, 13 * 25.4), 19, 0],
    ['one shorter than a stretch is all rest', band(300, 600), 0, 300],
    ['one not cut is whole', band(2000), 1, 0],
    ['one of no length has none', band(0), 0, 0],
  ])('%s', (_what, shape, whole, rest_mm) => {
    const stretches = bandStretches(shape);
    expect(stretches.whole).toBe(whole);
    expect(stretches.rest_mm).toBeCloseTo(rest_mm, 9);
  });

  it('always make up the length again, with a rest shorter than a stretch', () => {
    const length = fc.double({ min: 0, max: 99_999, noNaN: true });
    fc.assert(
      fc.property(length, fc.double({ min: 10, max: 9999, noNaN: true }), (length_mm, stretch) => {
        const { whole, stretch_mm, rest_mm } = bandStretches(band(length_mm, stretch));
        expect(Math.abs(whole * stretch_mm + rest_mm - length_mm)).toBeLessThan(0.02);
        expect(rest_mm).toBeLessThan(stretch_mm);
      }),
    );
  });
});
