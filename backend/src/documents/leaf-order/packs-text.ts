import type { LeafOrderLine } from '#shared/documents/leaf-order-lines';
import type { PaperWords } from '../paper-words';

/** How the booklets of a line are bought: so many packs of so many, the rest one by one. */
export function packsText({ product, purchase }: LeafOrderLine, { say }: PaperWords): string {
  const form = product.form === 'ribbon' ? 'ribbon' : 'leaf';
  const packs = purchase.packs.map(({ count, booklets }) => say('paper-order-packs', { count, booklets, form }));
  const singles = purchase.singles > 0 ? [say('paper-order-singles', { count: purchase.singles, form })] : [];
  return [...packs, ...singles].join(', ');
}
