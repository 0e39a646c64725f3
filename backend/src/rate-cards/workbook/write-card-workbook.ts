import { Workbook, type Worksheet } from 'exceljs';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import { yesOrNoChoices } from '#shared/rate-cards/tables/choices-of';
import type { CardColumn, CardTable } from '#shared/rate-cards/tables/card-table';
import { words } from '../../platform/http/words';
import { sheetLayout } from './sheet-layout';
import { sheetRows } from './sheet-rows';
import { toSheetText } from './sheet-text';

/** What is exported: the content, the card's name, and the currency its amounts are in. */
export interface ExportedCard {
  readonly name: string;
  readonly content: RateCard;
  readonly currency: string;
}

const widest = 60;
/** Rows below the last one that may be chosen into as well, for what is added. */
const spareRows = 50;

/** Where the choices of a column stand on the sheet of choices: "Choices!$A$2:$A$7". */
type ChoicePlaces = ReadonlyMap<string, string>;

const labelsOf = ({ kind, choices = [] }: CardColumn): string[] =>
  (kind === 'yes-no' ? yesOrNoChoices : choices).map(({ word }) => words(word));

const keyOf = (labels: readonly string[]): string => labels.join('\n');

function writeAbout(workbook: Workbook, name: string): void {
  const sheet = workbook.addWorksheet(words('workbook-about'));
  sheet.getColumn(1).width = 14;
  sheet.getColumn(2).width = 90;
  sheet.addRow([words('workbook-about-card'), toSheetText(name)]).font = { bold: true };
  for (const code of [
    'workbook-about-rows',
    'workbook-about-ids',
    'workbook-about-cells',
    'workbook-about-text',
  ] as const)
    sheet.addRow(['', words(code, { sheet: words('workbook-choices') })]).alignment = {
      wrapText: true,
      vertical: 'top',
    };
}

/** One column for each set of choices, headed by the cells that take from it first. */
function writeChoices(workbook: Workbook): ChoicePlaces {
  const sheet = workbook.addWorksheet(words('workbook-choices'));
  const places = new Map<string, string>();
  for (const column of cardTables.flatMap(({ columns }) => columns)) {
    const labels = labelsOf(column);
    if (labels.length === 0 || places.has(keyOf(labels))) continue;
    const at = sheet.getColumn(places.size + 1);
    at.values = [words(column.heading), ...labels];
    at.width = Math.max(...labels.map(({ length }) => length)) + 2;
    places.set(keyOf(labels), `'${sheet.name}'!$${at.letter}$2:$${at.letter}$${labels.length + 1}`);
  }
  sheet.getRow(1).font = { bold: true };
  return places;
}

function offerChoices(sheet: Worksheet, address: string, range: string): void {
  sheet.getCell(address).dataValidation = { type: 'list', allowBlank: true, formulae: [range] };
}

/** The cell of a form has the choices of its row, the cells of a list or grid those of their column. */
function offerAll(sheet: Worksheet, table: CardTable, places: ChoicePlaces): void {
  const lead = sheet.getRow(1).cellCount - (table.kind === 'form' ? 2 : table.columns.length);
  table.columns.forEach((column, at) => {
    const range = column.kind === 'choices' ? undefined : places.get(keyOf(labelsOf(column)));
    if (!range) return;
    if (table.kind === 'form') return offerChoices(sheet, `C${at + 2}`, range);
    const { letter } = sheet.getColumn(lead + at + 1);
    const last = sheet.rowCount + (table.kind === 'list' ? spareRows : 0);
    for (let row = 2; row <= last; row++) offerChoices(sheet, `${letter}${row}`, range);
  });
}

function dress(sheet: Worksheet, ids: number): void {
  sheet.getRow(1).font = { bold: true };
  sheet.getRow(1).alignment = { wrapText: true, vertical: 'top' };
  sheet.views = [{ state: 'frozen', xSplit: ids, ySplit: 1 }];
  for (let at = 1; at <= sheet.columnCount; at++) {
    const column = sheet.getColumn(at);
    const lengths: number[] = [];
    column.eachCell(({ text }, row) => lengths.push(row === 1 ? Math.min(text.length, 18) : text.length));
    column.width = Math.min(widest, Math.max(8, ...lengths) + 2);
  }
}

function writeTable(workbook: Workbook, table: CardTable, { content, currency }: ExportedCard): Worksheet {
  const { name, columns } = sheetLayout(table, currency);
  const sheet = workbook.addWorksheet(name);
  sheet.addRow(columns.map(({ heading }) => heading));
  for (const cells of sheetRows(table, content, currency)) {
    const row = sheet.addRow(cells.map(({ value }) => value));
    cells.forEach(({ format }, at) => {
      if (format) row.getCell(at + 1).numFmt = format;
    });
  }
  dress(sheet, columns.filter(({ isId }) => isId).length);
  return sheet;
}

/** A rate card as a workbook: a sheet for each of its tables, what may be chosen, and how it is filled in. */
export async function writeCardWorkbook(exported: ExportedCard): Promise<Buffer> {
  const workbook = new Workbook();
  writeAbout(workbook, exported.name);
  const sheets = cardTables.map((table) => [table, writeTable(workbook, table, exported)] as const);
  const places = writeChoices(workbook);
  for (const [table, sheet] of sheets) offerAll(sheet, table, places);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}
