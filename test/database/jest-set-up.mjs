import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { installDatabase, startDatabase } from '../../backend/bin/database-server.mjs';
import { freePort } from '../../backend/bin/free-port.mjs';

/** Starts one throw-away MariaDB for the whole run; each Jest worker makes a database of its own on it. */
export default async function setUp() {
  if (process.env.TEST_DATABASE_SERVER) return;
  const folder = mkdtempSync(join(tmpdir(), 'bolewright-test-'));
  await installDatabase(join(folder, 'database'));
  const server = await startDatabase({ folder: join(folder, 'database'), port: await freePort(), isThrowAway: true });
  process.env.TEST_DATABASE_SERVER = `mariadb://root@127.0.0.1:${server.port}`;
  globalThis.testDatabase = { server, folder };
}
