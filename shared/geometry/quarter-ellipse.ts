import { ellipsePerimeter } from '#shared/geometry/ellipse-perimeter';
import type { Point } from '#shared/geometry/point';

/** A quarter of an ellipse with upright axes, from the end of one semi-axis to the end of the other, about its centre. */
export interface QuarterEllipse {
  readonly from: Point;
  readonly to: Point;
  readonly centre: Point;
}

/** Semi-axes of a quarter-ellipse, across and up, in its unit. */
export const quarterSemiAxes = ({ from, to }: QuarterEllipse): readonly [number, number] => [
  Math.abs(to.x - from.x),
  Math.abs(to.y - from.y),
];

/** Length of a quarter-ellipse, in its unit. */
export const quarterLength = (quarter: QuarterEllipse): number => ellipsePerimeter(...quarterSemiAxes(quarter)) / 4;

// ∫₀¹ √(b² + (a² − b²)u²) du, which is a quarter-ellipse's moment about its centre along semi-axis a, over a (own integration).
function momentOver(a: number, b: number): number {
  if (b === 0) return a / 2;
  const k = Math.sqrt(Math.abs((a - b) * (a + b)));
  if (k <= 1e-9 * Math.max(a, b)) return (a + b) / 2;
  return (a + ((b * b) / k) * (a > b ? Math.asinh(k / b) : Math.asin(Math.min(1, k / b)))) / 2;
}

/** First moment (centroid × length) of a quarter-ellipse about the origin, in the square of its unit. */
export function quarterMoment(quarter: QuarterEllipse): Point {
  const { from, to, centre } = quarter;
  const [across, up] = quarterSemiAxes(quarter);
  const length = quarterLength(quarter);
  const x = from.x === centre.x ? to.x : from.x;
  const y = from.y === centre.y ? to.y : from.y;
  return {
    x: centre.x * length + (x - centre.x) * (across === 0 ? 0 : momentOver(across, up)),
    y: centre.y * length + (y - centre.y) * (up === 0 ? 0 : momentOver(up, across)),
  };
}
