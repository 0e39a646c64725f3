/**
 * Simpson's rule over values at equal steps, in the unit of value × step. Throws a RangeError unless the number of values is odd
 * and at least three.
 */
export function simpson(values: readonly number[], step: number): number {
  if (values.length < 3 || values.length % 2 === 0)
    throw new RangeError('Simpson’s rule takes an odd number of values');
  const last = values.length - 1;
  const weight = (index: number) => (index === 0 || index === last ? 1 : index % 2 === 1 ? 4 : 2);
  return (step / 3) * values.reduce((sum, value, index) => sum + weight(index) * value, 0);
}

/** Simpson's rule over a function between two limits in an even number of intervals; throws a RangeError for an odd one. */
export function simpsonOf(curve: (at: number) => number, limits: readonly [number, number], intervals: number): number {
  const [from, to] = limits;
  const step = (to - from) / intervals;
  return simpson(
    Array.from({ length: intervals + 1 }, (_, index) => curve(from + index * step)),
    step,
  );
}
