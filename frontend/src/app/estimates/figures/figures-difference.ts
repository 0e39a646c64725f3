const isSame = (one: number, other: number): boolean => {
  if (Number.isInteger(one) && Number.isInteger(other)) return one === other;
  // `sin`, `exp` and `pow` may differ in the last bit between engines; counts and money never do.
  return Math.abs(one - other) <= 1e-9 * Math.max(Math.abs(one), Math.abs(other), 1e-3);
};

/** The path of the first figure in which two workings of the same draft differ, with both; undefined where they agree. */
export function figuresDifference(one: unknown, other: unknown, path = ''): string | undefined {
  if (typeof one === 'number' && typeof other === 'number')
    return isSame(one, other) ? undefined : `${path}: ${one} ≠ ${other}`;
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null)
    return one === other ? undefined : `${path}: ${String(one)} ≠ ${String(other)}`;
  const keys = new Set([...Object.keys(one), ...Object.keys(other)]);
  for (const key of keys) {
    const [a, b] = [one, other].map((whole) => (whole as Readonly<Record<string, unknown>>)[key]);
    const found = figuresDifference(a, b, path ? `${path}.${key}` : key);
    if (found) return found;
  }
  return undefined;
}
