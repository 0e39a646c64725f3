import { randomUUID } from 'node:crypto';
import { Workbook } from 'exceljs';
import { v7 as newId } from 'uuid';
import { writtenOffBecause } from '../../backend/migrations/0052-written-off-because';
import type { Journal, OwedInCurrency, Payment, Statement } from '#shared/invoices/payment-schema';
import {
  readJournal,
  readJournalList,
  readJournalWorkbook,
  readOwed,
  readStatement,
  readStatementPaper,
  remindOfInvoice,
  sendStatement,
} from '#shared/invoices/owed-endpoints';
import { sendInvoice } from '#shared/invoices/invoices-endpoints';
import { recordPayment, refundPayment, sharePayment, writeOff } from '#shared/invoices/payments-endpoints';
import { ledgerFaults } from './ledger';
import {
  creditDraft,
  issued,
  paymentOf,
  readBack,
  sampleContent,
  sampleDraft,
  sampleInvoice,
  samplePayment,
} from './sample-invoice';
import { clientNamed, enterClient } from './sample-job';
import { startApi, type Api } from './start-api';

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterEach(async () => expect(await ledgerFaults(api.platform.database)).toEqual([]));
afterAll(() => api.stop());

type Entry = Awaited<ReturnType<typeof paymentOf>>;
const pay = (body: Entry, key = randomUUID()) => api.as('office').call(recordPayment, { body, key });
const entryFor = (sample: { clientId: string; invoiceId: string }, amount_minor: number) =>
  paymentOf(api.ours, api, { ...sample, amount_minor });
const typeOf = (response: { body: unknown }) => (response.body as { type: string }).type;
const wide = { from: '2020-01-01', to: '2099-12-31' };

const binary = (response: NodeJS.ReadableStream, done: (error: Error | null, body: Buffer) => void): void => {
  const parts: Buffer[] = [];
  response.on('data', (part: Buffer) => parts.push(part));
  response.on('end', () => done(null, Buffer.concat(parts)));
};

describe('a payment', () => {
  it('comes in parts until nothing is open', async () => {
    const sample = await sampleInvoice(api.ours);
    expect((await pay(await entryFor(sample, 5_000))).status).toBe(200);
    expect(await readBack(api.ours, sample.invoiceId)).toMatchObject({ open_minor: 7_000 });
    expect((await pay(await entryFor(sample, 7_000))).status).toBe(200);
    expect(await readBack(api.ours, sample.invoiceId)).toMatchObject({ open_minor: 0 });
    expect(typeOf(await pay(await entryFor(sample, 1)))).toBe('urn:problem:payment-over-invoice');
  });

  it('beyond what is open is refused, or kept to the client’s credit and used for another invoice, as is said', async () => {
    const sample = await sampleInvoice(api.ours);
    const over = { ...(await entryFor(sample, 12_000)), amount_minor: 15_000 };
    expect(typeOf(await pay(over))).toBe('urn:problem:payment-over');
    const kept = (await pay({ ...over, surplus: 'keep' })).body as Payment;
    expect(kept.credit_minor).toBe(3_000);
    const { invoiceId } = await sampleInvoice(api.ours, { clientId: sample.clientId });
    const share = (amount_minor: number) =>
      api
        .as('office')
        .call(sharePayment, { params: { paymentId: kept.id }, body: { invoiceId, amount_minor }, key: randomUUID() });
    expect(typeOf(await share(3_001))).toBe('urn:problem:payment-no-credit');
    expect((await share(3_000)).body).toMatchObject({ credit_minor: 0 });
    expect(await readBack(api.ours, invoiceId)).toMatchObject({ open_minor: 9_000 });
  });

  it('is refused on a draft, on a credit note, for another client’s invoice, in foreign money, from the future, over its own amount', async () => {
    const draft = await sampleDraft(api.ours);
    expect((await pay(await entryFor(draft, 100))).status).toBe(409);
    const sample = await sampleInvoice(api.ours);
    const note = await issued(api.ours, (await creditDraft(api.ours, sample.invoiceId)).id);
    expect(typeOf(await pay(await entryFor({ ...sample, invoiceId: note.id }, 100)))).toBe(
      'urn:problem:payment-not-invoice',
    );
    const open = await sampleInvoice(api.ours);
    const other = await sampleInvoice(api.ours);
    const entry = await entryFor(open, 100);
    expect(typeOf(await pay({ ...entry, clientId: other.clientId }))).toBe('urn:problem:payment-other-client');
    const foreign = await pay({ ...entry, currency: 'USD' });
    expect(foreign.status).toBe(400);
    expect(foreign.body).toMatchObject({
      errors: [{ path: ['currency'], message: expect.stringContaining('EUR') as string }],
    });
    expect((await pay({ ...entry, receivedOn: '2099-01-01' })).status).toBe(400);
    expect((await pay({ ...entry, amount_minor: 99 })).status).toBe(400);
    for (const amount_minor of [-1, 0, 1.5, 1e308, 2 ** 53])
      expect((await pay({ ...entry, amount_minor })).status).toBe(400);
    expect(await readBack(api.ours, open.invoiceId)).toMatchObject({ open_minor: 12_000 });
  });

  it('is taken once of fifty who pay the same invoice at the same moment', async () => {
    const sample = await sampleInvoice(api.ours);
    const entry = await entryFor(sample, 12_000);
    const answers = await Promise.all(Array.from({ length: 50 }, () => pay(entry)));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    expect(answers.filter(({ status }) => status !== 200 && status !== 409)).toEqual([]);
  }, 120_000);

  it('sent again under its key is one payment; another one under the same key is refused with 422', async () => {
    const sample = await sampleInvoice(api.ours);
    const [entry, key] = [await entryFor(sample, 1_000), randomUUID()];
    const first = await pay(entry, key);
    expect((await pay(entry, key)).text).toBe(first.text);
    expect((await pay(await entryFor(sample, 2_000), key)).status).toBe(422);
    expect(await readBack(api.ours, sample.invoiceId)).toMatchObject({ open_minor: 11_000 });
  });
});

