import type { ZoneLeaf } from '#shared/leaf/zone-leaf-result';
import { bookletTable } from './booklet-table';
import type { GoodsRates, LeafRates, LossRates } from './goods-rates';
import { countedUp, roundedMinor } from './rounded';
import { formula, input, Sheet } from './sheet';
import { lineNumber, type WorkbookFacts } from './workbook-facts';

/** Where the leaf of the zones stands, and what each product costs. */
export interface LeafPages {
  readonly sheet: Sheet;
  readonly booklets: Sheet;
  /** Addresses by zone: net leaves, and pieces (or metres) handled for a leaf. */
  readonly net: ReadonlyMap<string, string>;
  readonly handled: ReadonlyMap<string, string>;
  readonly losses: ReadonlyMap<string, LossRates>;
  /** Cost of each product in whole minor units, and the gross leaves of one of them on one line, as formulas. */
  readonly cost: ReadonlyMap<string, string>;
  readonly grossOnLine: (productId: string, line: string) => string;
}

const at = { line: 1, member: 2, zone: 3, leaf: 4, product: 5, way: 6, net: 7, handled: 8, gross: 9 } as const;
const columns = [7, 30, 24, 30, 9, 12].map((width) => ({ width, format: '' }));
const figures = ['#,##0.0000', '0.####', '#,##0.0000'].map((format) => ({ width: 14, format }));

/** Of net leaves, those laid at first, patched, and laid a second time: 1, f × (1 − s) and s. */
export const layingParts = ({ faulting, second }: LossRates) =>
  ({ first: '1', faulting: `(${faulting}/100*(1-${second}/100))`, second: `(${second}/100)` }) as const;

/** Gross = net × (1 + second + faulting × (1 − second)) ÷ (1 − breakage). */
function grossFormula(net: string, losses: LossRates): string {
  const { faulting, second } = layingParts(losses);
  return `${net}*(1+${second}+${faulting})/(1-${losses.breakage}/100)`;
}

const handledPerLeaf = ({ grossLeaves, handled }: ZoneLeaf): number =>
  grossLeaves.likely > 0 ? handled.likely / grossLeaves.likely : 1;

function heads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-line'), say('sheet-head-member'), say('sheet-head-zone'), say('sheet-head-leaf')],
    ...[say('sheet-head-leaf-number'), say('sheet-head-way'), say('sheet-head-net'), say('sheet-head-handled')],
    say('sheet-head-gross'),
  ];
}

function productHeads({ say }: WorkbookFacts['words'], unit: string): string[] {
  return [
    ...['', '', '', say('sheet-head-leaf'), say('sheet-head-leaf-number'), ''],
    ...[say('sheet-head-gross'), say('sheet-head-booklets'), say('sheet-head-cost', { unit })],
  ];
}

interface ProductPlace {
  readonly number: number;
  readonly spans: { readonly gross: string; readonly product: string };
  readonly booklets: Sheet;
}

/** Whole booklets of the likely need at the cheapest mix of packs, or leaf by leaf at list, as the card says. */
function productRow(sheet: Sheet, leaf: LeafRates, place: ProductPlace, facts: WorkbookFacts): string {
  const { prepared, price, snapshot } = facts;
  const total = prepared.work.leaf.find(({ productId }) => productId === leaf.product.id);
  const { number, spans, booklets } = place;
  const row = sheet.next;
  const [gross, count] = [sheet.here(at.net, row), sheet.here(at.handled, row)];
  const bought = bookletTable(booklets, leaf, { facts, need: total?.booklets ?? 0 });
  const byTheLeaf = `${leaf.price}*${10 ** price.digits}*${gross}/${leaf.inBooklet}`;
  const isWhole = snapshot.card.leaf.charge === 'booklets';
  const cost = facts.prepared.work.goods.find(({ head, itemId }) => head === 'leaf' && itemId === leaf.product.id);
  sheet.add([
    ...[null, null, null, leaf.product.name, number, null],
    formula(`SUMIFS(${spans.gross},${spans.product},${number})`, total?.grossLeaves.likely ?? 0),
    formula(countedUp(`${gross}/${leaf.inBooklet}`), total?.booklets ?? 0),
    formula(
      roundedMinor(isWhole ? bought(count) : byTheLeaf),
      Math.round(Number(cost?.cost ?? 0) * 10 ** price.digits),
    ),
  ]);
  return sheet.at(at.gross, row);
}

/** Leaf zone by zone from its net leaves, then product by product as it is bought. */
export function leafPages(facts: WorkbookFacts, rates: GoodsRates, unit: string): LeafPages {
  const { words, prepared } = facts;
  const sheet = new Sheet(words.say('sheet-leaf'), [...columns, ...figures]);
  const booklets = new Sheet(words.say('sheet-booklets'), [
    { width: 12, format: '0' },
    { width: 18, format: '#,##0.00##' },
  ]);
  booklets.head(words.say('sheet-booklets'), words.say('sheet-booklets-note', { unit }), []);
  sheet.head(words.say('sheet-leaf'), words.say('sheet-leaf-note'), heads(words));
  const from = sheet.next;
  const maps = {
    net: new Map<string, string>(),
    handled: new Map<string, string>(),
    losses: new Map<string, LossRates>(),
  };
  for (const { leaf, zone, memberId } of prepared.work.zones) {
    const number = rates.leaf.findIndex(({ product }) => product.id === leaf?.productId) + 1;
    if (!leaf || number === 0) continue;
    const losses = rates.losses(leaf);
    const row = sheet.next;
    const member = prepared.work.members.find((one) => one.member.id === memberId)?.member.name ?? '';
    sheet.add([
      ...[lineNumber(facts, { memberId, kind: 'gilding' }), member, zone.name, rates.leaf[number - 1].product.name],
      ...[number, words.say('sheet-way', { way: leaf.way }), input(leaf.netLeaves), input(handledPerLeaf(leaf))],
      formula(grossFormula(sheet.here(at.net, row), losses), leaf.grossLeaves.likely),
    ]);
    maps.net.set(zone.id, sheet.at(at.net, row));
    maps.handled.set(zone.id, sheet.at(at.handled, row));
    maps.losses.set(zone.id, losses);
  }
  const to = Math.max(from, sheet.rows.length);
  const spans = { gross: sheet.span(at.gross, from, to), product: sheet.span(at.product, from, to) };
  const lines = sheet.span(at.line, from, to);
  sheet.add([]);
  sheet.add(productHeads(words, unit), 'head');
  const cost = new Map(
    rates.leaf.map((leaf, place) => [
      leaf.product.id,
      productRow(sheet, leaf, { number: place + 1, spans, booklets }, facts),
    ]),
  );
  const numberOf = (id: string) => rates.leaf.findIndex(({ product }) => product.id === id) + 1;
  // To ten digits, as every weight is taken: the last bits of a sum are not a reason for a cent.
  const grossOnLine = (id: string, line: string) => {
    const sum = `SUMIFS(${spans.gross},${spans.product},${numberOf(id)},${lines},${line})`;
    return `IF(${sum}<=0,0,ROUND(${sum},9-INT(LOG10(${sum}))))`;
  };
  return { sheet, booklets, ...maps, cost, grossOnLine };
}
