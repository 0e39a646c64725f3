import { leafOrder } from '#shared/leaf/leaf-order';
import { leafTotals } from '#shared/leaf/leaf-totals';
import { startLeaf } from '#shared/leaf/start-leaf';
import type { ZoneLeaf } from '#shared/leaf/laying';

const zone = (productId: string, leaves: number, trueArea_mm2: number): ZoneLeaf => ({
  zoneId: `${productId} ${leaves}`,
  productId,
  ground: { system: 'water', finish: 'water-burnished', isSealed: false },
  way: 'sheets',
  laying: null,
  planArea_mm2: trueArea_mm2,
  trueArea_mm2,
  netLeaves: leaves * 0.8,
  losses: {
    breakage_percent: { low: 0, likely: 0, high: 0 },
    faulting_percent: { low: 0, likely: 0, high: 0 },
    second_percent: { low: 0, likely: 0, high: 0 },
    secondLayings: [],
  },
  grossLeaves: { low: leaves * 0.9, likely: leaves, high: leaves * 1.2 },
  grossLeaves_p10: leaves * 0.95,
  grossLeaves_p90: leaves * 1.1,
  handled: { low: leaves * 0.9, likely: leaves, high: leaves * 1.2 },
  reasons: [],
  findings: [],
});

const gold = 'gold-23-5-loose';

describe('leafTotals', () => {
  it('adds the exact leaves of all zones before it rounds to booklets', () => {
    const [total] = leafTotals([zone(gold, 30.4, 1e5), zone(gold, 69.6, 3e5)], startLeaf);
    expect(total).toMatchObject({ productId: gold, booklets: 4, price: '208', trueArea_mm2: 4e5 });
    expect(total?.grossLeaves.likely).toBeCloseTo(100, 9);
    expect(total?.netLeaves).toBeCloseTo(80, 9);
    expect(total?.mass_grams).toBeCloseTo(1.5, 9);
  });

  it('tells how the leaf stands to the surface', () => {
    const [total] = leafTotals([zone(gold, 100, 5e5)], startLeaf);
    expect(total?.coverage.grossToNet).toBeCloseTo(1.28, 9);
    expect(total?.coverage.loss_percent).toBeCloseTo(21.875, 9);
    expect(total?.coverage.leavesPerM2).toBeCloseTo(200, 9);
    expect(total?.coverage.leavesPerFt2).toBeCloseTo(18.580608, 6);
  });

  it('charges whole booklets, or by the leaf where the owner prefers it', () => {
    const zones = [zone(gold, 41.9, 1e5)];
    expect(leafTotals(zones, startLeaf)[0]?.price).toBe('104');
    expect(leafTotals(zones, { ...startLeaf, charge: 'leaves' })[0]?.price).toBe('87.152');
  });

  it('keeps products apart, in the order of the card, and leaves out what is not used', () => {
    const zones = [zone('silver-loose', 10, 1e5), zone(gold, 10, 1e5), zone('gone', 10, 1e5)];
    expect(leafTotals(zones, startLeaf).map(({ productId }) => productId)).toEqual([gold, 'silver-loose']);
    expect(leafTotals([], startLeaf)).toEqual([]);
  });

  it('asks for one batch wherever leaf is used', () => {
    expect(leafTotals([zone(gold, 1, 1)], startLeaf)[0]?.findings).toMatchObject([
      { kind: 'note', code: 'leaf-one-batch' },
    ]);
    expect(leafTotals([zone(gold, 0, 0)], startLeaf)[0]).toMatchObject({ booklets: 0, price: '0', findings: [] });
  });
});

describe('leafOrder', () => {
  const [product] = startLeaf.products;

  it.each([
    ['spare leaves of the batch are added before booklets are counted', 890, 38, 38],
    ['a need that comes to nineteen booklets is a pack of twenty', 450, 19, 20],
    ['an exact fit stays exact', 625 / 1.04, 25, 25],
    ['nothing is ordered for nothing', 0, 0, 0],
  ])('%s', (_sentence, need, booklets, bought) => {
    const order = leafOrder(product, need, startLeaf);
    expect(order.booklets).toBe(booklets);
    expect(order.purchase.booklets).toBe(bought);
  });
});
