import {
  measuresOf,
  paidFor,
  paidText,
  paidUnitOf,
  type MeasuredWork,
  type WorkMeasure,
} from '#shared/estimates/price/measured-work';
import { extraLineSchema } from '#shared/estimates/settings-schema';

const nothing = { count: 1, length_mm: null, girth_mm: null, area_mm2: null, sides: 1, worth: 1 } as const;
const by = (rule: MeasuredWork['rule'], ...measures: Partial<WorkMeasure>[]): MeasuredWork => ({
  ...{ rule, measures: measures.map((measure) => ({ ...nothing, ...measure })), typed: {} },
});
const paid = (measured: MeasuredWork, unit: 'm²' | 'ft²') => {
  const quantity = paidFor(measured);
  return quantity && paidText(quantity, unit);
};

describe('work paid by a measuring rule', () => {
  it.each<[string, MeasuredWork, 'm²' | 'ft²', string]>([
    // A Key to Civil Architecture, 1774: length by girth.
    [
      '48 ft of a moulding girthing 3 ft as measured',
      by('plain-area', { length_mm: 14_630.4, girth_mm: 914.4 }),
      'ft²',
      '144',
    ],
    // IS 1200 Part 15: carved work twice, for each side that is carved.
    ['half a square metre carved on one side', by('carved-each-side', { area_mm2: 5e5 }), 'm²', '1'],
    ['the same on both', by('carved-each-side', { area_mm2: 5e5, sides: 2 }), 'm²', '2'],
    // An Old Hand, Hints for Painters: under 6 in counts as 6, under 12 as 12.
    ['10 ft of a member girthing 4 in', by('narrow-girth', { length_mm: 3048, girth_mm: 101.6 }), 'ft²', '5'],
    ['the same girthing 7 in', by('narrow-girth', { length_mm: 3048, girth_mm: 177.8 }), 'ft²', '10'],
    // White: special work as so many times plain.
    [
      '60 yards worth three times plain, in ft²',
      by('weighted', { area_mm2: 60 * 836_127.36, worth: 3 }),
      'ft²',
      '1620',
    ],
    // Own: 3 × 98 in and 2 × 21 in, 3 in round, are 336 in by 3 in.
    [
      'three lengths of 8 ft 2 in and two of 1 ft 9 in, girthing 3 in',
      by('plain-area', { count: 3, length_mm: 2489.2, girth_mm: 76.2 }, { count: 2, length_mm: 533.4, girth_mm: 76.2 }),
      'ft²',
      '7',
    ],
  ])('%s', (_, measured, unit, expected) => {
    expect(paid(measured, unit)).toBe(expected);
  });

  it('waits while something its rule asks for is missing of any measure', () => {
    expect(paidFor(by('plain-area', { length_mm: 1000 }))).toBeNull();
    expect(paidFor(by('plain-area', { length_mm: 1000, girth_mm: 10 }, { length_mm: 1000 }))).toBeNull();
    expect(paidFor(by('weighted', {}))).toBeNull();
    expect(paidFor(by('weighted'))).toBeNull();
  });

  it('is explained measure by measure', () => {
    const measured = by('carved-each-side', { area_mm2: 5e5 }, { count: 2, area_mm2: 1e5, sides: 2 });
    expect(paidFor(measured)?.reasons.map(({ code, figure }) => [code, figure])).toEqual([
      ...[
        ['paid-carved-twice', 1e6],
        ['paid-carved-twice', 8e5],
      ],
      ['paid-quantity', 18e5],
    ]);
    expect(measuresOf(measured)).toHaveLength(2);
  });

  it('is paid in the workshop’s unit', () => {
    expect([paidUnitOf('mm'), paidUnitOf('in')]).toEqual(['m²', 'ft²']);
  });

  describe('is kept with its line', () => {
    const measured = by('carved-each-side', { area_mm2: 5e5 }, { area_mm2: 25e4 });
    const line = {
      ...{ id: '018f0000-0000-7000-8000-000000000001', name: 'Panel', taxCategoryId: 'standard' },
      ...{ memberId: null, alternativeId: null, kind: 'paid-quantity', rule: 'x', unit: 'm²', price: '80', measured },
    };
    const complaintsOf = (changed: object) =>
      extraLineSchema
        .safeParse({ ...line, quantity: '1.5', ...changed })
        .error?.issues.map(({ path }) => path.join('.'));

    it('whose quantity is the reckoned one', () => {
      expect(complaintsOf({})).toBeUndefined();
      expect(complaintsOf({ quantity: '1' })).toEqual(['quantity']);
    });

    it('with at least one measure, whole numbers of them, none negative', () => {
      expect(complaintsOf({ measured: by('weighted') })).toContain('measured.measures');
      const wrong = by('weighted', { count: 1.5, area_mm2: -1 });
      expect(complaintsOf({ measured: wrong })).toEqual(['measured.measures.0.count', 'measured.measures.0.area_mm2']);
    });
  });
});
