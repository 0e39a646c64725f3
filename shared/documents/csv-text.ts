import type { DecimalText } from '#shared/money/decimal';
import { guardedText } from '#shared/words/guarded-text';

/** What a cell of a list holds: a text somebody may have typed, a figure, or a decimal amount with all its digits (-120.00). */
export type CsvCell = string | number | { readonly amount: DecimalText };

const byteOrderMark = '\ufeff';

function cellText(cell: CsvCell): string {
  if (typeof cell === 'number') return String(cell);
  if (typeof cell === 'object') return cell.amount;
  const text = guardedText(cell);
  return /[",\r\n]/.test(text) ? `"${text.replace(/"/g, '""')}"` : text;
}

/** Rows as comma-separated values (RFC 4180: CRLF, quotes doubled) that begin with a byte order mark; texts guarded, figures plain. */
export const csvText = (rows: readonly (readonly CsvCell[])[]): string =>
  byteOrderMark + rows.map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
