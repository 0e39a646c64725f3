/** A point of a plane, in whatever unit its maker uses for both coordinates. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Distance between two points, in their unit. */
export const distance = (from: Point, to: Point): number => Math.hypot(to.x - from.x, to.y - from.y);

/** The point part of the way from one to another (0 the first, 1 the second). */
export const between = (from: Point, to: Point, part: number): Point => ({
  x: from.x + (to.x - from.x) * part,
  y: from.y + (to.y - from.y) * part,
});
