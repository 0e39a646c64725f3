import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

const isSource = (name) => !name.endsWith('.spec.ts') && !name.endsWith('.md');

function* filesOf(path) {
  if (!existsSync(path)) return;
  if (!statSync(path).isDirectory()) return yield path;
  for (const name of readdirSync(path).sort()) yield* filesOf(join(path, name));
}

/** Changes whenever one of the files under these paths does: names, sizes and times, not contents, so that it is quick. */
export function stampOf(paths) {
  const hash = createHash('sha256');
  for (const path of paths) {
    for (const file of filesOf(path)) {
      if (!isSource(file)) continue;
      const { size, mtimeMs } = statSync(file);
      hash.update(`${file} ${size} ${mtimeMs}\n`);
    }
  }
  return hash.digest('hex');
}

export const isCurrent = (stampFile, stamp) => existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp;

export function writeStamp(stampFile, stamp) {
  mkdirSync(dirname(stampFile), { recursive: true });
  writeFileSync(stampFile, stamp);
}
