import fc from 'fast-check';
import { cashRounding, cashStep } from '#shared/money/cash-rounding';
import { D } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';
import { lineAmount } from '#shared/money/line-amount';
import { exactMinor, minorOf } from '#shared/money/minor-of';
import { percentOf } from '#shared/money/percent-of';
import { roundMinor } from '#shared/money/round-minor';
import { sumMinor } from '#shared/money/sum-minor';
import { textOf } from '#shared/money/text-of';

describe('rounding to the minor unit', () => {
  it.each([
    ['0.5', 1],
    ['-0.5', -1],
    ['2.5', 3],
    ['-2.5', -3],
    ['2.4999999999999999999', 2],
    ['-0.4', 0],
  ])('%s becomes %d, half up and away from zero', (amount, expected) => {
    expect(roundMinor(new D(amount))).toBe(expected);
  });

  it.each([
    ['1.005', 2, 101],
    ['-2.005', 2, -201],
    ['12', 0, 12],
    ['1.0005', 3, 1001],
    ['0.1', 4, 1000],
  ])('%s with %d digits is %d minor units', (text, digits, expected) => {
    expect(minorOf(text, digits)).toBe(expected);
  });

  it('keeps a rate of fractions of a cent until a line is rounded', () => {
    expect(exactMinor('14.505', 2).toString()).toBe('1450.5');
  });

  it.each([
    [100, 2, '1.00'],
    [-5, 2, '-0.05'],
    [5, 0, '5'],
    [1, 3, '0.001'],
    [0, 2, '0.00'],
  ])('%d minor units with %d digits are written %s', (amount, digits, expected) => {
    expect(textOf(amount, digits)).toBe(expected);
  });

  it('goes to text and back without loss', () => {
    fc.assert(
      fc.property(fc.maxSafeInteger(), fc.integer({ min: 0, max: 4 }), (amount, digits) => {
        expect(minorOf(textOf(amount, digits), digits)).toBe(amount + 0);
      }),
    );
  });

  it('refuses what leaves the safe integers, or is not whole', () => {
    expect(() => roundMinor(new D('9007199254740992'))).toThrow(RangeError);
    expect(() => minorOf('90071992547409.92', 2)).toThrow(RangeError);
    expect(() => sumMinor([Number.MAX_SAFE_INTEGER, 1])).toThrow(RangeError);
    expect(() => sumMinor([0.5])).toThrow(RangeError);
    expect(() => textOf(1.5, 2)).toThrow(RangeError);
    expect(() => percentOf(Number.MAX_SAFE_INTEGER, '101')).toThrow(RangeError);
  });

  it.each([
    [0.1 + 0.2, '0.3'],
    [1 / 3, '0.333333'],
    [183.4000000001, '183.4'],
    [2.0000005, '2.000001'],
    [1e-9, '0'],
  ])('a quantity of %d enters money as %s', (quantity, expected) => {
    expect(exactFigure(quantity).toString()).toBe(expected);
  });

  it('multiplies a quantity with a price for so many', () => {
    expect(lineAmount({ quantity: '10', price: '200', baseQuantity: '2' }, 2)).toBe(100_000);
    expect(lineAmount({ quantity: '-800', price: '4', baseQuantity: '5' }, 2)).toBe(-64_000);
  });

  it.each([
    ['CHF', 5],
    ['DKK', 50],
    ['SEK', 100],
    ['HUF', 500],
    ['EUR', 1],
  ])('%s is paid in cash in steps of %d minor units', (currency, step) => {
    expect(cashStep(currency)).toBe(step);
  });

  it('rounds cash to the nearest step and says by how much', () => {
    expect(cashRounding(-3, 5)).toEqual({ due_minor: -5, rounding_minor: -2 });
    expect(() => cashRounding(100, 0)).toThrow(RangeError);
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.constantFrom(1, 5, 50, 100, 500), (due, step) => {
        const cash = cashRounding(due, step);
        expect(cash.due_minor % step).toBe(cash.due_minor < 0 ? -0 : 0);
        expect(due + cash.rounding_minor).toBe(cash.due_minor);
        expect(Math.abs(cash.rounding_minor) * 2).toBeLessThanOrEqual(step);
      }),
    );
  });
});
