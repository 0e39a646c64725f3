import type { PriceCost, PriceHead } from '#shared/estimates/price/price';
import { moneyParts, moneyStretches } from './money-parts';

const head = (given: Partial<PriceHead> & Pick<PriceHead, 'head' | 'cost_minor'>): PriceHead => ({
  itemId: null,
  name: '',
  hours: 0,
  ...given,
});

const cost = (given: Partial<PriceCost>): PriceCost => ({
  heads: [
    head({ head: 'leaf', name: 'Gold 23½ ct', cost_minor: 20_000 }),
    head({ head: 'labour', name: 'Gilder', hours: 10, cost_minor: 30_000 }),
    head({ head: 'labour', name: 'Carver', hours: 5, cost_minor: 10_000 }),
    head({ head: 'timber', cost_minor: 0 }),
  ],
  lines: [],
  hours: 15,
  direct_minor: 60_000,
  overhead_minor: 15_000,
  contingency_minor: 5_000,
  cost_minor: 80_000,
  priced_minor: 0,
  margin_percent: 20,
  markUp_percent: 25,
  profit_minor: 20_000,
  marginLeft_percent: 20,
  markUpLeft_percent: 25,
  reasons: [],
  ...given,
});

describe('moneyParts', () => {
  it('gathers grades under labour, in the order of the heads, then what is laid over the cost; nothing empty', () => {
    expect(moneyParts(cost({})).map(({ key, amount_minor, items }) => [key, amount_minor, items.length])).toEqual([
      ['labour', 40_000, 2],
      ['leaf', 20_000, 1],
      ['overhead', 15_000, 0],
      ['contingency', 5_000, 0],
      ['profit', 20_000, 0],
    ]);
  });

  it('keeps a loss as a part of its own, so that the parts are the net price still', () => {
    const parts = moneyParts(cost({ profit_minor: -30_000 }));
    expect(parts.at(-1)).toEqual({ key: 'profit', amount_minor: -30_000, items: [] });
    expect(parts.reduce((sum, { amount_minor }) => sum + amount_minor, 0)).toBe(50_000);
  });
});

describe('moneyStretches', () => {
  it('lays the parts end to end over a thousand', () => {
    expect(moneyStretches(moneyParts(cost({})))).toEqual([
      { key: 'labour', start: 0, length: 400 },
      { key: 'leaf', start: 400, length: 200 },
      { key: 'overhead', start: 600, length: 150 },
      { key: 'contingency', start: 750, length: 50 },
      { key: 'profit', start: 800, length: 200 },
    ]);
  });

  it('draws the cost alone where there is a loss, and nothing where there is no money', () => {
    const drawn = moneyStretches(moneyParts(cost({ profit_minor: -30_000 })));
    expect(drawn.map(({ key }) => key)).not.toContain('profit');
    expect(drawn.reduce((sum, { length }) => sum + length, 0)).toBeCloseTo(1000, 9);
    expect(moneyStretches([])).toEqual([]);
  });
});
