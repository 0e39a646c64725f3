import type { BandShape } from '#shared/measure/band-shape';
import type { FlatShape } from '#shared/measure/flat-shape';
import type { LegShape } from '#shared/measure/leg-shape';
import type { MeasuredShape } from '#shared/measure/measured-shape';
import type { MouldingShape } from '#shared/measure/moulding-shape';
import type { SolidShape } from '#shared/measure/solid-shape';
import type { TurnedShape } from '#shared/measure/turned-shape';

export type { FlatShape };

/** The shape of a member, told apart by `kind`; every length a plain number of mm, what was typed being kept elsewhere. */
export type Shape = FlatShape | MouldingShape | TurnedShape | LegShape | SolidShape | BandShape | MeasuredShape;

export type ShapeKind = Shape['kind'];

/** One shape of the union by its kind. */
export type ShapeOf<Kind extends ShapeKind> = Extract<Shape, { readonly kind: Kind }>;

/** Every kind, in the order a person is offered them. */
export const shapeKinds = [
  'rectangle',
  'triangle',
  'circle',
  'ellipse',
  'ring',
  'polygon',
  'moulding',
  'turned',
  'straight-leg',
  'cabriole',
  'stations',
  'twisted',
  'helicoid',
  'sphere',
  'ball-foot',
  'bun-foot',
  'torus',
  'cone',
  'box',
  'boss',
  'band',
  'measured',
] as const satisfies readonly ShapeKind[];
