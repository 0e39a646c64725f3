import { flatSpans, type FlatSpan } from '#shared/measure/flat-spans';
import type { Opening } from '#shared/measure/opening';
import { openingsArea } from '#shared/measure/openings-area';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';
import type { Complaint } from '#shared/problems/complaint';

const isAtMost = (figure: number, limit: number) => figure <= limit * (1 + 1e-9);

const hasRoom = (face: FlatSpan, opening: FlatSpan) =>
  isAtMost(opening.longest_mm, face.longest_mm) && isAtMost(opening.width_mm, face.width_mm);

// The entry of an opening beside which it is said that it is too much.
const chiefMeasure: Readonly<Record<Opening['shape']['kind'], Complaint['path']>> = {
  rectangle: ['length_mm'],
  triangle: ['base_mm'],
  circle: ['diameter_mm'],
  ellipse: ['length_mm'],
  ring: ['outerDiameter_mm'],
  polygon: ['points', 0, 'x_mm'],
  measured: ['area_mm2'],
};

const beside = ({ shape }: Opening, index: number): Complaint['path'] => [
  'openings',
  index,
  'shape',
  ...chiefMeasure[shape.kind],
];

// A triangle's longest side is not known, so as an opening it is asked for its width alone.
function spanOf({ shape }: Opening): FlatSpan | undefined {
  const span = flatSpans(shape).at(0);
  return span && shape.kind === 'triangle' ? { ...span, longest_mm: Math.max(shape.base_mm, shape.height_mm) } : span;
}

function misfit(faces: readonly FlatSpan[], opening: Opening, index: number): Complaint[] {
  const span = spanOf(opening);
  if (!span || faces.length === 0 || faces.some((face) => hasRoom(face, span))) return [];
  const path = beside(opening, index);
  const longEnough = faces.filter(({ longest_mm }) => isAtMost(span.longest_mm, longest_mm));
  if (longEnough.length === 0) {
    const face_mm = Math.max(...faces.map(({ longest_mm }) => longest_mm));
    return [{ path, code: 'measure-opening-too-long', values: { opening_mm: span.longest_mm, face_mm } }];
  }
  const room_mm = Math.max(...longEnough.map(({ width_mm }) => width_mm));
  return [{ path, code: 'measure-opening-too-wide', values: { opening_mm: span.width_mm, room_mm } }];
}

function tooMuchTogether(shape: Shape, openings: readonly Opening[]): Complaint[] {
  const [area_mm2, openings_mm2] = [surfaceOf(shape).area_mm2, openingsArea(openings)];
  const last = openings.at(-1);
  if (!last || isAtMost(openings_mm2, area_mm2)) return [];
  const path = beside(last, openings.length - 1);
  return [{ path, code: 'measure-openings-too-large', values: { openings_mm2, area_mm2 } }];
}

/**
 * What is wrong with a member's openings, by path from the member: one longer or wider than its flat face, or all together above
 * its developed surface. Lengths in mm, areas in mm²; the shapes taken as already checked.
 */
export function openingComplaints(shape: Shape, openings: readonly Opening[]): Complaint[] {
  const faces = flatSpans(shape);
  const single = openings.flatMap((opening, index) => misfit(faces, opening, index));
  return [...single, ...tooMuchTogether(shape, openings)];
}
