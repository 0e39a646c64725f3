import { printableText } from '#shared/words/printable-text';
import type { Pdf } from './open-paper';
import { textStyles, type TextStyle } from './paper-colours';
import { textLines, textWidth } from './text-lines';

/** A column: as wide as its widest figure, of a given width, or (exactly one) what the others leave. */
export interface TableColumn {
  readonly head: string;
  readonly align?: 'left' | 'right';
  readonly width: 'fit' | 'rest' | number;
}

export interface TableCell {
  readonly text: string;
  readonly style?: TextStyle;
  /** A smaller line or more under it. */
  readonly note?: string;
  readonly span?: number;
  readonly indent_pt?: number;
  readonly isRowHead?: boolean;
}

export interface TableRow {
  readonly cells: readonly TableCell[];
  readonly before_pt?: number;
  readonly padding_pt?: number;
  readonly above?: 'none' | 'hair' | 'strong' | 'gold';
  readonly tint?: boolean;
  readonly isHead?: boolean;
  readonly keepsWithNext?: boolean;
}

export interface LaidColumn {
  readonly x_pt: number;
  readonly width_pt: number;
  readonly align: 'left' | 'right';
}

export interface LaidCell {
  readonly lines: readonly { readonly text: string; readonly style: TextStyle; readonly x_pt: number }[];
  readonly column: LaidColumn;
  readonly span: number;
  readonly isRowHead: boolean;
}

export interface LaidRow {
  readonly cells: readonly LaidCell[];
  readonly height_pt: number;
  readonly before_pt: number;
  readonly padding_pt: number;
  readonly above: 'none' | 'hair' | 'strong' | 'gold';
  readonly tint: boolean;
  readonly keepsWithNext: boolean;
}

const gap_pt = 12;

interface Table {
  readonly columns: readonly TableColumn[];
  readonly rows: readonly TableRow[];
  readonly width_pt: number;
}

function cellAt(row: TableRow, place: number): TableCell | null {
  let at = 0;
  for (const cell of row.cells) {
    if (at === place) return (cell.span ?? 1) === 1 ? cell : null;
    at += cell.span ?? 1;
  }
  return null;
}

function fitWidth(pdf: Pdf, { columns, rows }: Table, place: number): number {
  const head = textWidth(pdf, printableText(columns[place].head), textStyles.columnHead);
  const widths = rows.map((row) => {
    const cell = cellAt(row, place);
    return cell ? textWidth(pdf, printableText(cell.text), cell.style ?? textStyles.body) : 0;
  });
  return Math.max(head, ...widths) + 0.5;
}

/** Columns side by side over a width in points, with the same gap between all of them. */
export function laidColumns(pdf: Pdf, table: Table): LaidColumn[] {
  const fixed = table.columns.map(({ width }, place) => {
    if (width === 'rest') return null;
    return width === 'fit' ? fitWidth(pdf, table, place) : width;
  });
  const gaps_pt = gap_pt * (table.columns.length - 1);
  const taken_pt = fixed.reduce<number>((sum, width) => sum + (width ?? 0), gaps_pt);
  let x_pt = 0;
  return table.columns.map(({ align = 'left' }, place) => {
    const width_pt = fixed[place] ?? Math.max(60, table.width_pt - taken_pt);
    const column = { x_pt, width_pt, align };
    x_pt += width_pt + gap_pt;
    return column;
  });
}

function spanned(columns: readonly LaidColumn[], at: number, span: number): LaidColumn {
  const [first, last] = [columns[at], columns[Math.min(columns.length, at + span) - 1]];
  return { ...first, width_pt: last.x_pt + last.width_pt - first.x_pt };
}

function laidCell(pdf: Pdf, cell: TableCell, { column, plain }: { column: LaidColumn; plain: TextStyle }): LaidCell {
  const { style = plain, note = '', span = 1, indent_pt = 0, isRowHead = false } = cell;
  const width_pt = column.width_pt - indent_pt;
  const x_pt = column.align === 'right' ? column.x_pt + column.width_pt : column.x_pt + indent_pt;
  const lines = (text: string, lineStyle: TextStyle) =>
    textLines(pdf, text, { style: lineStyle, width_pt }).map((line) => ({ text: line, style: lineStyle, x_pt }));
  const notes = note === '' ? [] : lines(note, textStyles.note);
  return { lines: [...lines(cell.text, style), ...notes], column, span, isRowHead };
}

/** A row with its cells broken into lines, and how high it is. */
export function laidRow(pdf: Pdf, row: TableRow, columns: readonly LaidColumn[]): LaidRow {
  const { before_pt = 0, padding_pt = 3, above = 'none', tint = false, keepsWithNext = false } = row;
  const plain = row.isHead ? textStyles.columnHead : textStyles.body;
  let at = 0;
  const cells = row.cells.map((cell) => {
    const laid = laidCell(pdf, cell, { column: spanned(columns, at, cell.span ?? 1), plain });
    at += cell.span ?? 1;
    return laid;
  });
  const inner_pt = Math.max(
    0,
    ...cells.map(({ lines }) => lines.reduce((sum, line) => sum + line.style.leading_pt, 0)),
  );
  return { cells, height_pt: before_pt + inner_pt + 2 * padding_pt, before_pt, padding_pt, above, tint, keepsWithNext };
}
