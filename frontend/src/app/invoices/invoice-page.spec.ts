import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { Notices } from '../core/problems/notices';
import { BooksVisit, invoiceId, pageOf, sampleDraft, sampleInvoice, sampleSummary } from '../../test/sample-invoices';
import { InvoicePage } from './invoice-page';

const address = `/api/invoices/${invoiceId(10)}`;
const rested_ms = 800;

type Visiting = Parameters<typeof BooksVisit.begin>[1];

const begin = async (invoice: Invoice, roles: Visiting['roles'] = ['office'], settings: Visiting['settings'] = {}) => {
  const visit = await BooksVisit.begin(InvoicePage, {
    ...{ path: 'accounts/invoices/:invoiceId', address: `/accounts/invoices/${invoice.id}` },
    ...{ roles, settings },
  });
  await visit.answer('GET', `/api/invoices/${invoice.id}`, invoice);
  return visit;
};

describe('InvoicePage, a draft', () => {
  it('shows what it comes to as one types, and keeps it on the version it was read in once the typing rests', async () => {
    const visit = await begin(sampleDraft());
    expect(visit.text).toContain('To be paid€246.00');
    await visit.type('Quantity', '3');
    // 3 h at 80.00 and 40.00: 280.00, 23 % of it 64.40.
    expect(visit.text).toContain('To be paid€344.40');
    expect(visit.waiting('PUT', address)).toHaveLength(0);
    await visit.settle(rested_ms);
    const { request } = visit.request('PUT', address);
    expect(request.headers.get('if-match')).toBe('"3"');
    expect((request.body as Invoice['content']).lines.map(({ quantity }) => quantity)).toEqual(['3', '1']);
  });

  it.each([
    ['S', ''],
    ['O', '0'],
  ] as const)('begins a first line with the workshop’s usual tax category %s', async (code, percent) => {
    const draft = sampleDraft();
    const bare = { ...draft, content: { ...draft.content, lines: [] } };
    const visit = await begin(bare, ['office'], { defaultTaxCategory: code });
    await visit.press('Add a line');
    expect(visit.entry('Tax').value).toContain(code);
    expect(visit.text.includes('Rate')).toBe(percent === '');
    await visit.type('What', 'Cleaning');
    await visit.type('Price of one', '80.00');
    if (percent === '') await visit.type('Rate', '20');
    await visit.settle(rested_ms);
    const [line] = (visit.request('PUT', address).request.body as Invoice['content']).lines;
    expect(line?.tax).toEqual({ code, percent: percent || '20' });
  });

  it('takes a price for several of what is counted, and comes to what that makes', async () => {
    const visit = await begin(sampleDraft());
    await visit.press('Price for several');
    await visit.type('Price', '410.00');
    await visit.type('for how many', '4');
    // 2 h at 410.00 for 4 are 205.00, with 40.00 245.00; 23 % of it 56.35.
    expect(visit.text).toContain('To be paid€301.35');
    await visit.settle(rested_ms);
    const { request } = visit.request('PUT', address);
    const [first] = (request.body as Invoice['content']).lines;
    expect([first.price, first.baseQuantity]).toEqual(['410', '4']);
  });

  it('finds the code of an exemption by its name, says what it stands for, and keeps no code that is not in the list', async () => {
    const draft = sampleDraft();
    const exempt = { ...draft.content.lines[0], tax: { code: 'E', percent: '0' } } as const;
    const exemptions = [{ code: 'E', reasonCode: '', reason: 'Museum services' }] as Invoice['content']['exemptions'];
    const visit = await begin({ ...draft, content: { ...draft.content, lines: [exempt], exemptions } });
    const choose = async (text: string) => {
      const entry = visit.entry('Code of the reason');
      entry.value = text;
      entry.dispatchEvent(new Event('change'));
      await visit.settle();
    };
    expect(visit.element.querySelectorAll('datalist option')).toHaveLength(83);
    await choose('cultural services (article 132 1 n)');
    expect(visit.entry('Code of the reason').value).toBe('VATEX-EU-132-1N');
    expect(visit.text).toContain('Cultural services (article 132 1 n)');
    await visit.settle(rested_ms);
    const { request } = visit.request('PUT', address);
    expect((request.body as Invoice['content']).exemptions).toMatchObject([{ reasonCode: 'VATEX-EU-132-1N' }]);
    await choose('culture');
    expect(visit.text).toContain('No such code is in the list.');
    await visit.settle(rested_ms);
    expect(visit.waiting('PUT', address)).toHaveLength(0);
  });

  it('says beside the entries what stops it, and does not issue it before', async () => {
    const findings: Invoice['findings'] = [
      { kind: 'refuse', code: 'invoice-seller-number', values: {} },
      { kind: 'warn', code: 'invoice-buyer-address', values: {} },
    ];
    const visit = await begin(sampleDraft({ findings }));
    const buyer = visit.element.querySelector('section[aria-label=Buyer]');
    expect(buyer?.textContent).toContain('The client’s address is empty.');
    expect(visit.text).toContain('One thing still stops it.');
    expect(visit.button('Issue it')?.disabled).toBe(true);
  });

  it('issues the version that is seen, after asking over what and to whom, once', async () => {
    const visit = await begin(sampleDraft());
    await visit.press('Issue it');
    expect(visit.questions.map(({ text, yes }) => [text.split(' It takes')[0], yes])).toEqual([
      ['Ashgrove House is to pay €246.00.', 'Issue it over €246.00'],
    ]);
    const { request } = visit.request('POST', `${address}/issue`);
    expect(request.body).toEqual({ version: 3 });
    expect(request.headers.get('idempotency-key')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('keeps what was just typed before it is issued, and issues that', async () => {
    const visit = await begin(sampleDraft());
    await visit.type('Quantity', '3');
    await visit.press('Issue it');
    expect(visit.questions).toEqual([]);
    const kept = sampleDraft({ version: 4 });
    await visit.answer('PUT', address, { ...kept, totals: { ...kept.totals, due_minor: 344_40 } });
    await visit.settle();
    expect(visit.questions.map(({ yes }) => yes)).toEqual(['Issue it over €344.40']);
    expect(visit.request('POST', `${address}/issue`).request.body).toEqual({ version: 4 });
  });

  it('shows both sides when somebody else changed it, and keeps one’s own over theirs when it is meant', async () => {
    const visit = await begin(sampleDraft());
    await visit.type('Quantity', '3');
    await visit.settle(rested_ms);
    const theirs = sampleDraft({ version: 7 });
    const current = { ...theirs, content: { ...theirs.content, terms: 'At once' } };
    const stale = {
      type: 'urn:problem:problem-stale',
      title: 'Changed meanwhile',
      status: 412,
      instance: '',
      errors: [],
    };
    await visit.refuse('PUT', address, { ...stale, current });
    expect(visit.text).toContain('Somebody else changed this meanwhile');
    expect(visit.text).toContain('kept now: €246.00');
    expect(visit.text).toContain('yours: €344.40');
    expect(visit.button('Issue it')?.disabled).toBe(true);
    await visit.press('Keep mine');
    expect(visit.request('PUT', address).request.headers.get('if-match')).toBe('"7"');
  });

  it('leaves the amounts of a stage as the contract has them', async () => {
    const claim = { issueId: invoiceId(50), claim: { of: 'deposit' as const } };
    const visit = await begin(sampleDraft({ claim }));
    expect(() => visit.entry('Quantity')).toThrow('no entry');
    expect([visit.button('Add a line'), visit.button('Take off or put on the whole')]).toEqual([undefined, undefined]);
    expect(visit.entry('What').value).toBe('Cleaning');
  });
});

describe('InvoicePage, issued', () => {
  const related = async (visit: BooksVisit, payments: readonly object[] = [], notes: readonly object[] = []) => {
    await visit.answer('GET', '/api/payments', pageOf(payments));
    await visit.answer('GET', '/api/invoices', pageOf(notes));
  };

  it('shows what is open, the papers, what was paid and what credits it', async () => {
    const visit = await begin(sampleInvoice({ open_minor: 100_00 }));
    const payment = {
      ...{ id: invoiceId(60), clientId: invoiceId(90), clientName: 'Ashgrove House', way: 'bank', currency: 'EUR' },
      ...{
        amount_minor: 146_00,
        credit_minor: 0,
        receivedOn: '2026-03-05',
        reference: '',
        refundsPaymentId: null,
        deed: 'payment',
      },
      ...{ shares: [{ invoiceId: invoiceId(10), number: '2026-0007', amount_minor: 146_00 }], recordedBy: 'Imke Vale' },
    };
    const note = sampleSummary({ id: invoiceId(20), kind: 'credit-note', number: 'C2026-0002', due_minor: 12_00 });
    const foreign = { ...note, id: invoiceId(21), number: 'C2026-0003', creditedInvoiceId: invoiceId(99) };
    await related(visit, [payment], [{ ...note, creditedInvoiceId: invoiceId(10) }, foreign]);
    for (const text of ['Open€100.00', '€146.00', 'Credit note C2026-0002', '−€12.00'])
      expect(visit.text).toContain(text);
    expect(visit.text).not.toContain('C2026-0003');
    const papers = [...visit.element.querySelectorAll('.papers a')].map((one) => one.getAttribute('href'));
    expect(papers).toEqual([`${address}/papers/invoice.pdf`, `${address}/papers/invoice.xml`]);
  });

  it('says what was mailed about it, where, when, by whom, and what was open then', async () => {
    const letter = { email: 'house@ashgrove.example', open_minor: 246_00, byName: 'Imke Vale' };
    const letters = [
      { ...letter, id: invoiceId(61), kind: 'paper' as const, at: '2026-03-02T09:00:00.000Z' },
      { ...letter, id: invoiceId(62), kind: 'reminder' as const, at: '2026-03-20T09:00:00.000Z', open_minor: 100_00 },
      { ...letter, id: invoiceId(63), kind: 'receipt' as const, at: '2026-03-21T09:00:00.000Z', byName: '' },
    ];
    const visit = await begin(sampleInvoice({ letters }));
    const texts = [...visit.element.querySelectorAll('app-invoice-related li')].map((one) =>
      (one.textContent ?? '').replace(/\s+/g, ' ').trim(),
    );
    expect(texts).toEqual([
      expect.stringMatching(/^Mailed to house@ashgrove\.example ?2 Mar 2026, Imke Vale ?€246\.00 open then$/),
      expect.stringMatching(/^Reminder to house@ashgrove\.example ?20 Mar 2026, Imke Vale ?€100\.00 open then$/),
      expect.stringMatching(/^Receipt to house@ashgrove\.example ?21 Mar 2026 ?€246\.00 open then$/),
    ]);
  });

  it('says what a price is for, why no tax is charged and by which code, and what was given up by whom', async () => {
    const issued = sampleInvoice();
    const line = {
      ...issued.content.lines[0],
      quantity: '10',
      price: '410.00',
      baseQuantity: '2',
      unit: 'H87',
    } as const;
    const tax = { code: 'AE', percent: '0' } as const;
    const writeOffs = [
      { id: invoiceId(50), amount_minor: 5_00, reason: 'Agreed by telephone', writtenOn: '2026-04-01', byName: 'Orla' },
    ];
    const visit = await begin({
      ...issued,
      content: { ...issued.content, lines: [{ ...line, tax }] },
      totals: { ...issued.totals, categories: [{ tax, net_minor: 2050_00, tax_minor: 0 }] },
      writeOffs,
    });
    await related(visit);
    expect(visit.text).toContain('410.00 for 2 pc');
    expect(visit.text).toContain('Reverse charge VATEX-EU-AE');
    expect(visit.text).toContain('Agreed by telephone 1 Apr 2026, Orla−€5.00');
  });

  it.each([
    ['while some is left', 1, true],
    ['never once all of it was written off', 0, false],
  ])('offers to credit it %s', async (_, left_minor, isOffered) => {
    const whole = sampleInvoice();
    const writeOff = { id: invoiceId(50), reason: 'Moved away', writtenOn: '2026-04-01', byName: 'Orla' };
    const amount_minor = whole.due_minor - whole.credited_minor - left_minor;
    const visit = await begin({ ...whole, open_minor: left_minor, writeOffs: [{ ...writeOff, amount_minor }] });
    await related(visit);
    expect(visit.button('Begin a credit note') !== undefined).toBe(isOffered);
  });

  it('offers writing off to the owner alone, and a reminder only once it is overdue', async () => {
    const office = await begin(sampleInvoice());
    await related(office);
    expect([office.button('Write off'), office.button('Remind them')]).toEqual([undefined, undefined]);
    TestBed.resetTestingModule();
    const owner = await begin(sampleInvoice({ isOverdue: true }), ['owner']);
    await related(owner);
    expect([owner.button('Write off'), owner.button('Remind them')].map(Boolean)).toEqual([true, true]);
  });

  it('lets the estimator read it and do nothing', async () => {
    const visit = await begin(sampleInvoice(), ['estimator']);
    await related(visit);
    expect(visit.element.querySelectorAll('.deeds')).toHaveLength(0);
    expect(visit.text).toContain('€246.00');
  });

  it('mails it under a key, so that it leaves once', async () => {
    const visit = await begin(sampleInvoice());
    await related(visit);
    await visit.press('Mail it');
    expect(visit.text).toContain('It goes to house@ashgrove.example.');
    await visit.press('Mail it now');
    const letter = visit.request('POST', `${address}/letters`);
    expect(letter.request.headers.get('idempotency-key')).toMatch(/^[0-9a-f-]{36}$/);
    letter.flush(null, { status: 204, statusText: 'No Content' });
    await visit.settle();
    expect(
      TestBed.inject(Notices)
        .current()
        .map(({ text }) => text),
    ).toEqual(['The letter is on its way.']);
  });

  it('begins a credit note and goes there', async () => {
    const visit = await begin(sampleInvoice());
    await related(visit);
    await visit.press('Begin a credit note');
    const asked = visit.request('POST', `${address}/credit-notes`);
    const { creditNoteId } = asked.request.body as { creditNoteId: string };
    asked.flush(sampleDraft({ id: creditNoteId, kind: 'credit-note', creditedInvoiceId: invoiceId(10) }));
    await visit.settle();
    expect(TestBed.inject(Router).url).toBe(`/accounts/invoices/${creditNoteId}`);
  });
});
