import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../../test/sign-in';
import { Formats } from './formats';
import { Words } from './words';

const plain = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');

describe('Formats', () => {
  beforeEach(() => TestBed.configureTestingModule({ providers: [words] }));

  it.each([
    ['en-GB', 'EUR', '€1,234.50', '€1,235', '1,234.5', '12.5'],
    ['de-DE', 'EUR', '1.234,50 €', '1.235 €', '1.234,5', '12,5'],
    ['ja-JP', 'JPY', '￥123,450', '￥123,450', '1,234.5', '12.5'],
  ])('writes money and numbers as %s has them, in %s', (locale, currency, money, whole, number, typed) => {
    signIn(['owner'], { locale, currency });
    const formats = TestBed.inject(Formats);
    const figures = [formats.money(123_450), formats.wholeMoney(123_450), formats.number(1234.5), formats.typed(12.5)];
    expect(figures.map(plain)).toEqual([money, whole, number, typed]);
  });

  it('shows the unit a workshop does not use beside the one it does', () => {
    signIn(['owner'], { lengthUnit: 'mm' });
    const formats = TestBed.inject(Formats);
    // 33 7/8 in is 860.425 mm: the inch of 25.4 mm, International Yard and Pound Agreement of 1959.
    expect(plain(formats.otherLength(860.425))).toBe('33 7/8 in');
    signIn(['owner'], { lengthUnit: 'in' });
    expect(plain(formats.otherLength(25.4))).toBe('25.4 mm');
    expect(plain(formats.otherLength(25.4, '1 in'))).toBe('25.4 mm');
    expect(plain(formats.otherLength(25.4, '2.54 cm'))).toBe('1 in');
  });

  it('writes days and times in the time zone of the workshop, not of the browser', () => {
    signIn(['owner'], { timeZone: 'Pacific/Auckland' });
    const formats = TestBed.inject(Formats);
    expect([formats.dayOf('2026-06-04T23:30:00Z', 'long'), formats.time('2026-06-04T23:30:00Z')]).toEqual([
      'Friday 5 June',
      '11:30',
    ]);
    expect(formats.day('2026-06-04')).toBe('4 Jun 2026');
  });

  it('follows a change of the settings at once', () => {
    const session = signIn(['owner'], { currency: 'EUR' });
    const formats = TestBed.inject(Formats);
    expect(formats.currencySign()).toBe('€');
    signIn(['owner'], { currency: 'GBP' });
    expect(formats.currencySign()).toBe('£');
    session.put(undefined, '');
    expect(formats.lengthUnit()).toBe('mm');
  });

  it('words a code with its figures in the units of the workshop', () => {
    signIn(['owner'], { locale: 'de-DE' });
    expect(TestBed.inject(Words).say('number-grouped', { sign: ',' })).toContain('“,” is the decimal sign');
  });
});
