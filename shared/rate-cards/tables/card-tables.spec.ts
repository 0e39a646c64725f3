import { cellAt, differencePath, listAt } from '#shared/rate-cards/tables/cell-at';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardTable } from '#shared/rate-cards/tables/card-table';
import { formCellPath, gridCellPath, listCellPath, type CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt, withValueAt } from '#shared/rate-cards/tables/value-at';
import { listRows } from '#shared/rate-cards/tables/list-rows';
import { startCard } from '#shared/rate-cards/start-card';

/** Cells that hold several choices are one value. */
const several = new Set(['cautions', 'holds']);

/** Every value of a card but the ids, by its way. */
function values(value: unknown, path: CellPath = []): string[] {
  const last = path[path.length - 1];
  if (last === 'id') return [];
  if (typeof value !== 'object' || value === null || several.has(String(last))) return [path.join('.')];
  return Object.entries(value).flatMap(([key, inner]) =>
    values(inner, [...path, Array.isArray(value) ? Number(key) : key]),
  );
}

function cells(table: CardTable): CellPath[] {
  switch (table.kind) {
    case 'list':
      return listRows(table, startCard).flatMap(({ path }) =>
        table.columns.map((column) => listCellPath(path, column)),
      );
    case 'grid':
      return table.rows.flatMap((row) => table.columns.map((column) => gridCellPath(row, column)));
    case 'form':
      return table.columns.map(formCellPath);
  }
}

describe('The tables of a rate card', () => {
  const shown = cardTables.flatMap(cells).map((path) => path.join('.'));

  it('show every value of the card', () => {
    const places = new Set(shown);
    expect(values(startCard).filter((path) => !places.has(path))).toEqual([]);
  });

  it('show none twice', () => {
    expect(shown.filter((path, at) => shown.indexOf(path) !== at)).toEqual([]);
  });

  it('show nothing that could not be there: a cell without a value may be empty', () => {
    const empty = cardTables.flatMap((table) =>
      cells(table)
        .filter((path) => valueAt(startCard, path) === undefined)
        .map((path) => cellAt(path)?.column.empty),
    );
    expect(new Set(empty)).toEqual(new Set(['absent']));
  });

  it('find the cell of a value again', () => {
    for (const table of cardTables) for (const path of cells(table)) expect(cellAt(path)?.table.id).toBe(table.id);
  });

  it('have ids that differ', () => {
    const ids = cardTables.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('stand after the table whose items they belong to', () => {
    const ids = cardTables.map(({ id }) => id);
    const misplaced = cardTables.filter(
      (table, at) => table.kind === 'list' && table.within !== undefined && !ids.slice(0, at).includes(table.within),
    );
    expect(misplaced).toEqual([]);
  });
});

describe('A difference between two cards', () => {
  it.each([
    ['money', 'grades', 'costPerHour', 'grades', 'card-column-cost-per-hour'],
    ['buildUps', '', 'setUp_hours', 'working-day', 'card-column-set-up'],
    ['buildUps', 'buildUps/steps', 'coats.plain', 'steps', 'card-column-coats-plain'],
    ['buildUps', 'buildUps/steps', 'uses.1.loss_percent', 'uses', 'card-column-loss'],
    ['buildUps', 'buildUps/steps', 'cautions.0', 'steps', 'card-column-cautions'],
    ['leaf', 'products', 'breaks.0.off_percent', 'leaf-packs', 'card-column-off'],
    ['leaf', '', 'losses.lays.faulting_percent.high', 'laying', 'card-column-faulting-high'],
    ['carving', 'stages', 'share_hundredths', 'stages', 'card-column-share'],
  ] as const)('of %s %s %s is shown in the table %s', (section, list, field, tableId, heading) => {
    const cell = cellAt(differencePath({ section, list, field }));
    expect([cell?.table.id, cell?.column.heading]).toEqual([tableId, heading]);
  });

  it.each([
    ['buildUps', 'buildUps/steps', 'steps'],
    ['buildUps', 'materials/packs', 'material-packs'],
    ['carving', 'items', 'items'],
  ] as const)('of the items of %s %s belongs to the table %s', (section, list, tableId) => {
    expect(listAt(differencePath({ section, list, field: '' }))?.id).toBe(tableId);
  });
});

describe('A value of a card', () => {
  it('is changed without touching the card it came from', () => {
    const path = ['money', 'grades', 2, 'costPerHour'];
    const after = withValueAt(startCard, path, '35.00');
    expect([valueAt(startCard, path), valueAt(after, path)]).toEqual(['33.00', '35.00']);
    expect(after.leaf).toBe(startCard.leaf);
  });

  it('is taken away by undefined', () => {
    const path = ['leaf', 'products', 0, 'alloy', 'silver'];
    const after = withValueAt(startCard, path, undefined);
    expect(Object.keys(after.leaf.products[0]?.alloy ?? {})).not.toContain('silver');
  });

  it('is nothing where the way leads nowhere', () => {
    expect(valueAt(startCard, ['money', 'grades', 99, 'name'])).toBeUndefined();
  });
});
