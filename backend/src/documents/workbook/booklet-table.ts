import { bookletPrices } from '#shared/leaf/leaf-purchase';
import { D } from '#shared/money/decimal';
import type { LeafRates } from './goods-rates';
import { formula, type Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

const costColumn = 2;

/** So many more booklets than are needed are priced, so that a changed loss or rate still finds its price. */
const headroom = (need: number): number => need + Math.max(6, Math.ceil(need / 5));

/**
 * A table of what 0, 1, 2 … booklets of a leaf come to at their cheapest, in minor units: one more at list, or a whole pack at its break, on
 * top of what fewer cost. Gives what a number of booklets costs, as a formula; beyond the table each one more costs what the last one did.
 */
export function bookletTable(
  sheet: Sheet,
  { product, price, breaks }: LeafRates,
  { facts, need }: { readonly facts: WorkbookFacts; readonly need: number },
): (booklets: string) => string {
  const scale = 10 ** facts.price.digits;
  const most = headroom(need);
  const costs = bookletPrices(product, most).map((cost) => new D(cost).times(scale).toNumber());
  sheet.add([product.name], 'part');
  const first = sheet.next;
  const cell = (count: number) => sheet.here(costColumn, first + Math.max(0, count));
  costs.forEach((cost, count) => {
    const packs = breaks.map(
      ({ booklets, off }) => `${cell(count - booklets)}+${booklets}*${price}*${scale}*(100-${off})/100`,
    );
    const offers = [`${cell(count - 1)}+${price}*${scale}`, ...packs];
    sheet.add([count, count === 0 ? 0 : formula(`MIN(${offers.join(',')})`, cost)]);
  });
  const column = sheet.span(costColumn, first, first + most);
  const [last, before] = [most, most - 1].map((count) => sheet.at(costColumn, first + count));
  return (booklets) =>
    `IF(${booklets}>${most},${last}+(${booklets}-${most})*(${last}-${before}),INDEX(${column},MIN(${booklets},${most})+1,1))`;
}
