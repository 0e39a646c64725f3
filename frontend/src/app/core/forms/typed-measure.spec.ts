import * as fc from 'fast-check';
import { decimalSign } from '#shared/units/decimal-sign';
import type { LengthUnit } from '#shared/units/length-unit';
import { parseArea } from '#shared/units/parse-area';
import { parseLength } from '#shared/units/parse-length';
import { type AreaEntry, type LengthEntry, typedMeasure } from './typed-measure';

const at = (unit: LengthUnit, locale = 'en-GB') => ({ unit, locale });
const lengthText = (mm: number, unit: LengthUnit) =>
  (typedMeasure(mm, undefined, { ...at(unit), name: 'length_mm' }) as LengthEntry).text;
const areaText = (mm2: number, unit: LengthUnit) =>
  (typedMeasure(mm2, undefined, { ...at(unit), name: 'area_mm2' }) as AreaEntry).text;

describe('A length or an area nobody typed here', () => {
  it.each<[number, LengthUnit, string]>([
    [860.425, 'mm', '860.425'],
    // 33 7/8 × 25.4 mm.
    [860.425, 'in', '33 7/8'],
    [5, 'in', '5 mm'],
    [1000, 'in', '1000 mm'],
  ])('of %s mm stands where one measures in %s as “%s”', (mm, unit, text) => {
    expect(lengthText(mm, unit)).toBe(text);
  });

  it.each<[number, LengthUnit, string]>([
    [120_000, 'mm', '1200 cm²'],
    // 10 × 25.4² mm².
    [6451.6, 'in', '10 in²'],
    [100_000, 'in', '1000 cm²'],
  ])('of %s mm² stands where one measures in %s as “%s”', (mm2, unit, text) => {
    expect(areaText(mm2, unit)).toBe(text);
  });

  const units = fc.constantFrom<LengthUnit>('mm', 'in');
  const locales = fc.constantFrom('en-GB', 'de-DE', 'fr-FR', 'de-CH', 'en-IN');

  it('is the same length when it is read again', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 99_999_999 }), units, locales, (micrometres, unit, locale) => {
        const mm = micrometres / 1000;
        const { text } = typedMeasure(mm, undefined, { ...at(unit, locale), name: 'length_mm' }) as LengthEntry;
        expect(parseLength(text, { unit, decimalSign: decimalSign(locale) })).toMatchObject({ ok: true, mm });
      }),
    );
  });

  it('is the same area when it is read again', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_999_999 }), units, locales, (hundredths, unit, locale) => {
        const mm2 = hundredths / 100;
        const { text } = typedMeasure(mm2, undefined, { ...at(unit, locale), name: 'area_mm2' }) as AreaEntry;
        const read = parseArea(text, { unit, locale });
        expect(read.ok && Math.abs(read.mm2 - mm2) <= 1e-9 * mm2).toBe(true);
      }),
    );
  });
});
