import type { LetterText } from '#shared/agreements/letter-complaints';
import { letterPieces } from '#shared/agreements/letter-pieces';

/** A letter ready to be sent: one line of subject, and the same words as plain text and as HTML. */
export interface FilledLetter {
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** What stands in place of the placeholders, by their names. */
export type LetterValues = Readonly<Record<string, string>>;

const signs: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => signs[sign] ?? '');
const oneLine = (text: string): string => text.replace(/[\u0000-\u001f\u007f\u2028\u2029]+/g, ' ').trim();

type Writing = (text: string, name?: string) => string;

/** In one pass: what a value says is never looked at for placeholders again. */
const written = (template: string, values: LetterValues, write: Writing): string =>
  letterPieces(template)
    .map((piece) => (piece.is === 'placeholder' ? write(values[piece.name] ?? '', piece.name) : write(piece.text)))
    .join('');

const asLink = (address: string): string =>
  /^https?:\/\/\S+$/.test(address) ? `<a href="${escaped(address)}">${escaped(address)}</a>` : escaped(address);

const inParagraphs = (body: string): string =>
  body
    .trim()
    .split(/\r?\n(?:[ \t]*\r?\n)+/)
    .map((paragraph) => `<p>${paragraph.split(/\r?\n/).join('<br>')}</p>`)
    .join('\n');

const htmlOf = (template: string, values: LetterValues): string =>
  inParagraphs(written(template, values, (text, name) => (name === 'link' ? asLink(text) : escaped(text))));

/** Plain words as HTML: paragraphs and line breaks as they were written, a line that is an address as a link, nothing as markup. */
export const paragraphsOf = (text: string): string => inParagraphs(text.split('\n').map(asLink).join('\n'));

/** Fills the words of a letter: values go in as text, never as markup and never as further placeholders; an unknown one is left empty. */
export function filledLetter(words: LetterText, values: LetterValues): FilledLetter {
  const plain: Writing = (text) => text;
  return {
    subject: oneLine(written(words.subject, values, plain)),
    // A value that is empty leaves one empty line, not three.
    text: `${written(words.text, values, plain)
      .trim()
      .replace(/(\r?\n){3,}/g, '\n\n')}\n`,
    html: htmlOf(words.text, values),
  };
}
