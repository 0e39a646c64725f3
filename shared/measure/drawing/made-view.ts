import type { DrawingBox, DrawingDimension, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';

/** A view still without its box: `reach` holds places its figure lies between. */
export interface ViewFacts extends Omit<DrawingView, 'box'> {
  readonly reach: readonly DrawingPoint[];
}

/** The least upright box around places, in mm; empty at 0, 0 around none. */
export function boxAround(places: readonly DrawingPoint[]): DrawingBox {
  if (places.length === 0) return { left_mm: 0, top_mm: 0, width_mm: 0, height_mm: 0 };
  const [xs, ys] = [places.map(({ x_mm }) => x_mm), places.map(({ y_mm }) => y_mm)];
  const [left_mm, top_mm] = [Math.min(...xs), Math.min(...ys)];
  return { left_mm, top_mm, width_mm: Math.max(...xs) - left_mm, height_mm: Math.max(...ys) - top_mm };
}

/** A view with the box its figure fills, in mm; dimensions of no length are left out. */
export const madeView = ({ reach, ...view }: ViewFacts): DrawingView => ({
  ...view,
  dimensions: view.dimensions.filter(({ label_mm }) => label_mm > 0),
  box: boxAround(reach),
});

/** A dimension from one place to another on a side of the figure, labelled with the distance between them in mm. */
export const dimension = (from: DrawingPoint, to: DrawingPoint, side: DrawingDimension['side']): DrawingDimension => ({
  from,
  to,
  label_mm: Math.hypot(to.x_mm - from.x_mm, to.y_mm - from.y_mm),
  side,
});
