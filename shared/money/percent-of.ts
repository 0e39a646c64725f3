import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';

/** So many percent of an amount, half up to the whole minor unit; RangeError beyond safe integers. */
export const percentOf = (amount_minor: MinorUnits, percent: DecimalText | D): MinorUnits =>
  roundMinor(new D(amount_minor).times(percent).div(100));
