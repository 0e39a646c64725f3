import { randomBytes, randomInt } from 'node:crypto';
import {
  closeSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { join } from 'node:path';
import { pidIn } from './running-process.mjs';

const startMark = 'bin/start.mjs';
const secret = () => randomBytes(32).toString('base64url');

/** Words for a phrase that is easily typed; with its figures one of some five hundred million. */
const phraseWords = [
  'ochre',
  'agate',
  'chalk',
  'rabbit',
  'linen',
  'umber',
  'walnut',
  'gouge',
  'mallet',
  'shellac',
  'garlic',
  'cushion',
  'copper',
  'damson',
  'feather',
  'kettle',
];

function phrase() {
  const chosen = Array.from({ length: 4 }, () => phraseWords[randomInt(phraseWords.length)]);
  return `${chosen.join(' ')} ${randomInt(1_000, 10_000)}`;
}

/**
 * A folder that one start at a time may use. Answers how to leave it, and whether the start before was killed: whoever ends in order takes
 * the lock away. Throws an error whose message says who uses it already.
 */
export function lockFolder(folder, port) {
  const file = join(folder, 'start.pid');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const claim = () => {
    const handle = openSync(file, 'wx', 0o600);
    writeSync(handle, `${process.pid}\n`);
    closeSync(handle);
    writeFileSync(join(folder, 'start.port'), String(port));
  };
  let wasKilled = false;
  try {
    claim();
  } catch {
    const pid = pidIn(file, startMark);
    const at = existsSync(join(folder, 'start.port'))
      ? ` at http://127.0.0.1:${readFileSync(join(folder, 'start.port'), 'utf8')}/`
      : '';
    if (pid && pid !== process.pid)
      throw new Error(`Bolewright is already running here (process ${pid})${at}. End that one first, or use it.`);
    rmSync(file, { force: true });
    claim();
    wasKilled = true;
  }
  return { leave: () => rmSync(file, { force: true }), wasKilled };
}

function readSecrets(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    throw new Error(
      `${file} cannot be read as what it was: put it back from a copy, or move the whole folder away to begin anew.`,
    );
  }
}

/** The secrets of this installation, made at the first start and readable by its user alone. */
export function secretsOf(folder) {
  const file = join(folder, 'secrets.json');
  if (existsSync(file)) return readSecrets(file);
  if (existsSync(join(folder, 'database/ibdata1')))
    throw new Error(
      `${file} is missing, and the database beside it opens to nothing else. Put it back from a copy, or move the whole folder away to begin anew.`,
    );
  const made = {
    databaseRoot: secret(),
    databaseMigration: secret(),
    databaseApplication: secret(),
    session: secret(),
    demonstration: phrase(),
  };
  writeFileSync(`${file}.making`, JSON.stringify(made, null, 2), { mode: 0o600, flush: true });
  renameSync(`${file}.making`, file);
  return made;
}

const portFile = (folder) => join(folder, 'database.port');
export const rememberedPort = (folder) =>
  existsSync(portFile(folder)) ? Number(readFileSync(portFile(folder), 'utf8')) : undefined;
export const rememberPort = (folder, port) => writeFileSync(portFile(folder), String(port));
