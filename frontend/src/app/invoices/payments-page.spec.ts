import type { Payment } from '#shared/invoices/payment-schema';
import { Notices } from '../core/problems/notices';
import { TestBed } from '@angular/core/testing';
import { BooksVisit, invoiceId, pageOf, sampleSummary } from '../../test/sample-invoices';
import { PaymentsPage } from './payments-page';

const payment = (more: Partial<Payment> = {}): Payment => ({
  ...{ id: invoiceId(40), clientId: invoiceId(90), clientName: 'Ashgrove House', way: 'bank', currency: 'EUR' },
  ...{ deed: 'payment', amount_minor: 300_00, credit_minor: 54_00, receivedOn: '2026-03-05', reference: 'March' },
  ...{ refundsPaymentId: null, recordedBy: 'Orla Byrne' },
  shares: [{ invoiceId: invoiceId(10), number: '2026-0007', amount_minor: 246_00 }],
  ...more,
});

const shown = async (items: readonly Payment[]) => {
  const visit = await BooksVisit.begin(PaymentsPage, { path: 'accounts/payments', address: '/accounts/payments' });
  await visit.answer('GET', '/api/payments', pageOf(items));
  return visit;
};
const notices = () =>
  TestBed.inject(Notices)
    .current()
    .map(({ text }) => text);

describe('PaymentsPage', () => {
  it('says what each is for and what lies to the client’s credit', async () => {
    const visit = await shown([payment()]);
    for (const text of ['Ashgrove House', 'by bank', '“March”', '2026-0007', '€246.00', 'to their credit', '€54.00'])
      expect(visit.text).toContain(text);
  });

  it('lists what the payment service told of payments nobody here has begun', async () => {
    const visit = await shown([payment()]);
    const event = { id: 'evt_told', kind: 'checkout.session.completed', receivedAt: '2026-03-05T10:15:00.000Z' };
    await visit.answer('GET', '/api/payment-events', { items: [event] });
    expect(visit.element.querySelector('app-unknown-events summary')?.textContent).toContain('not begun here: 1');
    expect(visit.text).toContain('evt_told');
    await visit.press('Ask again');
    await visit.answer('GET', '/api/payment-events', { items: [] });
    expect(visit.text).not.toContain('evt_told');
  });

  it('names what went back and what came back, and offers nothing to be given back of those', async () => {
    const beside = { refundsPaymentId: invoiceId(40), way: 'card' as const, shares: [], credit_minor: 0 };
    const visit = await shown([
      payment({ ...beside, id: invoiceId(41), deed: 'refund', amount_minor: -10_00 }),
      payment({ ...beside, id: invoiceId(42), deed: 'refund-failed', amount_minor: 10_00 }),
      payment({ ...beside, id: invoiceId(43), deed: 'dispute', amount_minor: -300_00 }),
      payment({ ...beside, id: invoiceId(44), deed: 'dispute', amount_minor: 300_00 }),
    ]);
    const chips = [...visit.element.querySelectorAll('.chip')].map((one) => one.textContent?.trim());
    expect(chips).toEqual(['given back', 'refund that failed', 'taken back by the bank', 'dispute settled']);
    expect(visit.button('Give back')).toBeUndefined();
  });

  it('puts credit to an invoice of the same currency, as much as is open of it', async () => {
    const visit = await shown([payment()]);
    await visit.press('Put to an invoice');
    const open = [
      sampleSummary({ id: invoiceId(11), number: '2026-0008', open_minor: 30_00 }),
      sampleSummary({ id: invoiceId(12), number: '2019-0001', currency: 'GBP', open_minor: 99_00 }),
    ];
    await visit.answer('GET', '/api/invoices', pageOf(open));
    expect(visit.text).toContain('2026-0008, €30.00 open');
    expect(visit.text).not.toContain('2019-0001');
    const chooser = visit.entry('Invoice');
    chooser.value = invoiceId(11);
    chooser.dispatchEvent(new Event('change'));
    await visit.settle();
    await visit.press('Put it there');
    const sent = visit.request('POST', `/api/payments/${invoiceId(40)}/shares`);
    expect(sent.request.body).toEqual({ invoiceId: invoiceId(11), amount_minor: 30_00 });
    sent.flush(payment());
    await visit.settle();
    expect(notices()).toEqual(['€30.00 put to invoice 2026-0008.']);
  });
});

describe('the form of a refund', () => {
  const opened = async (more: Partial<Payment> = {}) => {
    const visit = await shown([payment(more)]);
    await visit.press('Give back');
    return visit;
  };
  const address = `/api/payments/${invoiceId(40)}/refunds`;

  it('proposes what lies to their credit, and gives that back once however often it is pressed', async () => {
    const visit = await opened();
    expect(visit.entry('Amount').value).toBe('54.00');
    await visit.type('Day', '2026-03-06');
    await visit.press('Give it back');
    const sent = visit.request('POST', address);
    expect(sent.request.body).toMatchObject({ amount_minor: 54_00, refundedOn: '2026-03-06', reopens: false });
    const { refundId } = sent.request.body as { refundId: string };
    sent.flush({}, { status: 503, statusText: 'away' });
    await visit.settle();
    await visit.press('Give it back');
    const again = visit.request('POST', address);
    expect((again.request.body as { refundId: string }).refundId).toBe(refundId);
    expect(again.request.headers.get('idempotency-key')).toBe(sent.request.headers.get('idempotency-key'));
  });

  it('asks whether invoices may be left open again where more goes back than lies here', async () => {
    const visit = await opened();
    expect(visit.text).not.toContain('Invoices may be left open again');
    await visit.type('Amount', '100.00');
    expect(visit.text).toContain('Invoices may be left open again: only €54.00');
  });

  it('says that a card gets it back, and shows beside the form what the server has against it', async () => {
    const visit = await opened({ way: 'card', credit_minor: 0 });
    expect(visit.text).toContain('It goes back to the card it was paid with');
    await visit.press('Give it back');
    expect(visit.waiting('POST', address)).toHaveLength(0);
    await visit.type('Amount', '10.00');
    await visit.press('Give it back');
    const detail = 'Giving this back leaves invoices open again. Please confirm that it is meant.';
    await visit.refuse('POST', address, {
      status: 409,
      ...{ type: 'urn:problem:refund-reopens', title: detail, instance: 'request-1', errors: [] },
    });
    expect(visit.text).toContain(detail);
    await visit.press('Leave it');
    expect(visit.text).not.toContain('Give money back');
  });
});
