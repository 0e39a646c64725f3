import { TooLarge } from '#shared/money/too-large';

/** A whole number of at most ten digits has no noise to be taken out. */
const fewerThanTenDigits = 1e10;

/**
 * Takes the last-bit noise out of a floating-point figure before it enters a count or money (1e-9 relative), since `sin`, `exp`
 * and `pow` may differ in the last bit between engines. Any unit; throws TooLarge (a RangeError) for an infinite figure, a RangeError for none.
 */
export function settled(figure: number): number {
  if (Math.abs(figure) === Infinity) throw new TooLarge('a figure must be finite');
  if (Number.isNaN(figure)) throw new RangeError('a figure must be a number');
  if (Number.isInteger(figure) && Math.abs(figure) < fewerThanTenDigits) return figure + 0;
  return Number(figure.toPrecision(10));
}

/** Whole pieces that cover a figure: ceil(x − 1e-6), so that an exact fit stays one. Never below zero. */
export const countUp = (figure: number): number => Math.max(0, Math.ceil(settled(figure) - 1e-6)) + 0;

/** Whole pieces that fit in a figure: floor(x + 1e-6). Never below zero. */
export const countDown = (figure: number): number => Math.max(0, Math.floor(settled(figure) + 1e-6)) + 0;
