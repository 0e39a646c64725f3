import type { CardList } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, type CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';

/** A row of a list: the way to it, and the ids of the items it stands in, its own last where it has one. */
export interface ListRow {
  readonly path: CellPath;
  readonly ids: readonly string[];
}

const idOf = (item: unknown): readonly string[] => {
  const id = valueAt(item, ['id']);
  return typeof id === 'string' ? [id] : [];
};

function below(card: unknown, rows: readonly ListRow[], fields: readonly string[]): ListRow[] {
  return rows.flatMap(({ path, ids }) => {
    const place = [...path, ...fields];
    const items = valueAt(card, place);
    if (!Array.isArray(items)) return [];
    return items.map((item: unknown, at) => ({ path: [...place, at], ids: [...ids, ...idOf(item)] }));
  });
}

/** Every row of a list of a card, those of all items it stands in one after the other. */
export const listRows = ({ place }: Pick<CardList, 'place'>, card: unknown): ListRow[] =>
  place
    .split('.*.')
    .map(fieldsOf)
    .reduce<readonly ListRow[]>((rows, fields) => below(card, rows, fields), [{ path: [], ids: [] }])
    .slice();
