import { Router } from '@angular/router';
import { TestBed } from '@angular/core/testing';
import { BooksVisit, invoiceId, pageOf, sampleSummary } from '../../test/sample-invoices';
import { NewPaymentPage } from './new-payment-page';

const older = sampleSummary({ id: invoiceId(11), number: '2026-0003', dueOn: '2026-02-01', open_minor: 100_00 });
const newer = sampleSummary({ id: invoiceId(12), number: '2026-0009', dueOn: '2026-04-01', open_minor: 50_00 });
const credit = sampleSummary({ id: invoiceId(13), kind: 'credit-note', number: 'C2026-0001', open_minor: 0 });
const client = { id: invoiceId(90), version: 1, name: 'Ashgrove House', kind: 'firm', contact: '', email: '' };
const rest = { telephone: '', address: '', website: '', taxRegistration: '', note: '', jobs: 1 };

describe('NewPaymentPage', () => {
  let visit: BooksVisit;
  const shares = () => ['2026-0003', '2026-0009'].map((number) => visit.entry(`For invoice ${number}`).value);
  const sent = () => {
    const { request } = visit.request('POST', '/api/payments');
    return { body: request.body as Record<string, unknown>, key: request.headers.get('idempotency-key') };
  };
  const recorded = {
    ...{ id: invoiceId(60), clientId: invoiceId(90), clientName: 'Ashgrove House', way: 'bank', currency: 'EUR' },
    ...{
      amount_minor: 120_00,
      credit_minor: 0,
      receivedOn: '2026-03-05',
      reference: '',
      refundsPaymentId: null,
      deed: 'payment',
    },
    ...{ shares: [], recordedBy: 'Imke Vale' },
  };

  beforeEach(async () => {
    visit = await BooksVisit.begin(NewPaymentPage, { path: 'new', address: `/new?client=${invoiceId(90)}` });
    visit.waiting('GET', `/api/clients/${invoiceId(90)}`).forEach((one) => one.flush({ ...client, ...rest }));
    await visit.answer('GET', '/api/invoices', pageOf([newer, older, credit]));
  });

  it('proposes the invoice that fell due first, then the next, each up to what is open', async () => {
    await visit.type('Amount that arrived', '120');
    expect(shares()).toEqual(['100.00', '20.00']);
    await visit.type('Amount that arrived', '30.5');
    expect(shares()).toEqual(['30.50', '']);
  });

  it('sends what was proposed, refusing what would be over unless it is said to stay', async () => {
    await visit.type('Amount that arrived', '160');
    expect(visit.text).toContain('€10.00 of it is for no invoice.');
    await visit.press('Enter the payment');
    const { body, key } = sent();
    expect(body).toMatchObject({
      ...{ clientId: invoiceId(90), way: 'bank', currency: 'EUR', amount_minor: 160_00, surplus: 'refuse' },
      shares: [
        { invoiceId: invoiceId(11), amount_minor: 100_00 },
        { invoiceId: invoiceId(12), amount_minor: 50_00 },
      ],
    });
    expect(key).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('asks again under the same key when the answer was lost, and under another once something else is entered', async () => {
    await visit.type('Amount that arrived', '120');
    await visit.press('Enter the payment');
    const first = visit.request('POST', '/api/payments');
    const key = first.request.headers.get('idempotency-key');
    first.error(new ProgressEvent('error'));
    await visit.settle();
    await visit.press('Enter the payment');
    const second = visit.request('POST', '/api/payments');
    expect(second.request.headers.get('idempotency-key')).toBe(key);
    second.error(new ProgressEvent('error'));
    await visit.settle();
    await visit.type('Amount that arrived', '121');
    await visit.press('Enter the payment');
    const third = visit.request('POST', '/api/payments');
    expect(third.request.headers.get('idempotency-key')).not.toBe(key);
    third.flush(recorded);
    await visit.settle();
    expect(TestBed.inject(Router).url).toBe('/accounts/payments');
  });

  it('lets nothing out while the shares come to more than arrived', async () => {
    await visit.type('Amount that arrived', '120');
    await visit.type('For invoice 2026-0009', '45');
    expect(visit.text).toContain('The shares come to €25.00 more than arrived.');
    expect(visit.button('Enter the payment')?.disabled).toBe(true);
  });

  it('takes no more decimals than the currency has, and rounds none away', async () => {
    await visit.type('Amount that arrived', '120.005');
    expect(visit.text).toContain('This currency has 2 decimals; please enter no more.');
    expect(shares()).toEqual(['', '']);
  });
});
