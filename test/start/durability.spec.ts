import { execFile } from 'node:child_process';
import { join } from 'node:path';
import { promisify } from 'node:util';

interface Toll {
  readonly confirmed: number;
  readonly missing: number;
  /** The notes that have not both of their lines. */
  readonly half: readonly string[];
}

/** Kills a database of ours under sixteen writers, ten times. */
async function killed(...args: string[]): Promise<Toll> {
  const { stdout } = await promisify(execFile)(process.execPath, [join(__dirname, 'kill-database.mjs'), ...args]);
  return JSON.parse(stdout) as Toll;
}

test('what was confirmed is there after the database was killed, and nothing is there by halves', async () => {
  const { confirmed, missing, half } = await killed();
  expect(confirmed).toBeGreaterThan(100);
  expect({ missing, half }).toEqual({ missing: 0, half: [] });
}, 120_000);

test('the same with the settings of a throw-away database loses rows: so the test above can tell', async () => {
  expect((await killed('--throw-away')).missing).toBeGreaterThan(0);
}, 120_000);
