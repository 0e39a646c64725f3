import { guardedText } from '#shared/words/guarded-text';

/** How XML of workbooks writes a character by its number; text that looks so has to be written so itself. */
const numbered = /_(?=x[0-9A-Fa-f]{4}_)/g;

/** A text a person typed as it is written into a cell of a workbook, so that it is read as that text and as no formula. */
export const sheetText = (text: string): string => guardedText(text).replace(numbered, '_x005F_');
