import type { CardDifference } from '#shared/rate-cards/card-differences';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardColumn, CardTable, GridRow } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, gridCellPath, type CellPath } from '#shared/rate-cards/tables/cell-path';

/** Where a value of a card is shown. */
export interface ShownCell {
  readonly table: CardTable;
  readonly column: CardColumn;
  readonly row?: GridRow;
}

const keyOf = (path: CellPath): string => path.map((part) => (typeof part === 'number' ? '*' : part)).join('.');

const cellsOf = (table: CardTable): [string, ShownCell][] =>
  table.columns.flatMap((column): [string, ShownCell][] => {
    switch (table.kind) {
      case 'list':
        return [[`${table.place}.*.${column.field}`, { table, column }]];
      case 'grid':
        return table.rows.map((row) => [keyOf(gridCellPath(row, column)), { table, column, row }]);
      case 'form':
        return [[column.field, { table, column }]];
    }
  });

const shownCells: ReadonlyMap<string, ShownCell> = new Map(cardTables.flatMap(cellsOf));
const lists: ReadonlyMap<string, CardTable> = new Map(
  cardTables.flatMap((table): [string, CardTable][] => (table.kind === 'list' ? [[table.place, table]] : [])),
);

/** The cell that shows a value of a card; a value inside a cell (one of several choices) is shown by that cell. Undefined for a row or list. */
export function cellAt(path: CellPath): ShownCell | undefined {
  for (let length = path.length; length > 0; length--) {
    const cell = shownCells.get(keyOf(path.slice(0, length)));
    if (cell) return cell;
  }
  return undefined;
}

/** The list that a way leads to, into or through, the innermost of them. */
export function listAt(path: CellPath): CardTable | undefined {
  for (let length = path.length; length > 0; length--) {
    const list = lists.get(keyOf(path.slice(0, length)));
    if (list) return list;
  }
  return undefined;
}

const asPlace = (field: string): string | number => (/^\d+$/.test(field) ? Number(field) : field);

/** The way to what a difference speaks of, as far as tables go: each item stands at the first place of its list. */
export function differencePath({ section, list, field }: Pick<CardDifference, 'section' | 'list' | 'field'>): CellPath {
  const lists = list === '' ? [] : list.split('/').flatMap((one, at) => [...(at > 0 ? [0] : []), ...fieldsOf(one)]);
  const below = field === '' ? [] : [...(list === '' ? [] : [0]), ...fieldsOf(field).map(asPlace)];
  return [section, ...lists, ...below];
}
