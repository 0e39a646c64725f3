import type { Point } from '#shared/geometry/point';

type Segment = readonly [Point, Point];

// Which side of the line from → to a point lies on: 1 left, −1 right, 0 on it (within rounding of the products).
function sideOf([from, to]: Segment, point: Point): number {
  const left = (to.x - from.x) * (point.y - from.y);
  const right = (to.y - from.y) * (point.x - from.x);
  return Math.abs(left - right) <= 1e-12 * (Math.abs(left) + Math.abs(right)) ? 0 : Math.sign(left - right);
}

const isWithin = (value: number, one: number, other: number) =>
  value >= Math.min(one, other) && value <= Math.max(one, other);
const isOn = ([from, to]: Segment, point: Point) => isWithin(point.x, from.x, to.x) && isWithin(point.y, from.y, to.y);

function isMeeting(one: Segment, other: Segment): boolean {
  const [a, b] = [sideOf(one, other[0]), sideOf(one, other[1])];
  const [c, d] = [sideOf(other, one[0]), sideOf(other, one[1])];
  if (a * b < 0 && c * d < 0) return true;
  return (
    (a === 0 && isOn(one, other[0])) ||
    (b === 0 && isOn(one, other[1])) ||
    (c === 0 && isOn(other, one[0])) ||
    (d === 0 && isOn(other, one[1]))
  );
}

// Two sides that share a corner meet there anyway; they fold back on each other when they also run the same way from it.
function isFolded(before: Point, corner: Point, after: Point): boolean {
  if (sideOf([before, corner], after) !== 0) return false;
  const ahead = (corner.x - before.x) * (after.x - corner.x) + (corner.y - before.y) * (after.y - corner.y);
  return ahead < 0;
}

/** Whether a closed polygon crosses, touches or folds back upon itself; corners in order, in any unit. */
export function isSelfCrossing(points: readonly Point[]): boolean {
  const count = points.length;
  const sides = points.map((point, index): Segment => [point, points[(index + 1) % count]]);
  return sides.some((side, index) => {
    if (count > 2 && isFolded(side[0], side[1], points[(index + 2) % count])) return true;
    return sides.some((other, place) => {
      const isNeighbour = place <= index + 1 || (index === 0 && place === count - 1);
      return !isNeighbour && isMeeting(side, other);
    });
  });
}
