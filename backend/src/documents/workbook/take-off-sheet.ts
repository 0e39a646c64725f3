import type { MeasuredMember, MeasuredZone } from '#shared/estimates/measured-member';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import type { GildingRates } from './gilding-rates';
import { formula, input, Sheet, type CellContent } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** Where the surfaces of the zones stand, for all that is worked from them. */
export interface TakeOff {
  readonly sheet: Sheet;
  /** Addresses by zone: plan surface in m², and what a zone has of its own. */
  readonly plan: ReadonlyMap<string, string>;
  readonly painted: ReadonlyMap<string, string>;
  readonly burnished: ReadonlyMap<string, string>;
  readonly edge: ReadonlyMap<string, string>;
  /** Plan surface of all zones of a lot, as a formula. */
  readonly lotPlan: (lot: number) => string;
}

const areaColumn = { width: 13, format: '#,##0.0000' };
const countColumn = { width: 8, format: '0' };
const text = (width: number) => ({ width, format: '' });

const squareMetres = (area_mm2: number): number => area_mm2 / 1e6;

/** Columns of the zones; those of the members stand in the same places. */
const at = { number: 1, name: 2, zone: 3, text: 4, count: 5, developed: 6, openings: 7, plan: 8, true: 9 } as const;
const own = { painted: 10, burnished: 11, edge: 12, lot: 13 } as const;

function memberRow(sheet: Sheet, { member, surface, areas }: MeasuredMember, facts: WorkbookFacts): number {
  const { pieces } = facts.snapshot.draft;
  const piece = pieces.find(({ id }) => id === member.pieceId)?.name ?? '';
  const timber = facts.snapshot.card.carving.timbers.find(({ id }) => id === member.timberId)?.name ?? member.timberId;
  const row = sheet.next;
  const [count, developed, openings] = [at.count, at.developed, at.openings].map((column) => sheet.here(column, row));
  return sheet.add([
    ...[row, member.name, piece, timber],
    ...[input(member.count), input(squareMetres(surface.area_mm2)), input(squareMetres(areas.openingsEach_mm2))],
    formula(`MAX(0,${developed}-${openings})*${count}`, squareMetres(areas.plan_mm2)),
  ]);
}

function reliefName(zone: MeasuredZone, { surface }: MeasuredMember, rates: GildingRates): string {
  const { relief } = zone.zone;
  return relief === 'in-the-round' && surface.isTrueSurface ? rates.measuredInTheRound : rates.relief[relief];
}

interface ZonePlace {
  readonly measured: MeasuredMember;
  readonly memberRow: number;
  readonly lot: number;
  readonly rates: GildingRates;
}

/** (developed − openings) × count × share, and × relief; pierced work counts whole. */
function zoneRow(sheet: Sheet, worked: WorkedZone, { measured, memberRow: above, lot, rates }: ZonePlace): number {
  const { zone, area } = worked;
  const [row, here] = [sheet.next, (column: number) => sheet.here(column, above)];
  const whole = zone.relief === 'pierced' ? here(at.developed) : `MAX(0,${here(at.developed)}-${here(at.openings)})`;
  const ownFigures: CellContent[] = [
    zone.painted_percent > 0 ? input(zone.painted_percent) : null,
    zone.burnished_percent === null ? null : input(zone.burnished_percent),
    worked.facts.protectedEdge_mm > 0 ? input(worked.facts.protectedEdge_mm / 1000) : null,
    lot,
  ];
  return sheet.add([
    ...[row, measured.member.name, zone.name, worked.buildUp?.name ?? zone.buildUpId],
    ...[null, input(area.share), null],
    formula(`${whole}*${sheet.here(at.developed, row)}*${here(at.count)}`, squareMetres(area.plan_mm2)),
    formula(`${sheet.here(at.plan, row)}*${reliefName(worked, measured, rates)}`, squareMetres(area.net_mm2)),
    ...ownFigures,
  ]);
}

function memberTable(sheet: Sheet, facts: WorkbookFacts): Map<string, number> {
  const { members } = facts.prepared.work;
  return new Map(members.map((measured) => [measured.member.id, memberRow(sheet, measured, facts)]));
}

function totalRow(sheet: Sheet, label: string, { from, last }: { from: number; last: number }): void {
  const to = sheet.rows.length;
  const figure = (cells: readonly CellContent[], column: number) => {
    const cell = cells[column - 1];
    return cell !== null && typeof cell === 'object' && 'value' in cell ? cell.value : 0;
  };
  const total = (column: number) =>
    sheet.rows.slice(from - 1, to).reduce((sum, { cells }) => sum + figure(cells, column), 0);
  const sum = (column: number) =>
    to < from ? null : formula(`SUM(${sheet.here(column, from)}:${sheet.here(column, to)})`, total(column));
  const sums = [sum(at.plan), sum(at.true)].slice(0, last - at.plan + 1);
  sheet.add([null, label, null, null, null, null, null, ...sums], 'sum');
}

function zoneHeads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-row'), say('sheet-head-member'), say('sheet-head-zone'), say('sheet-head-buildup'), ''],
    ...[say('sheet-head-share'), '', say('sheet-head-plan'), say('sheet-head-true')],
    ...[say('sheet-head-painted'), say('sheet-head-burnished'), say('sheet-head-edge'), say('sheet-head-lot')],
  ];
}

function memberHeads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-row'), say('sheet-head-member'), say('sheet-head-piece'), say('sheet-head-timber')],
    ...[say('sheet-head-count'), say('sheet-head-developed'), say('sheet-head-openings'), say('sheet-head-plan')],
  ];
}

/** The surfaces: developed area of each member as measured, what its zones take of it, plan and true. */
export function takeOffSheet(facts: WorkbookFacts, rates: GildingRates): TakeOff {
  const { words, prepared } = facts;
  const texts = [text(7), text(30), text(24), text(30)];
  const figures = [countColumn, areaColumn, areaColumn, areaColumn, areaColumn];
  const more = ['0.##', '0.##', '0.000', '0'].map((format) => ({ width: 12, format }));
  const sheet = new Sheet(words.say('sheet-take-off'), [...texts, ...figures, ...more]);
  sheet.head(words.say('sheet-take-off'), words.say('sheet-take-off-note'), memberHeads(words));
  const first = sheet.next;
  const memberRows = memberTable(sheet, facts);
  totalRow(sheet, words.say('sheet-total'), { from: first, last: at.plan });
  sheet.add([]);
  sheet.add(zoneHeads(words), 'head');
  const from = sheet.next;
  const addresses = { plan: new Map(), painted: new Map(), burnished: new Map(), edge: new Map() } as const;
  for (const zone of prepared.work.zones) {
    const measured = prepared.work.members.find(({ member }) => member.id === zone.memberId);
    if (!measured) continue;
    const lot = prepared.work.lots.findIndex(({ zoneIds }) => zoneIds.includes(zone.zone.id)) + 1;
    const row = zoneRow(sheet, zone, { measured, memberRow: memberRows.get(zone.memberId) ?? 0, lot, rates });
    addresses.plan.set(zone.zone.id, sheet.at(at.plan, row));
    for (const key of ['painted', 'burnished', 'edge'] as const)
      addresses[key].set(zone.zone.id, sheet.at(own[key], row));
  }
  const to = sheet.rows.length;
  totalRow(sheet, words.say('sheet-total'), { from, last: at.true });
  const spans = { plan: sheet.span(at.plan, from, to), lot: sheet.span(own.lot, from, to) };
  return { sheet, ...addresses, lotPlan: (lot) => `SUMIFS(${spans.plan},${spans.lot},${lot})` };
}
