import { existsSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import type { WorkerOptions } from 'node:worker_threads';

/** A file a thread is started from, and how. */
export interface ThreadFile {
  readonly file: string;
  readonly options: WorkerOptions;
}

/** The built server has its threads beside it in dist/server; from the sources (tests, benchmarks) tsx reads the TypeScript. */
export function threadFile(source: string): ThreadFile {
  const built = join(dirname(source), basename(source).replace(/\.ts$/, '.js'));
  return existsSync(built)
    ? { file: built, options: {} }
    : { file: source, options: { execArgv: ['--require', 'tsx/cjs'] } };
}
