import type { DrawingView } from '#shared/measure/drawing/drawing';
import { madeView } from '#shared/measure/drawing/made-view';
import { polylineData } from '#shared/measure/drawing/polyline-data';
import { overallDimensions, uprightCorners } from '#shared/measure/drawing/upright-corners';
import type { BoxShape } from '#shared/measure/solid-shape';

/** One face of a box: its view, its size in mm, and whether either of the pair it stands for counts. */
interface BoxFigure {
  readonly view: DrawingView['view'];
  readonly size_mm: readonly [number, number];
  readonly isChosen: boolean;
}

function boxFace({ view, size_mm: [width_mm, height_mm], isChosen }: BoxFigure): DrawingView {
  const corners = uprightCorners(width_mm, height_mm);
  return madeView({
    view,
    paths: [{ kind: isChosen ? 'outline' : 'hidden', data: polylineData(corners, true) }],
    dimensions: overallDimensions(width_mm, height_mm),
    reach: corners,
  });
}

/** Front, side and plan of a box, in mm; a pair of faces of which neither counts is drawn in hidden lines. */
export function boxViews({ length_mm, depth_mm, height_mm, faces }: BoxShape): DrawingView[] {
  return [
    boxFace({ view: 'elevation', size_mm: [length_mm, height_mm], isChosen: faces.front || faces.back }),
    boxFace({ view: 'elevation', size_mm: [depth_mm, height_mm], isChosen: faces.left || faces.right }),
    boxFace({ view: 'plan', size_mm: [length_mm, depth_mm], isChosen: faces.top || faces.bottom }),
  ];
}
