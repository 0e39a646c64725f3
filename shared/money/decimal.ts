import { Decimal } from 'decimal.js';

/** The one decimal arithmetic of the product: 40 digits, half up away from zero. Built from strings and whole numbers only. */
export const D = Decimal.clone({ precision: 40, rounding: Decimal.ROUND_HALF_UP, toExpNeg: -40, toExpPos: 40 });
export type D = Decimal;

/** A decimal written as text: unit prices, rates, percentages. */
export type DecimalText = string;

/** Whole minor units of a currency (cents), a safe integer. */
export type MinorUnits = number;
