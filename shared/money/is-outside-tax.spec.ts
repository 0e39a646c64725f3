import { isOutsideTax, reasonOutsideTax } from '#shared/money/is-outside-tax';

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

describe('reasonOutsideTax', () => {
  const outside = (exemptionReason: string) => ({ code: 'O' as const, exemptionReason });

  it('tells each reason once', () => {
    expect(reasonOutsideTax([outside('Sold abroad'), outside(''), outside('A gift'), outside('Sold abroad')])).toBe(
      'Sold abroad; A gift',
    );
  });

  it('tells nothing where there may be tax', () => {
    expect(reasonOutsideTax([outside('Sold abroad'), { code: 'E', exemptionReason: 'Exempt' }])).toBe('');
  });
});
