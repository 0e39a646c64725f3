/** A cell by its place: row and column, both from nought. */
export interface GridPlace {
  readonly row: number;
  readonly column: number;
}

export interface GridSize {
  readonly rows: number;
  readonly columns: number;
}

const pageRows = 10;

type Move = (place: GridPlace, size: GridSize) => GridPlace;

const moves: Readonly<Record<string, Move | undefined>> = {
  ArrowUp: ({ row, column }) => ({ row: row - 1, column }),
  ArrowDown: ({ row, column }) => ({ row: row + 1, column }),
  ArrowLeft: ({ row, column }) => ({ row, column: column - 1 }),
  ArrowRight: ({ row, column }) => ({ row, column: column + 1 }),
  PageUp: ({ row, column }) => ({ row: row - pageRows, column }),
  PageDown: ({ row, column }) => ({ row: row + pageRows, column }),
  Home: ({ row }) => ({ row, column: 0 }),
  End: ({ row }, { columns }) => ({ row, column: columns - 1 }),
  'Control+Home': () => ({ row: 0, column: 0 }),
  'Control+End': (_, { rows, columns }) => ({ row: rows - 1, column: columns - 1 }),
};

const within = (place: number, count: number): number => Math.max(0, Math.min(count - 1, place));

/** Where a key leads from a cell, staying inside the grid; undefined for a key that moves nothing. */
export function placeAfter(key: string, place: GridPlace, size: GridSize): GridPlace | undefined {
  const moved = moves[key]?.(place, size);
  return moved && { row: within(moved.row, size.rows), column: within(moved.column, size.columns) };
}
