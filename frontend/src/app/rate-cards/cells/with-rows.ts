import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt, withValueAt } from '#shared/rate-cards/tables/value-at';

const rowsAt = (content: RateCard, list: CellPath): readonly unknown[] =>
  (valueAt(content, list) as readonly unknown[] | undefined) ?? [];

/** The card with a row put into a list of it, before the row that stands at that place now. */
export const withRow = (content: RateCard, list: CellPath, { at, row }: { at: number; row: unknown }): RateCard =>
  withValueAt(content, list, rowsAt(content, list).toSpliced(at, 0, row));

/** The card without a row of a list. */
export const withoutRow = (content: RateCard, list: CellPath, at: number): RateCard =>
  withValueAt(content, list, rowsAt(content, list).toSpliced(at, 1));

/** The card with a row of a list in another place; beyond the ends it stays. */
export function withRowMoved(content: RateCard, list: CellPath, { from, to }: { from: number; to: number }): RateCard {
  const rows = rowsAt(content, list);
  if (to < 0 || to >= rows.length) return content;
  return withValueAt(content, list, rows.toSpliced(from, 1).toSpliced(to, 0, rows[from]));
}
