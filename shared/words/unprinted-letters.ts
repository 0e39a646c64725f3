import { printableText } from '#shared/words/printable-text';
import { printedRanges } from '#shared/words/printed-ranges';

const segmenter = new Intl.Segmenter('en', { granularity: 'grapheme' });

const isPrinted = (code: number): boolean => printedRanges.some(([from, to]) => code >= from && code <= to);

/** What has no shape of its own: line ends, joiners, choosers of a variant. */
const shapeless = /[\n\p{Default_Ignorable_Code_Point}]/u;

const isWanting = (text: string): boolean =>
  [...text].some((part) => !shapeless.test(part) && !isPrinted(part.codePointAt(0) ?? 0));

/** The letters of a text, as its reader counts them, that the fonts of the papers do not have: each once, in the order they come. */
export function unprintedLetters(text: string): string[] {
  const printable = printableText(text);
  if (!isWanting(printable)) return [];
  const letters = [...segmenter.segment(printable)].map(({ segment }) => segment);
  return [...new Set(letters.filter(isWanting))];
}
