import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { create, type Font } from 'fontkit';
import { trueToText } from './true-to-text';

const file = join(__dirname, '../../../../fonts/alegreya-sans-400.ttf');
const text = '€4,834.19 to 7: both.';

interface Run {
  readonly glyphs: readonly { readonly id: number; readonly codePoints: readonly number[] }[];
}
const glyphsOf = (font: Font, written: string) => (font.layout(written) as Run).glyphs;
const read = (font: Font, written: string): string =>
  glyphsOf(font, written)
    .map(({ codePoints }) => String.fromCodePoint(...codePoints))
    .join('');

const fresh = (): Font => trueToText(create(readFileSync(file)));

describe('A font that is true to its text', () => {
  it('reads a sign that was a part of another before', () => {
    const font = fresh();
    for (const { id } of glyphsOf(create(readFileSync(file)), text)) font.getGlyph(id);
    expect(read(font, text)).toBe(text);
  });

  it('gives the same sign again for the same text', () => {
    const font = fresh();
    expect(glyphsOf(font, '.')[0]).toBe(glyphsOf(font, '.')[0]);
  });
});
