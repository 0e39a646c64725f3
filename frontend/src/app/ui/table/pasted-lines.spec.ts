import { pastedLines } from './pasted-lines';

describe('pastedLines', () => {
  it.each([
    ['one cell', 'Apron', [['Apron']]],
    ['a row', 'Apron\t2\t860', [['Apron', '2', '860']]],
    [
      'rows, the last one ended',
      'Apron\t2\r\nLeg\t4\r\n',
      [
        ['Apron', '2'],
        ['Leg', '4'],
      ],
    ],
    [
      'empty cells in between',
      'Apron\t\t860\n\t4\t',
      [
        ['Apron', '', '860'],
        ['', '4', ''],
      ],
    ],
    ['a cell with a line break and quotation marks', '"Leg,\nthe ""left"" one"\t2', [['Leg,\nthe "left" one', '2']]],
    ['inches, whose marks are no quotation', '33 7/8"\t2"\n4"', [['33 7/8"', '2"'], ['4"']]],
    ['nothing', '', [[]]],
  ])('reads %s', (_, text, lines) => {
    expect(pastedLines(text)).toEqual(lines);
  });
});
