import { type QuantileTable, quantileTable } from '#shared/estimates/risk/quantile-table';

/**
 * PERT is the beta distribution with α = 1 + λ·m, β = 1 + λ·(1 − m), λ = 4, m the place of the mode from 0 to 1. Its density x^(4m)·(1 − x)^(4 − 4m)
 * needs powers that engines may round differently, so they are built from square roots, which none does: x^s is the product of the roots
 * x^(1/2), x^(1/4) … that the binary digits of s call for.
 *
 * The table stands on y with x = y²(3 − 2y), which flattens the density at both ends, and Simpson's rule sums every cell.
 */
const cells = 1024;
const points = 2 * cells + 1;
const binaryDigits = 24;

/** The place from 0 to 1 that an entry y of a PERT table stands for. */
export const pertPlace = (y: number): number => y * y * (3 - 2 * y);

/** roots[k][point] = x^(1 / 2^k); made once. */
function rootTable(): Float64Array[] {
  const roots = [Float64Array.from({ length: points }, (_, point) => pertPlace(point / (points - 1)))];
  for (let digit = 1; digit <= binaryDigits; digit += 1) roots.push(roots[digit - 1].map((root) => Math.sqrt(root)));
  return roots;
}

let knownRoots: Float64Array[] | undefined;

/** x^exponent at every point, exponent 0…4 taken to 24 binary digits. */
function powers(exponent: number): Float64Array {
  const roots = (knownRoots ??= rootTable());
  const result = new Float64Array(points).fill(1);
  let rest = exponent;
  let size = 1;
  for (const root of roots) {
    for (; rest >= size; rest -= size) {
      for (let point = 0; point < points; point += 1) result[point] *= root[point];
    }
    size /= 2;
  }
  return result;
}

/** Density at every point, times dx/dy, of any scale. */
function densities(mode: number): Float64Array {
  const below = powers(4 * mode);
  const above = powers(4 - 4 * mode);
  return below.map((power, point) => {
    const y = point / (points - 1);
    return power * above[points - 1 - point] * y * (1 - y);
  });
}

/** The table of a PERT distribution with its mode at a place from 0 to 1; entries stand on y, see `pertPlace`. */
export function pertTable(mode: number): QuantileTable {
  const density = densities(mode);
  const sums = new Float64Array(cells + 1);
  for (let cell = 0; cell < cells; cell += 1) {
    const simpson = density[2 * cell] + 4 * density[2 * cell + 1] + density[2 * cell + 2];
    sums[cell + 1] = sums[cell] + simpson;
  }
  return quantileTable(0, 1 / cells, sums);
}
