import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';

/** Runs that whole repeats are fitted on: so many of one length. */
export interface OrnamentRuns {
  readonly run_mm: number;
  readonly runs: number;
}

// Sides of a regular plan come from sines, which agree to the last digits only.
const isAsLong = (one_mm: number, other_mm: number): boolean => Math.abs(one_mm - other_mm) < 1e-6;

/**
 * The runs of a shape an ornament is laid along: each side by itself between its mitres where all are as long, else the run as a whole;
 * of length 0 where the shape has none.
 */
export function ornamentRuns(shape: Shape): OrnamentRuns {
  const { run_mm = 0, sides_mm } = surfaceOf(shape);
  const [first = 0] = sides_mm;
  const isEven = sides_mm.length > 1 && sides_mm.every((side_mm) => isAsLong(side_mm, first));
  return isEven ? { run_mm: first, runs: sides_mm.length } : { run_mm, runs: 1 };
}
