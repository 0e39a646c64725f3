import * as path from 'node:path';

/** The folder of package.json, which every path in these checks is relative to. */
export const projectRoot = path.resolve(__dirname, '../..');
