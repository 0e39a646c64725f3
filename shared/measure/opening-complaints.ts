import { distance } from '#shared/geometry/point';
import type { Opening } from '#shared/measure/opening';
import { openingsArea } from '#shared/measure/openings-area';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';
import type { Complaint } from '#shared/problems/complaint';

// The longest straight line within a flat face; not known for the others, nor for a triangle, whose apex may stand anywhere.
function longestLine(shape: Shape): number | undefined {
  switch (shape.kind) {
    case 'rectangle':
      return Math.hypot(shape.length_mm, shape.height_mm);
    case 'circle':
      return shape.diameter_mm;
    case 'ellipse':
      return Math.max(shape.length_mm, shape.height_mm);
    case 'ring':
      return shape.outerDiameter_mm;
    case 'polygon': {
      const points = shape.points.map(({ x_mm, y_mm }) => ({ x: x_mm, y: y_mm }));
      return Math.max(0, ...points.flatMap((from) => points.map((to) => distance(from, to))));
    }
    default:
      return undefined;
  }
}

function isTooLong(opening: Opening, face_mm: number | undefined): number | undefined {
  const opening_mm = longestLine(opening.shape);
  return opening_mm !== undefined && face_mm !== undefined && opening_mm > face_mm * (1 + 1e-9)
    ? opening_mm
    : undefined;
}

/**
 * What is wrong with a member's openings, by path from the member: one longer than a flat face could hold, or all together above
 * its developed surface. Lengths in mm, areas in mm²; the shapes taken as already checked.
 */
export function openingComplaints(shape: Shape, openings: readonly Opening[]): Complaint[] {
  const face_mm = longestLine(shape);
  const long = openings.flatMap((opening, index): Complaint[] => {
    const opening_mm = isTooLong(opening, face_mm);
    if (opening_mm === undefined) return [];
    return [{ path: ['openings', index, 'shape'], code: 'measure-opening-too-long', values: { opening_mm } }];
  });
  const [area_mm2, openings_mm2] = [surfaceOf(shape).area_mm2, openingsArea(openings)];
  if (openings_mm2 <= area_mm2 * (1 + 1e-9)) return long;
  return [...long, { path: ['openings'], code: 'measure-openings-too-large', values: { openings_mm2, area_mm2 } }];
}
