import { randomUUID } from 'node:crypto';
import request from 'supertest';
import Stripe from 'stripe';
import { v7 as newId } from 'uuid';
import {
  askClientCheckout,
  beginClientCheckout,
  listClientInvoices,
} from '#shared/client-page/client-invoices-endpoints';
import type { Checkout, Journal, Payment } from '#shared/invoices/payment-schema';
import {
  listPayments,
  listUnknownPaymentEvents,
  refundPayment,
  takePaymentEvent,
} from '#shared/invoices/payments-endpoints';
import { readJournal, readOwed } from '#shared/invoices/owed-endpoints';
import { ledgerFaults } from './ledger';
import { acceptedIssue } from './sample-client-visit';
import { paymentOf, readBack, sampleInvoice, stageInvoice } from './sample-invoice';
import { recordPayment } from '#shared/invoices/payments-endpoints';
import { startApi, type Api } from './start-api';

/** The payment service standing in speaks the HTTP of the live one and signs as it does; here its events are held back, repeated and bent. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterEach(async () => expect(await ledgerFaults(api.platform.database)).toEqual([]));
afterAll(() => api.stop());

type Signed = { bytes: Buffer; signature: string };

const post = ({ bytes, signature }: Signed) => {
  const made = request(api.app.web.express).post(takePaymentEvent.path).set('content-type', 'application/json');
  return (signature === '' ? made : made.set(takePaymentEvent.signature, signature)).send(bytes.toString('utf8'));
};

async function begun(sample?: { clientId: string; invoiceId: string }) {
  const { invoiceId, clientId } = sample ?? (await sampleInvoice(api.ours));
  const payer = { accessId: newId(), name: 'Payer', email: '', returnUrl: () => 'http://127.0.0.1/back' };
  const row = await api.app.invoices.checkouts.begin(api.ours.id, invoiceId, payer);
  return { invoiceId, clientId, checkoutId: row.id, sessionId: row.sessionId ?? '', url: row.url ?? '' };
}

const ask = async (checkoutId: string): Promise<Checkout> =>
  api.app.invoices.reading.checkout(await api.app.invoices.checkouts.ask(api.ours.id, checkoutId));
const openOf = async (invoiceId: string) => (await readBack(api.ours, invoiceId)).open_minor;
const paymentsOf = async (clientId: string): Promise<Payment[]> =>
  ((await api.as('office').call(listPayments, { query: { clientId } })).body as { items: Payment[] }).items;
const entriesOf = (journal: unknown) => (journal as Journal).currencies.flatMap(({ entries }) => entries);
const rowsOf = async () => {
  const [row] = await api.platform.database.select<{ events: number; payments: number }>(
    'SELECT (SELECT COUNT(*) FROM payment_events) AS events, (SELECT COUNT(*) FROM payments) AS payments',
  );
  return row;
};

describe('a payment by card', () => {
  it('is recorded by its event, and a receipt goes out', async () => {
    const { invoiceId, clientId, sessionId, checkoutId } = await begun();
    await api.standIn.pay(sessionId);
    expect(await openOf(invoiceId)).toBe(0);
    expect(await paymentsOf(clientId)).toMatchObject([{ way: 'card', amount_minor: 12_000, credit_minor: 0 }]);
    expect(await ask(checkoutId)).toMatchObject({ state: 'paid', open_minor: 0, url: null });
    const [receipt] = await api.mails();
    expect(receipt.headers).toContain('thank you for your payment');
    for (const written of [receipt.text, receipt.html])
      expect(written).toMatch(/120\.00.*What is still open of it: .*0\.00/s);
  });

  it('is recorded by asking where no event ever comes, and once where it comes late', async () => {
    const { invoiceId, clientId, sessionId, checkoutId } = await begun();
    expect(await ask(checkoutId)).toMatchObject({ state: 'open', open_minor: 12_000 });
    const session = await api.standIn.pay(sessionId, false);
    expect(await openOf(invoiceId)).toBe(12_000);
    expect(await ask(checkoutId)).toMatchObject({ state: 'paid', open_minor: 0 });
    expect((await post(api.standIn.signed('checkout.session.completed', session))).status).toBe(204);
    expect(await paymentsOf(clientId)).toHaveLength(1);
  });

  it('is one payment when one event comes a hundred times at once', async () => {
    const { clientId, sessionId } = await begun();
    const session = await api.standIn.pay(sessionId, false);
    const event = api.standIn.signed('checkout.session.completed', session);
    const answers = await Promise.all(Array.from({ length: 100 }, () => post(event)));
    expect(answers.filter(({ status }) => status !== 204)).toEqual([]);
    expect(await paymentsOf(clientId)).toHaveLength(1);
  }, 120_000);

  it('is one payment when it is asked about and told of by different events at the same moment', async () => {
    const { clientId, sessionId, checkoutId } = await begun();
    const session = await api.standIn.pay(sessionId, false);
    const told = [
      'checkout.session.completed',
      'checkout.session.async_payment_succeeded',
      'checkout.session.completed',
    ];
    await Promise.all([
      ...told.map((kind) => post(api.standIn.signed(kind, session))),
      ask(checkoutId),
      ask(checkoutId),
    ]);
    expect(await paymentsOf(clientId)).toHaveLength(1);
  });

  it('ends right whatever order its events come in: given back, expired, completed', async () => {
    const { invoiceId, clientId, sessionId, checkoutId } = await begun();
    const session = await api.standIn.pay(sessionId, false);
    const refund = api.standIn.ledger.refund({ payment_intent: session.payment_intent ?? '', amount: '2000' });
    for (const [kind, object] of [
      ['refund.created', { ...refund, metadata: { checkoutId } }],
      ['checkout.session.expired', { ...session, status: 'expired' }],
      ['checkout.session.completed', session],
    ] as const)
      expect((await post(api.standIn.signed(kind, object))).status).toBe(204);
    expect((await paymentsOf(clientId)).map(({ amount_minor }) => amount_minor)).toEqual([-2_000, 12_000]);
    expect(await openOf(invoiceId)).toBe(2_000);
    expect(await ask(checkoutId)).toMatchObject({ state: 'paid' });
  });

  it('over an invoice that was paid meanwhile is kept to the client’s credit', async () => {
    const sample = await begun();
    const entry = await paymentOf(api.ours, api, { ...sample, amount_minor: 5_000 });
    expect((await api.as('office').call(recordPayment, { body: entry, key: randomUUID() })).status).toBe(200);
    await api.standIn.pay(sample.sessionId);
    expect(await openOf(sample.invoiceId)).toBe(0);
    const [card] = await paymentsOf(sample.clientId);
    expect(card).toMatchObject({ way: 'card', amount_minor: 12_000, credit_minor: 5_000 });
    expect((await api.as('office').call(readOwed)).text).toContain(sample.clientId);
  });

  it('goes on where it was begun over the same amount, and begins anew over another', async () => {
    const first = await begun();
    const again = await begun(first);
    expect(again.checkoutId).toBe(first.checkoutId);
    const entry = await paymentOf(api.ours, api, { ...first, amount_minor: 5_000 });
    await api.as('office').call(recordPayment, { body: entry, key: randomUUID() });
    const anew = await begun(first);
    expect(anew.checkoutId).not.toBe(first.checkoutId);
    expect(api.standIn.ledger.session(first.sessionId)?.status).toBe('expired');
    expect(api.standIn.ledger.session(anew.sessionId)?.amount_total).toBe(7_000);
  });

  it('begins anew where the service has ended its page, and is recorded where it was paid, though no event ever came', async () => {
    const first = await begun();
    api.standIn.ledger.expire(first.sessionId);
    const anew = await begun(first);
    expect(anew.sessionId).not.toBe(first.sessionId);
    expect(api.standIn.ledger.session(anew.sessionId)?.status).toBe('open');
    await api.standIn.pay(anew.sessionId, false);
    const again = await begun(first);
    expect([again.checkoutId, again.url]).toEqual([anew.checkoutId, '']);
    expect(await openOf(first.invoiceId)).toBe(0);
    expect(await paymentsOf(first.clientId)).toHaveLength(1);
  });

  it('that was given back by a server which stopped before it wrote that down is given back once', async () => {
    const { clientId, invoiceId, sessionId } = await begun();
    const { payment_intent: intentId } = await api.standIn.pay(sessionId);
    const [payment] = await paymentsOf(clientId);
    const refundId = newId();
    // The service did it and told of it; our own answer was lost with the server that would have given it.
    await api.platform.cards.refund({ intentId: intentId ?? '', amount_minor: 2_000, refundId });
    await api.standIn.quiet();
    const body = { refundId, amount_minor: 2_000, refundedOn: payment.receivedOn, reference: '', reopens: true };
    const params = { paymentId: payment.id };
    const again = await api.as('office').call(refundPayment, { params, body, key: randomUUID() });
    expect([again.status, (again.body as Payment).amount_minor]).toEqual([200, -2_000]);
    expect((await paymentsOf(clientId)).map(({ amount_minor }) => amount_minor)).toEqual([-2_000, 12_000]);
    expect(await openOf(invoiceId)).toBe(2_000);
  });

  it('is given back through the service, once however often it is asked', async () => {
    const { clientId, invoiceId, sessionId } = await begun();
    await api.standIn.pay(sessionId);
    const [payment] = await paymentsOf(clientId);
    const body = {
      refundId: newId(),
      amount_minor: 12_000,
      refundedOn: payment.receivedOn,
      reference: '',
      reopens: true,
    };
    const refund = () =>
      api.as('office').call(refundPayment, { params: { paymentId: payment.id }, body, key: randomUUID() });
    expect((await refund()).status).toBe(200);
    expect((await refund()).status).toBe(200);
    await api.standIn.quiet();
    expect((await paymentsOf(clientId)).map(({ amount_minor }) => amount_minor)).toEqual([-12_000, 12_000]);
    expect(await openOf(invoiceId)).toBe(12_000);
  });

  it('that the service cannot be asked about changes nothing and says so', async () => {
    const { checkoutId } = await begun();
    await api.platform.database.execute("UPDATE checkouts SET session_id = 'cs_test_gone' WHERE id = :checkoutId", {
      checkoutId,
    });
    await expect(ask(checkoutId)).rejects.toMatchObject({ kind: 'unavailable', more: { retryAfter_seconds: 10 } });
  });
});

/** A payment over the whole of an invoice, and the amounts of every row of money of its client, the newest first. */
async function paid() {
  const sample = await begun();
  const { payment_intent: intentId } = await api.standIn.pay(sample.sessionId);
  const amounts = async () => (await paymentsOf(sample.clientId)).map(({ deed, amount_minor }) => [deed, amount_minor]);
  return { ...sample, intentId: intentId ?? '', amounts };
}

