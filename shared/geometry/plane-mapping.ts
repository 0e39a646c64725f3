import type { Point } from '#shared/geometry/point';
import { solved } from '#shared/geometry/solved';

/** Four points of a plane. */
export type FourPoints = readonly [Point, Point, Point, Point];

// Each pair of points gives two linear equations in the eight unknowns of x' = (ax + by + c)/(gx + hy + 1), y' = (dx + ey + f)/(…).
const equations = (from: Point, to: Point): [number[], number[]] => [
  [from.x, from.y, 1, 0, 0, 0, -from.x * to.x, -from.y * to.x, to.x],
  [0, 0, 0, from.x, from.y, 1, -from.x * to.y, -from.y * to.y, to.y],
];

/**
 * The plane mapping (homography) that takes four points to four others, as a function of a point, from the one unit to the other;
 * undefined when it cannot be found (three of the points in line). Method: Hartley & Zisserman, Multiple View Geometry, 4.1 (memory).
 */
export function planeMapping(from: FourPoints, to: FourPoints): ((point: Point) => Point) | undefined {
  const found = solved(from.flatMap((point, index) => equations(point, to[index])));
  if (!found) return undefined;
  const [a, b, c, d, e, f, g, h] = found;
  return ({ x, y }) => {
    const depth = g * x + h * y + 1;
    return { x: (a * x + b * y + c) / depth, y: (d * x + e * y + f) / depth };
  };
}
