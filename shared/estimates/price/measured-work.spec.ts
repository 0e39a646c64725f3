import { paidFor, paidText, paidUnitOf, type MeasuredWork } from '#shared/estimates/price/measured-work';
import { extraLineSchema } from '#shared/estimates/settings-schema';

const typed = (text: string, mm: number) => ({ text, mm });
const nothing = { length: null, girth: null, area: null, sides: 1, worth: 1 } as const;
const paid = (measured: MeasuredWork, unit: 'm²' | 'ft²') => {
  const quantity = paidFor(measured);
  return quantity && paidText(quantity, unit);
};

describe('work paid by a measuring rule', () => {
  it.each<[string, MeasuredWork, 'm²' | 'ft²', string]>([
    // A Key to Civil Architecture, 1774: length by girth.
    [
      '48 ft of a moulding girthing 3 ft as measured',
      { ...nothing, rule: 'plain-area', length: typed('48 ft', 14_630.4), girth: typed('3 ft', 914.4) },
      'ft²',
      '144',
    ],
    // IS 1200 Part 15: carved work twice, for each side that is carved.
    [
      'half a square metre carved on one side',
      { ...nothing, rule: 'carved-each-side', area: { text: 'as measured', mm2: 5e5 } },
      'm²',
      '1',
    ],
    [
      'the same on both',
      { ...nothing, rule: 'carved-each-side', area: { text: 'as measured', mm2: 5e5 }, sides: 2 },
      'm²',
      '2',
    ],
    // An Old Hand, Hints for Painters: under 6 in counts as 6, under 12 as 12.
    [
      '10 ft of a member girthing 4 in',
      { ...nothing, rule: 'narrow-girth', length: typed('10 ft', 3048), girth: typed('4 in', 101.6) },
      'ft²',
      '5',
    ],
    [
      'the same girthing 7 in',
      { ...nothing, rule: 'narrow-girth', length: typed('10 ft', 3048), girth: typed('7 in', 177.8) },
      'ft²',
      '10',
    ],
    // White: special work as so many times plain.
    [
      '60 yards worth three times plain, in ft²',
      { ...nothing, rule: 'weighted', area: { text: 'as measured', mm2: 60 * 836_127.36 }, worth: 3 },
      'ft²',
      '1620',
    ],
  ])('%s', (_, measured, unit, expected) => {
    expect(paid(measured, unit)).toBe(expected);
  });

  it('waits while something its rule asks for is missing', () => {
    expect(paidFor({ ...nothing, rule: 'plain-area', length: typed('1 m', 1000) })).toBeNull();
    expect(paidFor({ ...nothing, rule: 'weighted' })).toBeNull();
  });

  it('is explained', () => {
    const reasons =
      paidFor({ ...nothing, rule: 'carved-each-side', area: { text: 'as measured', mm2: 5e5 } })?.reasons ?? [];
    expect(reasons.map(({ code }) => code)).toEqual(['paid-carved-twice', 'paid-quantity']);
  });

  it('is paid in the workshop’s unit', () => {
    expect([paidUnitOf('mm'), paidUnitOf('in')]).toEqual(['m²', 'ft²']);
  });

  it('is kept with its line, whose quantity is the reckoned one', () => {
    const measured: MeasuredWork = { ...nothing, rule: 'carved-each-side', area: { text: 'as measured', mm2: 5e5 } };
    const line = {
      ...{ id: '018f0000-0000-7000-8000-000000000001', name: 'Panel', taxCategoryId: 'standard' },
      ...{ memberId: null, alternativeId: null, kind: 'paid-quantity', rule: 'x', unit: 'm²', price: '80', measured },
    };
    expect(extraLineSchema.safeParse({ ...line, quantity: '1' }).success).toBe(true);
    expect(extraLineSchema.safeParse({ ...line, quantity: '1.5' }).error?.issues[0].path).toEqual(['quantity']);
  });
});
