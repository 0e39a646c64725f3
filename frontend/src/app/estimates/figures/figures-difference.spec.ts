import { figuresDifference } from './figures-difference';

describe('figuresDifference', () => {
  it.each<[string, unknown, unknown, string | undefined]>([
    ['nothing where all is equal', { a: [1, { b: 'x' }] }, { a: [1, { b: 'x' }] }, undefined],
    ['nothing where a float differs in its last bit', { h: 0.1 + 0.2 }, { h: 0.3 }, undefined],
    ['a float that differs more', { h: 0.300001 }, { h: 0.3 }, 'h: 0.300001 ≠ 0.3'],
    [
      'money by one minor unit, however large',
      { p: 900_000_000_001 },
      { p: 900_000_000_000 },
      'p: 900000000001 ≠ 900000000000',
    ],
    [
      'the place deep within',
      { zones: [{ leaf: null }] },
      { zones: [{ leaf: { net: 2 } }] },
      'zones.0.leaf: null ≠ [object Object]',
    ],
    ['what one of them lacks', { a: 1, b: 2 }, { a: 1 }, 'b: 2 ≠ undefined'],
  ])('tells %s', (_, one, other, difference) => {
    expect(figuresDifference(one, other)).toBe(difference);
  });
});
