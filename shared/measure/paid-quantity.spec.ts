import fc from 'fast-check';
import { paidQuantity, type PaidWork } from '#shared/measure/paid-quantity';

describe('A quantity paid for', () => {
  it.each<[string, PaidWork, number]>([
    [
      'lengths by their girths',
      {
        rule: 'plain-area',
        lengths: [
          { length_mm: 1000, girth_mm: 80 },
          { length_mm: 500, girth_mm: 20 },
        ],
      },
      90_000,
    ],
    ['carved work twice, on one side', { rule: 'carved-each-side', area_mm2: 300, sides: 1 }, 600],
    ['carved work twice, on both sides', { rule: 'carved-each-side', area_mm2: 300, sides: 2 }, 1200],
    ['a narrow member as six inches', { rule: 'narrow-girth', length_mm: 100, girth_mm: 30 }, 15_240],
    ['one of exactly six inches as twelve', { rule: 'narrow-girth', length_mm: 100, girth_mm: 152.4 }, 30_480],
    ['one of a foot as it is', { rule: 'narrow-girth', length_mm: 100, girth_mm: 304.8 }, 30_480],
    ['a member without a girth not at all', { rule: 'narrow-girth', length_mm: 100, girth_mm: 0 }, 0],
    [
      'areas by their worth',
      {
        rule: 'weighted',
        areas: [
          { area_mm2: 500, worth: 1 },
          { area_mm2: 100, worth: 2.5 },
        ],
      },
      750,
    ],
    ['nothing', { rule: 'weighted', areas: [] }, 0],
  ])('counts %s', (_what, work, quantity_mm2) => {
    expect(paidQuantity(work).quantity_mm2).toBeCloseTo(quantity_mm2, 6);
  });

  it('names its rule and explains itself', () => {
    const paid = paidQuantity({ rule: 'narrow-girth', length_mm: 100, girth_mm: 30 });
    expect(paid.rule).toBe('narrow-girth');
    expect(paid.reasons.map(({ code }) => code)).toEqual(['paid-girth-raised', 'paid-quantity']);
    expect(paid.reasons[0].figure).toBeCloseTo(152.4, 9);
    expect(paid.reasons[0]).toMatchObject({ unit: 'mm', values: { girth_mm: 30 } });
  });

  it('never pays a wider member less', () => {
    const girth = fc.double({ min: 0, max: 600, noNaN: true });
    fc.assert(
      fc.property(girth, girth, (one, other) => {
        const [narrow, wide] = [one, other].sort((a, b) => a - b);
        const paid = (girth_mm: number) =>
          paidQuantity({ rule: 'narrow-girth', length_mm: 100, girth_mm }).quantity_mm2;
        expect(paid(narrow)).toBeLessThanOrEqual(paid(wide));
      }),
    );
  });

  it('refuses a negative quantity', () => {
    expect(() => paidQuantity({ rule: 'carved-each-side', area_mm2: -1, sides: 1 })).toThrow(RangeError);
  });
});
