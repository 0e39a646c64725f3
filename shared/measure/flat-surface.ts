import { polygonArea } from '#shared/geometry/polygon';
import type {
  CircleShape,
  EllipseShape,
  FlatShape,
  PolygonShape,
  RectangleShape,
  RingShape,
  TriangleShape,
} from '#shared/measure/flat-shape';
import { flutedSurface } from '#shared/measure/fluted-surface';
import { because, girthByRun, madeSurface } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';
import type { Reason } from '#shared/words/reason';

// A face without a run, within its rectangle.
const face = (area_mm2: number, [length, height]: readonly [number, number], reasons: readonly Reason[]): Surface =>
  madeSurface({ area_mm2, bounds_mm: { length, height }, reasons });

const spread = (places: readonly number[]): number => Math.max(...places) - Math.min(...places);

const rectangle = ({ length_mm, height_mm, fluting }: RectangleShape): Surface =>
  flutedSurface(
    girthByRun({
      girth_mm: height_mm,
      run_mm: length_mm,
      courses: [{ length_mm, height_mm, closed: false }],
    }),
    fluting,
  );

// The width of a ring times its middle circumference is its area, so it also is a run round the middle.
const ring = ({ outerDiameter_mm, innerDiameter_mm }: RingShape): Surface =>
  girthByRun({
    girth_mm: (outerDiameter_mm - innerDiameter_mm) / 2,
    run_mm: (Math.PI * (outerDiameter_mm + innerDiameter_mm)) / 2,
    closedRun: true,
  });

function triangle({ base_mm, height_mm }: TriangleShape): Surface {
  const area_mm2 = (base_mm * height_mm) / 2;
  return face(
    area_mm2,
    [base_mm, height_mm],
    [because('measure-triangle', [area_mm2, 'mm2'], { base_mm, half_mm: height_mm / 2 })],
  );
}

function circle({ diameter_mm }: CircleShape): Surface {
  const area_mm2 = (Math.PI / 4) * diameter_mm ** 2;
  const reason = because('measure-circle', [area_mm2, 'mm2'], { radius_mm: diameter_mm / 2 });
  return face(area_mm2, [diameter_mm, diameter_mm], [reason]);
}

function ellipse({ length_mm, height_mm }: EllipseShape): Surface {
  const area_mm2 = (Math.PI / 4) * length_mm * height_mm;
  const values = { length_mm: length_mm / 2, height_mm: height_mm / 2 };
  return face(area_mm2, [length_mm, height_mm], [because('measure-ellipse', [area_mm2, 'mm2'], values)]);
}

// Told as one would work it on paper: from a line through the lowest corner, what lies below the sides going one way, less what lies below those going back.
function polygon({ points }: PolygonShape): Surface {
  const foot_mm = Math.min(...points.map(({ y_mm }) => y_mm));
  const below = points.map(({ x_mm, y_mm }, index) => {
    const next = points[(index + 1) % points.length];
    return ((next.x_mm - x_mm) * (y_mm + next.y_mm - 2 * foot_mm)) / 2;
  });
  const sums = [1, -1].map((way) => below.reduce((sum, each) => sum + Math.max(0, way * each), 0));
  const [back_mm2, out_mm2] = sums.toSorted((one, other) => one - other);
  const bounds = [spread(points.map(({ x_mm }) => x_mm)), spread(points.map(({ y_mm }) => y_mm))] as const;
  return face(polygonArea(points.map(({ x_mm, y_mm }) => ({ x: x_mm, y: y_mm }))), bounds, [
    because('measure-outline-out', [out_mm2, 'mm2']),
    ...(back_mm2 > 0 ? [because('measure-outline-back', [back_mm2, 'mm2'])] : []),
  ]);
}

/** The surface of a flat face, in mm and mm²; a rectangle is laid by courses and has a run along its length, a ring one round its middle. */
export function flatSurface(shape: FlatShape): Surface {
  switch (shape.kind) {
    case 'rectangle':
      return rectangle(shape);
    case 'triangle':
      return triangle(shape);
    case 'circle':
      return circle(shape);
    case 'ellipse':
      return ellipse(shape);
    case 'ring':
      return ring(shape);
    case 'polygon':
      return polygon(shape);
  }
}
