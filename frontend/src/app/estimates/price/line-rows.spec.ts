import type { PriceLine, PriceLineCost } from '#shared/estimates/price/price';
import { lineRows, type NamedPrice } from './line-rows';

const line = (id: string, memberId: string | null, given: Partial<PriceLine>): PriceLine => ({
  id,
  memberId,
  kind: 'carving',
  name: null,
  taxCategoryId: 'standard',
  price_minor: 100,
  ...given,
});

const costOf = (lineId: string, hours: number, cost_minor: number): PriceLineCost => ({
  lineId,
  hours,
  direct_minor: cost_minor - 30,
  overhead_minor: 20,
  contingency_minor: 10,
  cost_minor,
  reasons: [{ code: 'price-rounded', values: {}, figure: cost_minor, unit: 'minor' }],
});

const price: NamedPrice = {
  lines: [
    line('apron/carving', 'apron', { price_minor: 300 }),
    line('apron/gilding', 'apron', { kind: 'gilding', price_minor: 200 }),
    line('crate', null, { kind: 'bought-in', name: 'Crate', price_minor: 50 }),
    line('leg/carving', 'leg', { price_minor: 400 }),
  ],
  costs: [costOf('apron/carving', 4, 250), costOf('apron/gilding', 2, 150), costOf('leg/carving', 6, 330)],
  memberOrder: ['apron', 'leg'],
  memberName: (id) => ({ apron: 'Apron', leg: 'Leg' })[id ?? ''] ?? 'The whole',
  kindName: (kind) => kind,
};

const shown = (rows: ReturnType<typeof lineRows>) =>
  rows.map(({ name, isHead, price_minor }) => [isHead, name, price_minor]);

describe('lineRows', () => {
  it('puts the lines under their member, the job as a whole last', () => {
    expect(shown(lineRows(price, 'members'))).toEqual([
      [true, 'Apron', 500],
      [false, 'carving', 300],
      [false, 'gilding', 200],
      [true, 'Leg', 400],
      [false, 'carving', 400],
      [true, 'The whole', 50],
      [false, 'Crate', 50],
    ]);
  });

  it('or under their kind of work, in the order of the work, with the same sum', () => {
    expect(shown(lineRows(price, 'kinds'))).toEqual([
      [true, 'carving', 700],
      [false, 'Apron', 300],
      [false, 'Leg', 400],
      [true, 'gilding', 200],
      [false, 'Apron', 200],
      [true, 'bought-in', 50],
      [false, 'Crate', 50],
    ]);
  });

  it('adds the cost side up in the heads, and explains the lines that have one', () => {
    const [apron, carving] = lineRows(price, 'members');
    expect(apron.cost).toEqual({
      hours: 6,
      direct_minor: 340,
      overhead_minor: 40,
      contingency_minor: 20,
      cost_minor: 400,
    });
    expect(carving.reasons).toHaveLength(1);
  });

  it('knows no cost where none is given', () => {
    const rows = lineRows({ ...price, costs: undefined }, 'members');
    expect(rows.every(({ cost, reasons }) => cost === undefined && reasons.length === 0)).toBe(true);
  });
});
