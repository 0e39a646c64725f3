import fc from 'fast-check';
import { ellipsePerimeter } from '#shared/geometry/ellipse-perimeter';

/** Perimeter by chords between very many points, from outside the formula. */
function byChords(a: number, b: number, chords: number): number {
  const at = (step: number) => [
    a * Math.cos((2 * Math.PI * step) / chords),
    b * Math.sin((2 * Math.PI * step) / chords),
  ];
  let sum = 0;
  for (let step = 0; step < chords; step += 1) {
    const [x, y] = at(step);
    const [u, v] = at(step + 1);
    sum += Math.hypot(u - x, v - y);
  }
  return sum;
}

describe('The perimeter of an ellipse', () => {
  it.each([
    ['of a circle of radius 1 is 2π', 1, 1, 6.283185307179586],
    ['with no width is the line there and back', 7, 0, 28],
    ['of nothing is nothing', 0, 0, 0],
    ['does not ask which semi-axis comes first', 1, 10, 40.639741801],
  ])('%s', (_what, a, b, perimeter) => {
    expect(ellipsePerimeter(a, b)).toBeCloseTo(perimeter, 8);
  });

  it('agrees with many short chords', () => {
    for (const [a, b] of [
      [10, 5],
      [10, 1],
      [3, 2.9],
      [100, 0.5],
    ])
      expect(ellipsePerimeter(a, b) / byChords(a, b, 400_000)).toBeCloseTo(1, 8);
  });

  it('stays between the doubled chord of the axes and the sides of the box', () => {
    const axis = fc.double({ min: 1e-6, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(axis, axis, (a, b) => {
        const perimeter = ellipsePerimeter(a, b);
        expect(perimeter).toBeGreaterThanOrEqual(4 * Math.hypot(a, b) * (1 - 1e-12));
        expect(perimeter).toBeLessThanOrEqual(4 * (a + b));
      }),
    );
  });

  it('refuses a negative semi-axis', () => {
    expect(() => ellipsePerimeter(-1, 2)).toThrow(RangeError);
  });
});
