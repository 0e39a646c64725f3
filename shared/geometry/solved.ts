/**
 * The unknowns of a square set of linear equations, one row each with its right side last, by Gaussian elimination with pivoting
 * on rows scaled to their largest coefficient; undefined when the equations do not settle them.
 */
export function solved(equations: readonly (readonly number[])[]): number[] | undefined {
  const rows = equations.map(scaled);
  for (let column = 0; column < rows.length; column += 1) {
    const pivot = largestBelow(rows, column);
    if (!(Math.abs(rows[pivot][column]) > 1e-12)) return undefined;
    [rows[column], rows[pivot]] = [rows[pivot], rows[column]];
    for (let row = 0; row < rows.length; row += 1)
      if (row !== column) rows[row] = eliminated(rows[row], rows[column], column);
  }
  return rows.map((row, index) => row[rows.length] / row[index]);
}

function scaled(row: readonly number[]): number[] {
  const largest = Math.max(...row.slice(0, -1).map(Math.abs));
  return row.map((value) => (largest > 0 ? value / largest : value));
}

function largestBelow(rows: readonly (readonly number[])[], column: number): number {
  let best = column;
  for (let row = column + 1; row < rows.length; row += 1)
    if (Math.abs(rows[row][column]) > Math.abs(rows[best][column])) best = row;
  return best;
}

function eliminated(row: readonly number[], by: readonly number[], column: number): number[] {
  const times = row[column] / by[column];
  return row.map((value, index) => value - times * by[index]);
}
