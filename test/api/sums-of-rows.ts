import type { Database } from '../../backend/src/platform/database/database';

interface Column {
  readonly tableName: string;
  readonly columnName: string;
}

/** These change by being read or by time alone. */
const notWatched = ['sessions', 'tasks'];

async function columnsByTable(database: Database): Promise<Map<string, string[]>> {
  const columns = await database.select<Column>(
    'SELECT table_name AS tableName, column_name AS columnName FROM information_schema.columns WHERE table_schema = DATABASE() ORDER BY table_name, ordinal_position',
  );
  const found = new Map<string, string[]>();
  for (const { tableName, columnName } of columns) {
    found.set(tableName, [...(found.get(tableName) ?? []), columnName]);
  }
  return found;
}

/** The sum over every column of every row, so that not one byte may differ; CHECKSUM TABLE knows no rows of one workshop. */
function sumStatement(table: string, columns: readonly string[]): string {
  const bytes = columns.map((name) => 'COALESCE(HEX(`' + name + "`), 'null')").join(', ');
  const sum = 'HEX(BIT_XOR(CAST(CONV(LEFT(MD5(CONCAT_WS(0x2C, ' + bytes + ')), 16), 16, 10) AS UNSIGNED)))';
  // eslint-disable-next-line local/no-string-built-sql -- names of tables and columns, as the database has just given them
  return 'SELECT COUNT(*) AS rows_found, ' + sum + ' AS sum FROM ' + table + ' WHERE workshop_id = :id';
}

/** What a workshop has, table by table: how many rows, and a checksum over all of their columns. */
export async function sumsOfRows(database: Database, workshopId: string): Promise<Record<string, unknown>> {
  const sums: Record<string, unknown> = {};
  for (const [table, columns] of await columnsByTable(database)) {
    if (!columns.includes('workshop_id') || notWatched.includes(table)) continue;
    [sums[table]] = await database.select(sumStatement(table, columns), { id: workshopId });
  }
  return sums;
}
