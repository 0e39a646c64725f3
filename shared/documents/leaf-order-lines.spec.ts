import { leafOrderLines } from '#shared/documents/leaf-order-lines';
import { startLeaf } from '#shared/leaf/start-leaf';

const order = (productId: string, leaves: number) =>
  leafOrderLines([{ productId, leaves }], { card: startLeaf, digits: 2 });

describe('the leaf order', () => {
  it('adds the spare leaves and takes whole booklets', () => {
    // 207.3 leaves are 208, with 4 % spare 216; nine booklets of 25 at 52.00.
    const [line] = order('gold-23-5-loose', 207.3);
    expect([line.needLeaves, line.spareLeaves]).toEqual([208, 8]);
    expect(line.purchase).toMatchObject({ booklets: 9, packs: [], singles: 9 });
    expect(line.price_minor).toBe(9 * 52_00);
  });

  it('takes a pack where it is the cheaper way', () => {
    // 19.5 booklets are 20: a pack of 20 at 5 % off.
    const [line] = order('gold-23-5-loose', 468);
    expect(line.purchase).toMatchObject({ booklets: 20, packs: [{ booklets: 20, count: 1 }], singles: 0 });
    expect(line.price_minor).toBe(988_00);
  });

  it('orders nothing where nothing is needed', () => {
    expect(order('silver-loose', 0)).toEqual([]);
  });
});
