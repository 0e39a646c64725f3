import type { DrawingDimension, DrawingPath, DrawingPoint } from '#shared/measure/drawing/drawing';
import { dimension } from '#shared/measure/drawing/made-view';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';

/** The four corners of an upright rectangle with its top left at 0, 0, clockwise, in mm. */
export const uprightCorners = (width_mm: number, height_mm: number): DrawingPoint[] => [
  spot(0, 0),
  spot(width_mm, 0),
  spot(width_mm, height_mm),
  spot(0, height_mm),
];

/** The whole width below and the whole height on the left of an upright figure from 0, 0, in mm. */
export function overallDimensions(width_mm: number, height_mm: number): DrawingDimension[] {
  const [topLeft, , bottomRight, bottomLeft] = uprightCorners(width_mm, height_mm);
  return [dimension(bottomLeft, bottomRight, 'below'), dimension(topLeft, bottomLeft, 'left')];
}

/** An axis between two places. */
export const axis = (from: DrawingPoint, to: DrawingPoint): DrawingPath => ({
  kind: 'axis',
  data: polylineData([from, to]),
});

/** An edge of a cut through places. */
export const cutLine = (places: readonly DrawingPoint[]): DrawingPath => ({ kind: 'cut', data: polylineData(places) });

/** An outline of straight lines round places. */
export const closedOutline = (places: readonly DrawingPoint[]): DrawingPath => ({
  kind: 'outline',
  data: polylineData(places, true),
});
