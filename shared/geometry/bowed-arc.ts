import { between, distance, type Point } from '#shared/geometry/point';

/**
 * A circular arc from one point to another over a chord, with a rise in the middle: positive to the right of the way from the one
 * to the other (y upwards), negative to the left.
 */
export interface BowedArc {
  readonly from: Point;
  readonly to: Point;
  readonly bow: number;
}

// A rise this small a share of the chord is a straight line in double precision.
const isStraight = ({ from, to, bow }: BowedArc) => Math.abs(bow) <= 1e-9 * distance(from, to);

/** Radius of the circle an arc belongs to, in its unit; infinite for a straight one. */
export function arcRadius(arc: BowedArc): number {
  const half = distance(arc.from, arc.to) / 2;
  return isStraight(arc) ? Infinity : (half * half + arc.bow * arc.bow) / (2 * Math.abs(arc.bow));
}

/** Angle an arc turns through, in radians, never negative: 4·atan(rise ÷ half chord). */
export const arcAngle = ({ from, to, bow }: BowedArc): number =>
  bow === 0 ? 0 : 4 * Math.atan2(Math.abs(bow), distance(from, to) / 2);

/** Length of an arc, in its unit. */
export const arcLength = (arc: BowedArc): number =>
  isStraight(arc) ? distance(arc.from, arc.to) : arcRadius(arc) * arcAngle(arc);

// A unit step from the chord towards the side the arc bows to.
function bowDirection({ from, to, bow }: BowedArc): Point {
  const chord = distance(from, to);
  const sign = bow < 0 ? -1 : 1;
  return chord === 0 ? { x: 0, y: 0 } : { x: (sign * (to.y - from.y)) / chord, y: (-sign * (to.x - from.x)) / chord };
}

const beside = (arc: BowedArc, offset: number): Point => {
  const middle = between(arc.from, arc.to, 0.5);
  const direction = bowDirection(arc);
  return { x: middle.x + offset * direction.x, y: middle.y + offset * direction.y };
};

/** Centre of the circle an arc belongs to; undefined for a straight one. */
export const arcCentre = (arc: BowedArc): Point | undefined =>
  isStraight(arc) ? undefined : beside(arc, Math.abs(arc.bow) - arcRadius(arc));

/** Centroid of an arc as a curve: on its middle line, r·sin(α)/α from the centre for the half angle α (any mechanics text). */
export function arcCentroid(arc: BowedArc): Point {
  const half = arcAngle(arc) / 2;
  if (half < 1e-3) return beside(arc, (2 / 3) * Math.abs(arc.bow));
  return beside(arc, arcRadius(arc) * (Math.sin(half) / half - Math.cos(half)));
}

/** The furthest points an arc reaches to the four sides: its ends, and those of the circle's four extremes that lie on it. */
export function arcReach(arc: BowedArc): Point[] {
  const centre = arcCentre(arc);
  if (!centre) return [arc.from, arc.to];
  const radius = arcRadius(arc);
  const middle = beside(arc, Math.abs(arc.bow));
  const extremes = [0, 1, 2, 3].map((quarter) => ({
    x: centre.x + radius * [1, 0, -1, 0][quarter],
    y: centre.y + radius * [0, 1, 0, -1][quarter],
  }));
  const nearest = distance(arc.from, middle) * (1 + 1e-12);
  return [arc.from, arc.to, ...extremes.filter((point) => distance(point, middle) <= nearest)];
}
