import type { InvoiceContent } from '#shared/invoices/invoice';
import { invoiceFindings } from '#shared/invoices/invoice-findings';
import type { InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { workedInvoice } from '#shared/invoices/worked-invoice';
import type { TaxCode } from '#shared/money/tax-codes';

const line = (code: TaxCode, percent = '0', quantity = '1'): InvoiceLine => ({
  ...{ id: `${code}-${percent}`, name: 'Gilding', description: '', quantity, unit: 'C62', price: '100' },
  ...{ baseQuantity: '1', allowancesCharges: [], tax: { code, percent } },
});

const content = (more: Partial<InvoiceContent>): InvoiceContent => ({
  clientId: 'client',
  jobId: null,
  buyer: {
    ...{ name: 'Quay Museum', contact: '', address: '1 Quay', country: 'AT', vatId: 'ATU12345678' },
    ...{ companyNumber: '', email: '', reference: '' },
  },
  pricesHold: 'net',
  lines: [line('S', '20')],
  allowancesCharges: [],
  exemptions: [],
  deliveredOn: null,
  period: null,
  dueOn: null,
  terms: '',
  roundsToCash: false,
  note: '',
  ...more,
});

const hand = (more: Partial<InvoiceContent> = {}, facts: Partial<InvoiceInHand> = {}): InvoiceInHand => {
  const entered = content(more);
  const currency = facts.currency ?? 'EUR';
  return {
    kind: 'invoice',
    content: entered,
    worked: workedInvoice(entered, currency),
    currency,
    country: 'AT',
    seller: { vatId: 'ATU87654321', taxNumber: '', companyNumber: 'FN 1' },
    account: { name: 'Carvers', iban: 'AT611904300234573201', bic: '' },
    issuedOn: '2026-12-01',
    dueOn: '2026-12-15',
    mailsTo: 'office@museum.example',
    ...facts,
  };
};

const codes = (of: InvoiceInHand) => invoiceFindings(of).map(({ kind, code }) => `${kind} ${code}`);
const nobody = { vatId: '', taxNumber: '', companyNumber: '' };
const anonymous = { ...content({}).buyer, vatId: '' };

it('finds nothing to say of an ordinary invoice', () => {
  expect(codes(hand())).toEqual([]);
});

it('warns where no address is known that anything about it could be mailed to', () => {
  expect(codes(hand({}, { mailsTo: '' }))).toEqual(['warn invoice-buyer-email']);
});

it('warns of letters the paper cannot print, each by the text it stands in', () => {
  const buyer = { ...content({}).buyer, contact: 'דוד' };
  const foreign = { ...line('S', '20'), description: '金箔' };
  const told = invoiceFindings(hand({ buyer, lines: [foreign], terms: 'Vierzehn Tage, 14 дней' }));
  expect(told.map(({ kind, code, values }) => [kind, code, values])).toEqual([
    ['warn', 'letters-not-printed', { part: 'buyer', name: '', letters: 'ד ו', more: 0 }],
    ['warn', 'letters-not-printed', { part: 'line', name: 'Gilding', letters: '金 箔', more: 0 }],
  ]);
});

// Rules of EN 16931 (ConnectingEurope/eInvoicing-EN16931, release validation-1.3.16), by their names.
it.each<[string, InvoiceInHand, string]>([
  ['BR-16: no line', hand({ lines: [] }), 'refuse invoice-no-lines'],
  ['BR-CO-26: nobody sells', hand({}, { seller: nobody }), 'refuse invoice-seller-number'],
  [
    'BR-S-02: S without a tax number',
    hand({}, { seller: { ...nobody, companyNumber: 'FN 1' } }),
    'refuse invoice-seller-tax-number',
  ],
  ['BR-S-05: S at nothing', hand({ lines: [line('S')] }), 'refuse invoice-standard-rate'],
  ['BR-E-10: exempt without a reason', hand({ lines: [line('E')] }), 'refuse invoice-exemption-missing'],
  [
    'BR-AE-02: reverse charge to nobody',
    hand({ lines: [line('AE')], buyer: anonymous }),
    'refuse invoice-buyer-number',
  ],
  [
    'BR-IC-02: within the Union to nobody',
    hand({ lines: [line('K')], buyer: anonymous, deliveredOn: '2026-11-30' }),
    'refuse invoice-buyer-vat-number',
  ],
  ['BR-IC-11: within the Union, never delivered', hand({ lines: [line('K')] }), 'refuse invoice-delivery-missing'],
  [
    'BR-G-02: export without a VAT number',
    hand({ lines: [line('G')] }, { seller: { ...nobody, taxNumber: '12' } }),
    'refuse invoice-seller-vat-number',
  ],
  [
    'BR-O-11: outside the scope beside another',
    hand({ lines: [line('O'), line('S', '20')] }),
    'refuse invoice-outside-scope-alone',
  ],
  [
    'BR-CO-26 under BR-O-02',
    hand({ lines: [line('O')] }, { seller: { vatId: 'ATU1', taxNumber: '', companyNumber: '' } }),
    'refuse invoice-seller-company-number',
  ],
  ['BR-B-01: split payment outside Italy', hand({ lines: [line('B', '22')] }), 'refuse invoice-split-payment'],
  ['BR-CO-25: owed, but when?', hand({}, { dueOn: null }), 'refuse invoice-due-missing'],
  ['due before it is issued', hand({}, { dueOn: '2026-11-30' }), 'refuse invoice-due-early'],
  ['an invoice below nothing', hand({ lines: [line('S', '20', '-1')] }), 'refuse invoice-below-nothing'],
  ['BR-61: no account', hand({}, { account: null }), 'warn invoice-account-missing'],
  ['BR-DEC: three decimals', hand({}, { currency: 'KWD' }), 'note invoice-currency-no-data'],
  ['BR-CL-04: a currency that is gone', hand({}, { currency: 'BGN' }), 'note invoice-currency-no-data'],
  ['BR-CL-04: a currency not listed yet', hand({}, { currency: 'MRU' }), 'note invoice-currency-no-data'],
  [
    'BR-CL-14: a buyer of no country',
    hand({ buyer: { ...content({}).buyer, country: 'XX' } }),
    'refuse invoice-country-unknown',
  ],
  ['BR-CL-14: a workshop of no country', hand({}, { country: 'ZZ' }), 'refuse invoice-country-unknown'],
  [
    'BR-CO-09: a buyer’s number of no country',
    hand({ buyer: { ...content({}).buyer, vatId: 'AB51824753556' } }),
    'refuse invoice-vat-form',
  ],
  [
    'BR-CO-09: a seller’s number of no country',
    hand({}, { seller: { vatId: 'ZZ123', taxNumber: '', companyNumber: '' } }),
    'refuse invoice-vat-form',
  ],
])('%s', (_what, of, expected) => {
  expect(codes(of)).toContain(expected);
});

it('takes the one reason a category has as read, and any reason that was entered', () => {
  expect(codes(hand({ lines: [line('AE')] }))).toEqual([]);
  expect(
    codes(hand({ lines: [line('E')], exemptions: [{ code: 'E', reasonCode: '', reason: 'Small business' }] })),
  ).toEqual([]);
});

it('takes terms in words for a day', () => {
  expect(codes(hand({ terms: 'On delivery' }, { dueOn: null }))).toEqual([]);
});

it('refuses allowances beside prices that hold the tax', () => {
  const off = {
    charge: false,
    reason: 'Discount',
    reasonCode: '95',
    amount: { way: 'fixed', amount_minor: 1 },
  } as const;
  const lines = [{ ...line('S', '20'), allowancesCharges: [off] }];
  const worked = hand().worked;
  expect(codes(hand({ pricesHold: 'gross', lines }, { worked }))).toContain('refuse invoice-gross-allowances');
});
