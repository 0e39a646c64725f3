import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import { unprintedLetters } from '#shared/words/unprinted-letters';
import { paperWords } from './paper-words';

const workshop: SnapshotWorkshop = {
  name: 'Birchwood Gilding',
  addressLines: ['Mill Lane 3'],
  telephone: '',
  email: 'office@birchwood.example',
  taxRegistration: '',
  currency: 'EUR',
  locale: 'en-GB',
  lengthUnit: 'mm',
  timeZone: 'UTC',
  paperSize: 'A4',
  country: 'GB',
};

const plain = (text: string) => text.replace(/[\u200e\u200f\u061c]/g, '').replace(/\s/g, ' ');

describe('Amounts on a paper', () => {
  it.each([
    ['en-GB', 'EUR', 123_456, '€1,234.56'],
    ['de-DE', 'EUR', -123_456, '−1.234,56 €'],
    ['ja-JP', 'JPY', 123_456, 'JPY 123,456'],
    ['en-GB', 'JPY', 123_456, 'JP¥123,456'],
    ['th-TH', 'THB', 123_456, 'THB 1,234.56'],
  ])('of %s in %s name their currency in signs the fonts have', (locale, currency, amount_minor, written) => {
    const words = paperWords({ ...workshop, locale, currency });
    expect(plain(words.money(amount_minor))).toBe(written);
  });

  it('bear no letter that is not printed, in any locale a workshop may choose with its usual currency', () => {
    const pairs = [
      ...[
        ['he-IL', 'ILS'],
        ['ar-EG', 'EGP'],
        ['fa-IR', 'IRR'],
        ['hi-IN', 'INR'],
        ['ko-KR', 'KRW'],
        ['ru-RU', 'RUB'],
      ],
      ...[
        ['ne-NP', 'NPR'],
        ['vi-VN', 'VND'],
        ['tr-TR', 'TRY'],
        ['uk-UA', 'UAH'],
        ['kk-KZ', 'KZT'],
        ['zh-CN', 'CNY'],
      ],
    ];
    const wanting = pairs.flatMap(([locale, currency]) => {
      const { money, figure } = paperWords({ ...workshop, locale, currency });
      const texts = [money(-123_456), figure('percent', -7.5), figure('number', -1_234_567.5)];
      return texts.flatMap(unprintedLetters).map((letter) => `${locale}: ${letter}`);
    });
    expect(wanting).toEqual([]);
  });
});
