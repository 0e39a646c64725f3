import fc from 'fast-check';
import { marginOfMarkUp, markUpOfMargin, priceFactor } from '#shared/money/margin';

describe('margin and mark-up', () => {
  it('tell a price of 125 for a cost of 100 both ways', () => {
    expect(marginOfMarkUp('25').toString()).toBe('20');
    expect(markUpOfMargin('20').toString()).toBe('25');
    expect(priceFactor({ way: 'margin', percent: '20' }).toString()).toBe('1.25');
    expect(priceFactor({ way: 'mark-up', percent: '20' }).toString()).toBe('1.2');
  });

  it('lead back to where they started', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 9_999 }), (hundredths) => {
        const margin = (hundredths / 100).toFixed(2);
        expect(marginOfMarkUp(markUpOfMargin(margin)).toDecimalPlaces(20).toNumber()).toBe(Number(margin));
      }),
    );
  });

  it('never take a margin for a smaller mark-up: the mark-up is the larger figure', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 99 }), (margin) => {
        expect(markUpOfMargin(String(margin)).greaterThan(margin)).toBe(true);
      }),
    );
  });

  it('refuse a margin of the whole price', () => {
    expect(() => markUpOfMargin('100')).toThrow(RangeError);
    expect(() => marginOfMarkUp('-100')).toThrow(RangeError);
  });
});
