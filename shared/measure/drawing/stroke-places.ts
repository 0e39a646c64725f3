import { arcAngle, arcCentre, type BowedArc } from '#shared/geometry/bowed-arc';
import { between, type Point } from '#shared/geometry/point';
import type { QuarterEllipse } from '#shared/geometry/quarter-ellipse';
import type { Stroke } from '#shared/geometry/stroke';

const steps = 24;

function onArc(arc: BowedArc, part: number): Point {
  const centre = arcCentre(arc);
  if (!centre) return between(arc.from, arc.to, part);
  // A bow to the right of the way, y upwards, is walked anticlockwise.
  const angle = part * arcAngle(arc) * Math.sign(arc.bow);
  const [x, y] = [arc.from.x - centre.x, arc.from.y - centre.y];
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  return { x: centre.x + x * cos - y * sin, y: centre.y + x * sin + y * cos };
}

// The two semi-axes of the quarter stand upright, so it is their circle pulled in two directions.
function onQuarter({ from, to, centre }: QuarterEllipse, part: number): Point {
  const [cos, sin] = [Math.cos((part * Math.PI) / 2), Math.sin((part * Math.PI) / 2)];
  return {
    x: centre.x + (from.x - centre.x) * cos + (to.x - centre.x) * sin,
    y: centre.y + (from.y - centre.y) * cos + (to.y - centre.y) * sin,
  };
}

function onStroke(stroke: Stroke, part: number): Point {
  if (stroke.stroke === 'arc') return onArc(stroke, part);
  return stroke.stroke === 'quarter' ? onQuarter(stroke, part) : between(stroke.from, stroke.to, part);
}

/** Places along strokes that follow one another, close enough together to draw them, in their unit; ends included. */
export const strokePlaces = (strokes: readonly Stroke[]): Point[] =>
  strokes.flatMap((stroke, index) => {
    const count = stroke.stroke === 'line' ? 1 : steps;
    const places = Array.from({ length: count + 1 }, (_, step) => onStroke(stroke, step / count));
    return index === 0 ? places : places.slice(1);
  });
