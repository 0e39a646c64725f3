import { strokeReach } from '#shared/geometry/stroke';
import { cutEdges, cutsRound, edgesInFront } from '#shared/measure/drawing/cut-spans';
import type { DrawingPath, DrawingView } from '#shared/measure/drawing/drawing';
import { boxAround, dimension, madeView } from '#shared/measure/drawing/made-view';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { placed, strokesData } from '#shared/measure/drawing/stroke-data';
import { strokePlaces } from '#shared/measure/drawing/stroke-places';
import { axis, cutLine } from '#shared/measure/drawing/upright-corners';
import { drawnStrokes, profileCurve, type ProfilePiece } from '#shared/measure/profile-curve';
import type { Fluting } from '#shared/measure/fluting';
import type { TurnedShape } from '#shared/measure/turned-shape';

const level = (radius_mm: number, up_mm: number): DrawingPath => ({
  kind: 'outline',
  data: polylineData([spot(-radius_mm, 0 - up_mm), spot(radius_mm, 0 - up_mm)]),
});

// Both sides of an element, the step below it and the edge above it, as they are seen from the front.
const piecePaths = ({ strokes, uncounted, end }: ProfilePiece): DrawingPath[] => [
  ...(['right', 'left'] as const).flatMap((hand): DrawingPath[] => [
    { kind: 'outline', data: strokesData(strokes, hand) },
    ...(uncounted ? [{ kind: 'hidden' as const, data: strokesData([uncounted], hand) }] : []),
  ]),
  level(end.x, end.y),
];

// Cuts run up the piece, as many as its mean girth has room for; each follows the profile at its own angle.
function cutPaths(pieces: readonly ProfilePiece[], fluting: Fluting): DrawingPath[] {
  const places = pieces.map(({ strokes }) => strokePlaces(strokes));
  const radii = places.flat().map(({ x }) => x);
  const mean_mm = radii.reduce((sum, radius) => sum + radius, 0) / Math.max(1, radii.length);
  const parts = edgesInFront(cutEdges(cutsRound(fluting, 2 * Math.PI * mean_mm), fluting));
  return parts.flatMap((part) => places.map((piece) => cutLine(piece.map(({ x, y }) => spot(part * x, 0 - y)))));
}

/** The elevation of a turned piece with its height and its greatest and end diameters, in mm. */
export function turnedElevation({ profile, radius_mm, fluting }: TurnedShape): DrawingView {
  const pieces = profileCurve(profile, radius_mm);
  const right = pieces.flatMap(drawnStrokes).flatMap(strokeReach);
  const reach = right.flatMap((point) => [placed(point, 'right'), placed(point, 'left')]);
  const { left_mm, top_mm, width_mm, height_mm } = boxAround(reach);
  const bottom_mm = top_mm + height_mm;
  const foot = pieces[0]?.strokes[0].from ?? { x: radius_mm, y: 0 };
  const head = pieces.at(-1)?.strokes.at(-1)?.to ?? foot;
  return madeView({
    view: 'elevation',
    paths: [
      ...(fluting ? cutPaths(pieces, fluting) : []),
      level(foot.x, foot.y),
      ...pieces.flatMap(piecePaths),
      axis(spot(0, top_mm), spot(0, bottom_mm)),
    ],
    dimensions: [
      dimension(spot(left_mm, bottom_mm), spot(left_mm + width_mm, bottom_mm), 'below'),
      dimension(spot(left_mm, top_mm), spot(left_mm, bottom_mm), 'left'),
      dimension(placed(head, 'left'), placed(head, 'right'), 'above'),
    ],
    reach,
  });
}
