import { safeMinor } from '#shared/money/safe-minor';
import { settled } from '#shared/money/settled';
import { TooLarge, unlessTooLarge } from '#shared/money/too-large';

test('an amount beyond the safe integers and an infinite figure are too large', () => {
  expect(() => safeMinor(2 ** 53)).toThrow(TooLarge);
  expect(() => safeMinor(-(2 ** 53))).toThrow(TooLarge);
  expect(() => settled(Number.NEGATIVE_INFINITY)).toThrow(TooLarge);
});

test('what is no figure or no whole amount is another mistake', () => {
  expect(() => safeMinor(0.5)).not.toThrow(TooLarge);
  expect(() => safeMinor(0.5)).toThrow(RangeError);
  expect(() => settled(Number.NaN)).not.toThrow(TooLarge);
  expect(() => settled(Number.NaN)).toThrow(RangeError);
});

test('work is undefined where it becomes too large, and only there', () => {
  expect(unlessTooLarge(() => 3)).toBe(3);
  expect(unlessTooLarge(() => settled(Infinity))).toBeUndefined();
  expect(() => unlessTooLarge(() => settled(Number.NaN))).toThrow(RangeError);
});
