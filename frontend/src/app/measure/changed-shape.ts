import type { Shape, ShapeKind } from '#shared/measure/shape';
import type { LengthUnit } from '#shared/units/length-unit';
import { firstShape } from './first-shape';

const isCarriedOver = (key: string, value: unknown): boolean =>
  key === 'profile' || (key.endsWith('_mm') && Number.isFinite(value));

/** Another shape in the place of one: lengths that bear the same name, and a profile, come along. */
export function changedShape(before: Shape, kind: ShapeKind, unit: LengthUnit): Shape {
  const next = firstShape(kind, unit);
  const carried = Object.entries(before).filter(([key, value]) => key in next && isCarriedOver(key, value));
  return { ...next, ...Object.fromEntries(carried) };
}
