/** A round body by its two semi-axes: across (the radius) and along the axis of turning. */
export interface Spheroid {
  readonly radius: number;
  readonly halfHeight: number;
}

// ∫₀ʷ √(1 + k·t²) dt: with asinh where the body is flattened (k > 0), asin where it is lengthened.
function rootIntegral(k: number, w: number): number {
  if (Math.abs(k) * w * w < 1e-8) return w + (k * w ** 3) / 6;
  const root = Math.sqrt(Math.abs(k));
  const arc = k > 0 ? Math.asinh(root * w) : Math.asin(Math.min(1, Math.max(-1, root * w)));
  return (w * Math.sqrt(Math.max(0, 1 + k * w * w)) + arc / root) / 2;
}

/**
 * Curved area of the zone of a spheroid between two heights above its middle, in the square of its unit; a sphere gives
 * π·diameter·height. Throws a RangeError for heights outside the body or out of order.
 *
 * 2π·a ∫ √(1 + z²(a² − c²)/c⁴) dz, integrated in closed form with t = z/c (any calculus text; own integration).
 */
export function spheroidZoneArea({ radius, halfHeight }: Spheroid, [low, high]: readonly [number, number]): number {
  if (!(low <= high && low >= -halfHeight * (1 + 1e-12) && high <= halfHeight * (1 + 1e-12)))
    throw new RangeError('a zone lies within its body');
  if (radius === 0) return 0;
  if (halfHeight === 0) return 2 * Math.PI * radius * radius;
  const ratio = radius / halfHeight;
  const k = (ratio - 1) * (ratio + 1);
  return 2 * Math.PI * radius * halfHeight * (rootIntegral(k, high / halfHeight) - rootIntegral(k, low / halfHeight));
}

/** Radius of a spheroid's section at a height above its middle, in its unit; 0 outside it. */
export function spheroidRadiusAt({ radius, halfHeight }: Spheroid, height: number): number {
  if (halfHeight === 0) return 0;
  return radius * Math.sqrt(Math.max(0, (1 - height / halfHeight) * (1 + height / halfHeight)));
}
