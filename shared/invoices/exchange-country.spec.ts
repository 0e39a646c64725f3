import { buyerOf } from '#shared/invoices/buyer-of';
import { exchangeCountry, isOfCountry } from '#shared/invoices/exchange-country';

it.each([
  ['IE', 'IE'],
  ['XI', 'XI'],
  ['XK', '1A'],
  ['UK', 'GB'],
  ['IC', 'ES'],
  ['XX', undefined],
  ['', undefined],
])('a country %s is written %s', (code, written) => {
  expect(exchangeCountry(code)).toBe(written);
});

it.each([
  ['EL123456789', true],
  ['XI123456789', true],
  ['DE123456789', true],
  ['AB51824753556', false],
  ['', false],
])('a VAT number %s begins with a country: %s', (vatId, isRight) => {
  expect(isOfCountry(vatId)).toBe(isRight);
});

it('takes a registration for a VAT number where it begins with a country, else for another number', () => {
  const client = { name: 'Quay', contact: '', address: '', email: '' };
  const numbers = (taxRegistration: string) => {
    const { vatId, companyNumber } = buyerOf({ ...client, taxRegistration }, 'AU');
    return [vatId, companyNumber];
  };
  expect(numbers('DE 123 456 789')).toEqual(['DE123456789', '']);
  expect(numbers('ABN 51 824 753 556')).toEqual(['', 'ABN 51 824 753 556']);
});
