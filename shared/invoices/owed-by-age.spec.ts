import { clientStatement } from '#shared/invoices/client-statement';
import { journalTotals } from '#shared/invoices/journal-totals';
import type { LedgerEntry } from '#shared/invoices/ledger-entry';
import { ageOf, owedByAge } from '#shared/invoices/owed-by-age';
import { paymentShares, releasedShares } from '#shared/invoices/payment-shares';
import { isIban } from '#shared/invoices/is-iban';
import { dueDay } from '#shared/invoices/due-day';
import { startInvoiceSettings } from '#shared/invoices/invoice-settings';

describe('the age of what is owed', () => {
  it.each([
    ['2026-12-01', 'not-due', 'due today is not overdue'],
    ['2026-11-30', 'to-30', 'a day'],
    ['2026-11-01', 'to-30', 'thirty days'],
    ['2026-10-31', 'to-60', 'thirty-one'],
    ['2026-10-02', 'to-60', 'sixty'],
    ['2026-09-02', 'to-90', 'ninety'],
    ['2026-09-01', 'over-90', 'ninety-one'],
  ])('due on %s is %s on 1 December: %s', (dueOn, age) => {
    expect(ageOf(dueOn, '2026-12-01')).toBe(age);
  });

  it('adds up by client, the largest first, with what lies to their credit', () => {
    const invoices = [
      { clientId: 'a', dueOn: '2026-12-15', open_minor: 100 },
      { clientId: 'b', dueOn: '2026-10-01', open_minor: 250 },
      { clientId: 'a', dueOn: '2026-11-30', open_minor: 50 },
    ];
    const owed = owedByAge(invoices, { today: '2026-12-01', credits: [{ clientId: 'c', credit_minor: 7 }] });
    expect(owed.map(({ clientId, open_minor, credit_minor }) => [clientId, open_minor, credit_minor])).toEqual([
      ['b', 250, 0],
      ['a', 150, 0],
      ['c', 0, 7],
    ]);
    expect(owed[1].byAge_minor).toMatchObject({ 'not-due': 100, 'to-30': 50, 'over-90': 0 });
  });
});

const entry = (day: string, kind: LedgerEntry['kind'], amount_minor: number): LedgerEntry => ({
  ...{ id: `${day} ${kind}`, day, kind, clientId: 'a', clientName: 'A', number: '1', note: '', currency: 'EUR' },
  ...{ net_minor: 0, tax_minor: 0, rounding_minor: 0, amount_minor },
});

describe('a statement', () => {
  it('begins with what was owed and runs to what is owed, days at both ends included', () => {
    const entries = [
      entry('2026-10-31', 'invoice', 500),
      entry('2026-11-30', 'payment', -200),
      entry('2026-11-01', 'invoice', 300),
      entry('2026-12-01', 'invoice', 900),
    ];
    const statement = clientStatement(entries, { from: '2026-11-01', to: '2026-11-30' });
    expect(statement.opening_minor).toBe(500);
    expect(statement.lines.map(({ balance_minor }) => balance_minor)).toEqual([800, 600]);
    expect(statement.closing_minor).toBe(600);
  });

  it('agrees with the journal of the same days', () => {
    const entries = [
      entry('2026-11-02', 'invoice', 300),
      entry('2026-11-03', 'refund', 40),
      entry('2026-11-04', 'payment', -340),
    ];
    const sums = journalTotals(entries).map(({ kind, amount_minor }) => [kind, amount_minor]);
    expect(sums).toEqual([
      ['invoice', 300],
      ['credit-note', 0],
      ['payment', -340],
      ['refund', 40],
      ['dispute', 0],
      ['write-off', 0],
    ]);
  });
});

describe('a payment', () => {
  const open = [
    { invoiceId: 'a', open_minor: 100 },
    { invoiceId: 'b', open_minor: 50 },
  ];
  it.each([
    [70, [70], 0],
    [120, [100, 20], 0],
    [200, [100, 50], 50],
  ])('of %d goes to the oldest first', (amount, shares, rest) => {
    const found = paymentShares(amount, open);
    expect(found.shares.map(({ amount_minor }) => amount_minor)).toEqual(shares);
    expect(found.rest_minor).toBe(rest);
  });

  it('is taken back from the newest first', () => {
    const shares = [
      { invoiceId: 'a', amount_minor: 100 },
      { invoiceId: 'b', amount_minor: 50 },
    ];
    expect(releasedShares(60, shares)).toEqual({
      shares: [
        { invoiceId: 'b', amount_minor: 50 },
        { invoiceId: 'a', amount_minor: 10 },
      ],
      rest_minor: 0,
    });
  });
});

describe('what a workshop invoices with', () => {
  // Examples of the IBAN registry (SWIFT, ISO 13616) and one of them with two digits changed round.
  it.each([
    ['AT611904300234573201', true],
    ['DE89370400440532013000', true],
    ['GB29NWBK60161331926819', true],
    ['GB29NWBK60161331926891', false],
    ['AT61', false],
    ['', false],
  ])('an IBAN adds up: %s %s', (text, is) => {
    expect(isIban(text)).toBe(is);
  });

  it('falls due so many days later, over the end of a year, or on the day that was entered', () => {
    expect(dueDay('2026-12-20', null, 14)).toBe('2027-01-03');
    expect(dueDay('2026-12-20', '2026-12-24', 14)).toBe('2026-12-24');
  });

  it('is begun with the tax registration taken for what it looks like', () => {
    expect(startInvoiceSettings({ name: 'A', taxRegistration: 'ATU 12345678' }).seller.vatId).toBe('ATU12345678');
    expect(startInvoiceSettings({ name: 'A', taxRegistration: '12/345' }).seller).toMatchObject({
      vatId: '',
      taxNumber: '12/345',
    });
  });
});