describe('a payment that a bank takes back', () => {
  it('leaves its invoice open again, once however often and in whatever words it is told', async () => {
    const { intentId, invoiceId, amounts } = await paid();
    const dispute = await api.standIn.dispute(intentId);
    expect(await openOf(invoiceId)).toBe(12_000);
    for (const kind of ['charge.dispute.created', 'charge.dispute.updated'])
      expect((await post(api.standIn.signed(kind, dispute))).status).toBe(204);
    expect(await amounts()).toEqual([
      ['dispute', -12_000],
      ['payment', 12_000],
    ]);
    await api.standIn.closeDispute(dispute.id, 'lost');
    expect(await openOf(invoiceId)).toBe(12_000);
    expect((await amounts()).length).toBe(2);
  });

  it('settles it again where the dispute is won, and stands so in the journal', async () => {
    const { intentId, invoiceId, clientId, amounts } = await paid();
    const { id } = await api.standIn.dispute(intentId, { amount: 5_000 });
    expect(await openOf(invoiceId)).toBe(5_000);
    await api.standIn.closeDispute(id, 'won');
    expect(await openOf(invoiceId)).toBe(0);
    expect(await amounts()).toEqual([
      ['dispute', 5_000],
      ['dispute', -5_000],
      ['payment', 12_000],
    ]);
    const query = { from: '2000-01-01', to: '2199-12-31' };
    const journal = await api.as('office').call(readJournal, { query });
    const own = entriesOf(journal.body).filter((entry) => entry.clientId === clientId && entry.kind === 'dispute');
    expect(own.map(({ amount_minor }) => amount_minor).sort((one, other) => one - other)).toEqual([-5_000, 5_000]);
  });

  it('ends where the service says, though the end is told before the beginning and the payment last of all', async () => {
    const sample = await begun();
    const session = await api.standIn.pay(sample.sessionId, false);
    const dispute = api.standIn.ledger.dispute(session.payment_intent ?? '');
    // Nobody here knows the payment yet, so this one is kept as unknown; what it told is found with the payment itself.
    expect((await post(api.standIn.signed('charge.dispute.created', dispute))).status).toBe(204);
    expect((await post(api.standIn.signed('checkout.session.completed', session))).status).toBe(204);
    expect(await openOf(sample.invoiceId)).toBe(12_000);
    const won = api.standIn.ledger.changeDispute(dispute.id, 'won');
    await Promise.all(
      ['charge.dispute.closed', 'charge.dispute.funds_reinstated', 'charge.dispute.updated'].map((kind) =>
        post(api.standIn.signed(kind, won)),
      ),
    );
    await post(api.standIn.signed('charge.dispute.created', dispute));
    expect(await openOf(sample.invoiceId)).toBe(0);
    expect((await paymentsOf(sample.clientId)).map(({ amount_minor }) => amount_minor)).toEqual([
      12_000, -12_000, 12_000,
    ]);
  });

  it('stays where the bank only asks, and no more is taken than is left after a refund', async () => {
    const { intentId, invoiceId, clientId } = await paid();
    await api.standIn.dispute(intentId, { status: 'warning_needs_response' });
    expect(await openOf(invoiceId)).toBe(0);
    const [payment] = await paymentsOf(clientId);
    const refund = { refundId: newId(), amount_minor: 2_000, reference: '', reopens: true };
    const body = { ...refund, refundedOn: payment.receivedOn };
    await api.as('office').call(refundPayment, { params: { paymentId: payment.id }, body, key: randomUUID() });
    await api.standIn.quiet();
    await api.standIn.dispute(intentId, { currency: 'usd', amount: 13_100 });
    expect(await openOf(invoiceId)).toBe(12_000);
    expect((await paymentsOf(clientId)).map(({ amount_minor }) => amount_minor)).toEqual([-10_000, -2_000, 12_000]);
  });
});

