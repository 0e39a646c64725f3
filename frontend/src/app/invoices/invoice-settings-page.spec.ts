import { TestBed } from '@angular/core/testing';
import type { KeptInvoiceSettings } from '#shared/invoices/invoice-settings-schema';
import { Notices } from '../core/problems/notices';
import { BooksVisit } from '../../test/sample-invoices';
import { InvoiceSettingsPage } from './invoice-settings-page';

const kept: KeptInvoiceSettings = {
  seller: { vatId: 'IE1234567X', taxNumber: '', companyNumber: '' },
  account: { name: 'Harbour Lane', iban: 'IE29AIBK93115212345678', bic: '' },
  ...{ due_days: 14, terms: 'Two weeks', closing: '', invoicePrefix: '', creditNotePrefix: 'C', begins: null },
  version: 4,
};
const address = '/api/invoice-settings';

const begin = async () => {
  const visit = await BooksVisit.begin(InvoiceSettingsPage, {
    path: 'accounts/settings',
    address: '/accounts/settings',
  });
  await visit.answer('GET', address, kept);
  return visit;
};

describe('InvoiceSettingsPage', () => {
  it('shows what is kept, and how the next numbers will look as their beginning is typed', async () => {
    const visit = await begin();
    expect(visit.entry('VAT number').value).toBe('IE1234567X');
    await visit.type('Before the numbers of invoices', 'HL-');
    expect(visit.text).toMatch(/would be HL-\d{4}-0001 and C\d{4}-0001/);
  });

  it('keeps it over the version that was read; empty numbers of before are none', async () => {
    const visit = await begin();
    await visit.type('Days to pay', '30');
    await visit.press('Keep it like this');
    const sent = visit.request('PUT', address);
    expect(sent.request.headers.get('if-match')).toBe('"4"');
    expect(sent.request.body).toMatchObject({ due_days: 30, begins: null, seller: kept.seller });
    sent.flush({ ...kept, due_days: 30, version: 5 });
    await visit.settle();
    expect(
      TestBed.inject(Notices)
        .current()
        .map(({ text }) => text),
    ).toEqual(['How we invoice is kept.']);
  });

  it('sends nothing while an IBAN does not add up, and says so beside it', async () => {
    const visit = await begin();
    await visit.type('IBAN', 'IE29AIBK93115212345687');
    await visit.press('Keep it like this');
    expect(visit.waiting('PUT', address)).toHaveLength(0);
    expect(visit.text).toContain('This IBAN does not add up.');
  });

  it('shows both sides where somebody else kept it meanwhile, and keeps ours over theirs once that is meant', async () => {
    const visit = await begin();
    await visit.type('Days to pay', '30');
    await visit.press('Keep it like this');
    const stale = {
      type: 'urn:problem:stale',
      title: 'Somebody changed this meanwhile.',
      instance: 'request-1',
      errors: [],
    };
    await visit.refuse('PUT', address, { status: 412, ...stale, current: { ...kept, due_days: 21, version: 5 } });
    expect(visit.button('Keep it like this')).toBeUndefined();
    for (const text of ['21', '30']) expect(visit.element.querySelector('app-two-sides')?.textContent).toContain(text);
    await visit.press('Keep mine');
    const { request } = visit.request('PUT', address);
    expect([request.headers.get('if-match'), (request.body as KeptInvoiceSettings).due_days]).toEqual(['"5"', 30]);
  });
});
