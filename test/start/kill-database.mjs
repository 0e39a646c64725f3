/** Kills MariaDB in the middle of sixteen writers, ten times (twice where rows may be lost), and tells how many confirmed rows are missing afterwards. */
import { createPool } from 'mariadb';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { installDatabase, startDatabase } from '../../backend/bin/database-server.mjs';
import { freePort } from '../../backend/bin/free-port.mjs';

const isThrowAway = process.argv.includes('--throw-away');
const kills = isThrowAway ? 2 : 10;
const folder = mkdtempSync(join(tmpdir(), 'bolewright-kill-'));
const port = await freePort();
const open = () =>
  createPool({
    host: '127.0.0.1',
    port,
    user: 'root',
    database: 'test',
    connectionLimit: 16,
    connectTimeout: 2_000,
    acquireTimeout: 2_000,
  });
const confirmed = [];
let next = 0;

await installDatabase(join(folder, 'database'));
let server = await startDatabase({ folder: join(folder, 'database'), port, isThrowAway });
const first = createPool({ host: '127.0.0.1', port, user: 'root', connectionLimit: 1 });
await first.query('CREATE DATABASE test');
await first.query('CREATE TABLE test.notes (id INT PRIMARY KEY, note INT NOT NULL)');
await first.query('CREATE TABLE test.lines (note INT NOT NULL, line INT NOT NULL, PRIMARY KEY (note, line))');
await first.end();

/** One note of two lines, in one transaction. */
async function write(pool) {
  const id = next++;
  const connection = await pool.getConnection();
  try {
    await connection.beginTransaction();
    await connection.query('INSERT INTO notes VALUES (?, ?)', [id, id]);
    await connection.query('INSERT INTO `lines` VALUES (?, 1)', [id]);
    await connection.query('INSERT INTO `lines` VALUES (?, 2)', [id]);
    await connection.commit();
    confirmed.push(id);
  } finally {
    await connection.release();
  }
}

for (let kill = 0; kill < kills; kill++) {
  const pool = open();
  let writing = true;
  const writers = Array.from({ length: 16 }, async () => {
    while (writing) await write(pool).catch(() => (writing = false));
  });
  await pause(500);
  process.kill(server.child.pid, 'SIGKILL');
  await Promise.all(writers);
  await pool.end().catch(() => undefined);
  server = await startDatabase({ folder: join(folder, 'database'), port, isThrowAway });
}

const pool = open();
const kept = new Set((await pool.query('SELECT id FROM notes')).map(({ id }) => id));
const byHalves = () =>
  pool.query(`
    SELECT id, found FROM (SELECT n.id, (SELECT COUNT(*) FROM \`lines\` l WHERE l.note = n.id) AS found FROM notes n) counted
    WHERE found <> 2 ORDER BY id`);
const half = await byHalves();
/** Tells what stays by halves from what was only seen while the last kill was being taken back. */
if (half.length > 0) await pause(5_000);
const stay = new Set((half.length > 0 ? await byHalves() : []).map(({ id }) => id));
await pool.end();
await server.stop();
rmSync(folder, { recursive: true, force: true });
console.log(
  JSON.stringify({
    confirmed: confirmed.length,
    missing: confirmed.filter((id) => !kept.has(id)).length,
    half: half.map(
      ({ id, found }) => `note ${id} of ${next} with ${found} lines${stay.has(id) ? ', and it stays so' : ''}`,
    ),
  }),
);
process.exit(0);
