import { mergedValues, type CardSide } from '#shared/rate-cards/merged-values';
import type { ShopContent } from '#shared/programme/shop-schema';
import type { Difference } from '../../jobs';
import { valueAt, type ShopWords } from './shop-words';

/** What two people entered of one workshop since it was kept last. */
export interface ShopSides {
  readonly base: ShopContent;
  readonly mine: ShopContent;
  readonly theirs: ShopContent;
}

/** Both laid together line by line; the lines both changed are of one side. */
export const mergedShop = (sides: ShopSides, side: CardSide): ShopContent => mergedValues(sides, () => side).value;

/** The lines both changed, each in its own way, in words. */
export function shopDifferences(sides: ShopSides, words: ShopWords): Difference[] {
  const { mine, theirs } = sides;
  return mergedValues(sides, () => 'mine').overlaps.map(({ key }) => {
    const path = key.split('/');
    const field = path[path.length - 1];
    const said = (side: ShopContent): string =>
      field === '*' ? words.order(valueAt(side, path.slice(0, -1))) : words.value(field, valueAt(side, path));
    return { name: words.name(path, [mine, theirs]), mine: said(mine), theirs: said(theirs) };
  });
}
