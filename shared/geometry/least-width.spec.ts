import fc from 'fast-check';
import { leastWidth } from '#shared/geometry/least-width';

const at = (...pairs: readonly (readonly [number, number])[]) => pairs.map(([x, y]) => ({ x, y }));

describe('The least width', () => {
  it.each([
    ['of a rectangle is its shorter side', at([0, 0], [860, 0], [860, 150], [0, 150]), 150],
    ['of a triangle is its least height: 3, 4, 5 gives 12/5', at([0, 0], [4, 0], [0, 3]), 2.4],
    ['of a square on its corner is its side', at([0, 1], [1, 0], [2, 1], [1, 2]), Math.SQRT2],
    [
      'of an L is that of its outline: 10 by 10 less a quarter',
      at([0, 0], [10, 0], [10, 5], [5, 5], [5, 10], [0, 10]),
      10,
    ],
    ['of points in a line is nothing', at([0, 0], [1, 1], [3, 3]), 0],
    ['of two is nothing', at([0, 0], [1, 1]), 0],
  ])('%s', (_what, points, width) => {
    expect(leastWidth(points)).toBeCloseTo(width, 9);
  });

  it('is the same however the points are turned', () => {
    const place = fc.record({ x: fc.integer({ min: -500, max: 500 }), y: fc.integer({ min: -500, max: 500 }) });
    fc.assert(
      fc.property(
        fc.array(place, { minLength: 3, maxLength: 12 }),
        fc.double({ min: 0, max: 6, noNaN: true }),
        (points, angle) => {
          const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
          const turned = points.map(({ x, y }) => ({ x: x * cos - y * sin, y: x * sin + y * cos }));
          expect(leastWidth(turned)).toBeCloseTo(leastWidth(points), 6);
        },
      ),
    );
  });
});
