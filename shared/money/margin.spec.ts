import fc from 'fast-check';
import { D } from '#shared/money/decimal';
import { marginOfMarkUp, markUpOfMargin, priceFactor, priceOfCost } from '#shared/money/margin';
import { roundMinor } from '#shared/money/round-minor';

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

  it('give a price that ends in an exact half its half, so that it is rounded up', () => {
    // 99 % of 7,159.5 is 7,087.905: at a margin of 1 % the price is 7,159.5 and nothing less.
    expect(priceOfCost(new D('7087.905'), { way: 'margin', percent: '1' }).toString()).toBe('7159.5');
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 99 }), fc.integer({ min: 0, max: 9_999_999 }), (margin, whole) => {
        const cost = new D(whole)
          .plus('0.5')
          .times(100 - margin)
          .div(100);
        expect(roundMinor(priceOfCost(cost, { way: 'margin', percent: String(margin) }))).toBe(whole + 1);
      }),
    );
  });

  it('refuse a margin of the whole price', () => {
    expect(() => priceOfCost(new D(1), { way: 'margin', percent: '100' })).toThrow(RangeError);
    expect(() => markUpOfMargin('100')).toThrow(RangeError);
    expect(() => marginOfMarkUp('-100')).toThrow(RangeError);
  });
});
