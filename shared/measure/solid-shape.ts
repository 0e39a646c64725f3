import type { Ends } from '#shared/measure/ends';
import type { Fluted } from '#shared/measure/fluting';

export interface SphereShape {
  readonly kind: 'sphere';
  readonly diameter_mm: number;
}

/** A ball foot: a sphere with so much cut off flat above and below. */
export interface BallFootShape {
  readonly kind: 'ball-foot';
  readonly diameter_mm: number;
  readonly cutTop_mm: number;
  readonly cutBottom_mm: number;
  readonly ends: Ends;
}

/** A bun foot: a flattened (or lengthened) round body, whole height before so much is cut off flat above and below. */
export interface BunFootShape {
  readonly kind: 'bun-foot';
  readonly diameter_mm: number;
  readonly height_mm: number;
  readonly cutTop_mm: number;
  readonly cutBottom_mm: number;
  readonly ends: Ends;
}

/** A whole ring of round section, by the diameters of its centre line and of its section. */
export interface TorusShape {
  readonly kind: 'torus';
  readonly centreDiameter_mm: number;
  readonly sectionDiameter_mm: number;
}

/** A cone, a frustum or a cylinder. */
export interface ConeShape extends Fluted {
  readonly kind: 'cone';
  readonly bottomDiameter_mm: number;
  readonly topDiameter_mm: number;
  readonly height_mm: number;
  readonly ends: Ends;
}

export const boxFaces = ['top', 'bottom', 'front', 'back', 'left', 'right'] as const;
export type BoxFace = (typeof boxFaces)[number];

/** A block, of which the chosen faces count. */
export interface BoxShape {
  readonly kind: 'box';
  readonly length_mm: number;
  readonly depth_mm: number;
  readonly height_mm: number;
  readonly faces: Readonly<Record<BoxFace, boolean>>;
}

/** A spherical boss (a cap) of a height on a circle; its flat back never counts. */
export interface BossShape {
  readonly kind: 'boss';
  readonly diameter_mm: number;
  readonly height_mm: number;
}

export type SolidShape = SphereShape | BallFootShape | BunFootShape | TorusShape | ConeShape | BoxShape | BossShape;