describe('a refund', () => {
  const refundOf = async (clientId: string, amount_minor: number) => {
    const [payment] = (await paymentsOf(clientId)).filter(({ deed }) => deed === 'payment');
    const body = { refundId: newId(), amount_minor, refundedOn: payment.receivedOn, reference: '', reopens: true };
    const refund = () =>
      api.as('office').call(refundPayment, { params: { paymentId: payment.id }, body, key: randomUUID() });
    return { refund, payment };
  };

  it('that fails days later is money back here, and its invoice is settled again', async () => {
    const { clientId, invoiceId, intentId, amounts } = await paid();
    await (await refundOf(clientId, 4_000)).refund();
    await api.standIn.quiet();
    expect(await openOf(invoiceId)).toBe(4_000);
    const [refund] = api.standIn.ledger.refundsOf(intentId);
    await api.standIn.failRefund(refund.id);
    expect(await openOf(invoiceId)).toBe(0);
    expect(await amounts()).toEqual([
      ['refund-failed', 4_000],
      ['refund', -4_000],
      ['payment', 12_000],
    ]);
    const again = await (await refundOf(clientId, 12_000)).refund();
    expect([again.status, await openOf(invoiceId)]).toEqual([200, 12_000]);
  });

  it('that the service refuses at once is refused here, and nothing moved', async () => {
    const { clientId, invoiceId } = await paid();
    const { refund } = await refundOf(clientId, 4_000);
    const made = jest.spyOn(api.standIn.ledger, 'refund').mockImplementationOnce((fields) => {
      made.mockRestore();
      const { id } = api.standIn.ledger.refund(fields);
      return api.standIn.ledger.changeRefund(id, 'failed');
    });
    const refused = await refund();
    expect([refused.status, (refused.body as { type: string }).type]).toEqual([409, 'urn:problem:refund-failed']);
    await api.standIn.quiet();
    expect(await openOf(invoiceId)).toBe(0);
    expect(await paymentsOf(clientId)).toHaveLength(1);
  });
});

