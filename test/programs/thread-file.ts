import { basename } from 'node:path';
import type { ThreadFile } from '../../backend/src/platform/threads/thread-file';
import { builtProgram } from './built-program';

/** Stands in for `platform/threads/thread-file` in tests on a database (`jest.config.cjs`): threads start from what was put together for the run. */
export const threadFile = (source: string): ThreadFile => ({
  file: builtProgram(basename(source, '.ts')),
  options: {},
});
