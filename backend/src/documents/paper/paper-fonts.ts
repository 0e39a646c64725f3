import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import type { PaperFont } from './paper-colours';

const fileNames: Readonly<Record<PaperFont, string>> = {
  heading: 'alegreya-500.ttf',
  text: 'alegreya-sans-400.ttf',
  medium: 'alegreya-sans-500.ttf',
  bold: 'alegreya-sans-700.ttf',
};

/** The folder of fonts stands at the root, above the sources and above the built server alike. */
function fontFolder(from: string): string {
  const folder = join(from, 'fonts');
  if (existsSync(join(folder, fileNames.text))) return folder;
  const above = dirname(from);
  if (above === from) throw new Error('the fonts of the papers are missing');
  return fontFolder(above);
}

let read: Readonly<Record<PaperFont, Buffer>> | null = null;

/** The fonts papers are set in, whole, with all their scripts. */
export function paperFonts(): Readonly<Record<PaperFont, Buffer>> {
  const folder = fontFolder(__dirname);
  const file = (font: PaperFont) => readFileSync(join(folder, fileNames[font]));
  read ??= { heading: file('heading'), text: file('text'), medium: file('medium'), bold: file('bold') };
  return read;
}
