import type { DrawingBox, DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { flatCorners } from '#shared/measure/drawing/flat-face';
import { boxAround } from '#shared/measure/drawing/made-view';
import { ellipseData, polylineData, spot } from '#shared/measure/drawing/polyline-data';
import type { FlatShape } from '#shared/measure/flat-shape';
import type { Opening } from '#shared/measure/opening';

/** So many are drawn at most: more are a pattern, which one cannot tell apart on paper. */
const most = 100;

type Pair = readonly [number, number];

function diametersOf(shape: FlatShape): readonly Pair[] {
  switch (shape.kind) {
    case 'circle':
      return [[shape.diameter_mm, shape.diameter_mm]];
    case 'ellipse':
      return [[shape.length_mm, shape.height_mm]];
    case 'ring':
      return [shape.outerDiameter_mm, shape.innerDiameter_mm].map((diameter): Pair => [diameter, diameter]);
    default:
      return [];
  }
}

/** How much room a flat figure takes upright, in mm. */
export function flatBox(shape: FlatShape): Pick<DrawingBox, 'width_mm' | 'height_mm'> {
  const [round] = diametersOf(shape);
  return round ? { width_mm: round[0], height_mm: round[1] } : boxAround(flatCorners(shape));
}

function dashed(shape: FlatShape, centre: DrawingPoint): DrawingPath {
  const { width_mm, height_mm } = flatBox(shape);
  const [left, top] = [centre.x_mm - width_mm / 2, centre.y_mm - height_mm / 2];
  const corners = flatCorners(shape).map(({ x_mm, y_mm }) => spot(x_mm + left, y_mm + top));
  const rounds = diametersOf(shape).map(([across, up]) => ellipseData(centre, [across / 2, up / 2]));
  return { kind: 'opening', data: [polylineData(corners, true), ...rounds].filter(Boolean).join(' ') };
}

/** The middles of openings with as much between two as at the ends, along the longer way of a face; none where they do not fit in a row. */
function middles(shapes: readonly FlatShape[], box: DrawingBox): DrawingPoint[] {
  const isWide = box.width_mm >= box.height_mm;
  const [along, across] = isWide ? (['width_mm', 'height_mm'] as const) : (['height_mm', 'width_mm'] as const);
  const boxes = shapes.map(flatBox);
  const between_mm = (box[along] - boxes.reduce((sum, one) => sum + one[along], 0)) / (shapes.length + 1);
  if (between_mm < 0 || boxes.some((one) => one[across] > box[across])) return [];
  let reached_mm = 0;
  return boxes.map((one) => {
    const at_mm = reached_mm + between_mm + one[along] / 2;
    reached_mm = at_mm + one[along] / 2;
    const middle_mm = box[across] / 2;
    return isWide
      ? spot(box.left_mm + at_mm, box.top_mm + middle_mm)
      : spot(box.left_mm + middle_mm, box.top_mm + at_mm);
  });
}

/** The openings of a flat face, dashed and evenly spaced along its middle, in mm: nobody says where they are. None where they do not fit so. */
export function faceOpenings({ view, box }: DrawingView, openings: readonly Opening[]): DrawingPath[] {
  const count = openings.reduce((sum, opening) => sum + opening.count, 0);
  if ((view !== 'face' && view !== 'unrolled') || count > most) return [];
  const shapes = openings.flatMap(({ shape, count: alike }) =>
    shape.kind === 'measured' ? [] : Array.from({ length: alike }, () => shape),
  );
  return middles(shapes, box).map((middle, index) => dashed(shapes[index], middle));
}
