import { printableText } from '#shared/words/printable-text';
import type { Pdf } from './open-paper';
import type { TextStyle } from './paper-colours';

/** Figures all of one width and standing on the line, letters kerned: everywhere, since Alegreya's own figures hang. */
const features = ['lnum', 'tnum', 'kern', 'liga'] as unknown as PDFKit.Mixins.OpenTypeFeatures[];

const widths = new WeakMap<Pdf, Map<string, number>>();

/** Width of a piece of text in points. */
export function textWidth(pdf: Pdf, text: string, style: TextStyle): number {
  const known = widths.get(pdf) ?? new Map<string, number>();
  widths.set(pdf, known);
  const key = `${style.font} ${style.size_pt} ${text}`;
  const width = known.get(key) ?? pdf.font(style.font, style.size_pt).widthOfString(text, { features });
  known.set(key, width);
  return width;
}

/** A word too wide for the line is cut where the line ends. */
function cutWord(word: string, fits: (text: string) => boolean): string[] {
  const parts: string[] = [];
  let part = '';
  for (const letter of word) {
    if (part !== '' && !fits(part + letter)) {
      parts.push(part);
      part = '';
    }
    part += letter;
  }
  return [...parts, part];
}

function paragraphLines(paragraph: string, fits: (text: string) => boolean): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of paragraph.split(' ').filter(Boolean)) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (fits(longer)) {
      line = longer;
      continue;
    }
    if (line !== '') lines.push(line);
    const parts = cutWord(word, fits);
    lines.push(...parts.slice(0, -1));
    line = parts.at(-1) ?? '';
  }
  return [...lines, line];
}

/** Breaks a text into lines that fit a width in points; its own line ends stay. */
export function textLines(
  pdf: Pdf,
  text: string,
  { style, width_pt }: { style: TextStyle; width_pt: number },
): string[] {
  const space = textWidth(pdf, ' ', style);
  const word = (text: string) => textWidth(pdf, text, style);
  const fits = (line: string) =>
    line.split(' ').reduce((sum, part, place) => sum + (place > 0 ? space : 0) + word(part), 0) <= width_pt + 0.01;
  return printableText(text)
    .trim()
    .split('\n')
    .flatMap((paragraph) => paragraphLines(paragraph, fits));
}

/** Where a line of text stands: its left or right end, and the top of its line. */
export interface LinePlace {
  readonly x_pt: number;
  readonly y_pt: number;
  readonly align?: 'left' | 'right' | 'centre';
}

/** Writes one line of text. */
export function writeLine(pdf: Pdf, text: string, { style, place }: { style: TextStyle; place: LinePlace }): void {
  const line = printableText(text);
  if (line === '') return;
  const shift = { left: 0, centre: 0.5, right: 1 }[place.align ?? 'left'];
  const x = shift === 0 ? place.x_pt : place.x_pt - shift * textWidth(pdf, line, style);
  pdf.font(style.font, style.size_pt).fillColor(style.colour);
  const top = place.y_pt + (style.leading_pt - pdf.currentLineHeight()) / 2;
  pdf.text(line, x, top, { lineBreak: false, features });
}

/** A text on one line of a width in points, with an ellipsis where it had to be cut. */
export function fittedLine(
  pdf: Pdf,
  text: string,
  { style, width_pt }: { style: TextStyle; width_pt: number },
): string {
  const line = printableText(text).replace(/\n/g, ' ');
  if (textWidth(pdf, line, style) <= width_pt) return line;
  const [first = ''] = textLines(pdf, line, { style, width_pt: width_pt - textWidth(pdf, ' …', style) });
  return `${first} …`;
}
