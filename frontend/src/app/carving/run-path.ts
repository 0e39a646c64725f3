import { centreGlyph, mitreGlyph, ornamentGlyph } from './ornament-glyphs';
import type { RunItem } from './run-items';

/** A row of glyphs: what is drawn from its top, so high, as far as a length in mm. */
export interface GlyphRow {
  readonly ornamentId: string;
  readonly items: readonly RunItem[];
  readonly top_mm: number;
  readonly height_mm: number;
  readonly to_mm: number;
}

function glyphOf({ kind, at_mm, size_mm }: RunItem, row: GlyphRow): string {
  const box = { x: at_mm, y: row.top_mm, width: size_mm, height: row.height_mm };
  if (kind === 'repeat') return ornamentGlyph(row.ornamentId, box);
  return kind === 'centre' ? centreGlyph(box) : mitreGlyph(box, kind === 'mitre-right');
}

/** The things on a run that lie wholly within the length shown, as one path in mm. */
export const runPath = (row: GlyphRow): string =>
  row.items
    .filter(({ at_mm, size_mm }) => at_mm + size_mm <= row.to_mm + 1e-6)
    .map((item) => glyphOf(item, row))
    .join('');
