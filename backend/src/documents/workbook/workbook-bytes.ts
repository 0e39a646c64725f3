import { Workbook, type Cell, type Row, type Worksheet } from 'exceljs';
import { guardedText } from '#shared/words/guarded-text';
import { sheetText } from '#shared/words/sheet-text';
import { fixedZipDates } from './fixed-zip-dates';
import type { NameBook } from './name-book';
import { columnLetters, type CellContent, type RowLook, type Sheet, type SheetRow } from './sheet';

/** What a workbook bears beside its sheets. */
export interface WorkbookMarks {
  readonly title: string;
  readonly author: string;
  readonly madeAt: Date;
  readonly paper: 'A4' | 'Letter';
}

const colours = { ink: 'FF2C2019', muted: 'FF6E5E4E', line: 'FFE6DCCB', tint: 'FFF9F3E7', gold: 'FFC9A24B' } as const;

const fill = (argb: string) => ({ type: 'pattern', pattern: 'solid', fgColor: { argb } }) as const;
const under = (argb: string, style: 'thin' | 'medium' = 'thin') => ({ bottom: { style, color: { argb } } });

function contentOf(content: CellContent): Cell['value'] {
  if (typeof content === 'string') return sheetText(content);
  if (content === null || typeof content === 'number') return content;
  return 'input' in content ? content.input : { formula: content.formula, result: content.value };
}

/** Figures somebody may change stand on a tint; everything else is worked. */
function setCell(cell: Cell, content: CellContent, format: string): void {
  cell.value = contentOf(content);
  if (content === null || typeof content === 'string') return;
  if (format !== '') cell.numFmt = format;
  if (typeof content === 'object' && 'input' in content) cell.fill = fill(colours.tint);
}

const fonts: Readonly<Record<RowLook, Partial<Row['font']>>> = {
  plain: { color: { argb: colours.ink } },
  head: { bold: true, color: { argb: colours.muted } },
  part: { bold: true, size: 13, color: { argb: colours.ink } },
  sum: { bold: true, color: { argb: colours.ink } },
};

function setLook(row: Row, look: RowLook, columns: number): void {
  row.font = fonts[look];
  if (look === 'plain' || look === 'part') return;
  if (look === 'head') row.alignment = { wrapText: true, vertical: 'bottom' };
  for (let column = 1; column <= columns; column += 1)
    row.getCell(column).border = under(look === 'head' ? colours.gold : colours.line);
}

function writeRow(sheet: Worksheet, { cells, look, format }: SheetRow, columns: Sheet['columns']): void {
  const row = sheet.addRow([]);
  cells.forEach((content, place) => {
    if (content !== null && content !== '')
      setCell(row.getCell(place + 1), content, format ?? columns[place]?.format ?? '');
  });
  setLook(row, look, Math.max(columns.length, cells.length));
}

/** Landscape, as wide as the page, heads again on every page. */
function setUpPrint(sheet: Worksheet, plan: Sheet, paper: WorkbookMarks['paper']): void {
  const { frozen, columns } = plan;
  sheet.pageSetup = {
    ...{ paperSize: paper === 'A4' ? 9 : (1 as never), orientation: 'landscape', fitToPage: true },
    ...{ fitToWidth: 1, fitToHeight: 0, printTitlesRow: frozen.rows > 0 ? `1:${frozen.rows}` : undefined },
    margins: { left: 0.5, right: 0.5, top: 0.6, bottom: 0.7, header: 0.3, footer: 0.3 },
    printArea: `A1:${columnLetters(columns.length)}${Math.max(1, plan.rows.length)}`,
  };
  sheet.headerFooter.oddFooter = '&L&A&R&P / &N';
}

function writeSheet(workbook: Workbook, plan: Sheet, paper: WorkbookMarks['paper']): void {
  const { rows, columns } = plan.frozen;
  const view = { state: 'frozen', ySplit: rows, xSplit: columns, showGridLines: false } as const;
  const sheet = workbook.addWorksheet(plan.name, { views: [rows > 0 ? view : { showGridLines: false }] });
  plan.columns.forEach(({ width }, place) => (sheet.getColumn(place + 1).width = width));
  for (const row of plan.rows) writeRow(sheet, row, plan.columns);
  setUpPrint(sheet, plan, paper);
}

/** Writes planned sheets as a workbook that recalculates when it is opened; the same plan gives the same bytes. */
export async function workbookBytes(
  plan: { readonly sheets: readonly Sheet[]; readonly names: NameBook },
  marks: WorkbookMarks,
): Promise<Buffer> {
  const workbook = new Workbook();
  workbook.title = guardedText(marks.title);
  workbook.creator = guardedText(marks.author);
  workbook.lastModifiedBy = guardedText(marks.author);
  workbook.created = marks.madeAt;
  workbook.modified = marks.madeAt;
  workbook.calcProperties.fullCalcOnLoad = true;
  for (const sheet of plan.sheets) writeSheet(workbook, sheet, marks.paper);
  for (const { name, address } of plan.names.all) workbook.definedNames.add(address, name);
  return fixedZipDates(Buffer.from(await workbook.xlsx.writeBuffer()), marks.madeAt);
}
