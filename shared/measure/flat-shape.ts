import type { Fluted } from '#shared/measure/fluting';

/** A flat rectangular face: a panel, a top, a frieze; the run goes along its length. */
export interface RectangleShape extends Fluted {
  readonly kind: 'rectangle';
  readonly length_mm: number;
  readonly height_mm: number;
}

export interface TriangleShape {
  readonly kind: 'triangle';
  readonly base_mm: number;
  readonly height_mm: number;
}

export interface CircleShape {
  readonly kind: 'circle';
  readonly diameter_mm: number;
}

/** An oval face by its two whole axes. */
export interface EllipseShape {
  readonly kind: 'ellipse';
  readonly length_mm: number;
  readonly height_mm: number;
}

export interface RingShape {
  readonly kind: 'ring';
  readonly outerDiameter_mm: number;
  readonly innerDiameter_mm: number;
}

/** A corner of a drawn face; x to the right, y upwards, either may be negative. */
export interface Corner {
  readonly x_mm: number;
  readonly y_mm: number;
}

/** A flat face by its corners in order, closed from the last to the first; it may not cross itself. */
export interface PolygonShape {
  readonly kind: 'polygon';
  readonly points: readonly Corner[];
}

/** Flat faces; also the faces an opening can have. */
export type FlatShape = RectangleShape | TriangleShape | CircleShape | EllipseShape | RingShape | PolygonShape;
