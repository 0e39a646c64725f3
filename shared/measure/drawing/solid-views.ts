import { spheroidRadiusAt } from '#shared/geometry/spheroid-zone-area';
import { boxViews } from '#shared/measure/drawing/box-views';
import { cutEdges, cutsRound, edgesInFront } from '#shared/measure/drawing/cut-spans';
import type { DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { arcData, ellipseData, lineData, moveData, spot } from '#shared/measure/drawing/polyline-data';
import { taperedElevation } from '#shared/measure/drawing/tapered-elevation';
import { axis } from '#shared/measure/drawing/upright-corners';
import type { BossShape, ConeShape, SolidShape, TorusShape } from '#shared/measure/solid-shape';

/** A round body of two semi-axes, cut flat so far from its top and its bottom, in mm. */
interface CutBody {
  readonly radii_mm: readonly [number, number];
  readonly cutTop_mm: number;
  readonly cutBottom_mm: number;
}

// Down one side by way of the greatest width where it is left standing, so that no arc is more than a half.
function bodySide({ radii_mm, cutTop_mm, cutBottom_mm }: CutBody) {
  const [radius, halfHeight] = radii_mm;
  const at = (height_mm: number) => spot(spheroidRadiusAt({ radius, halfHeight }, height_mm), halfHeight - height_mm);
  const [top, bottom] = [at(halfHeight - cutTop_mm), at(cutBottom_mm - halfHeight)];
  const middle = cutTop_mm < halfHeight && cutBottom_mm < halfHeight ? [at(0)] : [];
  return [top, ...middle, bottom];
}

function bodyElevation(body: CutBody): DrawingView {
  const right = bodySide(body);
  const left = right.map(({ x_mm, y_mm }) => spot(0 - x_mm, y_mm)).toReversed();
  const [top, bottom] = [right[0], right[right.length - 1]];
  const arc = (to: (typeof right)[number]) => arcData({ radii_mm: body.radii_mm, to, isClockwise: true });
  const data = [moveData(top), ...right.slice(1).map(arc), lineData(left[0]), ...left.slice(1).map(arc), 'Z'].join(' ');
  const half_mm = Math.max(...right.map(({ x_mm }) => x_mm));
  return madeView({
    view: 'elevation',
    paths: [{ kind: 'outline', data }, axis(spot(0, top.y_mm), spot(0, bottom.y_mm))],
    dimensions: [
      dimension(spot(-half_mm, bottom.y_mm), spot(half_mm, bottom.y_mm), 'below'),
      dimension(spot(-half_mm, top.y_mm), spot(-half_mm, bottom.y_mm), 'left'),
    ],
    reach: [...right, ...left],
  });
}

function torusPlan({ centreDiameter_mm, sectionDiameter_mm }: TorusShape): DrawingView {
  const [outer, middle, inner] = [1, 0, -1].map((side) => (centreDiameter_mm + side * sectionDiameter_mm) / 2);
  const ring = (kind: 'outline' | 'axis', radius_mm: number) => ({
    kind,
    data: ellipseData(spot(0, 0), [radius_mm, radius_mm]),
  });
  return madeView({
    view: 'plan',
    paths: [ring('outline', outer), ring('outline', inner), ring('axis', middle)],
    dimensions: [
      dimension(spot(-middle, 0), spot(middle, 0), 'above'),
      dimension(spot(inner, 0), spot(outer, 0), 'below'),
    ],
    reach: [spot(-outer, -outer), spot(outer, outer)],
  });
}

function bossElevation({ diameter_mm, height_mm }: BossShape): DrawingView {
  const half_mm = diameter_mm / 2;
  const [left, crown, right] = [spot(-half_mm, height_mm), spot(0, 0), spot(half_mm, height_mm)];
  const radius_mm = height_mm === 0 ? 0 : (half_mm * half_mm + height_mm * height_mm) / (2 * height_mm);
  const arc = (to: typeof crown) => arcData({ radii_mm: [radius_mm, radius_mm], to, isClockwise: true, isLong: false });
  // A cap higher than its half width bulges to its sphere's diameter.
  const reach_mm = height_mm > half_mm ? radius_mm : half_mm;
  return madeView({
    view: 'elevation',
    paths: [
      { kind: 'outline', data: [moveData(left), arc(crown), arc(right), 'Z'].join(' ') },
      axis(crown, spot(0, height_mm)),
    ],
    dimensions: [dimension(left, right, 'below'), dimension(spot(-reach_mm, 0), spot(-reach_mm, height_mm), 'left')],
    reach: [spot(-reach_mm, 0), spot(reach_mm, height_mm)],
  });
}

function coneElevation({ topDiameter_mm, bottomDiameter_mm, height_mm, fluting }: ConeShape): DrawingView {
  const girth_mm = (Math.PI * (topDiameter_mm + bottomDiameter_mm)) / 2;
  const cutParts = fluting ? edgesInFront(cutEdges(cutsRound(fluting, girth_mm), fluting)) : [];
  return taperedElevation({ top_mm: topDiameter_mm, foot_mm: bottomDiameter_mm, height_mm, cutParts });
}

/** The views of a solid: an elevation, the plan of a ring, three views of a box; in mm. */
export function solidViews(shape: SolidShape): DrawingView[] {
  switch (shape.kind) {
    case 'sphere':
      return [
        bodyElevation({ radii_mm: [shape.diameter_mm / 2, shape.diameter_mm / 2], cutTop_mm: 0, cutBottom_mm: 0 }),
      ];
    case 'ball-foot':
      return [bodyElevation({ ...shape, radii_mm: [shape.diameter_mm / 2, shape.diameter_mm / 2] })];
    case 'bun-foot':
      return [bodyElevation({ ...shape, radii_mm: [shape.diameter_mm / 2, shape.height_mm / 2] })];
    case 'torus':
      return [torusPlan(shape)];
    case 'cone':
      return [coneElevation(shape)];
    case 'box':
      return boxViews(shape);
    case 'boss':
      return [bossElevation(shape)];
  }
}