describe('what is given back', () => {
  const refund = (paymentId: string, amount_minor: number, more: object = {}) =>
    api.as('office').call(refundPayment, {
      params: { paymentId },
      body: { refundId: newId(), amount_minor, refundedOn: '2026-01-01', reference: '', reopens: false, ...more },
      key: randomUUID(),
    });

  it('comes out of credit first; what invoices hold only when that is meant', async () => {
    const sample = await sampleInvoice(api.ours);
    const entry = { ...(await entryFor(sample, 12_000)), amount_minor: 13_000, surplus: 'keep' } as const;
    const { id } = (await pay(entry)).body as Payment;
    expect((await refund(id, 400)).body).toMatchObject({ amount_minor: -400, refundsPaymentId: id });
    expect(typeOf(await refund(id, 700))).toBe('urn:problem:refund-reopens');
    expect((await refund(id, 700, { reopens: true })).status).toBe(200);
    expect(await readBack(api.ours, sample.invoiceId)).toMatchObject({ open_minor: 100 });
    expect(typeOf(await refund(id, 11_901, { reopens: true }))).toBe('urn:problem:refund-over');
  });

  it('after a credit note on a paid invoice is the client’s credit', async () => {
    const sample = await sampleInvoice(api.ours);
    const { id } = (await pay(await entryFor(sample, 12_000))).body as Payment;
    await issued(api.ours, (await creditDraft(api.ours, sample.invoiceId)).id);
    expect(await readBack(api.ours, sample.invoiceId)).toMatchObject({ open_minor: 0, credited_minor: 12_000 });
    expect((await refund(id, 12_000)).status).toBe(200);
  });

  it('is refused under the id of another payment or refund, over another amount, and on a day to come', async () => {
    const [one, other] = [await samplePayment(api.ours, api), await samplePayment(api.ours, api)];
    const refundId = newId();
    expect((await refund(one.id, 1_000, { refundId, reopens: true })).status).toBe(200);
    for (const [paymentId, amount_minor, id] of [
      [other.id, 1_000, refundId],
      [other.id, 1_000, one.id],
      [one.id, 5_000, refundId],
    ] as const) {
      const answer = await refund(paymentId, amount_minor, { refundId: id, reopens: true });
      expect([answer.status, typeOf(answer)]).toEqual([409, 'urn:problem:refund-id-used']);
    }
    const late = await refund(other.id, 1_000, { reopens: true, refundedOn: '2999-01-01' });
    expect([late.status, late.text.includes('lies ahead')]).toEqual([400, true]);
  });

  it('is one refund when it is asked for twice by the same id', async () => {
    const sample = await sampleInvoice(api.ours);
    const { id } = (await pay(await entryFor(sample, 12_000))).body as Payment;
    const refundId = newId();
    const first = await refund(id, 12_000, { refundId, reopens: true });
    const second = await refund(id, 12_000, { refundId, reopens: true });
    expect(second.body).toEqual(first.body);
  });
});

