import { formatsFor } from '#shared/units/formats-for';
import { formatLength } from '#shared/units/format-length';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

const british = formatsFor({ locale: 'en-GB', currency: 'EUR', digits: 2, lengthUnit: 'mm' });
const german = formatsFor({ locale: 'de-DE', currency: 'EUR', digits: 2, lengthUnit: 'mm' });
const american = formatsFor({ locale: 'en-US', currency: 'USD', digits: 2, lengthUnit: 'in' });
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

describe('figures as a reader wants them', () => {
  it.each([
    ['mm', 860, '860 mm'],
    ['mm', 47.1239, '47.1 mm'],
    ['mm', 0.12, '0.12 mm'],
    ['mm', -3.2, '−3.2 mm'],
    ['mm2', 64_516, '645 cm²'],
    ['mm2', 999_999, '1.00 m²'],
    ['mm2', 1_000_000, '1.00 m²'],
    ['mm2', 2_154_000, '2.15 m²'],
    ['mm2', 2_700_000, '2.70 m²'],
    ['mm2', 0, '0 cm²'],
    ['mm2', 625, '6.25 cm²'],
    ['minor', 123_456, '€1,234.56'],
    ['minor', 50, '€0.50'],
    ['minor', -5, '−€0.05'],
    ['rate_minor', 1450, '€14.50'],
    ['rate_minor', 1450.5, '€14.505'],
    ['percent', -7.5, '−7.5%'],
    ['celsius', -4, '−4 °C'],
    ['minor', 1450.5, '€14.51'],
    ['hours', 183.4, '183.4 h'],
    ['hours', 0.125, '0.13 h'],
    ['minutes', 45, '45 min'],
    ['minutes', 90, '1 h 30 min'],
    ['minutes', 3120, '2 d 4 h'],
    ['minutes', 1440, '1 d'],
    ['minutes', 0, '0 min'],
    ['minutes', -90, '−1 h 30 min'],
    ['days', 1, '1 day'],
    ['days', 12, '12 days'],
    ['percent', 18, '18%'],
    ['percent', 8.125, '8.13%'],
    ['celsius', 20, '20 °C'],
    ['µm', 0.0787, '0.079 µm'],
    ['grams', 10.37, '10.4 g'],
    ['grams', 1250, '1.25 kg'],
    ['litres', 0.291, '291 mL'],
    ['litres', 1.5, '1.5 L'],
    ['leaves', 1, '1 leaf'],
    ['leaves', 166.67, '166.7 leaves'],
    ['booklets', 7, '7 booklets'],
    ['packs', 2, '2 packs'],
    ['pieces', 1, '1 piece'],
    ['factor', 1.35, '× 1.35'],
    ['factor', 0.4765, '× 0.4765'],
    ['divisor', 0.95, '÷ 0.95'],
    ['number', 1234.5678, '1,234.568'],
    ['anything', 3, '3'],
  ])('%s of %d in British English', (unit, figure, text) => {
    expect(plain(british.write(unit, figure))).toBe(text);
  });

  it.each([
    ['mm', 47.1239, '47,1 mm'],
    ['mm2', 2_154_000, '2,15 m²'],
    ['minor', 123_456, '1.234,56 €'],
    ['percent', 18.5, '18,5 %'],
    ['number', 1234.5, '1.234,5'],
  ])('%s of %d in a German locale', (unit, figure, text) => {
    expect(plain(german.write(unit, figure))).toBe(text);
  });

  it.each([
    ['celsius', 20, '68 °F'],
    ['celsius', -40, '−40 °F'],
    ['mm', 860.425, '33 7/8 in'],
    ['mm', 860, '≈ 33 27/32 in'],
    ['mm', 25.4, '1 in'],
    ['mm', 12.7, '1/2 in'],
    ['mm', 0.12, '≈ 0.005 in'],
    // A ground of eight coats: 0.96 mm ÷ 25.4.
    ['mm', 0.96, '≈ 0.038 in'],
    ['mm', 1.5875, '1/16 in'],
    ['mm', 3.2, '≈ 1/8 in'],
    ['mm', 0, '0 in'],
    ['mm', -25.4, '−1 in'],
    ['mm2', 645.16, '1.0 in²'],
    ['mm2', 92_903.04, '1.00 ft²'],
    ['mm2', 3_674_000, '39.55 ft²'],
    ['minor', 100_000, '$1,000.00'],
  ])('%s of %d in inches and dollars', (unit, figure, text) => {
    expect(plain(american.write(unit, figure))).toBe(text);
  });

  it('takes the decimals of money from ISO 4217, where Intl would take others', () => {
    const forints = formatsFor({ locale: 'en-GB', currency: 'HUF', digits: 2, lengthUnit: 'mm' });
    expect(plain(forints.write('minor', 123_456))).toBe('HUF 1,234.56');
    const yen = formatsFor({ locale: 'en-GB', currency: 'JPY', digits: 0, lengthUnit: 'mm' });
    expect(plain(yen.write('minor', 123_456))).toBe('JP¥123,456');
  });

  it('loses no cent of the largest amounts', () => {
    expect(british.write('minor', Number.MAX_SAFE_INTEGER)).toBe('€90,071,992,547,409.91');
  });

  it('words the units of a value by its ending, in a message', () => {
    const text = say(en, british)('problem-too-many', { wait_minutes: 90 });
    expect(plain(text)).toBe('That was too often in a short time. Please wait 1 h 30 min and try again.');
  });

  it('tells whoever works in inches what the metric measure of a rate is', () => {
    const values = { step: 'Cleaning', area_mm2: 92_903.04, rate_hours: 8 };
    const inFeet = plain(say(en, american)('buildup-hours-restoring', values));
    expect(inFeet).toBe('Cleaning: 1.00 ft² at 8 h a square metre (10.76 ft²).');
    expect(plain(say(en, american)('card-column-timber-price'))).toBe('Price a cubic decimetre (61 in³)');
    expect(plain(say(en, american)('card-column-ribbon-minutes'))).toBe('Ribbon, a metre (3.28 ft)');
    expect(say(en, british)('card-column-timber-price')).toBe('Price a cubic decimetre');
  });

  it('marks a length that is not exact in the unit it is read in', () => {
    expect(formatLength(860.425, 'mm', 'en-GB')).toBe('≈ 860.4 mm');
    expect(formatLength(860.425, 'in', 'en-GB')).toBe('33 7/8 in');
    expect(formatLength(860, 'in', 'en-GB')).toBe('≈ 33 27/32 in');
    expect(formatLength(860.5, 'mm', 'de-DE')).toBe('860,5 mm');
  });
});
