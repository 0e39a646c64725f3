import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants } from 'node:zlib';

const compressed = promisify(brotliCompress);
const isText = (name) => /\.(js|css|svg)$/.test(name);

/** Writes beside each text file of a built folder what it comes to by brotli at its best, which would take too long at each request. */
export async function compressPages(folder) {
  const names = readdirSync(folder, { recursive: true }).filter(isText);
  await Promise.all(
    names.map(async (name) => {
      const text = readFileSync(join(folder, name));
      const params = { [constants.BROTLI_PARAM_SIZE_HINT]: text.length };
      writeFileSync(join(folder, `${name}.br`), await compressed(text, { params }));
    }),
  );
}
