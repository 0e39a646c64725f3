import type { Shape } from '#shared/measure/shape';
import { shapeComplaints } from '#shared/measure/shape-complaints';

// Displacements and turns have a direction; every other figure of a shape is a size.
const directed = new Set(['across_mm', 'up_mm', 'bow_mm', 'x_mm', 'y_mm', 'turns_degrees']);

function isPossible(value: unknown, name: string): boolean {
  if (typeof value === 'number') return Number.isFinite(value) && (value >= 0 || directed.has(name));
  if (Array.isArray(value)) return value.every((item) => isPossible(item, name));
  if (typeof value !== 'object' || value === null) return true;
  return Object.entries(value).every(([key, item]) => isPossible(item, key));
}

/** Throws a RangeError for a shape that cannot exist: a size negative or not finite, or anything `shapeComplaints` finds. Lengths in mm. */
export function refuseImpossible(shape: Shape): void {
  if (!isPossible(shape, '')) throw new RangeError('a size must be finite and not negative');
  const [first] = shapeComplaints(shape);
  if (first) throw new RangeError(`${first.path.join('.')}: ${first.code}`);
}
