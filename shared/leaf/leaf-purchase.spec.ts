import fc from 'fast-check';
import { bookletPrices, leafPurchase } from '#shared/leaf/leaf-purchase';
import { startLeaf } from '#shared/leaf/start-leaf';

const [gold] = startLeaf.products;
const at = (price: string, ...breaks: [number, string][]) => ({
  ...gold,
  price,
  breaks: breaks.map(([booklets, off_percent]) => ({ booklets, off_percent })),
});
const usual = at('52.00', [20, '5'], [100, '8']);

describe('leafPurchase', () => {
  it.each([
    ['nothing costs nothing', usual, 0, 0, [], 0, '0'],
    ['singles at list', usual, 3, 3, [], 3, '156'],
    ['a pack and the rest in singles', usual, 36, 36, [[20, 1]], 16, '1820'],
    ['nineteen singles cost what a pack costs, so the pack it is', usual, 19, 20, [[20, 1]], 0, '988'],
    ['whole packs alone', usual, 40, 40, [[20, 2]], 0, '1976'],
    ['a hundred at 8 % off are cheaper than ninety-eight any other way', usual, 98, 100, [[100, 1]], 0, '4784'],
    [
      'large and small packs and singles together',
      usual,
      125,
      125,
      [
        [100, 1],
        [20, 1],
      ],
      5,
      '6032',
    ],
    ['without breaks only singles', at('9.50'), 7, 7, [], 7, '66.5'],
    [
      'fractions of a cent are kept until the line is rounded',
      at('3.33', [10, '12.5']),
      10,
      10,
      [[10, 1]],
      0,
      '29.1375',
    ],
  ])('%s', (_sentence, product, need, booklets, packs, singles, price) => {
    expect(leafPurchase(product, need)).toEqual({
      booklets,
      packs: (packs as [number, number][]).map(([size, count]) => ({ booklets: size, count })),
      singles,
      price,
    });
  });

  it('refuses a need that is not whole, below nothing or beyond counting', () => {
    for (const need of [1.5, -1, 20_001]) expect(() => leafPurchase(usual, need)).toThrow(RangeError);
  });

  it('finds no dearer mix than trying all of them, and prices the whole table alike', () => {
    const need = fc.integer({ min: 0, max: 60 });
    fc.assert(
      fc.property(need, fc.integer({ min: 2, max: 25 }), fc.integer({ min: 0, max: 40 }), (booklets, size, off) => {
        const product = at('7.00', [size, String(off)]);
        const found = leafPurchase(product, booklets);
        // In ten-thousandths, to compare exactly.
        const all = Array.from({ length: Math.ceil(booklets / size) + 1 }, (_, packs) => {
          const singles = Math.max(0, booklets - packs * size);
          return { cost: packs * size * 700 * (100 - off) + singles * 70_000, booklets: packs * size + singles };
        });
        const least = Math.min(...all.map(({ cost }) => cost));
        const most = Math.max(...all.filter(({ cost }) => cost === least).map((mix) => mix.booklets));
        expect(Math.round(Number(found.price) * 10_000)).toBe(least);
        expect(found.booklets).toBe(most);
        expect(bookletPrices(product, booklets)[booklets]).toBe(found.price);
      }),
    );
  });

  it('never costs less for more booklets', () => {
    const prices = bookletPrices(usual, 250).map(Number);
    prices.slice(1).forEach((price, index) => expect(price).toBeGreaterThanOrEqual(prices[index]));
    expect(prices).toHaveLength(251);
  });
});
