import { sizeFactor } from '#shared/carving/size-factor';

describe('sizeFactor', () => {
  it.each([
    ['the reference size is as it is', 60, 60, 1.4, 1, true],
    ['half as large again', 90, 60, 1.4, 1.764119, true],
    ['twice the size is still trusted', 120, 60, 1.4, 2.639016, true],
    ['more is not', 121, 60, 1.4, 2.669856, false],
    ['half the size is still trusted', 30, 60, 1, 0.5, true],
    ['less is not', 29, 60, 1, 0.483333, false],
    ['an exponent of nought makes size no matter', 90, 60, 0, 1, true],
  ])('%s', (_sentence, size_mm, reference_mm, exponent, factor, isTrusted) => {
    const found = sizeFactor(size_mm, reference_mm, exponent);
    expect(found.factor).toBeCloseTo(factor, 5);
    expect(found.isTrusted).toBe(isTrusted);
  });

  it('refuses sizes of nothing', () => {
    expect(() => sizeFactor(0, 60, 1)).toThrow(RangeError);
    expect(() => sizeFactor(60, 0, 1)).toThrow(RangeError);
  });
});
