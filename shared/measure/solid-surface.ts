import { spheroidRadiusAt, spheroidZoneArea, type Spheroid } from '#shared/geometry/spheroid-zone-area';
import { flutedSurface } from '#shared/measure/fluted-surface';
import { because, girthByRun, madeSurface, steppedSurface } from '#shared/measure/made-surface';
import type {
  BallFootShape,
  BossShape,
  BoxFace,
  BoxShape,
  BunFootShape,
  ConeShape,
  SolidShape,
  SphereShape,
  TorusShape,
} from '#shared/measure/solid-shape';
import { boxFaces } from '#shared/measure/solid-shape';
import type { Course, Surface } from '#shared/measure/surface';
import { surfaceWithEnds } from '#shared/measure/surface-with-ends';
import type { Reason } from '#shared/words/reason';

const circleArea = (diameter_mm: number) => (Math.PI / 4) * diameter_mm ** 2;
const round = (area_mm2: number, reasons: readonly Reason[]) => steppedSurface(area_mm2, reasons, 'patches');

function sphere({ diameter_mm }: SphereShape): Surface {
  const area_mm2 = Math.PI * diameter_mm ** 2;
  return round(area_mm2, [because('measure-ball', [area_mm2, 'mm2'], { diameter_mm })]);
}

function boss({ diameter_mm, height_mm }: BossShape): Surface {
  const [base_mm2, rise_mm2] = [circleArea(diameter_mm), Math.PI * height_mm ** 2];
  return round(base_mm2 + rise_mm2, [
    because('measure-circle', [base_mm2, 'mm2'], { radius_mm: diameter_mm / 2 }),
    because('measure-boss-rise', [rise_mm2, 'mm2'], { height_mm }),
  ]);
}

// A zone of a ball is told whole; a flattened or lengthened body by how much its surface differs from that.
function zoneReasons({ radius, halfHeight }: Spheroid, height_mm: number, area_mm2: number): Reason[] {
  const diameter_mm = 2 * radius;
  const ball_mm2 = Math.PI * diameter_mm * height_mm;
  const ball = because('measure-ball-zone', [ball_mm2, 'mm2'], { diameter_mm, height_mm });
  if (radius === halfHeight || ball_mm2 === 0) return [ball];
  const values = { diameter_mm, height_mm: 2 * halfHeight };
  return [ball, because('measure-spheroid', [area_mm2 / ball_mm2, 'factor'], values)];
}

function foot(shape: BallFootShape | BunFootShape, body: Spheroid): Surface {
  const bottom_mm = shape.cutBottom_mm - body.halfHeight;
  // Cut away to the last hair, the top may come out below the bottom by a rounding.
  const limits = [bottom_mm, Math.max(bottom_mm, body.halfHeight - shape.cutTop_mm)] as const;
  const [bottom_mm2, top_mm2] = limits.map((height) => circleArea(2 * spheroidRadiusAt(body, height)));
  const area_mm2 = spheroidZoneArea(body, limits);
  const sides = round(area_mm2, zoneReasons(body, limits[1] - limits[0], area_mm2));
  return surfaceWithEnds(sides, shape.ends, [top_mm2, bottom_mm2]);
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
  const faces = boxFaces.filter((face) => shape.faces[face]).map((face) => ({ face, course: faceOf(shape, face) }));
  const courses = faces.map(({ course }) => course);
  return madeSurface({
    area_mm2: courses.reduce((sum, { length_mm, height_mm }) => sum + length_mm * height_mm, 0),
    courses,
    reasons: faces.map(({ face, course: { length_mm, height_mm } }) =>
      because('measure-face', [length_mm * height_mm, 'mm2'], { face, length_mm, height_mm }),
    ),
  });
}

/** The surface of a solid in mm and mm², with the ends or faces that were chosen (mensuration of solids, ICS Building Trades Pocketbook). */
export function solidSurface(shape: SolidShape): Surface {
  switch (shape.kind) {
    case 'sphere':
      return sphere(shape);
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
      return boss(shape);
  }
}
