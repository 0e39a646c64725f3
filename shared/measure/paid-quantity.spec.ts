import fc from 'fast-check';
import { paidQuantity, type PaidWork } from '#shared/measure/paid-quantity';

describe('A quantity paid for', () => {
  it.each<[string, PaidWork, number]>([
    [
      'lengths by their girths',
      {
        rule: 'plain-area',
        measures: [
          { count: 1, length_mm: 1000, girth_mm: 80 },
          { count: 1, length_mm: 500, girth_mm: 20 },
        ],
      },
      90_000,
    ],
    [
      'three lengths of 8 ft 2 in and two of 1 ft 9 in, 3 in round, each raised to 6 in',
      {
        rule: 'narrow-girth',
        measures: [
          { count: 3, length_mm: 2489.2, girth_mm: 76.2 },
          { count: 2, length_mm: 533.4, girth_mm: 76.2 },
        ],
      },
      (3 * 98 + 2 * 21) * 6 * 645.16,
    ],
    [
      'carved work twice, on one side',
      { rule: 'carved-each-side', measures: [{ count: 1, area_mm2: 300, sides: 1 }] },
      600,
    ],
    [
      'carved work twice, on both sides',
      { rule: 'carved-each-side', measures: [{ count: 1, area_mm2: 300, sides: 2 }] },
      1200,
    ],
    [
      'a narrow member as six inches',
      { rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm: 30 }] },
      15_240,
    ],
    [
      'one of exactly six inches as twelve',
      { rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm: 152.4 }] },
      30_480,
    ],
    [
      'one of a foot as it is',
      { rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm: 304.8 }] },
      30_480,
    ],
    [
      'a member without a girth not at all',
      { rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm: 0 }] },
      0,
    ],
    [
      'areas by their worth',
      {
        rule: 'weighted',
        measures: [
          { count: 1, area_mm2: 500, worth: 1 },
          { count: 1, area_mm2: 100, worth: 2.5 },
        ],
      },
      750,
    ],
    ['nothing', { rule: 'weighted', measures: [] }, 0],
  ])('counts %s', (_what, work, quantity_mm2) => {
    expect(paidQuantity(work).quantity_mm2).toBeCloseTo(quantity_mm2, 6);
  });

  it('names its rule and explains itself', () => {
    const paid = paidQuantity({ rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm: 30 }] });
    expect(paid.rule).toBe('narrow-girth');
    expect(paid.reasons.map(({ code }) => code)).toEqual(['paid-girth-raised', 'paid-quantity']);
    expect(paid.reasons[0].figure).toBeCloseTo(15_240, 9);
    expect(paid.reasons[0].values['paid_mm']).toBeCloseTo(152.4, 9);
    expect(paid.reasons[0]).toMatchObject({ unit: 'mm2', values: { count: 1, length_mm: 100, girth_mm: 30 } });
  });

  it('never pays a wider member less', () => {
    const girth = fc.double({ min: 0, max: 600, noNaN: true });
    fc.assert(
      fc.property(girth, girth, (one, other) => {
        const [narrow, wide] = [one, other].sort((a, b) => a - b);
        const paid = (girth_mm: number) =>
          paidQuantity({ rule: 'narrow-girth', measures: [{ count: 1, length_mm: 100, girth_mm }] }).quantity_mm2;
        expect(paid(narrow)).toBeLessThanOrEqual(paid(wide));
      }),
    );
  });

  it('adds measures under one rule, in whatever order, and so many alike as so many', () => {
    const figure = fc.double({ min: 0, max: 5000, noNaN: true });
    const measure = fc.record({ count: fc.integer({ min: 1, max: 20 }), length_mm: figure, girth_mm: figure });
    fc.assert(
      fc.property(fc.array(measure, { minLength: 1, maxLength: 6 }), (measures) => {
        const paid = (some: typeof measures) => paidQuantity({ rule: 'narrow-girth', measures: some }).quantity_mm2;
        const oneByOne = measures.flatMap(({ count, ...one }) =>
          Array.from({ length: count }, () => ({ count: 1, ...one })),
        );
        expect(paid(measures)).toBeCloseTo(paid(measures.toReversed()), 3);
        expect(paid(oneByOne) / Math.max(1, paid(measures))).toBeCloseTo(
          paid(measures) / Math.max(1, paid(measures)),
          9,
        );
        expect(paid(measures)).toBeGreaterThanOrEqual(paid(measures.slice(1)));
      }),
    );
  });

  it('refuses a negative quantity, also where others outweigh it', () => {
    const measures = [
      { count: 1, area_mm2: -1, sides: 1 },
      { count: 1, area_mm2: 5, sides: 1 },
    ] as const;
    expect(() => paidQuantity({ rule: 'carved-each-side', measures })).toThrow(RangeError);
    expect(() => paidQuantity({ rule: 'carved-each-side', measures: [{ count: 1, area_mm2: -1, sides: 1 }] })).toThrow(
      RangeError,
    );
  });
});
