import type { Shape, ShapeKind } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';

/** A new shape of a kind. A measured area says how it is known from the beginning: until somebody measures, it is a guess. */
export function firstShape(kind: ShapeKind): Shape {
  const shape = shapeDefaults(kind);
  return shape.kind === 'measured' ? { ...shape, note: $localize`Guessed by eye, not measured yet` } : shape;
}
