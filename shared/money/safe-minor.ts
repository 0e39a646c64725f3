import type { MinorUnits } from '#shared/money/decimal';

/** Passes a whole amount of minor units on; RangeError when it is not whole or leaves the safe integers. */
export function safeMinor(amount: number): MinorUnits {
  if (!Number.isSafeInteger(amount)) throw new RangeError('an amount must be a safe whole number of minor units');
  return amount + 0;
}
