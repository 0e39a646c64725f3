import fc from 'fast-check';
import { formatLength } from '#shared/units/format-length';
import { parseLength } from '#shared/units/parse-length';

const british = { unit: 'mm', decimalSign: '.' } as const;
const german = { unit: 'mm', decimalSign: ',' } as const;
const american = { unit: 'in', decimalSign: '.' } as const;

describe('a typed length', () => {
  it.each([
    ['860', british, 860],
    ['  860 mm ', british, 860],
    ['860mm', british, 860],
    ['86 cm', british, 860],
    ['0.86 m', british, 860],
    ['0,86 m', german, 860],
    [',5 m', german, 500],
    ['860,5', german, 860.5],
    ['0', british, 0],
    ['33 7/8 in', british, 860.425],
    ['33 7/8"', british, 860.425],
    ['33-7/8"', british, 860.425],
    ['33⅞″', british, 860.425],
    ['33 ⅞ inches', british, 860.425],
    ['7/8 in', british, 22.225],
    ['½"', british, 12.7],
    ['33.875 in', british, 860.425],
    ['33,875 in', german, 860.425],
    [`2' 9 7/8"`, british, 860.425],
    [`2'9⅞"`, british, 860.425],
    ['2 ft 9 7/8 in', british, 860.425],
    ['2ft 9 7/8in', british, 860.425],
    ['2 feet 9 inches', british, 838.2],
    [`2′ 9 7/8″`, british, 860.425],
    [`2' 9 7/8`, american, 860.425],
    ["2'", american, 609.6],
    ['6 ft', american, 1828.8],
    ['33 7/8', american, 860.425],
    ['33.5', american, 850.9],
    ['860 mm', american, 860],
    ['1/32', american, 0.79375],
  ])('%s is read', (text, reading, mm) => {
    expect(parseLength(text, reading)).toEqual({ ok: true, mm, value_nm: Math.round(mm * 1e6) });
  });

  it.each([
    ['', british, 'entry-missing'],
    ['-5', british, 'length-negative'],
    ['−5 mm', british, 'length-negative'],
    ['1,234', british, 'number-grouped'],
    ['1.234', german, 'number-grouped'],
    ['1 234', british, 'number-grouped'],
    ['1.234,5 mm', german, 'number-grouped'],
    ["1'234", british, 'length-inches-over'],
    [`2' 12"`, british, 'length-inches-over'],
    ['33 7/8', british, 'length-fraction'],
    ['1/2 cm', british, 'length-fraction'],
    ['7/0 in', british, 'length-unclear'],
    ['about 5', british, 'length-unclear'],
    ['5 miles', british, 'length-unclear'],
    ['mm', british, 'length-unclear'],
    ['5 in 3', british, 'length-unclear'],
    ['≈ 5', british, 'length-unclear'],
    ['5.', british, 'length-unclear'],
    ['1e3', british, 'length-unclear'],
    ['99999999999 m', british, 'length-too-large'],
  ])('"%s" is refused in words', (text, reading, code) => {
    expect(parseLength(text, reading)).toMatchObject({ ok: false, code });
  });

  it('keeps 1/32 in as 793,750 nanometres', () => {
    expect(parseLength('1/32"', british)).toMatchObject({ value_nm: 793_750 });
  });

  it('reads back what was written, to the rounding of what was written', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e5, noNaN: true }),
        fc.constantFrom('mm', 'in'),
        fc.constantFrom('en-GB', 'de-DE'),
        (mm, unit, locale) => {
          const written = formatLength(mm, unit, locale);
          const read = parseLength(written.replace('≈ ', ''), {
            unit: 'mm',
            decimalSign: locale === 'de-DE' ? ',' : '.',
          });
          expect(read.ok).toBe(true);
          const back = read.ok ? read.mm : NaN;
          expect(Math.abs(back - mm)).toBeLessThanOrEqual(unit === 'in' ? 0.79375 / 2 + 1e-6 : 0.05 + 1e-6);
          if (!written.startsWith('≈')) expect(back).toBeCloseTo(mm, 5);
        },
      ),
    );
  });

  it('writes every 32nd of an inch exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 100_000 }), (parts) => {
        const written = formatLength(parts * 0.79375, 'in', 'en-GB');
        expect(parseLength(written, british)).toMatchObject({ ok: true, value_nm: parts * 793_750 });
      }),
    );
  });
});
