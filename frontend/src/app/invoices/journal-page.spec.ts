import type { Journal, JournalInCurrency } from '#shared/invoices/payment-schema';
import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import { BooksVisit, invoiceId } from '../../test/sample-invoices';
import { JournalPage } from './journal-page';

const noTax = { net_minor: 0, tax_minor: 0, rounding_minor: 0 };
const who = { clientId: invoiceId(90), clientName: 'Ashgrove House', note: '' };
const invoice = { net_minor: 200_00, tax_minor: 46_00, rounding_minor: 0, amount_minor: 246_00 };

const book = (currency: string): JournalInCurrency => ({
  currency,
  entries: [
    { ...who, ...invoice, id: invoiceId(10), day: '2026-03-02', kind: 'invoice', number: '2026-0007' },
    {
      ...{ ...who, ...noTax, id: invoiceId(30), day: '2026-03-09', kind: 'write-off', number: '2026-0007' },
      ...{ amount_minor: -46_00, note: 'Agreed by telephone (Orla Byrne)' },
    },
  ],
  totals: [
    { kind: 'invoice', count: 1, ...invoice },
    { kind: 'payment', count: 0, ...noTax, amount_minor: 0 },
    { kind: 'write-off', count: 1, ...noTax, amount_minor: -46_00 },
  ],
});

const begin = () =>
  BooksVisit.begin(JournalPage, {
    path: 'accounts/journal',
    address: '/accounts/journal?from=2026-03-01&to=2026-03-31',
  });
const shown = async (currencies: Journal['currencies']) => {
  const visit = await begin();
  await visit.answer('GET', '/api/journal', { from: '2026-03-01', to: '2026-03-31', currencies });
  return visit;
};
const rowsOf = (visit: BooksVisit) =>
  [...visit.element.querySelectorAll('tr')].map((row) =>
    [...row.children]
      .map((cell) => (cell.textContent ?? '').replace(/\s+/g, ' ').trim())
      .filter(Boolean)
      .join('|'),
  );

describe('JournalPage', () => {
  it('asks for the days of its address, and gives the accountant the same', async () => {
    const visit = await begin();
    const { request } = visit.request('GET', '/api/journal');
    expect(request.urlWithParams).toContain('from=2026-03-01&to=2026-03-31');
    const files = [...visit.element.querySelectorAll('a[download]')].map((one) => one.getAttribute('href'));
    expect(files).toEqual([
      '/api/journal.xlsx?from=2026-03-01&to=2026-03-31',
      '/api/journal.csv?from=2026-03-01&to=2026-03-31',
    ]);
  });

  it('shows each entry with why it was written off and by whom, and the sums of what there is', async () => {
    const visit = await shown([book('EUR')]);
    expect(visit.text).toContain('Agreed by telephone (Orla Byrne)');
    expect(visit.text).not.toContain('Payments');
    // 246.00 invoiced less 46.00 given up.
    expect(rowsOf(visit)).toContain('What is owed changed by|200.00|46.00|200.00');
    const links = [...visit.element.querySelectorAll('tbody a')].map((one) => one.getAttribute('href'));
    expect(links).toEqual([`/accounts/invoices/${invoiceId(10)}`]);
  });

  it('keeps currencies apart, each in its own decimals', async () => {
    const visit = await shown([book('EUR'), book('JPY')]);
    const names = [...visit.element.querySelectorAll('h2')].map((one) => one.textContent?.trim());
    expect(names).toEqual(['Sums, in EUR', 'Entries, in EUR', 'Sums, in JPY', 'Entries, in JPY']);
    expect(rowsOf(visit)).toContain('What is owed changed by|20,000|4,600|20,000');
  });

  it('says so where nothing happened in these days', async () => {
    const visit = await shown([{ currency: 'EUR', entries: [], totals: [] }]);
    expect(visit.text).toContain('Nothing in these days');
    expect(TestBed.inject(Router).url).toContain('from=2026-03-01');
  });
});
