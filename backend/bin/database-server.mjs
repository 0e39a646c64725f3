import { execFile, spawn } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { promisify } from 'node:util';
import { endProcess, pidIn } from './running-process.mjs';

const longestStart_milliseconds = 60_000;

/** Run by root, the database must be told to stay root; run by anybody else, it must not. */
const asUser = process.getuid?.() === 0 ? ['--user=root'] : [];
const program = (name) => [`/usr/sbin/${name}`, `/usr/bin/${name}`].find((path) => existsSync(path)) ?? name;

/** For tests only: a crash may lose what such a server has confirmed. */
const throwAway = ['--innodb-flush-log-at-trx-commit=0', '--innodb-doublewrite=OFF', '--innodb-flush-method=nosync'];
const durable = ['--innodb-flush-log-at-trx-commit=1', '--innodb-doublewrite=ON'];

const settings = [
  '--skip-log-bin',
  '--skip-name-resolve',
  '--performance-schema=OFF',
  '--character-set-server=utf8mb4',
  '--collation-server=utf8mb4_unicode_ci',
  '--default-time-zone=+00:00',
  '--sql-mode=TRADITIONAL,NO_ENGINE_SUBSTITUTION,ONLY_FULL_GROUP_BY',
  '--innodb-log-file-size=16M',
  '--innodb-buffer-pool-size=128M',
  '--max-connections=100',
];

/**
 * Where the temporary tables of a database go, beside it and its alone: as it starts MariaDB clears away whatever looks like one, and in a
 * folder shared with another server that would be what the other is working on.
 */
function temporaryTables(folder) {
  mkdirSync(`${folder}.tmp`, { recursive: true });
  return `--tmpdir=${folder}.tmp`;
}

/** Makes an empty database in a folder that does not exist yet. */
export async function installDatabase(folder) {
  const options = ['--auth-root-authentication-method=normal', '--skip-test-db', '--innodb-log-file-size=16M'];
  await promisify(execFile)(program('mariadb-install-db'), [
    '--no-defaults',
    ...asUser,
    `--datadir=${folder}`,
    temporaryTables(folder),
    ...options,
  ]);
}

/** Resolves when a server greets at an address; MariaDB speaks first. */
const isGreeted = (address) =>
  new Promise((resolve) => {
    const socket = connect(address);
    const end = (greeted) => {
      socket.destroy();
      resolve(greeted);
    };
    socket
      .once('data', () => end(true))
      .once('error', () => end(false))
      .setTimeout(1_000, () => end(false));
  });

async function waitForGreeting(address, child) {
  const until = Date.now() + longestStart_milliseconds;
  while (Date.now() < until && child.exitCode === null) {
    if (await isGreeted(address)) return true;
    await pause(30);
  }
  return false;
}

const lastLines = (file) => (existsSync(file) ? readFileSync(file, 'utf8').split('\n').slice(-8).join('\n') : '');

/** Ends a server that was left running on this folder when its parent was killed. */
export async function endLeftover(folder) {
  const pid = pidIn(`${folder}.pid`, `--datadir=${folder}`);
  if (pid && !(await endProcess(pid)))
    throw new Error(`The database of an earlier start (process ${pid}) does not end. Please end it and start again.`);
}

/**
 * Starts MariaDB on a folder, on a port of loopback or, without one, on a socket alone, and answers once it greets. It is started
 * apart from this process group, so that Ctrl+C reaches it only through `stop`.
 */
export async function startDatabase({ folder, port, isThrowAway = false }) {
  const socketFolder = mkdtempSync(join(tmpdir(), 'bw-'));
  const socket = join(socketFolder, 's');
  const log = `${folder}.log`;
  const place = port ? ['--bind-address=127.0.0.1', `--port=${port}`] : ['--skip-networking'];
  const kept = [`--datadir=${folder}`, `--pid-file=${folder}.pid`, `--log-error=${log}`];
  const files = [...kept, `--socket=${socket}`, temporaryTables(folder)];
  const safety = isThrowAway ? throwAway : durable;
  const child = spawn(program('mariadbd'), ['--no-defaults', ...asUser, ...files, ...place, ...settings, ...safety], {
    detached: true,
    stdio: 'ignore',
  });
  child.on('error', () => undefined);
  const stop = async () => {
    if (child.exitCode === null && child.signalCode === null && child.pid) await endProcess(child.pid);
    rmSync(socketFolder, { recursive: true, force: true });
  };
  if (!(await waitForGreeting(port ? { port, host: '127.0.0.1' } : { path: socket }, child))) {
    await stop();
    throw new Error(`The database did not start. The end of ${log}:\n${lastLines(log)}`);
  }
  if (child.pid) writeFileSync(`${folder}.pid`, String(child.pid));
  return { port, socket, child, stop };
}
