import type { BandShape } from '#shared/measure/band-shape';
import { bandLength, bandSides, bandStretches } from '#shared/measure/band-stretches';
import type { DrawingDimension, DrawingPath, DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { uprightCuts } from '#shared/measure/drawing/flat-face';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { closedOutline, overallDimensions, uprightCorners } from '#shared/measure/drawing/upright-corners';

const upright = (kind: DrawingPath['kind'], at_mm: number, height_mm: number): DrawingPath => ({
  kind,
  data: polylineData([spot(at_mm, 0), spot(at_mm, height_mm)]),
});

// Where the parts of a built-up length meet, the two ends left out.
function joints(shape: BandShape): number[] {
  let reached_mm = 0;
  return bandSides(shape.length)
    .slice(0, -1)
    .map((side_mm) => (reached_mm += side_mm));
}

function stretchDimensions({ whole, stretch_mm, rest_mm }: ReturnType<typeof bandStretches>): DrawingDimension[] {
  if (whole === 0) return [];
  const cut_mm = whole * stretch_mm;
  return [
    dimension(spot(0, 0), spot(stretch_mm, 0), 'above'),
    ...(rest_mm > 0 ? [dimension(spot(cut_mm, 0), spot(cut_mm + rest_mm, 0), 'above')] : []),
  ];
}

/** A rim unrolled, with the cuts between its stretches and the joints of its parts (hidden), in mm. */
export function bandView(shape: BandShape): DrawingView {
  const [length_mm, { height_mm }] = [bandLength(shape.length), shape];
  const stretches = bandStretches(shape);
  const cuts = Array.from({ length: stretches.whole }, (_, index) => (index + 1) * stretches.stretch_mm);
  const corners = uprightCorners(length_mm, height_mm);
  return madeView({
    view: 'unrolled',
    paths: [
      closedOutline(corners),
      ...uprightCuts(shape.fluting, length_mm, height_mm),
      ...cuts.filter((at_mm) => at_mm < length_mm - 1e-3).map((at_mm) => upright('outline', at_mm, height_mm)),
      ...joints(shape).map((at_mm) => upright('hidden', at_mm, height_mm)),
    ],
    dimensions: [...overallDimensions(length_mm, height_mm), ...(shape.stretch_mm ? stretchDimensions(stretches) : [])],
    reach: corners,
  });
}