describe('writing off', () => {
  it('is the owner’s, up to what is open, and leaves that much less to credit', async () => {
    const sample = await sampleInvoice(api.ours);
    const params = { invoiceId: sample.invoiceId };
    const off = (role: 'owner' | 'office', amount_minor: number) =>
      api.as(role).call(writeOff, { params, body: { amount_minor, reason: 'Gone abroad' }, key: randomUUID() });
    expect((await off('office', 100)).status).toBe(403);
    expect((await off('owner', 12_001)).status).toBe(409);
    expect((await off('owner', 2_000)).body).toMatchObject({ open_minor: 10_000 });
    const note = await creditDraft(api.ours, sample.invoiceId);
    const key = randomUUID();
    const { issueInvoice } = await import('#shared/invoices/invoices-endpoints');
    const over = await api
      .as('owner')
      .call(issueInvoice, { params: { invoiceId: note.id }, body: { version: 1 }, key });
    expect(typeOf(over)).toBe('urn:problem:invoice-credit-over');
  });
});

describe('what is owed', () => {
  it('agrees by client and age, in statement and journal, to the cent', async () => {
    const sample = await sampleInvoice(api.ours);
    await pay(await entryFor(sample, 2_000));
    const { currencies } = (await api.as('office').call(readOwed)).body as { currencies: OwedInCurrency[] };
    const [owed] = currencies;
    expect(owed.items.find(({ clientId }) => clientId === sample.clientId)).toMatchObject({
      open_minor: 10_000,
      byAge_minor: { 'not-due': 10_000 },
    });
    const call = { params: { clientId: sample.clientId }, query: wide };
    const statement = (await api.as('office').call(readStatement, call)).body as Statement;
    const [account] = statement.currencies;
    expect(account).toMatchObject({ opening_minor: 0, closing_minor: 10_000 });
    expect(account.lines.map(({ kind, balance_minor }) => [kind, balance_minor])).toEqual([
      ['invoice', 12_000],
      ['payment', 10_000],
    ]);
    const paper = await api
      .as('office')
      .call(readStatementPaper, call)
      .buffer(true)
      .parse(binary as never);
    expect((paper.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    const journal = (await api.as('office').call(readJournal, { query: wide })).body as Journal;
    const paid = journal.currencies[0].entries.find(
      ({ kind, clientId }) => kind === 'payment' && clientId === sample.clientId,
    );
    const { number } = await readBack(api.ours, sample.invoiceId);
    expect(paid).toMatchObject({ amount_minor: -2_000, paid: { way: 'bank', invoices: [number] } });
    const list = await api
      .as('office')
      .call(readJournalList, { query: wide })
      .buffer(true)
      .parse(binary as never);
    const lines = (list.body as Buffer).toString('utf8').split('\r\n');
    expect(lines.find((one) => one.includes(`Bank transfer,${number}`))).toMatch(/,EUR,0\.00,0\.00,0\.00,-20\.00$/);
    const credit = owed.items.reduce((sum, one) => sum + one.credit_minor, 0);
    expect(journal.currencies[0].totals.reduce((sum, { amount_minor }) => sum + amount_minor, 0)).toBe(
      owed.open_minor - credit,
    );
  });

  it('stays in the currency it was invoiced in where the workshop has another by now, and is never added to another', async () => {
    const workshop = api.theirs;
    const own = workshop.people.owner.visitor;
    const old = await sampleInvoice(workshop);
    // However it came about: what was invoiced before stays in what it was invoiced in.
    await api.platform.database.execute("UPDATE workshops SET currency = 'SEK' WHERE id = :id", { id: workshop.id });
    const fresh = await sampleInvoice(workshop, { clientId: old.clientId });
    const owed = (await own.call(readOwed)).body as { currencies: OwedInCurrency[] };
    expect(owed.currencies.map(({ currency, open_minor }) => [currency, open_minor])).toEqual([
      ['SEK', 12_000],
      ['EUR', 12_000],
    ]);
    const body = { amount_minor: 2_000, reason: 'A scratch on the plinth' };
    const key = randomUUID();
    expect((await own.call(writeOff, { params: { invoiceId: old.invoiceId }, body, key })).status).toBe(200);
    const call = { params: { clientId: old.clientId }, query: wide };
    const statement = await own.call(readStatement, call);
    expect(
      (statement.body as Statement).currencies.map(({ currency, closing_minor }) => [currency, closing_minor]),
    ).toEqual([
      ['SEK', 12_000],
      ['EUR', 10_000],
    ]);
    // Why something was given up is between the workshop and its accountant.
    expect(statement.text).not.toContain('scratch');
    const journal = (await own.call(readJournal, { query: wide })).body as Journal;
    const sums = journal.currencies.map(({ currency, totals }) => [
      currency,
      totals.reduce((sum, { amount_minor }) => sum + amount_minor, 0),
    ]);
    expect(sums).toEqual([
      ['SEK', 12_000],
      ['EUR', 10_000],
    ]);
    const notes = journal.currencies.flatMap(({ entries }) => entries.map(({ note }) => note)).filter(Boolean);
    expect(notes).toEqual([expect.stringMatching(/^A scratch on the plinth \(.+\)$/)]);
    const workbook = new Workbook();
    const file = await own
      .call(readJournalWorkbook, { query: wide })
      .buffer(true)
      .parse(binary as never);
    await workbook.xlsx.load(file.body as never);
    expect(workbook.worksheets.map(({ name }) => name)).toEqual(['Journal SEK', 'Journal EUR']);
    const csv = (
      await own
        .call(readJournalList, { query: wide })
        .buffer(true)
        .parse(binary as never)
    ).body as Buffer;
    const together = csv
      .toString('utf8')
      .split('\r\n')
      .filter((row) => row.includes('Together'));
    expect(together.map((row) => row.split(',').filter(Boolean))).toEqual([
      ['Totals', 'Together', 'SEK', '100.00', '20.00', '0.00', '120.00'],
      ['Totals', 'Together', 'EUR', '100.00', '20.00', '0.00', '100.00'],
    ]);
    const paper = await own
      .call(readStatementPaper, call)
      .buffer(true)
      .parse(binary as never);
    expect((paper.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    const invoice = await readBack(workshop, old.invoiceId);
    expect(invoice.writeOffs).toMatchObject([{ amount_minor: 2_000, reason: body.reason }]);
    expect((await readBack(workshop, fresh.invoiceId)).currency).toBe('SEK');
  });

  it('says in the history why something was written off, though it was written down before the history did', async () => {
    const { invoiceId } = await sampleInvoice(api.ours);
    const body = { amount_minor: 1_500, reason: 'Agreed by telephone' };
    await api.as('owner').call(writeOff, { params: { invoiceId }, body, key: randomUUID() });
    const said = async () => {
      const [row] = await api.platform.database.select<{ said: string }>(
        "SELECT JSON_VALUE(`values`, '$.reason') AS said FROM audit WHERE code = 'history-written-off' AND subject_id = :invoiceId",
        { invoiceId },
      );
      return row.said;
    };
    expect(await said()).toBe(body.reason);
    await api.platform.database.execute(
      "UPDATE audit SET `values` = JSON_REMOVE(`values`, '$.reason') WHERE subject_id = :invoiceId",
      { invoiceId },
    );
    for (const statement of writtenOffBecause.statements) await api.platform.database.execute(statement);
    expect(await said()).toBe(body.reason);
  });

  it('goes to the accountant as a list and a workbook whose sums are those of the entries, and no text is a formula', async () => {
    const clientName = '=HYPERLINK("http://evil.example")';
    const { enterClient, clientNamed } = await import('./sample-job');
    const clientId = await enterClient(api.as('owner'), clientNamed(clientName));
    const sample = await sampleInvoice(api.ours, { clientId });
    await pay({ ...(await entryFor(sample, 100)), reference: '@SUM(A1)' });
    const file = (endpoint: typeof readJournalList | typeof readJournalWorkbook) =>
      api
        .as('office')
        .call(endpoint, { query: wide })
        .buffer(true)
        .parse(binary as never);
    const csv = ((await file(readJournalList)).body as Buffer).toString('utf8');
    const rows = csv
      .replace(/^\ufeff/, '')
      .trim()
      .split('\r\n');
    expect(csv).toContain('"\'=HYPERLINK');
    expect(csv).toContain("'@SUM");
    const amounts = rows.map((row) => [row, Number(/(-?[\d.]+)$/.exec(row)?.[1])] as const).slice(1);
    const entries = amounts.filter(([row]) => /^\d{4}-/.test(row));
    const cents = (list: readonly (readonly [string, number])[]) =>
      list.reduce((sum, [, amount]) => sum + Math.round(amount * 100), 0);
    expect(cents(amounts.slice(-1))).toBe(cents(entries));
    const workbook = new Workbook();
    await workbook.xlsx.load((await file(readJournalWorkbook)).body as never);
    const [sheet] = workbook.worksheets;
    const last = sheet.getRow(sheet.rowCount).getCell(sheet.columnCount).value as { formula: string; result: number };
    expect(last.formula).toMatch(/^SUM\(/);
    expect(Math.round(last.result * 100)).toBe(cents(entries));
  });

  it('is reminded of by mail once it is overdue, and not before', async () => {
    const sample = await sampleInvoice(api.ours);
    const remind = () =>
      api
        .as('office')
        .call(remindOfInvoice, { params: { invoiceId: sample.invoiceId }, body: { note: '' }, key: randomUUID() });
    expect(typeOf(await remind())).toBe('urn:problem:reminder-not-due');
    const days = 15 * 24 * 60;
    api.clock.move({ minutes: days });
    const { reading } = api.app.invoices;
    const actor = api.ours.people.office.actor;
    const later = await reading.get(api.ours.id, sample.invoiceId);
    expect(later.isOverdue).toBe(true);
    const fresh = await api.newcomer(api.ours, 'office');
    const sent = await fresh.visitor.call(remindOfInvoice, {
      params: { invoiceId: sample.invoiceId },
      body: { note: 'Kindly' },
      key: randomUUID(),
    });
    expect([sent.status, actor.workshopId]).toEqual([204, api.ours.id]);
    const [mail] = await api.mails();
    api.clock.move({ minutes: -days });
    expect(mail.headers).toContain('is still open');
    expect(mail.text).toContain('Kindly');
    expect(mail.html).toContain('Kindly');
    expect(mail.enclosures.map(({ media }) => media)).toEqual(['application/pdf', 'application/xml']);
    // 100.00 and 20 % of tax, nothing of it paid.
    const told = { kind: 'reminder', email: 'office@museum.example', open_minor: 12_000 };
    expect((await readBack(api.ours, sample.invoiceId)).letters).toMatchObject([told]);
  });

  it('is mailed to the address that is known by now where none stood on it, and warns while none is known', async () => {
    const clientId = await enterClient(api.as('owner'), clientNamed(`Herons ${randomUUID()}`, { email: '' }));
    const { buyer } = sampleContent('Herons', clientId);
    const draft = await sampleDraft(api.ours, { clientId, buyer: { ...buyer, email: '' } });
    const warned = await readBack(api.ours, draft.invoiceId);
    expect(warned.findings).toMatchObject([{ kind: 'warn', code: 'invoice-buyer-email' }]);
    const { id: invoiceId } = await issued(api.ours, draft.invoiceId);
    const send = () =>
      api.as('office').call(sendInvoice, { params: { invoiceId }, body: { note: '' }, key: randomUUID() });
    expect(typeOf(await send())).toBe('urn:problem:letter-no-address');
    await api.platform.database.execute('UPDATE clients SET email = :email WHERE id = :clientId', {
      ...{ clientId, email: 'found@later.example' },
    });
    expect((await send()).status).toBe(204);
    expect((await api.mails())[0].headers).toMatch(/^To: .*found@later\.example/m);
    const { mailsTo, letters } = await readBack(api.ours, invoiceId);
    expect(mailsTo).toBe('found@later.example');
    expect(letters).toMatchObject([{ kind: 'paper', email: 'found@later.example', open_minor: 12_000 }]);
  });

  it('goes to the client as a statement by mail, the same paper enclosed', async () => {
    const { clientId } = await sampleInvoice(api.ours);
    const days = { from: wide.from, to: '2099-12-31' };
    const send = (body: object) =>
      api.as('office').call(sendStatement, { params: { clientId }, body: { note: '', ...body }, key: randomUUID() });
    expect((await send({ from: days.to, to: days.from })).status).toBe(400);
    expect((await send({ ...days, note: 'For your books' })).status).toBe(204);
    const [mail] = await api.mails();
    expect(mail.headers).toMatch(/^Subject: Herons.*: what is open/m);
    for (const written of [mail.text, mail.html]) {
      expect(written).toContain('120.00');
      expect(written).toContain('For your books');
      // What is open is said of today, not of a day to come.
      expect(written).not.toContain('2099');
    }
    expect(mail.enclosures).toMatchObject([{ media: 'application/pdf' }]);
    expect(mail.enclosures[0].size_bytes).toBeGreaterThan(2_000);
  });
});
