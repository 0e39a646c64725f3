import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, statfsSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { endLeftover, installDatabase, startDatabase } from '../../backend/bin/database-server.mjs';
import { freePort } from '../../backend/bin/free-port.mjs';
import { commandOf } from '../../backend/bin/running-process.mjs';
import { buildPrograms } from '../programs/build-programs.mjs';

const prefix = 'bolewright-test-';

/** What is thrown away need not reach a disk: the memory of Linux takes it, where it has room. A new database is there in a third of the time. */
const memory = '/dev/shm';
const enough_bytes = 4 * 2 ** 30;
const hasRoom = ({ bavail, bsize }) => bavail * bsize > enough_bytes;
const place = existsSync(memory) && hasRoom(statfsSync(memory)) ? memory : tmpdir();

/** Clears away the databases of runs that were killed and could not do it themselves. */
async function clearLeftovers() {
  for (const name of readdirSync(place).filter((one) => one.startsWith(prefix))) {
    const folder = join(place, name);
    const owner = join(folder, 'owner.pid');
    if (!existsSync(owner) || commandOf(Number(readFileSync(owner, 'utf8')))) continue;
    await endLeftover(join(folder, 'database'));
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Starts one throw-away MariaDB for the whole run; each Jest worker makes databases of its own on it. */
export default async function setUp() {
  if (process.env.TEST_DATABASE_SERVER) return;
  await Promise.all([clearLeftovers(), buildPrograms()]);
  const folder = mkdtempSync(join(place, prefix));
  writeFileSync(join(folder, 'owner.pid'), String(process.pid));
  await installDatabase(join(folder, 'database'));
  const server = await startDatabase({ folder: join(folder, 'database'), port: await freePort(), isThrowAway: true });
  process.env.TEST_DATABASE_SERVER = `mariadb://root@127.0.0.1:${server.port}`;
  globalThis.testDatabase = { server, folder };
}
