/** The cells of a spreadsheet's clipboard text: tabs between columns, a cell with line breaks or tabs in quotation marks. */
export function pastedLines(text: string): string[][] {
  const lines: string[][] = [[]];
  const cell = /(?:"((?:[^"]|"")*)"(?=[\t\r\n]|$)|([^\t\r\n]*))(\t|\r?\n|\r|$)/y;
  while (cell.lastIndex < text.length) {
    const [, quoted, plain = '', end = ''] = cell.exec(text) ?? [];
    lines.at(-1)?.push((quoted?.replaceAll('""', '"') ?? plain).trim());
    const isDone = cell.lastIndex >= text.length;
    if (end === '\t' && isDone) lines.at(-1)?.push('');
    if (end !== '\t' && !isDone) lines.push([]);
  }
  return lines;
}
