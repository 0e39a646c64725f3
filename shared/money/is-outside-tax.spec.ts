import { isOutsideTax } from '#shared/money/is-outside-tax';

describe('isOutsideTax', () => {
  it.each([
    ['all outside', ['O', 'O'], true],
    ['one that is taxed', ['O', 'S'], false],
    ['exempt, which lies within the scope', ['E'], false],
    ['nothing priced', [], false],
  ] as const)('%s', (_, codes, expected) => {
    expect(isOutsideTax(codes.map((code) => ({ code })))).toBe(expected);
  });
});
