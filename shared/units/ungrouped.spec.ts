import * as fc from 'fast-check';
import { decimalSign } from '#shared/units/decimal-sign';
import { formatLength } from '#shared/units/format-length';
import { formatsFor } from '#shared/units/formats-for';
import type { LengthUnit } from '#shared/units/length-unit';
import { parseArea } from '#shared/units/parse-area';
import { parseLength } from '#shared/units/parse-length';
import { parseNumber } from '#shared/units/parse-number';
import { ungrouped } from '#shared/units/ungrouped';

describe('A figure as somebody would type it', () => {
  it.each([
    ['12,345.6 cm²', 'en-GB', '12345.6 cm²'],
    ['1,234,567', 'en-GB', '1234567'],
    ['12.345,6 cm²', 'de-DE', '12345,6 cm²'],
    ['1\u202f234,5', 'fr-FR', '1234,5'],
    ['1 234,5', 'fr-FR', '1234,5'],
    ['1’234.5', 'de-CH', '1234.5'],
    ['12,34,567', 'en-IN', '1234567'],
    ['±1,234 cm²', 'en-GB', '±1234 cm²'],
    ['1,234 to 2,345', 'en-GB', '1234 to 2345'],
  ])('"%s" in %s is "%s"', (text, locale, typed) => {
    expect(ungrouped(text, locale)).toBe(typed);
  });

  it.each([
    ['a group too short', '12,34', 'en-GB'],
    ['a group too long', '1,2345', 'en-GB'],
    ['a figure of another locale', '1.234,5', 'en-GB'],
    ['a decimal sign twice', '1.2.3', 'en-GB'],
    ['digits behind the decimal sign', '0.123 456', 'fr-FR'],
    ['a fraction of an inch', '33 7/8', 'fr-FR'],
  ])('leaves %s as it stands', (_, text, locale) => {
    expect(ungrouped(text, locale)).toBe(text);
  });
});

describe('What a page shows can be typed again', () => {
  const locales = fc.constantFrom(
    'en-GB',
    'en-US',
    'de-DE',
    'de-CH',
    'de-AT',
    'fr-FR',
    'it-IT',
    'es-ES',
    'sv-SE',
    'en-IN',
  );
  const units = fc.constantFrom<LengthUnit>('mm', 'in');
  const shown = (locale: string, lengthUnit: LengthUnit) =>
    formatsFor({ locale, currency: 'EUR', digits: 2, lengthUnit });

  it('an area is the same to the last figure shown, with its unit and without opening the cell', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 9e9, noNaN: true }), locales, units, (area_mm2, locale, unit) => {
        const formats = shown(locale, unit);
        const text = formats.write('mm2', area_mm2);
        const parsed = parseArea(text, { unit, locale });
        expect(parsed.ok && formats.write('mm2', parsed.mm2)).toBe(text);
      }),
    );
  });

  it.each([
    ['mm', 9_999.49, '99.99 cm²'],
    ['mm', 9_999.6, '100 cm²'],
    ['mm', -9_999.6, '−100 cm²'],
    ['mm', 999_949, '9,999 cm²'],
    ['mm', 999_950, '1.00 m²'],
    ['in', 143.94 * 645.16, '143.9 in²'],
    ['in', 143.96 * 645.16, '1.00 ft²'],
  ] as const)(
    'in %s an area of %d mm² is written %s, where it is rounded over the limit of its unit',
    (unit, area_mm2, text) => {
      expect(shown('en-GB', unit).write('mm2', area_mm2).replace(/\s/g, ' ')).toBe(text);
    },
  );

  it('a length is the same to the last figure shown', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 99_999, noNaN: true }), locales, units, (length_mm, locale, unit) => {
        const figure = (mm: number) => formatLength(mm, unit, locale).replace(/^≈ /, '');
        const parsed = parseLength(figure(length_mm), { unit, decimalSign: decimalSign(locale) });
        expect(parsed.ok && figure(parsed.mm)).toBe(figure(length_mm));
      }),
    );
  });

  it('hours and amounts are the same to the last figure shown', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_999_999 }), locales, (hundredths, locale) => {
        const format = new Intl.NumberFormat(locale, { minimumFractionDigits: 2, numberingSystem: 'latn' });
        const parsed = parseNumber(ungrouped(format.format(hundredths / 100), locale), locale);
        expect(parsed.ok && Math.round(parsed.value * 100)).toBe(hundredths);
      }),
    );
  });
});
