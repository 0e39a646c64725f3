import type { Explained } from '../figure/explained';

/** One column of a figure table. The same column says how a cell reads, explains itself and is edited. */
export interface FigureColumn<Row> {
  readonly key: string;
  readonly heading: string;
  /** Words, figures aligned at their decimal sign, or a mark in a frame. */
  readonly kind: 'text' | 'figure' | 'chip';
  readonly text: (row: Row) => string;
  /** A second, smaller line. */
  readonly minor?: (row: Row) => string;
  readonly explained?: (row: Row) => Explained | undefined;
  /** The cell may be typed into; the table hands the text out and keeps nothing. */
  readonly editable?: boolean;
  /** What may be chosen instead of typed; the table hands out the words. */
  readonly choices?: (row: Row) => readonly string[];
  /** What is wrong with a cell as it stands. */
  readonly remark?: (row: Row) => string;
}

/** A cell as it was typed. */
export interface EditedCell {
  readonly rowId: string;
  readonly key: string;
  readonly text: string;
}

/** A row that is to stand elsewhere: its place now, and where it goes, counted without itself. */
export interface MovedRow {
  readonly rowId: string;
  readonly from: number;
  readonly to: number;
}

/** Rows of a spreadsheet put down at a cell: the keys they fall under, and their texts line by line. */
export interface PastedCells {
  readonly rowId: string;
  readonly keys: readonly string[];
  readonly lines: readonly (readonly string[])[];
}
