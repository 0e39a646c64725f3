import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';

/** Whole minor units as a decimal of the currency with all its digits and a full stop: 100 with 2 digits is "1.00". */
export const textOf = (amount_minor: MinorUnits, digits: number): DecimalText =>
  new D(safeMinor(amount_minor)).div(new D(10).pow(digits)).toFixed(digits);
