import type { MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';

/** Adds whole minor units; RangeError as soon as a sum leaves the safe integers. */
export const sumMinor = (amounts: readonly MinorUnits[]): MinorUnits =>
  amounts.reduce((sum, amount) => safeMinor(sum + safeMinor(amount)), 0);