describe('while the payment service is asked', () => {
  /** Lets the service answer only once this is let go; tells when it has been asked. */
  function slowly(method: 'begin' | 'refund') {
    let letGo: () => void = () => undefined;
    const held = new Promise<void>((resolve) => (letGo = resolve));
    let isAsked: () => void = () => undefined;
    const asked = new Promise<void>((resolve) => (isAsked = resolve));
    const { cards } = api.platform;
    const real = cards[method].bind(cards) as (order: never) => Promise<never>;
    const spy = jest.spyOn(cards, method).mockImplementation(async (order: object) => {
      isAsked();
      await held;
      return real(order as never);
    });
    return { asked, letGo, restore: () => spy.mockRestore() };
  }

  const cash = async (sample: { clientId: string; invoiceId: string }, amount_minor: number) => {
    const body = await paymentOf(api.ours, api, { ...sample, amount_minor });
    return (await api.as('office').call(recordPayment, { body, key: randomUUID() })).status;
  };

  it('nobody waits who moves money of the same workshop', async () => {
    const sample = await sampleInvoice(api.ours);
    const other = await sampleInvoice(api.ours);
    const { asked, letGo, restore } = slowly('begin');
    const beginning = begun(sample);
    await asked;
    expect(await cash(other, 1_000)).toBe(200);
    letGo();
    expect((await beginning).sessionId).toMatch(/^cs_/);
    restore();
  });

  it('nor while it gives back', async () => {
    const { clientId } = await paid();
    const other = await sampleInvoice(api.ours);
    const [payment] = await paymentsOf(clientId);
    const { asked, letGo, restore } = slowly('refund');
    const body = { refundId: newId(), amount_minor: 100, refundedOn: payment.receivedOn, reference: '', reopens: true };
    // Sent only once somebody waits for it.
    const refunding = (async () =>
      api.as('office').call(refundPayment, { params: { paymentId: payment.id }, body, key: randomUUID() }))();
    await asked;
    expect(await cash(other, 1_000)).toBe(200);
    letGo();
    expect((await refunding).status).toBe(200);
    await api.standIn.quiet();
    restore();
  });

  it('two who begin at once are led to one page', async () => {
    const sample = await sampleInvoice(api.ours);
    const pages = await Promise.all(Array.from({ length: 8 }, () => begun(sample)));
    expect(new Set(pages.map(({ sessionId }) => sessionId)).size).toBe(1);
    expect(new Set(pages.map(({ checkoutId }) => checkoutId)).size).toBe(1);
  });

  it('a server that stops leaves what the next one goes on with, and two payers of one invoice get one page', async () => {
    const sample = await sampleInvoice(api.ours);
    const { cards } = api.platform;
    const real = cards.begin.bind(cards);
    const lost = jest.spyOn(cards, 'begin').mockImplementationOnce(async (order) => {
      await real(order);
      throw new Error('the answer was lost with the server');
    });
    await expect(begun(sample)).rejects.toMatchObject({ code: 'checkout-unreachable' });
    lost.mockRestore();
    const healed = await begun(sample);
    const rows = await api.platform.database.select<{ id: string }>(
      'SELECT id FROM checkouts WHERE invoice_id = :invoiceId',
      { invoiceId: sample.invoiceId },
    );
    expect(rows.map(({ id }) => id)).toEqual([healed.checkoutId]);
    await api.standIn.pay(healed.sessionId);
    expect(await openOf(sample.invoiceId)).toBe(0);
  });
});

