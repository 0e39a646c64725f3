import { spawn } from 'node:child_process';
import { existsSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { buildServer } from './build-server.mjs';
import { compressPages } from './compress-pages.mjs';
import { joinChunks } from './join-chunks.mjs';
import { prepareFirstVisit } from './client-first-visit.mjs';
import { isCurrent, stampOf, writeStamp } from './source-stamp.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const inRoot = (...names) => names.map((name) => join(root, name));
const [ng] = inRoot('node_modules/@angular/cli/bin/ng.js');

const parts = [
  {
    name: 'the pages (half a minute)',
    stampFile: join(root, '.cache/built-pages.txt'),
    result: join(root, 'dist/web/index.html'),
    sources: inRoot(
      ...['frontend', 'shared', 'fonts', 'angular.json', 'package-lock.json', 'tsconfig.json'],
      ...['backend/bin/build.mjs', 'backend/bin/client-first-visit.mjs', 'backend/bin/compress-pages.mjs'],
      'backend/bin/join-chunks.mjs',
    ),
    build: buildPages,
  },
  {
    name: 'the server',
    stampFile: join(root, '.cache/built-server.txt'),
    result: join(root, 'dist/server/main.js'),
    sources: inRoot('backend/src', 'backend/migrations', 'seeders', 'shared', 'package-lock.json'),
    build: buildServer,
  },
];

/** The workshop's pages, and then those of clients, which lie in a folder of theirs. */
async function buildPages() {
  await run(process.execPath, [ng, 'build', 'web', '--progress=false', '--stats-json']);
  await joinChunks(join(root, 'dist/web'));
  await run(process.execPath, [ng, 'build', 'client', '--progress=false', '--stats-json']);
  await prepareFirstVisit(join(root, 'dist/web/client-files'));
  await compressPages(join(root, 'dist/web'));
}

function run(command, args) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd: root, stdio: ['ignore', 'ignore', 'inherit'] });
    child.once('error', reject);
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error('The pages could not be built; the reasons stand above.')),
    );
  });
}

/** Builds what has changed since it was built last; seeding needs no pages. */
export async function buildWhatChanged(say, { withPages }) {
  for (const part of withPages ? parts : parts.slice(1)) {
    const stamp = stampOf(part.sources);
    if (existsSync(part.result) && isCurrent(part.stampFile, stamp)) continue;
    say(`Building ${part.name} …`);
    await part.build();
    writeStamp(part.stampFile, stamp);
  }
}

/** Builds the pages again at every change, for development: the next start builds its own. Answers how to end it. */
export function watchPages() {
  rmSync(parts[0].stampFile, { force: true });
  const child = spawn(process.execPath, [ng, 'build', 'web', '--watch', '--configuration', 'development'], {
    cwd: root,
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  return () => child.kill('SIGTERM');
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href)
  await buildWhatChanged(console.log, { withPages: true });
