import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { create, type Font } from 'fontkit';
import type { PaperFont } from './paper-colours';
import { trueToText } from './true-to-text';

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

let opened: Readonly<Record<PaperFont, Font>> | null = null;

/**
 * The fonts papers are set in, whole, with all their scripts; each is opened once for all papers, since finding one's way through its tables
 * takes longer than setting a paper.
 */
export function paperFonts(): Readonly<Record<PaperFont, Font>> {
  const folder = fontFolder(__dirname);
  const font = (name: PaperFont) => trueToText(create(readFileSync(join(folder, fileNames[name]))));
  opened ??= { heading: font('heading'), text: font('text'), medium: font('medium'), bold: font('bold') };
  return opened;
}
