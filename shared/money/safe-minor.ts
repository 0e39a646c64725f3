import type { MinorUnits } from '#shared/money/decimal';
import { TooLarge } from '#shared/money/too-large';

/** Passes a whole amount of minor units on; RangeError when it is not whole, TooLarge (a RangeError) when it leaves the safe integers. */
export function safeMinor(amount: number): MinorUnits {
  if (Math.abs(amount) > Number.MAX_SAFE_INTEGER) throw new TooLarge('an amount must stay within the safe integers');
  if (!Number.isSafeInteger(amount)) throw new RangeError('an amount must be a safe whole number of minor units');
  return amount + 0;
}
