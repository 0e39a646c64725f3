/** Control characters have no shape and could only do harm. */
const unprintable =
  /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u200b-\u200f\u202a-\u202e\u2060-\u2069\ufeff]/g;

/** A text as it can be printed: composed characters, line ends as they are counted here, spaces and hyphens the fonts have. */
export const printableText = (text: string): string =>
  text
    .normalize('NFC')
    .replace(/\r\n?|[\u2028\u2029]/g, '\n')
    .replace(unprintable, '')
    .replace(/\t/g, ' ')
    .replace(/\u202f/g, '\u00a0')
    .replace(/\u2011/g, '-');
