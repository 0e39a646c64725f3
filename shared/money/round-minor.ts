import { D, type MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';

/** Rounds an amount of minor units half up, away from zero (EN 16931 examples do so); RangeError beyond safe integers. */
export const roundMinor = (amount_minor: D): MinorUnits =>
  safeMinor(amount_minor.toDecimalPlaces(0, D.ROUND_HALF_UP).toNumber());
