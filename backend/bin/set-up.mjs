/** Makes ready what `npm start` and `npm test` need. Uses nothing but Node itself, since the packages may not be there yet. */
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const stampFile = join(root, '.cache/packages.txt');
const forTests = process.argv.includes('--test');

const say = (text) => console.log(text);

const programs = [
  { debian: 'mariadb-server', command: 'mariadbd', use: 'keeps the workshop’s records', always: true },
  {
    debian: 'chromium-headless-shell',
    command: 'chromium-headless-shell',
    use: 'opens the pages in tests',
    always: false,
  },
  { debian: 'poppler-utils', command: 'pdftotext', use: 'reads the papers in tests', always: false },
];

const places = [...(process.env.PATH ?? '').split(':'), '/usr/sbin', '/usr/bin', '/usr/local/bin'];
const isThere = ({ command }) => places.some((place) => existsSync(join(place, command)));

function install(missing) {
  const names = missing.map(({ debian }) => debian);
  say(`Installing ${names.join(', ')} …`);
  const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const quiet = { env: environment, stdio: ['ignore', 'ignore', 'inherit'] };
  execFileSync('apt-get', ['update', '-q'], quiet);
  execFileSync('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...names], quiet);
}

function ensurePrograms() {
  const missing = programs.filter(
    (one) => (one.always || forTests) && !isThere(one) && !(one.always && process.env.DATABASE_URL && !forTests),
  );
  if (missing.length === 0) return;
  const mayInstall = process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
  if (mayInstall) return install(missing);
  const wanted = missing.map(({ debian, use }) => `${debian} (${use})`).join(', ');
  say(
    `Please install ${wanted} first, for example: sudo apt-get install ${missing.map(({ debian }) => debian).join(' ')}`,
  );
  process.exit(1);
}

/** Changes with the lock file and with Node: packages bring programs built for one Node. */
const stamp = () =>
  createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .update(process.version)
    .digest('hex');

function ensurePackages() {
  const wanted = stamp();
  const found = existsSync(stampFile) ? readFileSync(stampFile, 'utf8') : '';
  if (existsSync(join(root, 'node_modules/.package-lock.json')) && found === wanted) return;
  say('Installing the packages (about a minute) …');
  execFileSync('npm', ['ci', '--no-audit', '--no-fund'], { cwd: root, stdio: 'inherit' });
  mkdirSync(dirname(stampFile), { recursive: true });
  writeFileSync(stampFile, wanted);
}

function refuseOtherNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if ((major === 20 && minor >= 19) || (major === 22 && minor >= 12)) return;
  say(`This needs Node 20.19 or 22.12 and later of these two lines; this is ${process.version}.`);
  process.exit(1);
}

refuseOtherNode();
ensurePrograms();
ensurePackages();
