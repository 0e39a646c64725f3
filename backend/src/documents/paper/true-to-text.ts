import type { Font, Glyph } from 'fontkit';

/**
 * Makes a font give every glyph with the text it stands for this time. By itself it keeps what the glyph stood for first, which may be
 * nothing at all where it was only a part of another: then a paper made later could not be searched, copied or read aloud, and what its
 * bytes are would hang on the papers made before it.
 */
export function trueToText(font: Font): Font {
  const kept = font.getGlyph.bind(font);
  const standing = new Map<string, Glyph>();
  font.getGlyph = (id, codePoints = []) => {
    if (codePoints.length === 0) return kept(id);
    const key = `${id}:${codePoints.join()}`;
    const glyph = standing.get(key) ?? (Object.create(kept(id), { codePoints: { value: codePoints } }) as Glyph);
    standing.set(key, glyph);
    return glyph;
  };
  return font;
}
