import { placeAfter } from './grid-place';

const size = { rows: 12, columns: 4 };

describe('placeAfter', () => {
  it.each([
    ['ArrowDown', { row: 0, column: 1 }, { row: 1, column: 1 }],
    ['ArrowDown', { row: 11, column: 1 }, { row: 11, column: 1 }],
    ['ArrowLeft', { row: 3, column: 0 }, { row: 3, column: 0 }],
    ['End', { row: 3, column: 0 }, { row: 3, column: 3 }],
    ['PageDown', { row: 3, column: 2 }, { row: 11, column: 2 }],
    ['Control+Home', { row: 3, column: 2 }, { row: 0, column: 0 }],
    ['Control+End', { row: 0, column: 0 }, { row: 11, column: 3 }],
  ])('%s from %j leads to %j', (key, from, to) => {
    expect(placeAfter(key, from, size)).toEqual(to);
  });

  it('leaves other keys to others', () => {
    expect(placeAfter('a', { row: 0, column: 0 }, size)).toBeUndefined();
  });

  it('stays at the beginning of an empty table', () => {
    expect(placeAfter('ArrowDown', { row: 0, column: 0 }, { rows: 0, columns: 4 })).toEqual({ row: 0, column: 0 });
  });
});
