import { TestBed } from '@angular/core/testing';
import type { Checkout } from '#shared/invoices/payment-schema';
import { BooksVisit, invoiceId } from '../../test/sample-invoices';
import { ClientPaymentPage } from './client-payment-page';

const checkoutId = invoiceId(70);
const checkout = (more: Partial<Checkout>): Checkout => ({
  ...{ id: checkoutId, invoiceId: invoiceId(10), state: 'open', amount_minor: 246_00, currency: 'EUR' },
  ...{ url: 'https://pay.example/1', open_minor: 246_00, isReceiptMailed: false },
  ...more,
});
const invoice = {
  ...{ id: invoiceId(10), kind: 'invoice', jobId: null, number: '2026-0007', issuedOn: '2026-03-02' },
  ...{
    dueOn: '2026-03-16',
    due_minor: 246_00,
    open_minor: 246_00,
    credited_minor: 0,
    currency: 'EUR',
    isOverdue: false,
  },
  ...{ papers: ['invoice.pdf'], mayPayByCard: true },
};
const state = `/api/client/checkouts/${checkoutId}/state`;
const firstPause_ms = 2_200;

describe('ClientPaymentPage', () => {
  const begin = async (found: Checkout) => {
    const visit = await BooksVisit.begin(ClientPaymentPage, {
      ...{ path: 'client/payments/:checkoutId', address: `/client/payments/${checkoutId}`, roles: [] },
    });
    await visit.answer('GET', '/api/client/invoices', { items: [invoice] });
    await visit.answer('POST', state, found);
    return visit;
  };

  it.each([
    ['paid', { open_minor: 0, url: null }, 'Paid. Thank you.', /€246\.00 ?has arrived by card for invoice 2026-0007/],
    ['expired', { url: null }, 'Nothing was paid', /your card was not charged/],
    ['refused', { url: null }, 'The card was refused', /Nothing was paid/],
    ['open', {}, 'Not paid yet', /does not have €246\.00 for invoice 2026-0007 yet/],
  ] as const)('says of a payment that is %s what the service says', async (found, more, heading, sentence) => {
    const visit = await begin(checkout({ state: found, ...more }));
    expect(visit.element.querySelector('h1')?.textContent?.trim()).toBe(heading);
    expect(visit.text).toMatch(sentence);
  });

  it('promises a receipt where one was mailed, and nowhere else', async () => {
    const paid = { state: 'paid', open_minor: 0, url: null } as const;
    expect((await begin(checkout(paid))).text).not.toContain('receipt');
    TestBed.resetTestingModule();
    expect((await begin(checkout({ ...paid, isReceiptMailed: true }))).text).toContain(
      'A receipt is on its way to you by mail.',
    );
  });

  it('asks again by itself while it is open, keeps what it knew meanwhile, and then tells what has come', async () => {
    const visit = await begin(checkout({}));
    await visit.settle(firstPause_ms);
    const again = visit.request('POST', state);
    expect(visit.text).toContain('Not paid yet');
    again.flush(checkout({ state: 'paid', url: null, open_minor: 0 }));
    await visit.settle();
    expect(visit.text).toContain('Paid. Thank you.');
    await visit.settle(firstPause_ms);
    expect(visit.waiting('POST', state)).toHaveLength(0);
  });

  it('says that it cannot be said when nobody answers, and neither that it was paid nor that it was not', async () => {
    const visit = await BooksVisit.begin(ClientPaymentPage, {
      ...{ path: 'client/payments/:checkoutId', address: `/client/payments/${checkoutId}`, roles: [] },
    });
    visit.request('POST', state).error(new ProgressEvent('error'));
    await visit.settle();
    expect(visit.text).toContain('It cannot be said how this payment stands');
    expect(visit.text).not.toMatch(/Paid\.|Nothing was paid/);
    expect(visit.button('Ask again')).toBeDefined();
  });
});