describe('an event', () => {
  it('that could not be followed is taken when it comes again', async () => {
    const { sessionId, invoiceId } = await begun();
    const session = await api.standIn.pay(sessionId, false);
    const event = api.standIn.signed('checkout.session.completed', session);
    const away = jest.spyOn(api.platform.cards, 'state').mockRejectedValueOnce(new Error('away'));
    expect((await post(event)).status).toBe(503);
    away.mockRestore();
    expect(await openOf(invoiceId)).toBe(12_000);
    expect((await post(event)).status).toBe(204);
    expect(await openOf(invoiceId)).toBe(0);
  });

  const seconds = (instant: Date) => Math.floor(instant.getTime() / 1_000);

  async function bent(): Promise<[string, Signed][]> {
    const { sessionId } = await begun();
    const session = await api.standIn.pay(sessionId, false);
    const { bytes, signature } = api.standIn.signed('checkout.session.completed', session);
    const signer = new Stripe('sk_test_of_the_tests');
    const at = (timestamp: number, secret = api.standIn.webhookSecret) => ({
      bytes,
      signature: signer.webhooks.generateTestHeaderString({ payload: bytes.toString('utf8'), secret, timestamp }),
    });
    const now = seconds(api.clock.now());
    return [
      ['a changed byte', { bytes: Buffer.from(bytes.toString('utf8').replace('12000', '12001')), signature }],
      ['an old time', at(now - 301)],
      ['a time to come', at(now + 302)],
      ['no signature', { bytes, signature: '' }],
      ['half a signature', { bytes, signature: signature.slice(0, -10) }],
      ['another secret', at(now, 'whsec_of_somebody_else_altogether')],
      ['nothing at all', { bytes: Buffer.from(''), signature }],
    ];
  }

  it('whose signature does not fit is refused, and leaves no row', async () => {
    const all = await bent();
    const before = await rowsOf();
    for (const [what, signed] of all) expect([what, (await post(signed)).status]).toEqual([what, 400]);
    expect(await rowsOf()).toEqual(before);
  });

  it('of a kind nobody knows, and about nothing of ours, is kept and does nothing', async () => {
    const before = await rowsOf();
    const unknown = api.standIn.signed('invoice.sang_a_song', { id: 'x', object: 'song' });
    const strange = api.standIn.signed('checkout.session.completed', {
      id: 'cs_other',
      object: 'checkout.session',
      metadata: null,
    });
    expect([(await post(unknown)).status, (await post(strange)).status]).toEqual([204, 204]);
    const after = await rowsOf();
    expect([Number(after.events) - Number(before.events), after.payments]).toEqual([2, before.payments]);
    const list = await api.as('office').call(listUnknownPaymentEvents);
    const { items } = list.body as { items: { id: string; kind: string }[] };
    expect(
      items
        .slice(0, 2)
        .map(({ kind }) => kind)
        .sort(),
    ).toEqual(['checkout.session.completed', 'invoice.sang_a_song']);
    expect(list.text).not.toContain('cs_other');
  });
});

