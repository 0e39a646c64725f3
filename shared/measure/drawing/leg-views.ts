import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { boxAround, dimension, madeView } from '#shared/measure/drawing/made-view';
import { ellipseData, polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { taperedElevation } from '#shared/measure/drawing/tapered-elevation';
import { axis, closedOutline } from '#shared/measure/drawing/upright-corners';
import type { CabrioleShape, StationsShape, StraightLegShape } from '#shared/measure/leg-shape';

const octagonPart = Math.tan(Math.PI / 8);

function sectionData(section: StraightLegShape['section'], width_mm: number): string {
  if (section === 'round') return ellipseData(spot(0, 0), [width_mm / 2, width_mm / 2]);
  const corners = section === 'square' ? 4 : 8;
  const radius_mm = width_mm / 2 / Math.cos(Math.PI / corners);
  return polylineData(
    Array.from({ length: corners }, (_, index) => {
      const angle = ((2 * index + 1) * Math.PI) / corners;
      return spot(radius_mm * Math.cos(angle), radius_mm * Math.sin(angle));
    }),
    true,
  );
}

// The larger of head and foot as the outline of the plan, the other within it.
function sectionView({ section, top_mm, foot_mm }: StraightLegShape): DrawingView {
  const half_mm = Math.max(top_mm, foot_mm) / 2;
  const inner = (kind: DrawingPath['kind'], width_mm: number): DrawingPath => ({
    kind,
    data: sectionData(section, width_mm),
  });
  return madeView({
    view: 'plan',
    paths: [
      inner('outline', top_mm),
      ...(foot_mm === top_mm ? [] : [inner(foot_mm < top_mm ? 'hidden' : 'outline', foot_mm)]),
    ],
    dimensions: [dimension(spot(-half_mm, half_mm), spot(half_mm, half_mm), 'below')],
    reach: [spot(-half_mm, -half_mm), spot(half_mm, half_mm)],
  });
}

/** Elevation and plan of a straight leg, in mm. */
export const straightLegViews = (shape: StraightLegShape): DrawingView[] => [
  taperedElevation({
    ...shape,
    height_mm: shape.length_mm,
    ...(shape.section === 'octagonal' ? { arrisPart: octagonPart } : {}),
  }),
  sectionView(shape),
];

/** A member by girths, drawn along its straightened axis as if it were round: each girth as its diameter, its station as a hidden line; in mm. */
export function stationsElevation(shape: CabrioleShape | StationsShape): DrawingView {
  const stations = stationsOf(shape);
  const sides = (sign: 1 | -1) =>
    stations.map(({ at_mm, girth_mm }): DrawingPoint => spot((sign * girth_mm) / (2 * Math.PI), at_mm));
  const [left, right] = [sides(-1), sides(1)];
  const { left_mm, top_mm, height_mm } = boxAround(left);
  return madeView({
    view: 'elevation',
    paths: [
      closedOutline([...right, ...left.toReversed()]),
      ...stations.map((_, index): DrawingPath => ({ kind: 'hidden', data: polylineData([left[index], right[index]]) })),
      axis(spot(0, top_mm), spot(0, top_mm + height_mm)),
    ],
    dimensions: [dimension(spot(left_mm, top_mm), spot(left_mm, top_mm + height_mm), 'left')],
    reach: [...left, ...right],
  });
}

function stationsOf(shape: CabrioleShape | StationsShape): StationsShape['stations'] {
  if (shape.kind === 'stations') return shape.stations;
  const step_mm = shape.length_mm / (shape.girths_mm.length - 1);
  return shape.girths_mm.map((girth_mm, index) => ({ at_mm: index * step_mm, girth_mm }));
}
