import type { ZoneLeaf } from '#shared/leaf/laying';
import type { GoodsRates, LossRates } from './goods-rates';
import { grossFormula } from './gross-formula';
import { leafProducts } from './leaf-products';
import { settledFormula } from './rounded';
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
/** Products stand under the zones: gross leaves, booklets and cost in the last three columns. */
const productColumns = { gross: at.net, booklets: at.handled, cost: at.gross } as const;

const columns = [7, 30, 24, 30, 9, 12].map((width) => ({ width, format: '' }));
const figures = ['#,##0.0000', '0.####', '#,##0.0000'].map((format) => ({ width: 14, format }));

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

interface LaidZones {
  readonly net: Map<string, string>;
  readonly handled: Map<string, string>;
  readonly losses: Map<string, LossRates>;
}

/** The zones that are laid, one after another. */
function zoneRows(sheet: Sheet, facts: WorkbookFacts, rates: GoodsRates): LaidZones {
  const { prepared, words } = facts;
  const laid: LaidZones = { net: new Map(), handled: new Map(), losses: new Map() };
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
    laid.net.set(zone.id, sheet.at(at.net, row));
    laid.handled.set(zone.id, sheet.at(at.handled, row));
    laid.losses.set(zone.id, losses);
  }
  return laid;
}

function bookletSheet({ words }: WorkbookFacts, unit: string): Sheet {
  const sheet = new Sheet(words.say('sheet-booklets'), [
    { width: 30, format: '0' },
    { width: 18, format: '#,##0.00##' },
  ]);
  sheet.head(words.say('sheet-booklets'), words.say('sheet-booklets-note', { unit }), []);
  return sheet;
}

/** Leaf zone by zone from its net leaves, then product by product as it is bought. */
export function leafPages(facts: WorkbookFacts, rates: GoodsRates, unit: string): LeafPages {
  const { words } = facts;
  const sheet = new Sheet(words.say('sheet-leaf'), [...columns, ...figures]);
  sheet.head(words.say('sheet-leaf'), words.say('sheet-leaf-note'), heads(words));
  const from = sheet.next;
  const zones = zoneRows(sheet, facts, rates);
  const to = Math.max(from, sheet.rows.length);
  const span = (column: number) => sheet.span(column, from, to);
  const booklets = bookletSheet(facts, unit);
  sheet.add([]);
  sheet.add(productHeads(words, unit), 'head');
  const spans = { gross: span(at.gross), product: span(at.product), booklets, at: productColumns };
  const cost = leafProducts(sheet, rates.leaf, { facts, spans });
  const numberOf = (id: string) => rates.leaf.findIndex(({ product }) => product.id === id) + 1;
  const grossOnLine = (id: string, line: string) =>
    settledFormula(`SUMIFS(${spans.gross},${spans.product},${numberOf(id)},${span(at.line)},${line})`);
  return { sheet, booklets, ...zones, cost, grossOnLine };
}
