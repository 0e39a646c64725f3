import type { DrawingPath, DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { axis, closedOutline, cutLine } from '#shared/measure/drawing/upright-corners';

/** A straight-sided elevation: widths at top and foot, height along the axis, in mm; arrises and the edges of cuts at so great a part of the half width. */
export interface TaperedFigure {
  readonly top_mm: number;
  readonly foot_mm: number;
  readonly height_mm: number;
  readonly arrisPart?: number;
  readonly cutParts?: readonly number[];
}

/** The elevation of a straight or tapered member about its axis with its three dimensions, in mm. */
export function taperedElevation({ top_mm, foot_mm, height_mm, arrisPart, cutParts = [] }: TaperedFigure): DrawingView {
  const [topLeft, topRight] = [spot(-top_mm / 2, 0), spot(top_mm / 2, 0)];
  const [footLeft, footRight] = [spot(-foot_mm / 2, height_mm), spot(foot_mm / 2, height_mm)];
  const downwards = (part: number) => [spot((part * top_mm) / 2, 0), spot((part * foot_mm) / 2, height_mm)];
  const arris = (part: number): DrawingPath => ({ kind: 'outline', data: polylineData(downwards(part)) });
  const left_mm = Math.min(topLeft.x_mm, footLeft.x_mm);
  const corners = [topLeft, topRight, footRight, footLeft];
  return madeView({
    view: 'elevation',
    paths: [
      closedOutline(corners),
      ...cutParts.map((part) => cutLine(downwards(part))),
      ...(arrisPart ? [arris(-arrisPart), arris(arrisPart)] : []),
      axis(spot(0, 0), spot(0, height_mm)),
    ],
    dimensions: [
      dimension(topLeft, topRight, 'above'),
      dimension(footLeft, footRight, 'below'),
      dimension(spot(left_mm, 0), spot(left_mm, height_mm), 'left'),
    ],
    reach: corners,
  });
}
