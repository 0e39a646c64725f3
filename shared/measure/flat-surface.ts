import { polygonArea } from '#shared/geometry/polygon';
import type { FlatShape, RectangleShape, RingShape } from '#shared/measure/flat-shape';
import { flutedSurface } from '#shared/measure/fluted-surface';
import { girthByRun, madeSurface } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';

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

/** The surface of a flat face, in mm and mm²; a rectangle is laid by courses and has a run along its length, a ring one round its middle. */
export function flatSurface(shape: FlatShape): Surface {
  switch (shape.kind) {
    case 'rectangle':
      return rectangle(shape);
    case 'triangle':
      return madeSurface({ area_mm2: (shape.base_mm * shape.height_mm) / 2 });
    case 'circle':
      return madeSurface({ area_mm2: (Math.PI / 4) * shape.diameter_mm ** 2 });
    case 'ellipse':
      return madeSurface({ area_mm2: (Math.PI / 4) * shape.length_mm * shape.height_mm });
    case 'ring':
      return ring(shape);
    case 'polygon':
      return madeSurface({ area_mm2: polygonArea(shape.points.map(({ x_mm, y_mm }) => ({ x: x_mm, y: y_mm }))) });
  }
}
