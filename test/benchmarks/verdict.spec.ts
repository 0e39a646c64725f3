import { keepsBound, verdict } from './verdict';

describe('A bound', () => {
  it.each([
    ['below what it may be at most', 2, { atMost: 3 }, true],
    ['exactly what it may be at most', 3, { atMost: 3 }, true],
    ['above what it may be at most', 3.01, { atMost: 3 }, false],
    ['above what it must be at least', 4, { atLeast: 3 }, true],
    ['below what it must be at least', 2, { atLeast: 3 }, false],
    ['no figure, under a ceiling', Number.NaN, { atMost: 3 }, false],
    ['no figure, over a floor', Number.NaN, { atLeast: 3 }, false],
  ])('%s', (_what, figure, bound, keeps) => {
    expect(keepsBound(figure, bound)).toBe(keeps);
  });
});

describe('A verdict', () => {
  it('says what passed, by which figure, under which bound', () => {
    const measure = { what: 'against a spreadsheet', figure: 12.34567, unit: 'times as fast', bound: { atLeast: 3 } };
    expect(verdict(measure)).toBe('  pass  against a spreadsheet: 12.35 times as fast (at least 3)');
  });

  it('shouts what failed', () => {
    expect(verdict({ what: 'first visit', figure: 512, unit: 'kB', bound: { atMost: 450 } })).toBe(
      '  FAIL  first visit: 512 kB (at most 450)',
    );
  });
});