describe('a client', () => {
  it('sees their own invoice, pays it by card and comes back to what is true', async () => {
    const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
    const { id: invoiceId, due_minor } = await stageInvoice(
      api.ours,
      { jobId, issueId },
      { of: 'work', from_percent: '0', to_percent: '30' },
    );
    const list = await visitor.call(listClientInvoices);
    expect(list.body).toMatchObject({
      items: [{ id: invoiceId, open_minor: due_minor, mayPayByCard: true, papers: ['invoice.pdf', 'invoice.xml'] }],
    });
    const checkout = (await visitor.call(beginClientCheckout, { params: { invoiceId } })).body as Checkout;
    expect(checkout).toMatchObject({ state: 'open', amount_minor: due_minor });
    const page = await fetch(checkout.url ?? '');
    expect(await page.text()).toContain('no money moves');
    const paid = await fetch(checkout.url ?? '', {
      method: 'POST',
      body: new URLSearchParams({ answer: 'pay' }),
      redirect: 'manual',
    });
    expect(paid.headers.get('location')).toMatch(new RegExp(`/client/payments/${checkout.id}$`));
    const back = await visitor.call(askClientCheckout, { params: { checkoutId: checkout.id } });
    expect(back.body).toMatchObject({ state: 'paid', open_minor: 0 });
  });

  it('cannot begin to pay what is not theirs, or is not open', async () => {
    const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
    const { invoiceId } = await sampleInvoice(api.ours);
    expect((await visitor.call(beginClientCheckout, { params: { invoiceId } })).status).toBe(404);
    const own = await stageInvoice(api.ours, { jobId, issueId }, { of: 'work', from_percent: '0', to_percent: '30' });
    const { url } = (await visitor.call(beginClientCheckout, { params: { invoiceId: own.id } })).body as Checkout;
    await api.standIn.pay((url ?? '').split('/').at(-1) ?? '');
    const again = await visitor.call(beginClientCheckout, { params: { invoiceId: own.id } });
    expect(again.body).toMatchObject({ type: 'urn:problem:checkout-nothing-open' });
  });
});
