import fc from 'fast-check';
import { planeMapping, type FourPoints } from '#shared/geometry/plane-mapping';
import type { Point } from '#shared/geometry/point';

const four = (...pairs: [number, number][]) => pairs.map(([x, y]): Point => ({ x, y })) as unknown as FourPoints;
const photograph = four([112, 80], [955, 141], [902, 760], [84, 690]);
const panel = four([0, 0], [600, 0], [600, 450], [0, 450]);

describe('A plane mapping', () => {
  it('takes its four points where they belong, and back again', () => {
    const there = planeMapping(photograph, panel);
    const back = planeMapping(panel, photograph);
    photograph.forEach((point, index) => {
      const mapped = there?.(point) ?? { x: NaN, y: NaN };
      expect(mapped.x).toBeCloseTo(panel[index].x, 8);
      expect(mapped.y).toBeCloseTo(panel[index].y, 8);
      expect(back?.(mapped).x).toBeCloseTo(point.x, 8);
    });
  });

  it('keeps a straight line straight', () => {
    const mapping = planeMapping(photograph, panel);
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 0.95, noNaN: true }), (part) => {
        const on = { x: 112 + (902 - 112) * part, y: 80 + (760 - 80) * part };
        const mapped = mapping?.(on) ?? { x: NaN, y: NaN };
        // The diagonal of the photograph lands on the diagonal of the panel, y = 0.75 x.
        expect(mapped.y).toBeCloseTo(0.75 * mapped.x, 6);
      }),
    );
  });

  it('turns, moves and scales like a plain similarity when that is all there is', () => {
    const turned = four([10, 20], [10, 40], [-10, 40], [-10, 20]);
    const mapped = planeMapping(four([0, 0], [10, 0], [10, 10], [0, 10]), turned)?.({ x: 5, y: 2 });
    expect(mapped?.x).toBeCloseTo(6, 9);
    expect(mapped?.y).toBeCloseTo(30, 9);
  });

  it('cannot be found when three of the points are in line', () => {
    expect(planeMapping(four([0, 0], [5, 5], [10, 10], [0, 10]), panel)).toBeUndefined();
  });
});
