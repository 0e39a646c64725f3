import { arcCentroid, arcLength, arcReach, type BowedArc } from '#shared/geometry/bowed-arc';
import { between, distance, type Point } from '#shared/geometry/point';
import { quarterLength, quarterMoment, type QuarterEllipse } from '#shared/geometry/quarter-ellipse';

/** A piece of a drawn curve in one unit, y upwards: a straight line, a circular arc or a quarter-ellipse. */
export type Stroke =
  | { readonly stroke: 'line'; readonly from: Point; readonly to: Point }
  | ({ readonly stroke: 'arc' } & BowedArc)
  | ({ readonly stroke: 'quarter' } & QuarterEllipse);

const times = (point: Point, factor: number): Point => ({ x: point.x * factor, y: point.y * factor });

/** Length of a stroke, in its unit. */
export function strokeLength(stroke: Stroke): number {
  switch (stroke.stroke) {
    case 'line':
      return distance(stroke.from, stroke.to);
    case 'arc':
      return arcLength(stroke);
    case 'quarter':
      return quarterLength(stroke);
  }
}

/** First moment (centroid × length) of a stroke about the origin, in the square of its unit. */
export function strokeMoment(stroke: Stroke): Point {
  switch (stroke.stroke) {
    case 'line':
      return times(between(stroke.from, stroke.to, 0.5), strokeLength(stroke));
    case 'arc':
      return times(arcCentroid(stroke), strokeLength(stroke));
    case 'quarter':
      return quarterMoment(stroke);
  }
}

/** Points between which a stroke lies, to find how far it reaches. */
export const strokeReach = (stroke: Stroke): readonly Point[] =>
  stroke.stroke === 'arc' ? arcReach(stroke) : [stroke.from, stroke.to];
