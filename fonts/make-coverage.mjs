// Writes which letters the papers can print, from the fonts beside it: `node fonts/make-coverage.mjs`.
// Only what all of them hold counts, since any text may stand in any of them.
import { readFile, readdir, writeFile } from 'node:fs/promises';
import PDFDocument from 'pdfkit';

const folder = new URL('.', import.meta.url);
const target = new URL('../shared/words/printed-ranges.ts', folder);

const pdf = new PDFDocument({ font: '' });
const sets = [];
for (const name of (await readdir(folder)).filter((file) => file.endsWith('.ttf')).sort()) {
  pdf.font(await readFile(new URL(name, folder)));
  sets.push(new Set(pdf._font.font.characterSet));
}
const [first, ...others] = sets;
const codes = [...first].filter((code) => code >= 0x20 && others.every((set) => set.has(code))).sort((a, b) => a - b);

const ranges = [];
for (const code of codes) {
  const last = ranges.at(-1);
  if (last && last[1] === code - 1) last[1] = code;
  else ranges.push([code, code]);
}
const hex = (code) => `0x${code.toString(16).padStart(4, '0')}`;
const lines = ranges.map(([from, to]) => `  [${hex(from)}, ${hex(to)}],`);
await writeFile(
  target,
  `/** Code points every font of the papers holds, as inclusive ranges in rising order; made by fonts/make-coverage.mjs. */
export const printedRanges: readonly (readonly [number, number])[] = [
${lines.join('\n')}
];
`,
);
console.log(`${codes.length} code points in ${ranges.length} ranges`);
