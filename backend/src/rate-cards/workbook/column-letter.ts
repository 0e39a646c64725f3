/** The letters a spreadsheet names a column by, counted from 1: A, Z, AA. */
export function columnLetter(column: number): string {
  const rest = (column - 1) % 26;
  const letter = String.fromCharCode(65 + rest);
  return column > 26 ? `${columnLetter((column - 1 - rest) / 26)}${letter}` : letter;
}
