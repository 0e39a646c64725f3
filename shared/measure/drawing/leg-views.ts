import { cutEdges, cutsRound, edgesInFront } from '#shared/measure/drawing/cut-spans';
import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { boxAround, dimension, madeView } from '#shared/measure/drawing/made-view';
import { legCutParts, octagonPart, legSection } from '#shared/measure/drawing/leg-section';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { taperedElevation } from '#shared/measure/drawing/tapered-elevation';
import { axis, closedOutline, cutLine } from '#shared/measure/drawing/upright-corners';
import type { CabrioleShape, StationsShape, StraightLegShape } from '#shared/measure/leg-shape';

/** Elevation and plan of a straight leg, in mm. */
export const straightLegViews = (shape: StraightLegShape): DrawingView[] => [
  taperedElevation({
    ...shape,
    height_mm: shape.length_mm,
    cutParts: legCutParts(shape),
    ...(shape.section === 'octagonal' ? { arrisPart: octagonPart } : {}),
  }),
  legSection(shape),
];

/** A member by girths, drawn along its straightened axis as if it were round: each girth as its diameter, its station as a hidden line; in mm. */
export function stationsElevation(shape: CabrioleShape | StationsShape): DrawingView {
  const stations = stationsOf(shape);
  const cutPaths = cutPartsOf(shape, stations).map((part) =>
    cutLine(stations.map(({ at_mm, girth_mm }) => spot((part * girth_mm) / (2 * Math.PI), at_mm))),
  );
  const sides = (sign: 1 | -1) =>
    stations.map(({ at_mm, girth_mm }): DrawingPoint => spot((sign * girth_mm) / (2 * Math.PI), at_mm));
  const [left, right] = [sides(-1), sides(1)];
  const { left_mm, top_mm, height_mm } = boxAround(left);
  return madeView({
    view: 'elevation',
    paths: [
      ...cutPaths,
      closedOutline([...right, ...left.toReversed()]),
      ...stations.map((_, index): DrawingPath => ({ kind: 'hidden', data: polylineData([left[index], right[index]]) })),
      axis(spot(0, top_mm), spot(0, top_mm + height_mm)),
    ],
    dimensions: [dimension(spot(left_mm, top_mm), spot(left_mm, top_mm + height_mm), 'left')],
    reach: [...left, ...right],
  });
}

function cutPartsOf({ fluting }: CabrioleShape | StationsShape, stations: StationsShape['stations']): number[] {
  const mean_mm = stations.reduce((sum, { girth_mm }) => sum + girth_mm, 0) / Math.max(1, stations.length);
  return fluting ? edgesInFront(cutEdges(cutsRound(fluting, mean_mm), fluting)) : [];
}

function stationsOf(shape: CabrioleShape | StationsShape): StationsShape['stations'] {
  if (shape.kind === 'stations') return shape.stations;
  const step_mm = shape.length_mm / (shape.girths_mm.length - 1);
  return shape.girths_mm.map((girth_mm, index) => ({ at_mm: index * step_mm, girth_mm }));
}
