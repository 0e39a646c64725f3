import fc from 'fast-check';
import { gaussLegendre } from '#shared/geometry/gauss-legendre';
import { simpson, simpsonOf } from '#shared/geometry/simpson';
import { slopesAt } from '#shared/geometry/slopes-at';
import { unevenSimpson } from '#shared/geometry/uneven-simpson';

describe('Simpson’s rule', () => {
  it('is exact for a cubic: x³ from 0 to 2 is 4', () => {
    expect(simpsonOf((x) => x ** 3, [0, 2], 2)).toBeCloseTo(4, 12);
  });

  it.each([[[1, 2]], [[1, 2, 3, 4]], [[5]]])(
    'refuses %j, which is not an odd number of values from three',
    (values) => {
      expect(() => simpson(values, 1)).toThrow(RangeError);
    },
  );
});

describe('The uneven Simpson’s rule', () => {
  const parabola = (places: readonly number[]) => places.map((at) => ({ at, value: 3 * at * at + 2 * at + 1 }));

  // ∫ 3x² + 2x + 1 from 0 to 5 is 125 + 25 + 5.
  it.each([
    ['two intervals', [0, 1, 5]],
    ['three, the last one by itself', [0, 1, 2.5, 5]],
    ['four', [0, 0.1, 2, 4.9, 5]],
    ['five', [0, 1, 1.5, 3, 4, 5]],
  ])('is exact for a parabola over %s', (_what, places) => {
    expect(unevenSimpson(parabola(places))).toBeCloseTo(155, 9);
  });

  it.each([
    ['two samples are a trapezium', [0, 4], [1, 3], 8],
    ['one sample is nothing', [2], [9], 0],
    ['none is nothing', [], [], 0],
  ])('%s', (_what, places, values, area) => {
    expect(unevenSimpson(places.map((at, index) => ({ at, value: values[index] })))).toBeCloseTo(area, 12);
  });

  it('gives on even spaces what the even rule gives', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 500 }), { minLength: 3, maxLength: 21 }), (raw) => {
        const values = raw.length % 2 === 0 ? raw.slice(1) : raw;
        const uneven = unevenSimpson(values.map((value, index) => ({ at: index * 7, value })));
        expect(uneven).toBeCloseTo(simpson(values, 7), 6);
      }),
    );
  });

  it('refuses places that do not rise', () => {
    expect(() =>
      unevenSimpson([
        { at: 0, value: 1 },
        { at: 0, value: 1 },
      ]),
    ).toThrow(RangeError);
  });
});

describe('Slopes at samples', () => {
  it('are exact for a quartic on uneven places', () => {
    const places = [0, 0.4, 1, 1.7, 2, 3];
    const slopes = slopesAt(places.map((at) => ({ at, value: at ** 4 - 2 * at })));
    // 4x³ − 2 at each place, by hand.
    [-2, -1.744, 2, 17.652, 30, 106].forEach((slope, index) => expect(slopes[index]).toBeCloseTo(slope, 9));
  });

  it.each([
    ['one sample is level', [3], [0]],
    ['two are joined by a line', [1, 5], [4, 4]],
  ])('%s', (_what, values, slopes) => {
    expect(slopesAt(values.map((value, at) => ({ at, value })))).toEqual(slopes);
  });
});

describe('Gauss–Legendre', () => {
  it.each<[string, (x: number) => number, [number, number], number]>([
    ['sin from 0 to π is 2', Math.sin, [0, Math.PI], 2],
    ['1/x from 1 to e is 1', (x) => 1 / x, [1, Math.E], 1],
    ['x¹⁵ from 0 to 1 is 1/16, in a single panel', (x) => x ** 15, [0, 1], 0.0625],
  ])('%s', (_what, curve, limits, integral) => {
    expect(gaussLegendre(curve, limits, integral === 0.0625 ? 1 : 4)).toBeCloseTo(integral, 12);
  });
});
