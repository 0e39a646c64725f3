import { sheetText } from '#shared/words/sheet-text';

/** Text as it is written into a cell of a card: its own apostrophe is guarded too, since the first one is taken off when it is read. */
export const toSheetText = (text: string): string => sheetText(text.startsWith("'") ? `'${text}` : text);

/** Text as it was before it was written into a cell. */
export function fromSheetText(text: string): string {
  return text.startsWith("'") ? text.slice(1) : text;
}
