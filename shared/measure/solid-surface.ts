import { spheroidRadiusAt, spheroidZoneArea, type Spheroid } from '#shared/geometry/spheroid-zone-area';
import { flutedSurface } from '#shared/measure/fluted-surface';
import { girthByRun, madeSurface } from '#shared/measure/made-surface';
import type {
  BallFootShape,
  BoxFace,
  BoxShape,
  BunFootShape,
  ConeShape,
  SolidShape,
  TorusShape,
} from '#shared/measure/solid-shape';
import { boxFaces } from '#shared/measure/solid-shape';
import type { Course, Surface } from '#shared/measure/surface';
import { surfaceWithEnds } from '#shared/measure/surface-with-ends';

const circleArea = (diameter_mm: number) => (Math.PI / 4) * diameter_mm ** 2;
const round = (area_mm2: number) => madeSurface({ area_mm2, laying: 'patches' });

function foot(shape: BallFootShape | BunFootShape, body: Spheroid): Surface {
  const limits = [shape.cutBottom_mm - body.halfHeight, body.halfHeight - shape.cutTop_mm] as const;
  const [bottom_mm2, top_mm2] = limits.map((height) => circleArea(2 * spheroidRadiusAt(body, height)));
  return surfaceWithEnds(round(spheroidZoneArea(body, limits)), shape.ends, [top_mm2, bottom_mm2]);
}

const torus = ({ centreDiameter_mm, sectionDiameter_mm }: TorusShape): Surface =>
  girthByRun({
    girth_mm: Math.PI * sectionDiameter_mm,
    run_mm: Math.PI * centreDiameter_mm,
    closedRun: true,
    laying: 'patches',
    finish: 'moulded',
  });

function cone({ bottomDiameter_mm, topDiameter_mm, height_mm, ends, fluting }: ConeShape): Surface {
  const sides = girthByRun({
    girth_mm: Math.hypot(height_mm, (bottomDiameter_mm - topDiameter_mm) / 2),
    run_mm: (Math.PI * (bottomDiameter_mm + topDiameter_mm)) / 2,
    closedRun: true,
  });
  return surfaceWithEnds(flutedSurface(sides, fluting), ends, [
    circleArea(topDiameter_mm),
    circleArea(bottomDiameter_mm),
  ]);
}

const faceOf = ({ length_mm, depth_mm, height_mm }: BoxShape, face: BoxFace): Course => {
  if (face === 'top' || face === 'bottom') return { length_mm, height_mm: depth_mm, closed: false };
  return { length_mm: face === 'left' || face === 'right' ? depth_mm : length_mm, height_mm, closed: false };
};

function box(shape: BoxShape): Surface {
  const courses = boxFaces.filter((face) => shape.faces[face]).map((face) => faceOf(shape, face));
  return madeSurface({
    area_mm2: courses.reduce((sum, { length_mm, height_mm }) => sum + length_mm * height_mm, 0),
    courses,
  });
}

/** The surface of a solid in mm and mm², with the ends or faces that were chosen (mensuration of solids, ICS Building Trades Pocketbook). */
export function solidSurface(shape: SolidShape): Surface {
  switch (shape.kind) {
    case 'sphere':
      return round(Math.PI * shape.diameter_mm ** 2);
    case 'ball-foot':
      return foot(shape, { radius: shape.diameter_mm / 2, halfHeight: shape.diameter_mm / 2 });
    case 'bun-foot':
      return foot(shape, { radius: shape.diameter_mm / 2, halfHeight: shape.height_mm / 2 });
    case 'torus':
      return torus(shape);
    case 'cone':
      return cone(shape);
    case 'box':
      return box(shape);
    case 'boss':
      return round(circleArea(shape.diameter_mm) + Math.PI * shape.height_mm ** 2);
  }
}
