import { sheetText } from '#shared/words/sheet-text';

describe('a text in a cell of a workbook', () => {
  it.each([
    ['_x000D_=1', '_x005F_x000D_=1'],
    ['_x003D_1+1', '_x005F_x003D_1+1'],
    ['a _x0041__x0042_', 'a _x005F_x0041__x005F_x0042_'],
    ['_x41_', '_x41_'],
    ['=_x0041_', "'=_x005F_x0041_"],
    ['＝1', "'＝1"],
    ['  +1', "'  +1"],
    ['Top edge', 'Top edge'],
  ])('%j is written %j', (typed, written) => expect(sheetText(typed)).toBe(written));
});
