import { Rejection } from '#shared/problems/rejection';
import { cursorAt, readCursor } from './cursor';

const id = '01a230ee-614b-72e7-9db4-7079ffdb1113';
const at = new Date('2026-05-04T09:15:00.123Z');

describe('A cursor', () => {
  it('gives back what it was made of', () => {
    expect(readCursor(cursorAt(['Crédence – ½', 7, at, id]), ['text', 'whole', 'instant', 'id'])).toEqual([
      'Crédence – ½',
      7,
      at,
      id,
    ]);
  });

  it('fits its query even for the longest title', () => {
    expect(cursorAt(['\u0800'.repeat(120), id]).length).toBeLessThanOrEqual(700);
  });

  it.each([
    ['nothing', ''],
    ['a word', 'cursor'],
    ['other kinds', cursorAt([7, 'x'])],
    ['too many values', cursorAt(['x', id, 8])],
    ['too few values', cursorAt(['x'])],
    ['an id that is none', cursorAt(['x', 'ü'])],
    ['what is no list', cursorAt(['x']).replace(/^./, 'e')],
  ])('that nobody gave is refused: %s', (_what, cursor) => {
    expect(() => readCursor(cursor, ['text', 'id'])).toThrow(Rejection);
  });

  it.each(['', 'yesterday', '+275760-09-13T00:00:00.000Z', 12])('with the instant %j is refused', (instant) => {
    expect(() => readCursor(cursorAt([instant]), ['instant'])).toThrow(Rejection);
  });
});
