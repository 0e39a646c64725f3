import type { CardColumn, CardForm, CardGrid, CardList, CardTable } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, formCellPath, gridCellPath, listCellPath, type CellPath } from '#shared/rate-cards/tables/cell-path';
import type { CardBuilding, SheetPlace } from './card-building';
import type { FoundSheet } from './read-sheets';
import { fromSheetCell } from './sheet-cell';
import { columnLetter } from './column-letter';
import { sheetLayout, tablesAround, nameOf } from './sheet-layout';
import { fromSheetText } from './sheet-text';

/** A table and the sheet it is read from; `currency` is that of the headings. */
export interface TableSheet<Table extends CardTable = CardTable> {
  readonly table: Table;
  readonly sheet: FoundSheet;
  readonly currency: string;
}

/** A sheet with the columns found by their headings. */
interface Reading<Table extends CardTable> extends TableSheet<Table> {
  readonly at: readonly number[];
  readonly building: CardBuilding;
}

const headingAt = ({ cell }: FoundSheet, column: number): string => {
  const { value } = cell(1, column);
  return typeof value === 'string' ? value.trim() : '';
};

/** In which column each heading stands; complains of headings that are missing, unknown or there twice. */
function columnsFound({ table, sheet, currency }: TableSheet, building: CardBuilding): number[] | undefined {
  const wanted = sheetLayout(table, currency).columns.map(({ heading }) => heading);
  const found = Array.from({ length: sheet.lastColumn }, (_, at) => headingAt(sheet, at + 1));
  const before = building.complaints.length;
  found.forEach((heading, at) => {
    const place = [sheet.name, 1, columnLetter(at + 1)];
    if (heading !== '' && !wanted.includes(heading)) building.complain(place, 'workbook-heading-unknown');
    else if (heading !== '' && found.indexOf(heading) < at) building.complain(place, 'workbook-heading-twice');
  });
  for (const heading of wanted)
    if (!found.includes(heading)) building.complain([sheet.name, 1], 'workbook-heading-missing', { heading });
  return building.complaints.length > before ? undefined : wanted.map((heading) => found.indexOf(heading) + 1);
}

const placeAt = ({ sheet }: TableSheet, row: number, column: number): SheetPlace => [
  sheet.name,
  row,
  columnLetter(column),
];

function idAt(reading: Reading<CardTable>, row: number, at: number): string {
  const { value } = reading.sheet.cell(row, reading.at[at] ?? 0);
  if (typeof value === 'number') return String(value);
  return typeof value === 'string' ? fromSheetText(value.trim()) : '';
}

const isBlankRow = ({ sheet, at }: Reading<CardTable>, row: number): boolean =>
  at.every((column) => [null, undefined, ''].includes(sheet.cell(row, column).value as null));

function rowsOf(reading: Reading<CardTable>): number[] {
  const rows = Array.from({ length: Math.max(0, reading.sheet.lastRow - 1) }, (_, at) => at + 2);
  return rows.filter((row) => !isBlankRow(reading, row));
}

interface Cell {
  readonly column: CardColumn;
  readonly path: CellPath;
  readonly row: number;
  /** The place among the columns of the sheet. */
  readonly at: number;
}

function readCell(reading: Reading<CardTable>, { column, path, row, at }: Cell): void {
  const place = placeAt(reading, row, reading.at[at] ?? 0);
  const read = fromSheetCell(column, reading.sheet.cell(row, reading.at[at] ?? 0));
  if ('refused' in read) reading.building.complain(place, read.refused);
  reading.building.put(path, 'refused' in read ? undefined : read.value, place);
}

/** The list a row belongs to: that of the item its first ids name. */
function listOf(reading: Reading<CardList>, row: number, ids: readonly string[]): CellPath | undefined {
  const around = tablesAround(reading.table);
  const parent = around.at(-1);
  const list = fieldsOf(reading.table.place.split('.*.').at(-1) ?? '');
  if (!parent) return list;
  const item = reading.building.itemOf(parent, ids.slice(0, around.length));
  if (item) return [...item, ...list];
  const place = placeAt(reading, row, reading.at[around.length - 1] ?? 0);
  reading.building.complain(place, 'workbook-parent-unknown', { table: nameOf(parent) });
  return undefined;
}

function readListRow(reading: Reading<CardList>, row: number): void {
  const { table, building, at } = reading;
  const around = tablesAround(table).length;
  const lead = around + (table.hasIds ? 1 : 0);
  const ids = Array.from({ length: lead }, (_, index) => idAt(reading, row, index));
  const list = listOf(reading, row, ids);
  if (!list) return;
  const path = building.begin(table, list, [reading.sheet.name, row]);
  if (table.hasIds) building.put([...path, 'id'], ids.at(-1) || undefined, placeAt(reading, row, at[around] ?? 0));
  building.know(table, ids, path);
  table.columns.forEach((column, index) =>
    readCell(reading, { column, path: listCellPath(path, column), row, at: lead + index }),
  );
}

function readList(reading: Reading<CardList>): void {
  const { table, sheet, building } = reading;
  if (table.within === undefined) building.mark(fieldsOf(table.place), [sheet.name]);
  for (const row of rowsOf(reading)) readListRow(reading, row);
}

/** Rows that are always there: each once, by its id. */
function fixedRows(reading: Reading<CardGrid | CardForm>, keys: readonly string[]): [string, number][] {
  const { building, sheet } = reading;
  const found = rowsOf(reading).map((row): [string, number] => [idAt(reading, row, 0), row]);
  const ids = found.map(([id]) => id);
  found.forEach(([id, row], at) => {
    const place = placeAt(reading, row, reading.at[0] ?? 0);
    if (!keys.includes(id)) building.complain(place, 'workbook-row-unknown');
    else if (ids.indexOf(id) < at) building.complain(place, 'workbook-row-twice');
  });
  for (const key of keys) if (!ids.includes(key)) building.complain([sheet.name], 'workbook-row-missing', { row: key });
  return found.filter(([id]) => keys.includes(id));
}

function readGrid(reading: Reading<CardGrid>): void {
  const { rows, columns } = reading.table;
  const keys = rows.map(({ key }) => key);
  for (const [key, row] of fixedRows(reading, keys)) {
    const path = (column: CardColumn) => gridCellPath({ key, words: [] }, column);
    columns.forEach((column, index) => readCell(reading, { column, path: path(column), row, at: index + 2 }));
  }
}

function readForm(reading: Reading<CardForm>): void {
  const { columns } = reading.table;
  const fields = columns.map(({ field }) => field);
  for (const [field, row] of fixedRows(reading, fields)) {
    const column = columns.find((one) => one.field === field);
    if (column) readCell(reading, { column, path: formCellPath(column), row, at: 2 });
  }
}

/** Reads a table from its sheet into the card that is being put together. */
export function readTable(from: TableSheet, building: CardBuilding): void {
  const at = columnsFound(from, building);
  if (!at) return;
  const { table, sheet, currency } = from;
  const base = { sheet, currency, at, building };
  if (table.kind === 'grid') readGrid({ ...base, table });
  else if (table.kind === 'form') readForm({ ...base, table });
  else readList({ ...base, table });
}
