import { parseArea } from '#shared/units/parse-area';

describe('parseArea', () => {
  const reading = { unit: 'mm', locale: 'en-GB' } as const;

  it.each([
    ['a bare figure is in square centimetres', '1200', 120_000],
    ['square centimetres by their sign', '1200 cm²', 120_000],
    ['square metres with a plain two', '0.12 m2', 120_000],
    ['square millimetres', '450mm²', 450],
    ['square inches in words, 25.4 mm to the inch', '10 sq in', 6451.6],
    ['square feet, 144 square inches each', '1 ft²', 92_903.04],
  ])('reads %s', (_, text, mm2) => {
    expect(parseArea(text, reading)).toEqual({ ok: true, mm2 });
  });

  it('takes a bare figure for square inches where one measures in inches', () => {
    expect(parseArea('2', { unit: 'in', locale: 'en-GB' })).toEqual({ ok: true, mm2: 1290.32 });
  });

  it('knows the decimal sign of the reader alone', () => {
    expect(parseArea('0,5 m²', { unit: 'mm', locale: 'de-DE' })).toEqual({ ok: true, mm2: 500_000 });
    expect(parseArea('0,5 m²', reading)).toMatchObject({ ok: false, code: 'number-grouped' });
  });

  it('takes grouped digits with their unit, as a page shows them, and refuses them bare, where they may mean two things', () => {
    expect(parseArea('12,345.6 cm²', reading)).toEqual({ ok: true, mm2: 1_234_560 });
    expect(parseArea('1,200', reading)).toMatchObject({ ok: false, code: 'number-grouped' });
  });

  it.each([
    ['nothing', '', 'entry-missing'],
    ['words', 'about a metre', 'area-unclear'],
    ['a negative area', '-5 cm²', 'area-negative'],
    ['a negative area with a true minus', '−5', 'area-negative'],
  ])('asks again for %s', (_, text, code) => {
    expect(parseArea(text, reading)).toMatchObject({ ok: false, code });
  });
});
