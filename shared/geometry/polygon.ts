import { distance, type Point } from '#shared/geometry/point';

/** Twice the area the points run round, positive when they run anticlockwise with y upwards, in the square of their unit. */
export const signedDoubleArea = (points: readonly Point[]): number =>
  points.reduce((sum, { x, y }, index) => {
    const next = points[(index + 1) % points.length];
    return sum + (x * next.y - next.x * y);
  }, 0);

/** Area of a polygon that does not cross itself, by the corners in order, in the square of their unit (the surveyor's formula). */
export const polygonArea = (points: readonly Point[]): number => Math.abs(signedDoubleArea(points)) / 2;

/** Length round a polygon, from the last corner back to the first, in its unit. */
export const polygonPerimeter = (points: readonly Point[]): number =>
  points.reduce((sum, point, index) => sum + distance(point, points[(index + 1) % points.length]), 0);
