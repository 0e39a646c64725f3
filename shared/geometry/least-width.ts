import type { Point } from '#shared/geometry/point';

// How far the points reach across a line from one of them to another, in their unit.
function widthAcross(points: readonly Point[], [from, to]: readonly [Point, Point]): number {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const offsets = points.map(({ x, y }) => ((to.x - from.x) * (y - from.y) - (to.y - from.y) * (x - from.x)) / length);
  return Math.max(...offsets) - Math.min(...offsets);
}

// The corners of the convex outline round points (Andrew’s monotone chain, Information Processing Letters 9, 1979).
function convexOutline(points: readonly Point[]): Point[] {
  const sorted = [...points].sort((a, b) => a.x - b.x || a.y - b.y);
  const chain = (some: readonly Point[]): Point[] => {
    const kept: Point[] = [];
    for (const point of some) {
      while (kept.length > 1 && turn(kept[kept.length - 2], kept[kept.length - 1], point) <= 0) kept.pop();
      kept.push(point);
    }
    return kept.slice(0, -1);
  };
  return [...chain(sorted), ...chain(sorted.reverse())];
}

const turn = (from: Point, by: Point, to: Point): number =>
  (by.x - from.x) * (to.y - from.y) - (by.y - from.y) * (to.x - from.x);

/**
 * The least distance between two parallel lines that hold all the points, in their unit: one of the lines runs along a side of their
 * convex outline (Houle and Toussaint, IEEE Transactions on Pattern Analysis and Machine Intelligence 10, 1988). 0 for fewer than three.
 */
export function leastWidth(points: readonly Point[]): number {
  const outline = convexOutline(points);
  if (outline.length < 3) return 0;
  return Math.min(...outline.map((from, index) => widthAcross(outline, [from, outline[(index + 1) % outline.length]])));
}
