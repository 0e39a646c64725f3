import type { DrawingDimension, DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { arcData, ellipseData, lineData, moveData, polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { axis, uprightCorners } from '#shared/measure/drawing/upright-corners';
import type { ArcPlan, EllipsePlan, MouldingPlan, PolygonPlan } from '#shared/measure/moulding-shape';

const outline = (data: string): DrawingPath => ({ kind: 'outline', data });

/** Corners of a plan of straight sides, walked from 0, 0 to the right, turning clockwise as seen from above, in mm. */
export function walkedCorners({ sides_mm, turns_degrees }: PolygonPlan): DrawingPoint[] {
  const corners = [spot(0, 0)];
  let heading = 0;
  sides_mm.forEach((side_mm, index) => {
    const { x_mm, y_mm } = corners[index];
    corners.push(spot(x_mm + side_mm * Math.cos(heading), y_mm + side_mm * Math.sin(heading)));
    heading += ((turns_degrees[index] ?? 0) * Math.PI) / 180;
  });
  return corners;
}

// A plan turns clockwise, so its outside, where the dimension stands, is on the left of the way.
function sideDimension(from: DrawingPoint, to: DrawingPoint): DrawingDimension {
  const [across_mm, down_mm] = [to.x_mm - from.x_mm, to.y_mm - from.y_mm];
  if (Math.abs(across_mm) >= Math.abs(down_mm)) return dimension(from, to, across_mm >= 0 ? 'above' : 'below');
  return dimension(from, to, down_mm > 0 ? 'right' : 'left');
}

function polygonView(plan: PolygonPlan): DrawingView {
  const corners = walkedCorners(plan);
  return madeView({
    view: 'plan',
    paths: [outline(polylineData(corners))],
    dimensions: corners.slice(1).map((corner, index) => sideDimension(corners[index], corner)),
    reach: corners,
  });
}

function ellipseView({ length_mm, width_mm }: EllipsePlan): DrawingView {
  const centre = spot(length_mm / 2, width_mm / 2);
  return madeView({
    view: 'plan',
    paths: [
      outline(ellipseData(centre, [centre.x_mm, centre.y_mm])),
      axis(spot(0, centre.y_mm), spot(length_mm, centre.y_mm)),
      axis(spot(centre.x_mm, 0), spot(centre.x_mm, width_mm)),
    ],
    dimensions: [
      dimension(spot(0, width_mm), spot(length_mm, width_mm), 'below'),
      dimension(spot(0, 0), spot(0, width_mm), 'left'),
    ],
    reach: uprightCorners(length_mm, width_mm),
  });
}

// The sweep stands symmetrically above its centre, from left to right.
function arcView({ radius_mm, angle_degrees }: ArcPlan): DrawingView {
  const half = (angle_degrees * Math.PI) / 360;
  const at = (angle: number) => spot(radius_mm * Math.sin(angle), -radius_mm * Math.cos(angle));
  const [from, crown, to] = [at(-half), at(0), at(half)];
  const quarters = [-2, -1, 0, 1, 2]
    .map((quarter) => (quarter * Math.PI) / 2)
    .filter((angle) => Math.abs(angle) < half);
  const curve = { radii_mm: [radius_mm, radius_mm], isClockwise: true } as const;
  const swept = [moveData(from), arcData({ ...curve, to: crown }), arcData({ ...curve, to })].join(' ');
  return madeView({
    view: 'plan',
    paths: [outline(swept), { kind: 'axis', data: [moveData(from), lineData(spot(0, 0)), lineData(to)].join(' ') }],
    dimensions: [dimension(spot(0, 0), crown, 'right')],
    reach: [from, to, spot(0, 0), ...quarters.map(at)],
  });
}

/** The plan of a moulding along the edge it was measured at, with the lengths of its sides or its radius, in mm; none for straight lengths. */
export function planView(plan: MouldingPlan): DrawingView | undefined {
  switch (plan.form) {
    case 'straight':
      return undefined;
    case 'arc':
      return arcView(plan);
    case 'ellipse':
      return ellipseView(plan);
    case 'polygon':
      return polygonView(plan);
  }
}
