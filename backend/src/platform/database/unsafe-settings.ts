import type { Database } from './database';

interface Setting {
  readonly name: string;
  readonly value: string;
}

const wanted: Readonly<Record<string, string>> = {
  innodb_flush_log_at_trx_commit: '1',
  innodb_doublewrite: 'ON',
  sync_binlog: '1',
};

/** The database settings under which a committed row could be lost in a crash; `sync_binlog` counts only where a binary log is kept. */
export async function unsafeSettings(database: Database): Promise<string[]> {
  const rows = await database.select<Setting>(
    'SELECT LOWER(VARIABLE_NAME) AS name, VARIABLE_VALUE AS value FROM information_schema.GLOBAL_VARIABLES WHERE VARIABLE_NAME IN (:names)',
    { names: [...Object.keys(wanted), 'log_bin'] },
  );
  const keepsBinaryLog = rows.some(({ name, value }) => name === 'log_bin' && value === 'ON');
  return rows
    .filter(({ name, value }) => name in wanted && value !== wanted[name] && (name !== 'sync_binlog' || keepsBinaryLog))
    .map(({ name, value }) => `${name}=${value} (must be ${wanted[name]})`);
}

/** Refuses a database that could lose what it has confirmed, unless whoever started the server accepts that. */
export async function refuseUnsafeSettings(database: Database, isAccepted: boolean): Promise<void> {
  const unsafe = isAccepted ? [] : await unsafeSettings(database);
  if (unsafe.length > 0) throw new Error(`The database could lose what it has confirmed: ${unsafe.join(', ')}.`);
}
