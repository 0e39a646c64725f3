import { arcAngle, arcRadius, type BowedArc } from '#shared/geometry/bowed-arc';
import type { Point } from '#shared/geometry/point';
import { quarterSemiAxes, type QuarterEllipse } from '#shared/geometry/quarter-ellipse';
import type { Stroke } from '#shared/geometry/stroke';
import type { DrawingPoint } from '#shared/measure/drawing/drawing';
import { arcData, lineData, moveData, spot } from '#shared/measure/drawing/polyline-data';

/** Where a curve drawn with y upwards lands on a drawing: as it is, or mirrored about its axis x = 0. */
export type Hand = 'right' | 'left';

/** The place on a drawing, y downwards, of a point with y upwards; mirrored about x = 0 on the left hand, in mm. */
export const placed = ({ x, y }: Point, hand: Hand): DrawingPoint => spot(hand === 'right' ? x : 0 - x, 0 - y);

function bowedData(arc: BowedArc, hand: Hand): string {
  const radius = arcRadius(arc);
  if (radius === Infinity) return lineData(placed(arc.to, hand));
  // A bow to the right of the way, y upwards, is walked anticlockwise.
  return arcData({
    radii_mm: [radius, radius],
    to: placed(arc.to, hand),
    isClockwise: arc.bow > 0 === (hand === 'left'),
    isLong: arcAngle(arc) > Math.PI,
  });
}

function quarterData(quarter: QuarterEllipse, hand: Hand): string {
  const { from, to, centre } = quarter;
  const turn = (from.x - centre.x) * (to.y - centre.y) - (from.y - centre.y) * (to.x - centre.x);
  return arcData({
    radii_mm: quarterSemiAxes(quarter),
    to: placed(to, hand),
    isClockwise: turn < 0 === (hand === 'right'),
  });
}

function onwardData(stroke: Stroke, hand: Hand): string {
  switch (stroke.stroke) {
    case 'line':
      return lineData(placed(stroke.to, hand));
    case 'arc':
      return bowedData(stroke, hand);
    case 'quarter':
      return quarterData(stroke, hand);
  }
}

/** Path data of strokes that follow one another, in mm, y downwards; nothing for none. */
export function strokesData(strokes: readonly Stroke[], hand: Hand = 'right'): string {
  if (strokes.length === 0) return '';
  return [moveData(placed(strokes[0].from, hand)), ...strokes.map((stroke) => onwardData(stroke, hand))].join(' ');
}
