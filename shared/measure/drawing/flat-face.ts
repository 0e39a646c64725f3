import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { boxAround, madeView } from '#shared/measure/drawing/made-view';
import { ellipseData, spot } from '#shared/measure/drawing/polyline-data';
import { cutEdges, cutsAcross } from '#shared/measure/drawing/cut-spans';
import {
  axis,
  closedOutline,
  cutLine,
  overallDimensions,
  uprightCorners,
} from '#shared/measure/drawing/upright-corners';
import type { FlatShape } from '#shared/measure/flat-shape';
import type { Fluting } from '#shared/measure/fluting';

/** Edges of upright cuts side by side along a length, in mm. */
export const uprightCuts = (fluting: Fluting | undefined, length_mm: number, height_mm: number): DrawingPath[] =>
  fluting
    ? cutEdges(cutsAcross(fluting, length_mm), fluting).map((edge) =>
        cutLine([spot(edge * length_mm, 0), spot(edge * length_mm, height_mm)]),
      )
    : [];

function straightFace(corners: readonly DrawingPoint[], cuts: readonly DrawingPath[] = []): DrawingView {
  const { width_mm, height_mm } = boxAround(corners);
  return madeView({
    view: 'face',
    paths: [closedOutline(corners), ...cuts],
    dimensions: overallDimensions(width_mm, height_mm),
    reach: corners,
  });
}

// An oval with its axes, and the hole of a ring where there is one.
function roundFace([width_mm, height_mm]: readonly [number, number], hole_mm = 0): DrawingView {
  const centre = spot(width_mm / 2, height_mm / 2);
  const hole = hole_mm > 0 ? [ellipseData(centre, [hole_mm / 2, hole_mm / 2])] : [];
  return madeView({
    view: 'face',
    paths: [
      ...[ellipseData(centre, [width_mm / 2, height_mm / 2]), ...hole].map((data) => ({
        kind: 'outline' as const,
        data,
      })),
      axis(spot(0, centre.y_mm), spot(width_mm, centre.y_mm)),
      axis(spot(centre.x_mm, 0), spot(centre.x_mm, height_mm)),
    ],
    dimensions: [
      ...overallDimensions(width_mm, height_mm),
      {
        from: spot(centre.x_mm - hole_mm / 2, centre.y_mm),
        to: spot(centre.x_mm + hole_mm / 2, centre.y_mm),
        label_mm: hole_mm,
        side: 'above',
      },
    ],
    reach: uprightCorners(width_mm, height_mm),
  });
}

// Corners drawn with y downwards, moved so that their box begins at 0, 0.
function cornersOf(points: readonly { readonly x_mm: number; readonly y_mm: number }[]): DrawingPoint[] {
  const turned = points.map(({ x_mm, y_mm }) => spot(x_mm, 0 - y_mm));
  const { left_mm, top_mm } = boxAround(turned);
  return turned.map(({ x_mm, y_mm }) => spot(x_mm - left_mm, y_mm - top_mm));
}

/** The corners of a flat figure, in mm, its box beginning at 0, 0; a triangle has its apex above the middle of its base. None for what is round. */
export function flatCorners(shape: FlatShape): DrawingPoint[] {
  switch (shape.kind) {
    case 'rectangle':
      return uprightCorners(shape.length_mm, shape.height_mm);
    case 'triangle':
      return [spot(shape.base_mm / 2, 0), spot(shape.base_mm, shape.height_mm), spot(0, shape.height_mm)];
    case 'polygon':
      return cornersOf(shape.points);
    default:
      return [];
  }
}

/** The face of a flat shape with its overall dimensions, in mm. */
export function flatFace(shape: FlatShape): DrawingView {
  switch (shape.kind) {
    case 'rectangle':
      return straightFace(flatCorners(shape), uprightCuts(shape.fluting, shape.length_mm, shape.height_mm));
    case 'triangle':
    case 'polygon':
      return straightFace(flatCorners(shape));
    case 'circle':
      return roundFace([shape.diameter_mm, shape.diameter_mm]);
    case 'ellipse':
      return roundFace([shape.length_mm, shape.height_mm]);
    case 'ring':
      return roundFace([shape.outerDiameter_mm, shape.outerDiameter_mm], shape.innerDiameter_mm);
  }
}
