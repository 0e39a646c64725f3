import fc from 'fast-check';
import { csvText } from '#shared/documents/csv-text';
import { guardedText } from '#shared/words/guarded-text';

/** Reads a list as RFC 4180 has it. */
function parsed(text: string): string[][] {
  const rows: string[][] = [[]];
  const cell = /("(?:[^"]|"")*"|[^,\r\n]*)(,|\r\n|$)/gy;
  for (let found = cell.exec(text); found && cell.lastIndex <= text.length; found = cell.exec(text)) {
    const [, content = '', end] = found;
    rows[rows.length - 1].push(content.startsWith('"') ? content.slice(1, -1).replaceAll('""', '"') : content);
    if (end === '\r\n') rows.push([]);
    if (cell.lastIndex === text.length) break;
  }
  return rows.slice(0, -1);
}

describe('a list of cells', () => {
  it('is set in lines that end in CR LF after a byte order mark, quotes doubled where quotes are needed', () => {
    expect(
      csvText([
        ['Leaf', 'Price'],
        ['Gold, 23½ ct "old"', -2.5],
        ['=1', 3],
      ]),
    ).toBe('\ufeffLeaf,Price\r\n"Gold, 23½ ct ""old""",-2.5\r\n\'=1,3\r\n');
  });

  it('is read back as it was written, texts guarded', () => {
    const text = fc.string({ unit: fc.constantFrom('a', '"', ',', '\r', '\n', '=', 'ż', ' '), maxLength: 8 });
    fc.assert(
      fc.property(fc.array(fc.array(text, { minLength: 2, maxLength: 3 }), { minLength: 1, maxLength: 4 }), (rows) => {
        const same = rows.map((row) => row.slice(0, 2));
        expect(parsed(csvText(same).slice(1))).toEqual(same.map((row) => row.map(guardedText)));
      }),
    );
  });
});
