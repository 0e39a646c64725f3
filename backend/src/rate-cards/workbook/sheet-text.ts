/** Beginnings by which a spreadsheet program takes text for a formula or a command (CWE-1236, ASVS 1.2.10), and the sign that guards them. */
const guarded = /^['=+\-@\t\r\n\0]/;
/** How XML of workbooks writes a character by its number; text that looks so has to be written so itself. */
const numbered = /_(?=x[0-9A-Fa-f]{4}_)/g;

/** Text as it is written into a cell, so that it stays text. */
export function toSheetText(text: string): string {
  return (guarded.test(text) ? `'${text}` : text).replace(numbered, '_x005F_');
}

/** Text as it was before it was written into a cell. */
export function fromSheetText(text: string): string {
  return text.startsWith("'") ? text.slice(1) : text;
}
