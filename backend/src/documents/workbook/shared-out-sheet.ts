import type { PriceGoods } from '#shared/estimates/price/price-input';
import { sharesByLine } from '#shared/estimates/price/worked-lines';
import { minorOf } from '#shared/money/minor-of';
import { settled } from '#shared/money/settled';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import type { LeafPages } from './leaf-pages';
import type { MaterialsPage } from './materials-sheet';
import { remainderFormula, remainderOf, shareFormula, thresholdFormula, thresholdOf } from './remainder';
import { formula, input, Sheet } from './sheet';
import { lineNumber, type WorkbookFacts } from './workbook-facts';

/** Leaf and materials of the job shared out to the lines they are used on. */
export interface SharedOutPage {
  readonly sheet: Sheet;
  /** What falls to a line in whole minor units, as a formula; null where nothing does. */
  readonly goodsOnLine: (line: number) => string | null;
}

const at = { item: 1, line: 2, member: 3, weight: 4, remainder: 5, part: 6 } as const;

interface ItemPlace {
  readonly cost: string;
  readonly weights: string;
  readonly remainders: string;
  readonly threshold: string;
}

/** Cut towards zero; what is left goes by ones to the largest remainders. */
function shareRow(sheet: Sheet, place: number, { cost, weights, threshold }: ItemPlace) {
  const row = sheet.next;
  const [weight, remainder] = [sheet.here(at.weight, row), sheet.here(at.remainder, row)];
  const share = shareFormula(`${cost}*${weight}/${weights}`);
  return {
    remainder: remainderFormula(share, place),
    part: `TRUNC(${share})+IF(${remainder}>=${threshold},1,0)`,
  };
}

interface Item {
  readonly goods: PriceGoods;
  readonly cost: string;
  readonly weight: (line: string) => string | null;
}

/** One item: its cost, the sum of its weights and the least remainder that still gets one more; then its lines. */
function itemRows(sheet: Sheet, { goods, cost, weight }: Item, facts: WorkbookFacts): void {
  const shares = sharesByLine(goods);
  const total = minorOf(goods.cost, facts.price.digits);
  const weights = shares.map((share) => settled(share.weight));
  const parts = splitByLargestRemainder(total, weights);
  const whole = weights.reduce((sum, one) => sum + one, 0);
  const remainders = weights.map((one, place) => remainderOf((total * one) / whole, place + 1));
  const row = sheet.next;
  const [first, last] = [row + 1, row + shares.length];
  const span = (column: number) => `${sheet.here(column, first)}:${sheet.here(column, last)}`;
  const item: ItemPlace = {
    cost: sheet.here(at.part, row),
    weights: sheet.here(at.weight, row),
    remainders: span(at.remainder),
    threshold: sheet.here(at.remainder, row),
  };
  sheet.add(
    [
      ...[goods.name, null, null],
      formula(`SUM(${span(at.weight)})`, whole),
      formula(thresholdFormula(span(at.remainder)), thresholdOf(remainders)),
      formula(cost, total),
    ],
    'sum',
  );
  shares.forEach((share, place) => {
    const { remainder, part } = shareRow(sheet, place + 1, item);
    const line = sheet.here(at.line, sheet.next);
    const member = facts.prepared.work.members.find((one) => one.member.id === share.memberId)?.member.name ?? '';
    const text = weight(line);
    sheet.add([
      ...[null, lineNumber(facts, share), member],
      text === null ? input(weights[place]) : formula(text, weights[place]),
      formula(remainder, remainders[place]),
      formula(part, parts[place]),
    ]);
  });
}

/** What is bought once for the whole job, shared out by largest remainder, so that the parts sum to the total. */
export function sharedOutSheet(
  facts: WorkbookFacts,
  { leaf, materials }: { readonly leaf: LeafPages; readonly materials: MaterialsPage },
  unit: string,
): SharedOutPage {
  const { words, prepared } = facts;
  const figure = (width: number, format: string) => ({ width, format });
  const sheet = new Sheet(words.say('sheet-shared-out'), [
    ...[figure(34, ''), figure(8, '0'), figure(30, ''), figure(16, '#,##0.000000')],
    ...[figure(18, '0.000000000000'), figure(16, '#,##0')],
  ]);
  sheet.head(words.say('sheet-shared-out'), words.say('sheet-shared-out-note'), [
    ...[words.say('sheet-head-item'), words.say('sheet-head-line'), words.say('sheet-head-member')],
    ...[words.say('sheet-head-weight'), words.say('sheet-head-remainder'), words.say('sheet-head-part', { unit })],
  ]);
  const from = sheet.next;
  for (const goods of prepared.work.goods) {
    const cost = (goods.head === 'leaf' ? leaf.cost : materials.cost).get(goods.itemId) ?? '0';
    const isLeaf = goods.head === 'leaf' && goods.shares.some(({ weight }) => weight > 0);
    const weight = (line: string) => (isLeaf ? leaf.grossOnLine(goods.itemId, line) : null);
    itemRows(sheet, { goods, cost, weight }, facts);
  }
  const to = Math.max(from, sheet.rows.length);
  const [parts, lines] = [sheet.span(at.part, from, to), sheet.span(at.line, from, to)];
  const known = new Set(sheet.rows.map(({ cells }) => cells[at.line - 1]));
  return { sheet, goodsOnLine: (line) => (known.has(line) ? `SUMIFS(${parts},${lines},${line})` : null) };
}
