const taken = /^\s*[=+\-@\t\r\n\uff1d\uff0b\uff0d\uff20]/;
// XML and spreadsheets know none of these.
const unwritable = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g;

/**
 * A text a person typed as it may stand in a cell of a sheet: one that a spreadsheet could take for a formula begins with an apostrophe
 * (OWASP ASVS 5.0.0, 1.2.10: = + - @ tab and NUL; carriage return and the full-width forms besides), and no control character is left.
 */
export function guardedText(text: string): string {
  const written = text.replace(unwritable, '');
  return taken.test(text) || taken.test(written) || text.startsWith('\0') ? `'${written}` : written;
}
