/**
 * Perimeter of an ellipse from its two semi-axes, in their unit, to about 1e-14 of the value; a semi-axis of 0 gives the doubled
 * line. Throws a RangeError for a negative or infinite semi-axis.
 *
 * Complete elliptic integral of the second kind by the arithmetic-geometric mean: P = 2π/M · (a² − Σ 2ⁿ⁻¹cₙ²), c₀² = a² − b²,
 * cₙ₊₁ = (aₙ − bₙ)/2 (Gauss; NIST Digital Library of Mathematical Functions, 19.8.6).
 */
export function ellipsePerimeter(semiAxis: number, otherSemiAxis: number): number {
  if (!(semiAxis >= 0 && otherSemiAxis >= 0) || semiAxis + otherSemiAxis === Infinity)
    throw new RangeError('a semi-axis must be finite and not negative');
  const longer = Math.max(semiAxis, otherSemiAxis);
  const ratio = longer === 0 ? 0 : Math.min(semiAxis, otherSemiAxis) / longer;
  return ratio < 1e-12 ? 4 * longer : longer * unitPerimeter(ratio);
}

function unitPerimeter(ratio: number): number {
  let mean = 1;
  let geometric = ratio;
  let weight = 0.5;
  let sum = weight * (1 - ratio) * (1 + ratio);
  while (mean - geometric > 1e-15) {
    const half = (mean - geometric) / 2;
    [mean, geometric] = [(mean + geometric) / 2, Math.sqrt(mean * geometric)];
    weight *= 2;
    sum += weight * half * half;
  }
  return ((2 * Math.PI) / mean) * (1 - sum);
}
