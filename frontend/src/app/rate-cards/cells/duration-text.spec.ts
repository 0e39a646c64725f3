import * as fc from 'fast-check';
import { durationText, parseDuration } from './duration-text';

const typed = (figure: number) => String(figure);
const minutesIn = (text: string, locale = 'en-GB') => {
  const read = parseDuration(text, locale);
  return read.ok ? read.minutes : read.code;
};

describe('A duration', () => {
  it.each([
    ['45', 45],
    ['45 min', 45],
    ['12 h', 720],
    ['1.5h', 90],
    ['2 d 4 h', 3120],
    ['1d 30', 1470],
    [' 2 D ', 2880],
    ['0', 0],
  ])('typed as %s is %s minutes', (text, minutes) => {
    expect(minutesIn(text)).toBe(minutes);
  });

  it('is read with the decimal sign of the workshop', () => {
    expect([minutesIn('1,5 h', 'de-AT'), minutesIn('1,5 h')]).toEqual([90, 'number-grouped']);
  });

  it.each([
    ['soon', 'rate-card-duration-unclear'],
    ['12 hours', 'rate-card-duration-unclear'],
    ['h', 'rate-card-duration-unclear'],
    ['', 'entry-missing'],
  ])('is not made out of %s', (text, code) => {
    expect(minutesIn(text)).toBe(code);
  });

  it.each([
    [1.3, '1.3 min'],
    [45, '45 min'],
    [720, '12 h'],
    [1440, '1 d'],
    [1530, '1 d 1 h 30 min'],
    [0, '0 min'],
  ])('of %s minutes is written %s', (minutes, text) => {
    expect(durationText(minutes, typed)).toBe(text);
  });

  it('law: is read back as it was written', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 525_600 }), (minutes) => {
        expect(minutesIn(durationText(minutes, typed))).toBe(minutes);
      }),
    );
  });
});
