import fc from 'fast-check';
import { guardedText } from '#shared/words/guarded-text';

describe('a text in a cell', () => {
  it.each([
    ['=1+1', "'=1+1"],
    ['+49 30 1234', "'+49 30 1234"],
    ['-2+3', "'-2+3"],
    ['@SUM(A1)', "'@SUM(A1)"],
    ['\t=1', "'\t=1"],
    ['\r=1', "'\r=1"],
    ['\u0000=1', "'=1"],
    ['\u0001=cmd|x', "'=cmd|x"],
    ['  =1', "'  =1"],
    ['＝1+1', "'＝1+1"],
    ['Top edge', 'Top edge'],
    ['12 mm = half', '12 mm = half'],
    ['', ''],
  ])('%j stands as %j', (typed, written) => {
    expect(guardedText(typed)).toBe(written);
  });

  it('never begins as a formula does, whatever was typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 40 }), (typed) => {
        expect(guardedText(typed)).not.toMatch(/^[\s\0]*[=+\-@]/);
        expect(guardedText(typed)).not.toMatch(/^[\t\r]/);
      }),
    );
  });
});
