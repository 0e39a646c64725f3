/** A formula without its equals sign, and the figure our own calculator has for it. */
export interface FormulaCell {
  readonly formula: string;
  readonly value: number;
}

/** A figure somebody may change. */
export interface InputCell {
  readonly input: number;
}

export type CellContent = string | number | null | FormulaCell | InputCell;

/** How a row is set: plain, a head of columns, the heading of a part, a sum. */
export type RowLook = 'plain' | 'head' | 'part' | 'sum';

export interface SheetColumn {
  readonly width: number;
  /** Number format; empty for texts. */
  readonly format: string;
}

export interface SheetRow {
  readonly look: RowLook;
  readonly cells: readonly CellContent[];
  /** Format of the figures of this row, where it is not that of their columns. */
  readonly format: string | null;
}

export const formula = (text: string, value: number): FormulaCell => ({ formula: text, value });
export const input = (value: number): InputCell => ({ input: value });

/** The letter or letters of a column, from 1 on: A, Z, AA. */
export function columnLetters(column: number): string {
  const [rest, last] = [Math.floor((column - 1) / 26), (column - 1) % 26];
  return (rest > 0 ? columnLetters(rest) : '') + String.fromCharCode(65 + last);
}

/** A sheet being written, row by row, that can tell the address of what stands on it. */
export class Sheet {
  readonly rows: SheetRow[] = [];
  /** Rows above what scrolls, and columns left of it. */
  frozen: { readonly rows: number; readonly columns: number } = { rows: 0, columns: 0 };

  constructor(
    readonly name: string,
    readonly columns: readonly SheetColumn[],
  ) {}

  /** Writes a row and gives its number. */
  add(cells: readonly CellContent[], look: RowLook = 'plain', format: string | null = null): number {
    this.rows.push({ look, cells, format });
    return this.rows.length;
  }

  /** The row after the last one. */
  get next(): number {
    return this.rows.length + 1;
  }

  /** A heading over the whole sheet, a note under it, and the heads of the columns, which stay in sight. */
  head(title: string, note: string, heads: readonly string[]): void {
    this.add([title], 'part');
    this.add([note]);
    this.add(heads, 'head');
    this.frozen = { rows: this.rows.length, columns: 2 };
  }

  /** Address of a cell for other sheets. */
  at(column: number, row: number): string {
    return `'${this.name}'!${this.here(column, row)}`;
  }

  /** Address of a cell on this sheet. */
  here(column: number, row: number): string {
    return `$${columnLetters(column)}$${row}`;
  }

  /** Cells of a column from one row to another, for other sheets. */
  span(column: number, from: number, to: number): string {
    return `${this.at(column, from)}:${this.here(column, Math.max(from, to))}`;
  }
}
