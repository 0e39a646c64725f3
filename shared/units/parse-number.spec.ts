import { formatDecimal } from '#shared/units/format-decimal';
import { parseNumber } from '#shared/units/parse-number';

describe('a typed number', () => {
  it.each([
    ['14.50', 'en-GB', '14.5', 14.5],
    ['14,50', 'de-DE', '14.5', 14.5],
    [' 0,04 ', 'fr-FR', '0.04', 0.04],
    ['.5', 'en-GB', '0.5', 0.5],
    ['-3', 'en-GB', '-3', -3],
    ['−3,25', 'de-AT', '-3.25', -3.25],
    ['-0', 'en-GB', '0', 0],
    ['007', 'en-GB', '7', 7],
    ['0.1234567890123456789', 'en-GB', '0.1234567890123456789', 0.12345678901234568],
  ])('%s in %s is read', (text, locale, decimal, value) => {
    expect(parseNumber(text, locale)).toEqual({ ok: true, decimal, value });
  });

  it.each([
    ['', 'en-GB', 'entry-missing'],
    ['1,234', 'en-GB', 'number-grouped'],
    ['1.234', 'de-DE', 'number-grouped'],
    ['1 234', 'fr-FR', 'number-grouped'],
    ["1'234.5", 'de-CH', 'number-grouped'],
    ['1.2.3', 'en-GB', 'number-grouped'],
    ['5 %', 'en-GB', 'number-unclear'],
    ['12.', 'en-GB', 'number-unclear'],
    ['1e3', 'en-GB', 'number-unclear'],
    ['--1', 'en-GB', 'number-unclear'],
    ['.', 'en-GB', 'number-unclear'],
  ])('"%s" in %s is refused in words', (text, locale, code) => {
    expect(parseNumber(text, locale)).toMatchObject({ ok: false, code });
  });

  it('is written back with the sign of its locale', () => {
    expect(formatDecimal('1234.5', 'de-DE')).toBe('1234,5');
    expect(formatDecimal('1234.5', 'en-GB')).toBe('1234.5');
  });
});
