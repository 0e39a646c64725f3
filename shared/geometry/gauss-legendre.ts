// Nodes and weights of the eight-point Gauss–Legendre rule on −1…1 (Abramowitz & Stegun, Table 25.4).
const nodes = [0.1834346424956498, 0.525532409916329, 0.7966664774136267, 0.9602898564975363];
const weights = [0.362683783378362, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763];

/**
 * Integral of a smooth function between two limits by the eight-point Gauss–Legendre rule in so many equal panels, in the unit of
 * value × place.
 */
export function gaussLegendre(
  curve: (at: number) => number,
  limits: readonly [number, number],
  panels: number,
): number {
  const half = (limits[1] - limits[0]) / panels / 2;
  let sum = 0;
  for (let panel = 0; panel < panels; panel += 1) {
    const middle = limits[0] + (2 * panel + 1) * half;
    for (let index = 0; index < nodes.length; index += 1)
      sum += weights[index] * (curve(middle - half * nodes[index]) + curve(middle + half * nodes[index]));
  }
  return sum * half;
}
