import { join } from 'node:path';

/** A program of a test as it was put together for this run (`build-programs.mjs`), by the name of its file. */
export const builtProgram = (name: string): string => join(__dirname, '../../.cache/programs', `${name}.js`);
