import fc from 'fast-check';
import type { Point } from '#shared/geometry/point';
import { polygonArea, polygonPerimeter, signedDoubleArea } from '#shared/geometry/polygon';
import { isSelfCrossing } from '#shared/geometry/self-crossing';

const points = (...pairs: [number, number][]): Point[] => pairs.map(([x, y]) => ({ x, y }));
const square = points([0, 0], [10, 0], [10, 10], [0, 10]);

describe('A polygon', () => {
  it.each<[string, Point[], number, number]>([
    ['a square of 10', square, 100, 40],
    ['a right-angled triangle of 3, 4, 5', points([0, 0], [4, 0], [0, 3]), 6, 12],
    ['an L of three squares of 10', points([0, 0], [20, 0], [20, 10], [10, 10], [10, 20], [0, 20]), 300, 80],
    ['no corners at all', [], 0, 0],
  ])('%s', (_what, corners, area, perimeter) => {
    expect(polygonArea(corners)).toBe(area);
    expect(polygonPerimeter(corners)).toBe(perimeter);
  });

  it('runs anticlockwise when its signed area is positive', () => {
    expect(signedDoubleArea(square)).toBe(200);
    expect(signedDoubleArea([...square].reverse())).toBe(-200);
  });

  it('keeps its area wherever it lies', () => {
    const shift = fc.integer({ min: -10_000, max: 10_000 });
    fc.assert(
      fc.property(shift, shift, (x, y) => {
        expect(polygonArea(square.map((corner) => ({ x: corner.x + x, y: corner.y + y })))).toBe(100);
      }),
    );
  });
});

describe('A polygon crosses itself', () => {
  it.each<[string, Point[], boolean]>([
    ['a square does not', square, false],
    ['a bow tie does', points([0, 0], [10, 10], [10, 0], [0, 10]), true],
    ['a star of five points does', points([0, 9], [6, -8], [-9, 3], [9, 3], [-6, -8]), true],
    ['a hollow corner alone does not', points([0, 0], [10, 0], [5, 2], [10, 10], [0, 10]), false],
    ['a corner that touches another side does', points([0, 0], [10, 0], [10, 10], [5, 0], [0, 10]), true],
    ['a side folded back on the one before does', points([0, 0], [10, 0], [4, 0], [4, 5]), true],
    ['a corner in the middle of a straight side does not', points([0, 0], [5, 0], [10, 0], [10, 10], [0, 10]), false],
    ['the same corner twice, apart, does', points([0, 0], [10, 0], [10, 10], [0, 0], [0, 10]), true],
    ['a triangle does not', points([0, 0], [4, 0], [0, 3]), false],
    ['a flat triangle does', points([0, 0], [4, 0], [2, 0]), true],
  ])('%s', (_what, corners, crosses) => {
    expect(isSelfCrossing(corners)).toBe(crosses);
    expect(isSelfCrossing([...corners].reverse())).toBe(crosses);
  });

  it('never, when its corners lie on a circle in order', () => {
    fc.assert(
      fc.property(fc.uniqueArray(fc.integer({ min: 0, max: 359 }), { minLength: 3, maxLength: 12 }), (degrees) => {
        const corners = [...degrees]
          .sort((a, b) => a - b)
          .map((angle) => ({ x: Math.cos((angle * Math.PI) / 180), y: Math.sin((angle * Math.PI) / 180) }));
        expect(isSelfCrossing(corners)).toBe(false);
      }),
    );
  });
});
