// Makes the browser's WOFF2 subsets from the full TrueType files beside it: `node fonts/make-subsets.mjs`.
// The full files serve the papers; the subsets keep Latin in all its European spellings and the signs the screens use.
import { readFile, readdir, writeFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import subsetFont from 'subset-font';

const folder = new URL('.', import.meta.url);

/** Inclusive ranges of code points, each with what it is for. */
const ranges = [
  [0x0020, 0x007e], // Basic Latin
  [0x00a0, 0x00ff], // Latin-1: accents, × ÷ ² ³ µ ° ± ½ ¼ ¾ £ ¥
  [0x0100, 0x017f], // Latin Extended-A: Polish, Czech, Hungarian, Turkish, Baltic
  [0x0218, 0x021b], // Romanian comma below
  [0x02c6, 0x02dd], // spacing accents
  [0x1e80, 0x1e85], // Welsh
  [0x1e9e, 0x1e9e], // capital sharp s
  [0x2009, 0x200a], // thin and hair space
  [0x2013, 0x2014], // dashes
  [0x2018, 0x201e], // quotation marks
  [0x2020, 0x2022], // dagger, bullet
  [0x2026, 0x2026], // ellipsis
  [0x2030, 0x2033], // per mille, feet and inches
  [0x2039, 0x203a], // single angle quotation marks
  [0x2044, 0x2044], // fraction slash
  [0x20a0, 0x20bf], // currencies
  [0x2116, 0x2122], // numero, trade mark
  [0x2153, 0x215e], // thirds to eighths
  [0x2190, 0x2199], // arrows
  [0x2212, 0x2212], // minus
  [0x221e, 0x221e], // without end
  [0x2248, 0x2248], // about equal
  [0x2260, 0x2265], // not equal, at most, at least
  [0x03bc, 0x03bc], // Greek mu
];

/** What a page of figures needs; small capitals and stylistic sets stay behind. `lnum` and `tnum` align every column. */
const features = ['kern', 'liga', 'ccmp', 'mark', 'mkmk', 'lnum', 'tnum', 'frac', 'numr', 'dnom', 'sups', 'subs', 'case'];

const text = ranges
  .flatMap(([first, last]) => Array.from({ length: last - first + 1 }, (_, step) => String.fromCodePoint(first + step)))
  .join('');

for (const name of (await readdir(folder)).filter((file) => file.endsWith('.ttf')).sort()) {
  const full = await readFile(new URL(name, folder));
  const subset = await subsetFont(full, text, { targetFormat: 'woff2', keepFeatures: features, noHinting: true });
  await writeFile(new URL(name.replace('.ttf', '.woff2'), folder), subset);
  console.log(fileURLToPath(new URL(name, folder)).split('/').at(-1), full.length, '→', subset.length);
}
