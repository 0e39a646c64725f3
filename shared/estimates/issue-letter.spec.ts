import { issueLetter } from '#shared/estimates/issue-letter';

describe('the letter of an issue', () => {
  it.each([
    [1, 'A'],
    [2, 'B'],
    [26, 'Z'],
    [27, 'AA'],
    [52, 'AZ'],
    [53, 'BA'],
    [702, 'ZZ'],
    [703, 'AAA'],
  ])('of issue %i is %s', (sequence, letter) => expect(issueLetter(sequence)).toBe(letter));

  it('is refused for what is no count', () => {
    expect(() => issueLetter(0)).toThrow(RangeError);
    expect(() => issueLetter(1.5)).toThrow(RangeError);
  });
});
