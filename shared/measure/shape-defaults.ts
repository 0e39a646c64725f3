import type { ClassicalElement } from '#shared/measure/profile-element';
import { noEnds } from '#shared/measure/ends';
import type { Shape, ShapeKind, ShapeOf } from '#shared/measure/shape';

const member = (
  id: string,
  element: ClassicalElement['element'],
  [height_mm, projection_mm]: readonly [number, number],
): ClassicalElement => ({ id, element, height_mm, projection_mm, going: 'out' });

/** A sensible new shape of each kind, sized for a console or cabinet base. */
const starts: { readonly [Kind in ShapeKind]: ShapeOf<Kind> } = {
  rectangle: { kind: 'rectangle', length_mm: 600, height_mm: 150 },
  triangle: { kind: 'triangle', base_mm: 200, height_mm: 100 },
  circle: { kind: 'circle', diameter_mm: 200 },
  ellipse: { kind: 'ellipse', length_mm: 300, height_mm: 200 },
  ring: { kind: 'ring', outerDiameter_mm: 300, innerDiameter_mm: 200 },
  polygon: {
    kind: 'polygon',
    points: [
      { x_mm: 0, y_mm: 0 },
      { x_mm: 200, y_mm: 0 },
      { x_mm: 200, y_mm: 100 },
      { x_mm: 100, y_mm: 150 },
      { x_mm: 0, y_mm: 100 },
    ],
  },
  moulding: {
    kind: 'moulding',
    profile: [
      member('fillet-1', 'fillet', [5, 0]),
      member('ovolo-1', 'ovolo', [20, 20]),
      member('fillet-2', 'fillet', [5, 3]),
    ],
    plan: { form: 'straight', sides_mm: [1000], returns_mm: [] },
    measuredAt: 'back',
    facing: 'outward',
  },
  turned: {
    kind: 'turned',
    profile: [
      member('torus-1', 'torus', [20, 10]),
      member('fillet-1', 'fillet', [4, 2]),
      { ...member('scotia-1', 'scotia', [15, 5]), going: 'in' },
    ],
    radius_mm: 30,
    ends: noEnds,
  },
  'straight-leg': { kind: 'straight-leg', section: 'square', length_mm: 700, top_mm: 60, foot_mm: 40, ends: noEnds },
  cabriole: { kind: 'cabriole', length_mm: 400, girths_mm: [260, 220, 180, 150, 190] },
  stations: {
    kind: 'stations',
    stations: [
      { at_mm: 0, girth_mm: 260 },
      { at_mm: 150, girth_mm: 190 },
      { at_mm: 400, girth_mm: 180 },
    ],
  },
  twisted: {
    kind: 'twisted',
    section: { outline: 'lobed', radius_mm: 25, depth_mm: 10, lobes: 2 },
    length_mm: 600,
    turns: 4,
    hand: 'right',
  },
  helicoid: { kind: 'helicoid', radius_mm: 40, coreRadius_mm: 20, risePerTurn_mm: 120, turns: 4, hand: 'right' },
  sphere: { kind: 'sphere', diameter_mm: 60 },
  'ball-foot': { kind: 'ball-foot', diameter_mm: 80, cutTop_mm: 10, cutBottom_mm: 5, ends: noEnds },
  'bun-foot': { kind: 'bun-foot', diameter_mm: 100, height_mm: 70, cutTop_mm: 8, cutBottom_mm: 4, ends: noEnds },
  torus: { kind: 'torus', centreDiameter_mm: 200, sectionDiameter_mm: 30 },
  cone: { kind: 'cone', bottomDiameter_mm: 80, topDiameter_mm: 60, height_mm: 100, ends: noEnds },
  box: {
    kind: 'box',
    length_mm: 200,
    depth_mm: 200,
    height_mm: 100,
    faces: { top: false, bottom: false, front: true, back: true, left: true, right: true },
  },
  boss: { kind: 'boss', diameter_mm: 80, height_mm: 20 },
  band: { kind: 'band', length: { by: 'tape', length_mm: 2000 }, height_mm: 120, closed: true },
  measured: { kind: 'measured', area_mm2: 100_000, uncertainty_mm2: 10_000, note: '', isTrueSurface: false },
};

/** A sensible new shape of a kind, lengths in mm; a measured area still wants its note. */
export const shapeDefaults = (kind: ShapeKind): Shape => starts[kind];
