import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';

/** An amount of whole currency (or a rate in it) as an unrounded decimal of minor units: "14.505" with 2 digits is 1450.5. */
export const exactMinor = (amount: DecimalText, digits: number): D => new D(amount).times(new D(10).pow(digits));

/** Whole minor units of a decimal amount of currency, half up; RangeError beyond safe integers. */
export const minorOf = (amount: DecimalText, digits: number): MinorUnits => roundMinor(exactMinor(amount, digits));
