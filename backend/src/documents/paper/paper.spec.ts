import fc from 'fast-check';
import type { DrawingView } from '#shared/measure/drawing/drawing';
import { printableText } from '#shared/words/printable-text';
import { printedRanges } from '#shared/words/printed-ranges';
import { dimensionPlaces } from './dimension-places';
import { fileName } from '../file-names';
import { openPaper } from './open-paper';
import { textStyles } from './paper-colours';
import { paperFonts } from './paper-fonts';
import { fittedLine, textLines, textWidth } from './text-lines';
import { viewLayout } from './view-layout';

const pdf = openPaper({
  title: 't',
  author: 'a',
  subject: 's',
  language: 'en',
  size: 'A4',
  madeAt: '2026-03-02T09:30:00Z',
});
const style = textStyles.body;

it('knows exactly the letters every one of its fonts has', () => {
  const sets = Object.keys(paperFonts()).map((name) => {
    const { _font } = pdf.font(name) as unknown as { _font: { font: { characterSet: number[] } } };
    return new Set(_font.font.characterSet);
  });
  const everywhere = [...sets[0]].filter((code) => code >= 0x20 && sets.every((set) => set.has(code)));
  const told = printedRanges.flatMap(([from, to]) => Array.from({ length: to - from + 1 }, (_, step) => from + step));
  expect(told).toEqual(everywhere.sort((one, other) => one - other));
});

describe('lines of text', () => {
  it('fit the width and lose no word', () => {
    const words = fc.array(fc.string({ unit: fc.constantFrom('a', 'ż', 'W', 'i', '1'), minLength: 1, maxLength: 12 }), {
      minLength: 1,
      maxLength: 30,
    });
    fc.assert(
      fc.property(words, fc.integer({ min: 80, max: 400 }), (text, width_pt) => {
        const lines = textLines(pdf, text.join(' '), { style, width_pt });
        expect(lines.join(' ').replaceAll(' ', '')).toBe(text.join(''));
        for (const line of lines) expect(textWidth(pdf, line, style)).toBeLessThanOrEqual(width_pt + 0.5);
      }),
    );
  });

  it('cut a word that is wider than the line, and keep line ends', () => {
    const lines = textLines(pdf, `${'W'.repeat(40)}\n\nend`, { style, width_pt: 100 });
    expect(lines.length).toBeGreaterThan(4);
    expect(lines.slice(-2)).toEqual(['', 'end']);
  });

  it('end in an ellipsis where a title has to stay on one line', () => {
    const line = fittedLine(pdf, 'A pier table with paired herons, gilt in water', { style, width_pt: 90 });
    expect(line).toMatch(/^A pier table.* …$/);
    expect(textWidth(pdf, line, style)).toBeLessThanOrEqual(90);
  });

  it('have nothing in them that cannot be printed', () => {
    expect(printableText('a\u0000\u202eb\r\nc\u202fd\u2011e\u0301')).toBe('ab\nc\u00a0d-é');
  });
});

const box = { left_mm: 0, top_mm: 0, width_mm: 300, height_mm: 100 };
const at = (x_mm: number, y_mm: number) => ({ x_mm, y_mm });
const across = (from: number, to: number) => ({
  from: at(from, 100),
  to: at(to, 100),
  label_mm: to - from,
  side: 'below' as const,
});
const view: DrawingView = {
  view: 'face',
  paths: [],
  box,
  dimensions: [across(0, 300), across(0, 150), across(150, 300)],
};
const setting = { labelHeight_pt: 9, label: String, widthOf: (label: string) => 4 * label.length };

describe('a view drawn to scale', () => {
  it('takes the largest recommended scale at which it fits', () => {
    const layout = viewLayout(view, { width_pt: 180, height_pt: 150 }, setting);
    expect(layout.ratio).toEqual([1, 5]);
    expect(layout.scale * 300).toBeCloseTo((300 / 5) * (72 / 25.4), 9);
    expect(layout.width_pt).toBeLessThanOrEqual(180);
  });

  it('is as large as life where there is room', () => {
    expect(viewLayout(view, { width_pt: 900, height_pt: 400 }, setting).ratio).toEqual([1, 1]);
  });

  it('sets dimensions that do not meet in one row, others further out', () => {
    expect(dimensionPlaces(view, { ...setting, scale: 0.5 }).map(({ tier }) => tier)).toEqual([0, 1, 1]);
  });
});

describe('the name of a file', () => {
  it.each([
    [['estimate', 'E-2026-031', 'B'], 'estimate-E-2026-031-B.pdf'],
    [['estimate', '../../etc/"x"\r\n', 'Ä'], 'estimate-etc-x-A.pdf'],
    [['leaf-order', '\u202eżółw', ''], 'leaf-order-zo-w.pdf'],
  ])('of %j is %s', (parts, name) => {
    expect(fileName(parts, 'pdf')).toBe(name);
  });
});
