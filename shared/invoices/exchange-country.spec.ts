import { buyerOf } from '#shared/invoices/buyer-of';
import { exchangeCountry, isVatNumber } from '#shared/invoices/exchange-country';
import { startInvoiceSettings } from '#shared/invoices/invoice-settings';

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
  expect(isVatNumber(vatId)).toBe(isRight);
});

it('takes a registration for a VAT number where it begins with a country, else for another number', () => {
  const client = { name: 'Quay', contact: '', address: '', email: '' };
  const numbers = (taxRegistration: string) => {
    const { vatId, companyNumber } = buyerOf({ ...client, taxRegistration }, 'AU');
    return [vatId, companyNumber];
  };
  expect(numbers('DE 123 456 789')).toEqual(['DE123456789', '']);
  expect(numbers('ABN 51 824 753 556')).toEqual(['', 'ABN 51 824 753 556']);
  const seller = (taxRegistration: string) => startInvoiceSettings({ name: 'Quay', taxRegistration }).seller;
  expect(seller('IE 1234567 T')).toMatchObject({ vatId: 'IE1234567T', taxNumber: '' });
  expect(seller('ABN 51 824 753 556')).toMatchObject({ vatId: '', taxNumber: 'ABN 51 824 753 556' });
});
