import { minorOf } from '#shared/money/minor-of';
import { bookletTable } from './booklet-table';
import type { LeafRates } from './goods-rates';
import { countedUp, roundedMinor, settledFormula } from './rounded';
import { formula, type Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** Columns the products share with the zones above them. */
export interface ProductColumns {
  readonly gross: number;
  readonly booklets: number;
  readonly cost: number;
}

/** Where the gross leaves of the zones stand, and the sheet of what booklets cost. */
export interface ZoneSpans {
  readonly gross: string;
  readonly product: string;
  readonly booklets: Sheet;
  readonly at: ProductColumns;
}

/** Whole booklets of the likely need at the cheapest mix of packs, or leaf by leaf at list, as the card says; gives where the cost stands. */
function productRow(
  sheet: Sheet,
  { leaf, number }: { leaf: LeafRates; number: number },
  { facts, spans }: { facts: WorkbookFacts; spans: ZoneSpans },
): string {
  const { prepared, price, snapshot } = facts;
  const { id, name } = leaf.product;
  const total = prepared.work.leaf.find(({ productId }) => productId === id);
  const row = sheet.next;
  const [gross, count] = [sheet.here(spans.at.gross, row), sheet.here(spans.at.booklets, row)];
  const bought = bookletTable(spans.booklets, leaf, { facts, need: total?.booklets ?? 0 });
  const byTheLeaf = `${leaf.price}*${10 ** price.digits}*${settledFormula(gross)}/${leaf.inBooklet}`;
  const cost = snapshot.card.leaf.charge === 'booklets' ? bought(count) : byTheLeaf;
  sheet.add([
    ...[null, null, null, name, number, null],
    formula(`SUMIFS(${spans.gross},${spans.product},${number})`, total?.grossLeaves.likely ?? 0),
    formula(countedUp(`${gross}/${leaf.inBooklet}`), total?.booklets ?? 0),
    formula(roundedMinor(cost), minorOf(total?.price ?? '0', price.digits)),
  ]);
  return sheet.at(spans.at.cost, row);
}

/** The products one after another, each as it is bought; addresses of their costs in minor units, by product. */
export function leafProducts(
  sheet: Sheet,
  leaf: readonly LeafRates[],
  at: { facts: WorkbookFacts; spans: ZoneSpans },
): ReadonlyMap<string, string> {
  return new Map(leaf.map((one, place) => [one.product.id, productRow(sheet, { leaf: one, number: place + 1 }, at)]));
}
