import type { Point } from '#shared/geometry/point';
import { strokeReach } from '#shared/geometry/stroke';
import { cutSection, lengthThrough } from '#shared/measure/drawing/cut-section';
import { cutsAcross } from '#shared/measure/drawing/cut-spans';
import type { DrawingDimension, DrawingPath, DrawingView } from '#shared/measure/drawing/drawing';
import { boxAround, dimension, madeView } from '#shared/measure/drawing/made-view';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { placed, strokesData } from '#shared/measure/drawing/stroke-data';
import { strokePlaces } from '#shared/measure/drawing/stroke-places';
import type { Fluting } from '#shared/measure/fluting';
import { drawnStrokes, profileCurve, type ProfilePiece } from '#shared/measure/profile-curve';
import type { ProfileElement } from '#shared/measure/profile-element';

// An element is cut where a whole cut finds room on it; walking up the profile, the wood is on the left.
function elementData({ strokes }: ProfilePiece, fluting: Fluting | undefined): string {
  const places = fluting ? strokePlaces(strokes).map((point) => placed(point, 'right')) : [];
  const cuts = fluting ? cutsAcross(fluting, lengthThrough(places)) : [];
  return fluting && cuts.length > 0 ? cutSection({ places, inside: 'left' }, cuts, fluting) : strokesData(strokes);
}

/** Paths of a profile's curve: its elements, and the steps that do not count as hidden lines. */
const curvePaths = (pieces: readonly ProfilePiece[], fluting: Fluting | undefined): DrawingPath[] =>
  pieces.flatMap((piece): DrawingPath[] => [
    { kind: 'outline', data: elementData(piece, fluting) },
    ...(piece.uncounted ? [{ kind: 'hidden' as const, data: strokesData([piece.uncounted]) }] : []),
  ]);

// The height of each element stands on the right, clear of the furthest projection.
const elementHeights = (pieces: readonly ProfilePiece[], right_mm: number): DrawingDimension[] =>
  pieces.map(({ strokes, end }) =>
    dimension(spot(right_mm, 0 - strokes[0].from.y), spot(right_mm, 0 - end.y), 'right'),
  );

/** The section of a moulding's profile, closed behind by hidden lines, with its overall and its elements' dimensions, in mm. */
export function profileView(profile: readonly ProfileElement[], fluting?: Fluting): DrawingView {
  const pieces = profileCurve(profile);
  const reach = pieces
    .flatMap(drawnStrokes)
    .flatMap(strokeReach)
    .map((point) => placed(point, 'right'));
  const { left_mm, top_mm, width_mm, height_mm } = boxAround(reach);
  // Reeds stand forward of the profile they are worked on.
  const reeds_mm = fluting?.cut === 'reeds' ? fluting.depth_mm : 0;
  const [right_mm, bottom_mm] = [left_mm + width_mm, top_mm + height_mm];
  const start: Point = { x: 0, y: 0 };
  const end: Point = pieces[pieces.length - 1]?.end ?? start;
  const behind = polylineData([
    placed(start, 'right'),
    spot(left_mm, 0 - start.y),
    spot(left_mm, 0 - end.y),
    placed(end, 'right'),
  ]);
  return madeView({
    view: 'profile',
    paths: [...curvePaths(pieces, fluting), { kind: 'hidden', data: behind }],
    dimensions: [
      dimension(spot(left_mm, bottom_mm), spot(right_mm, bottom_mm), 'below'),
      dimension(spot(left_mm, top_mm), spot(left_mm, bottom_mm), 'left'),
      ...(pieces.length > 1 ? elementHeights(pieces, right_mm) : []),
    ],
    reach: [...reach, spot(right_mm + reeds_mm, top_mm - reeds_mm), spot(left_mm - reeds_mm, bottom_mm + reeds_mm)],
  });
}
