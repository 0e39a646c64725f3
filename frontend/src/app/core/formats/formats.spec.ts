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

  // U+2212 stands directly before the figure, whatever hyphen the locale's own writing has.
  it.each([
    ['en-GB', 'EUR', '−€355.84', '−€356', '−355.84', '−JP¥35,584', '−12.5', '−7.5%', '+€10.00', '€0.00'],
    ['de-DE', 'EUR', '−355,84 €', '−356 €', '−355,84', '−35.584 ¥', '−12,5', '−7,5 %', '+10,00 €', '0,00 €'],
  ])('writes what is below nothing with a true minus in %s', (locale, currency, ...expected) => {
    signIn(['owner'], { locale, currency });
    const formats = TestBed.inject(Formats);
    const money = (size_minor: number) => formats.money(size_minor);
    const amounts = [formats.money(-35_584), formats.wholeMoney(-35_584), formats.amount(-35_584)];
    const others = [formats.moneyIn('JPY', -35_584), formats.number(-12.5), formats.figure('percent', -7.5)];
    const signed = [formats.signed(1_000, money), formats.signed(0, money)];
    expect([...amounts, ...others, ...signed].map(plain)).toEqual(expected);
    expect(plain(formats.signed(-1_144, money))).toBe(plain(formats.money(-1_144)));
  });

  it.each([
    ['en-IE', '18.0%', '100%'],
    ['de-DE', '18,0 %', '100 %'],
  ])('writes shares of a hundred with the sign of %s', (locale, ...expected) => {
    signIn(['owner'], { locale });
    const formats = TestBed.inject(Formats);
    expect([formats.percent(18, 1, 1), formats.percent(99.6, 0)].map(plain)).toEqual(expected);
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

  it('words a day among the values as the workshop writes it', () => {
    signIn(['owner'], { locale: 'de-DE' });
    const values = { number: '2026-011-1', letter: 'A', until: '2027-01-30' };
    expect(TestBed.inject(Words).say('history-slot-held', values)).toBe(
      'Held the slot of estimate 2026-011-1 for issue A until 30. Jan. 2027',
    );
  });

  it('words a code with its figures in the units of the workshop', () => {
    signIn(['owner'], { locale: 'de-DE' });
    expect(TestBed.inject(Words).say('number-grouped', { sign: ',' })).toContain('“,” is the decimal sign');
  });
});
