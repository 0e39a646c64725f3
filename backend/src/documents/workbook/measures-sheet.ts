import { paidFor, type MeasuredWork, type WorkMeasure } from '#shared/estimates/price/measured-work';
import type { ExtraLine } from '#shared/estimates/settings';
import { squareMillimetresPerSquareFoot } from '#shared/units/exact-factors';
import { formula, input, Sheet, type CellContent } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The measures that measured work is reckoned from; without any there is no sheet. */
export interface MeasuresPage {
  readonly sheets: readonly Sheet[];
  /** The quantity of a line as a formula; null where it follows a rule of the workshop's own. */
  readonly quantity: (lineId: string) => string | null;
}

type MeasuredLine = Extract<ExtraLine, { kind: 'paid-quantity' }> & { readonly measured: MeasuredWork };

const at = { count: 3, length: 4, girth: 5, paidGirth: 6, area: 7, times: 8, quantity: 9 } as const;

const isMeasured = (extra: ExtraLine): extra is MeasuredLine =>
  extra.kind === 'paid-quantity' && extra.measured !== undefined;

const takesLengths = ({ rule }: MeasuredWork): boolean => rule === 'plain-area' || rule === 'narrow-girth';

const scaled = (figure: number | null, scale: number): CellContent =>
  figure === null ? null : input(Number((figure / scale).toPrecision(15)));

/** Girth a narrow member is paid by: under 6 in as 6, under 12 in as 12, in metres. */
function paidGirth({ rule }: MeasuredWork, girth: string): string {
  if (rule === 'plain-area') return girth;
  const inches = `ROUND(${girth}/0.0254,9)`;
  return `IF(${girth}=0,0,IF(${inches}<6,0.1524,IF(${inches}<12,0.3048,${girth})))`;
}

/** How many times its area a measure counts. */
const timesOf = ({ rule }: MeasuredWork, { sides, worth }: WorkMeasure): number =>
  rule === 'weighted' ? worth : 2 * sides;

function cellsOf(measured: MeasuredWork, measure: WorkMeasure, here: (column: number) => string): CellContent[] {
  const { count, length_mm, girth_mm, area_mm2 } = measure;
  if (!takesLengths(measured)) {
    const times = timesOf(measured, measure);
    return [input(count), null, null, null, scaled(area_mm2, 1e6), input(times)];
  }
  const paid = paidFor({ ...measured, measures: [{ ...measure, count: 1, length_mm: 1000 }] });
  const girth_m = (paid?.quantity_mm2 ?? 0) / 1e6;
  const raised = formula(paidGirth(measured, here(at.girth)), girth_m);
  return [input(count), scaled(length_mm, 1000), scaled(girth_mm, 1000), raised, null, null];
}

/** One measure with what it adds to the quantity of its line. */
function measureRow(sheet: Sheet, { name, rule, unit, measured }: MeasuredLine, measure: WorkMeasure): void {
  const row = sheet.next;
  const here = (column: number) => sheet.here(column, row);
  const parts = takesLengths(measured) ? [at.count, at.length, at.paidGirth] : [at.count, at.area, at.times];
  const unit_m2 = unit === 'm²' ? 1 : squareMillimetresPerSquareFoot / 1e6;
  const quantity_mm2 = paidFor({ ...measured, measures: [measure] })?.quantity_mm2 ?? 0;
  sheet.add([
    ...[name, rule, ...cellsOf(measured, measure, here)],
    formula(`${parts.map(here).join('*')}/${unit_m2}`, quantity_mm2 / 1e6 / unit_m2),
    unit,
  ]);
}

function lineQuantity(sheet: Sheet, line: MeasuredLine): string {
  const from = sheet.next;
  for (const measure of line.measured.measures) measureRow(sheet, line, measure);
  return `ROUND(ROUND(SUM(${sheet.span(at.quantity, from, sheet.rows.length)}),9),4)`;
}

function emptySheet({ words }: WorkbookFacts): Sheet {
  const column = (width: number, format = '') => ({ width, format });
  const figures = ['0', '0.0000', '0.0000', '0.0000', '0.0000', '0.##', '#,##0.0000##'];
  const sheet = new Sheet(words.say('sheet-measures'), [
    ...[column(40), column(34), ...figures.map((format) => column(12, format)), column(8)],
  ]);
  sheet.head(words.say('sheet-measures'), words.say('sheet-measures-note'), [
    ...[words.say('sheet-head-what'), words.say('sheet-head-rule'), words.say('sheet-head-count')],
    ...[words.say('sheet-head-length'), words.say('sheet-head-girth'), words.say('sheet-head-paid-girth')],
    ...[words.say('sheet-head-area'), words.say('sheet-head-times'), words.say('sheet-head-quantity')],
    words.say('sheet-head-unit'),
  ]);
  return sheet;
}

/** Every measure of every line of measured work, and what each comes to. */
export function measuresSheet(facts: WorkbookFacts): MeasuresPage {
  const lines = facts.price.extras.filter(isMeasured);
  if (lines.length === 0) return { sheets: [], quantity: () => null };
  const sheet = emptySheet(facts);
  const quantities = new Map(lines.map((line) => [line.id, lineQuantity(sheet, line)]));
  return { sheets: [sheet], quantity: (lineId) => quantities.get(lineId) ?? null };
}
