import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import { BooksVisit, invoiceId, pageOf, sampleSummary } from '../../test/sample-invoices';
import { InvoicesPage } from './invoices-page';

const begin = (address = '/accounts/invoices') =>
  BooksVisit.begin(InvoicesPage, { path: 'accounts/invoices', address });
const askedOf = (visit: BooksVisit) => {
  const call = visit.request('GET', '/api/invoices');
  return { call, query: call.request.urlWithParams.split('?')[1] ?? '' };
};
const rowsOf = (visit: BooksVisit) =>
  [...visit.element.querySelectorAll('tbody tr')].map((row) => (row.textContent ?? '').replace(/\s+/g, ' ').trim());

describe('InvoicesPage', () => {
  it('shows where each paper stands, what of it is open, and credit notes below nothing', async () => {
    const visit = await begin();
    await visit.answer(
      'GET',
      '/api/invoices',
      pageOf([
        sampleSummary({ isOverdue: true, open_minor: 46_00 }),
        sampleSummary({ id: invoiceId(20), kind: 'credit-note', number: 'C2026-0002', dueOn: null, open_minor: 0 }),
        sampleSummary({ id: invoiceId(21), state: 'draft', number: null, issuedOn: null, open_minor: 0 }),
      ]),
    );
    const [overdue, credit, draft] = rowsOf(visit);
    expect(overdue).toMatch(/2026-0007.*Ashgrove House.*overdue.*€246\.00 €46\.00$/);
    expect(credit).toMatch(/C2026-0002.*credit note.*−€246\.00$/);
    expect(draft).toMatch(/^Invoice.*draft/);
    const links = [...visit.element.querySelectorAll('tbody a')].map((one) => one.getAttribute('href'));
    expect(links).toEqual([10, 20, 21].map((number) => `/accounts/invoices/${invoiceId(number)}`));
  });

  it('narrows by its address, and asks the server for those alone', async () => {
    const visit = await begin('/accounts/invoices?show=open');
    expect(askedOf(visit).query).toContain('open=yes');
    await visit.press('Credit notes');
    expect(TestBed.inject(Router).url).toBe('/accounts/invoices?show=credits');
    expect(askedOf(visit).query).toMatch(/kind=credit-note.*state=issued|state=issued.*kind=credit-note/);
    const pressed = [...visit.element.querySelectorAll('[aria-pressed=true]')].map((one) => one.textContent?.trim());
    expect(pressed).toEqual(['Credit notes']);
  });

  it('shows all where its address asks for what there is not', async () => {
    const visit = await begin('/accounts/invoices?show=toString');
    expect(askedOf(visit).query).not.toMatch(/open|state|kind/);
  });

  it('begins one where there is none, and shows all where only these are none', async () => {
    const none = await begin();
    await none.answer('GET', '/api/invoices', pageOf([]));
    expect(none.text).toContain('No invoice yet');
    TestBed.resetTestingModule();
    const narrowed = await begin('/accounts/invoices?show=drafts');
    await narrowed.answer('GET', '/api/invoices', pageOf([]));
    await narrowed.press('Show all');
    expect(TestBed.inject(Router).url).toBe('/accounts/invoices');
  });
});
