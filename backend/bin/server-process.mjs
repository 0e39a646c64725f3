import { spawn } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const longestStop_milliseconds = 15_000;

/** Starts the built server and resolves with what it tells when it is ready; rejects when it ends before that. */
export function startServer(environment) {
  const child = spawn(process.execPath, ['--enable-source-maps', join(root, 'dist/server/main.js')], {
    cwd: root,
    env: environment,
    detached: true,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ended = new Promise((resolve) => child.once('exit', (code) => resolve(code ?? 1)));
  const ready = new Promise((resolve, reject) => {
    child.once('message', resolve);
    child.once('error', reject);
    void ended.then(() => reject(new Error('The server did not start; the reason stands above.')));
  });
  ready.catch(() => undefined);
  const stop = async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill('SIGTERM');
    const late = setTimeout(() => child.kill('SIGKILL'), longestStop_milliseconds);
    await ended;
    clearTimeout(late);
  };
  return { ready, ended, stop };
}
