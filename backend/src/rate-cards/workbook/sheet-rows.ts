import { words } from '../../platform/http/words';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CardForm, CardGrid, CardList, CardTable } from '#shared/rate-cards/tables/card-table';
import { formCellPath, gridCellPath, listCellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { listRows } from '#shared/rate-cards/tables/list-rows';
import { toSheetCell, type WrittenCell } from './sheet-cell';
import { unitText } from './sheet-layout';

const text = (value: string): WrittenCell => ({ value });

const ofList = (table: CardList, card: RateCard): WrittenCell[][] =>
  listRows(table, card).map(({ path, ids }) => [
    ...ids.map(text),
    ...table.columns.map((column) => toSheetCell(column, valueAt(card, listCellPath(path, column)))),
  ]);

const ofGrid = (table: CardGrid, card: RateCard): WrittenCell[][] =>
  table.rows.map((row) => [
    text(row.key),
    text(row.words.map((word) => words(word)).join(', ')),
    ...table.columns.map((column) => toSheetCell(column, valueAt(card, gridCellPath(row, column)))),
  ]);

const ofForm = (table: CardForm, card: RateCard, currency: string): WrittenCell[][] =>
  table.columns.map((column) => [
    text(column.field),
    text(words(column.heading)),
    toSheetCell(column, valueAt(card, formCellPath(column))),
    text(unitText(column, currency)),
  ]);

/** The rows of a table as they are written below its headings. */
export function sheetRows(table: CardTable, card: RateCard, currency: string): WrittenCell[][] {
  switch (table.kind) {
    case 'list':
      return ofList(table, card);
    case 'grid':
      return ofGrid(table, card);
    case 'form':
      return ofForm(table, card, currency);
  }
}
