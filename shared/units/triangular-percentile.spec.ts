import fc from 'fast-check';
import { triangularPercentile } from '#shared/units/triangular-percentile';

describe('triangularPercentile', () => {
  it.each([
    ['the lower end is never undershot', { low: 10, likely: 12, high: 20 }, 0, 10],
    ['the upper end is never passed', { low: 10, likely: 12, high: 20 }, 1, 20],
    ['the peak parts the cases by its distance from the ends', { low: 10, likely: 12, high: 20 }, 0.2, 12],
    ['a symmetrical triple has its middle at the peak', { low: 0, likely: 5, high: 10 }, 0.5, 5],
    ['a single point stays itself', { low: 7, likely: 7, high: 7 }, 0.9, 7],
    ['a peak at the top is met at the end', { low: 80, likely: 100, high: 100 }, 1, 100],
  ])('%s', (_sentence, triple, share, expected) => {
    expect(triangularPercentile(triple, share)).toBeCloseTo(expected, 10);
  });

  it('never falls as the share rises, and stays between the ends', () => {
    const figure = fc.double({ min: 0, max: 1e4, noNaN: true });
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(figure, figure, figure), share, share, (points, one, other) => {
        const [low, likely, high] = [...points].sort((a, b) => a - b) as [number, number, number];
        const triple = { low, likely, high };
        const lower = triangularPercentile(triple, Math.min(one, other));
        const upper = triangularPercentile(triple, Math.max(one, other));
        expect(lower).toBeLessThanOrEqual(upper + 1e-9);
        expect(lower).toBeGreaterThanOrEqual(low - 1e-9);
        expect(upper).toBeLessThanOrEqual(high + 1e-9);
      }),
    );
  });
});
