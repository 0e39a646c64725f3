import { simpsonOf } from '#shared/geometry/simpson';

/** A curve turned about its axis: its radius and the slope of its radius at a place along the axis. */
export interface RevolvedCurve {
  readonly radiusAt: (at: number) => number;
  readonly slopeAt: (at: number) => number;
}

/**
 * Area of a curve revolved about its axis, in the square of its unit, by Simpson's rule in an even number of intervals:
 * 2π ∫ r √(1 + r′²) ds (any calculus text).
 */
export const revolvedArea = (curve: RevolvedCurve, limits: readonly [number, number], intervals: number): number =>
  2 * Math.PI * simpsonOf((at) => curve.radiusAt(at) * Math.hypot(1, curve.slopeAt(at)), limits, intervals);
