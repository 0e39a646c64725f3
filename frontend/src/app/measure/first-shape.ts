import type { Shape, ShapeKind } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import type { LengthUnit } from '#shared/units/length-unit';
import { roundInches } from './round-inches';

/** What is offered, in round figures of the unit the workshop measures in. */
export const offeredIn = <T>(unit: LengthUnit, value: T): T => (unit === 'in' ? roundInches(value) : value);

/** A new shape of a kind. A measured area says how it is known from the beginning: until somebody measures, it is a guess. */
export function firstShape(kind: ShapeKind, unit: LengthUnit): Shape {
  const shape = offeredIn(unit, shapeDefaults(kind));
  return shape.kind === 'measured' ? { ...shape, note: $localize`Guessed by eye, not measured yet` } : shape;
}
