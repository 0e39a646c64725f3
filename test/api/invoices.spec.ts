import { randomUUID } from 'node:crypto';
import { createHash } from 'node:crypto';
import { gunzipSync } from 'node:zlib';
import { v7 as newId } from 'uuid';
import {
  beginStageInvoice,
  readContractAccount,
  type ContractAccountAnswer,
} from '#shared/invoices/contract-account-endpoints';
import {
  issueInvoice,
  keepInvoice,
  keepInvoiceSettings,
  listInvoices,
  readInvoicePaper,
  removeInvoice,
  sendInvoice,
} from '#shared/invoices/invoices-endpoints';
import { acceptIssue } from '#shared/client-page/client-issues-endpoints';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { startInvoiceSettings } from '#shared/invoices/invoice-settings';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { stagePayments } from '#shared/money/stage-payments';
import { textAt, ublFaults, ublRoot } from '../reference/ubl-check';
import { keepLetterTemplate } from '#shared/agreements/letters-endpoints';
import { contractFaults, ledgerFaults } from './ledger';
import { acceptanceOf, acceptedIssue, clientOf, issueOf } from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import {
  creditDraft,
  issued,
  readBack,
  sampleContent,
  sampleDraft,
  sampleInvoice,
  sampleLine,
  sayWho,
  stageInvoice,
} from './sample-invoice';
import { startApi, type Api } from './start-api';

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterEach(async () => expect(await ledgerFaults(api.platform.database)).toEqual([]));
afterAll(() => api.stop());

const owner = () => api.ours.people.owner;
const binary = (response: NodeJS.ReadableStream, done: (error: Error | null, body: Buffer) => void): void => {
  const parts: Buffer[] = [];
  response.on('data', (part: Buffer) => parts.push(part));
  response.on('end', () => done(null, Buffer.concat(parts)));
};
const paperOf = async (invoiceId: string, paper: string): Promise<Buffer> => {
  const call = api.as('office').call(readInvoicePaper, { params: { invoiceId, paper } });
  return (await call.buffer(true).parse(binary as never)).body as Buffer;
};
const issue = (invoiceId: string, version = 1, key = randomUUID()) =>
  api.as('office').call(issueInvoice, { params: { invoiceId }, body: { version }, key });
const codes = (body: unknown): string => JSON.stringify(body);

describe('a draft', () => {
  it('is worked as it would be issued, and says what is missing', async () => {
    const { invoiceId } = await sampleDraft(api.ours, {
      lines: [sampleLine({ tax: { code: 'E', percent: '0' } }) as never],
    });
    const draft = await readBack(api.ours, invoiceId);
    expect(draft).toMatchObject({ state: 'draft', number: null, net_minor: 10_000, due_minor: 10_000, open_minor: 0 });
    expect(draft.findings.map(({ code }) => code)).toContain('invoice-exemption-missing');
    const refused = await issue(invoiceId);
    expect(refused.status).toBe(409);
    expect(codes(refused.body)).toContain('say why');
  });

  it('keeps both sides when two change it: the second is shown what stands there', async () => {
    const { invoiceId, clientId } = await sampleDraft(api.ours);
    const keep = (note: string) =>
      api
        .as('office')
        .call(keepInvoice, { params: { invoiceId }, version: 1, body: sampleContent('Herons', clientId, { note }) });
    expect((await keep('first')).status).toBe(200);
    const late = await keep('second');
    expect(late.status).toBe(412);
    expect(late.body).toMatchObject({ current: { version: 2 } });
  });

  it('goes only for the version that was seen', async () => {
    const { invoiceId } = await sampleDraft(api.ours);
    expect((await issue(invoiceId, 2)).status).toBe(412);
  });

  it.each([
    ['a quantity of nothing', { quantity: '0' }],
    ['a quantity of 40 digits', { quantity: '1234567890123456789012345678901234567890' }],
    ['a price below nothing', { price: '-1' }],
    ['a price as a figure', { price: 1.5 }],
    ['a rate over 100 %', { tax: { code: 'S', percent: '101' } }],
    [
      'a discount over 100 %',
      {
        allowancesCharges: [
          {
            charge: false,
            reason: 'Off',
            reasonCode: null,
            amount: { way: 'percent', base_minor: 100, percent: '101' },
          },
        ],
      },
    ],
    ['a unit that is a cigarette', { unit: 'STK' }],
  ])('refuses %s', async (_what, more) => {
    const { invoiceId, clientId } = await sampleDraft(api.ours);
    const body = sampleContent('Herons', clientId, { lines: [sampleLine(more as never) as never] });
    expect((await api.as('office').call(keepInvoice, { params: { invoiceId }, version: 1, body })).status).toBe(400);
  });

  it('refuses amounts beyond what is counted exactly, in words', async () => {
    const { invoiceId, clientId } = await sampleDraft(api.ours);
    const lines = [sampleLine({ quantity: '9999999', price: '999999999' }) as never];
    const response = await api
      .as('office')
      .call(keepInvoice, { params: { invoiceId }, version: 1, body: sampleContent('Herons', clientId, { lines }) });
    expect(response.status).toBe(400);
    expect(response.body).toMatchObject({ type: 'urn:problem:invoice-too-large' });
  });
});

describe('an issued invoice', () => {
  it('bears its number, is frozen under its SHA-256, and its papers say the same to the cent', async () => {
    const { invoiceId } = await sampleDraft(api.ours, {
      lines: [sampleLine({ quantity: '3', price: '33.335' }) as never, sampleLine({ price: '1.005' }) as never],
    });
    const invoice = await issued(api.ours, invoiceId);
    expect(invoice.number).toMatch(/^\d{4}-\d{4}$/);
    const [row] = await api.platform.database.select<{ snapshot: Buffer; sha256: string; due: number }>(
      'SELECT snapshot, sha256, due_minor AS due FROM invoices WHERE id = :invoiceId',
      { invoiceId },
    );
    expect(createHash('sha256').update(gunzipSync(row.snapshot)).digest('hex')).toBe(invoice.sha256);
    const xml = (await paperOf(invoiceId, 'invoice.xml')).toString('utf8');
    expect(ublFaults(xml)).toEqual([]);
    expect(textAt(ublRoot(xml), 'LegalMonetaryTotal/PayableAmount')).toBe('121.22');
    expect(row.due).toBe(121_22);
    const pdf = await paperOf(invoiceId, 'invoice.pdf');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pdf.toString('latin1')).toContain('/AFRelationship /Alternative');
  });

  it('stays as it is: no change, no removal, no second issue, neither here nor in the database', async () => {
    const { invoiceId, clientId } = await sampleInvoice(api.ours);
    const { version } = await readBack(api.ours, invoiceId);
    const edited = await api
      .as('owner')
      .call(keepInvoice, { params: { invoiceId }, version, body: sampleContent('Herons', clientId) });
    const removed = await api.as('owner').call(removeInvoice, { params: { invoiceId }, version });
    expect([edited.status, removed.status, (await issue(invoiceId, version)).status]).toEqual([409, 409, 409]);
    for (const statement of [
      'UPDATE invoices SET due_minor = 1 WHERE id = :invoiceId',
      'DELETE FROM invoices WHERE id = :invoiceId',
    ])
      await expect(api.platform.database.execute(statement, { invoiceId })).rejects.toThrow();
  });

  it('answers the same key with the same invoice, and another body under it with 422', async () => {
    const { invoiceId } = await sampleDraft(api.ours);
    const key = randomUUID();
    const first = await issue(invoiceId, 1, key);
    expect(first.status).toBe(200);
    expect((await issue(invoiceId, 1, key)).text).toBe(first.text);
    expect((await issue(invoiceId, 2, key)).status).toBe(422);
  });

  it('goes out by mail with both papers', async () => {
    const { invoiceId } = await sampleInvoice(api.ours);
    const sent = await api
      .as('office')
      .call(sendInvoice, { params: { invoiceId }, body: { note: 'With thanks {{7*7}}' }, key: randomUUID() });
    expect(sent.status).toBe(204);
    const [mail] = await api.mails();
    expect(mail.headers).toMatch(/^Subject: Herons.*: invoice \d{4}-\d{4}/m);
    for (const written of [mail.text, mail.html]) {
      expect(written).toContain('With thanks {{7*7}}');
      expect(written).toContain('120.00');
      expect(written).toContain('/client/sign-in');
    }
    expect(mail.enclosures.map(({ media }) => media)).toEqual(['application/pdf', 'application/xml']);
  });

  it('goes out in the words of the workshop, where it has its own; a credit note has others', async () => {
    const words = {
      kind: 'invoice',
      subject: 'Our account {number}',
      text: 'To {client}, about {job}: {total}, by {day}. {note}',
    };
    const keep = { body: words, version: 0 };
    expect((await api.as('owner').call(keepLetterTemplate, keep)).status).toBe(200);
    const { invoiceId } = await sampleInvoice(api.ours);
    const note = await issued(api.ours, (await creditDraft(api.ours, invoiceId)).id);
    const send = (id: string) =>
      api
        .as('office')
        .call(sendInvoice, { params: { invoiceId: id }, body: { note: '<b>Soon</b>' }, key: randomUUID() });
    expect((await send(invoiceId)).status).toBe(204);
    const [own] = await api.mails();
    expect(own.headers).toMatch(/^Subject: Our account \d{4}-\d{4}/m);
    expect(own.text).toMatch(/about work done for you: .*120\.00, by .+ \d{4}\. <b>Soon<\/b>/);
    expect(own.html).toContain('&lt;b&gt;Soon&lt;/b&gt;');
    expect((await send(note.id)).status).toBe(204);
    const [usual] = await api.mails();
    expect(usual.headers).toMatch(/^Subject: Herons.*: credit note C\d{4}-\d{4}/m);
  });

  it('in a currency of three decimals goes out as a PDF alone, and says so before', async () => {
    const { invoiceId } = await sampleDraft(api.ours);
    await api.platform.database.execute("UPDATE invoices SET currency = 'KWD' WHERE id = :invoiceId", { invoiceId });
    expect((await readBack(api.ours, invoiceId)).findings.map(({ code }) => code)).toContain(
      'invoice-currency-no-data',
    );
    expect((await issued(api.ours, invoiceId)).papers).toEqual(['invoice.pdf']);
  });
});

describe('a credit note', () => {
  it('gives back what is open first, and never more than is left', async () => {
    const { invoiceId } = await sampleInvoice(api.ours);
    const note = await creditDraft(api.ours, invoiceId);
    const again = await creditDraft(api.ours, invoiceId);
    expect((await issued(api.ours, note.id)).number).toMatch(/^C\d{4}-\d{4}$/);
    expect(await readBack(api.ours, invoiceId)).toMatchObject({
      open_minor: 0,
      credited_minor: 12_000,
      due_minor: 12_000,
    });
    const over = await issue(again.id);
    expect(over.status).toBe(409);
    expect(over.body).toMatchObject({ type: 'urn:problem:invoice-credit-nothing' });
    const xml = (await paperOf(note.id, 'invoice.xml')).toString('utf8');
    expect(ublFaults(xml)).toEqual([]);
    expect(ublRoot(xml).localName).toBe('CreditNote');
  });

  it('over more than the invoice is refused, over part of it is not', async () => {
    const { invoiceId, clientId } = await sampleInvoice(api.ours);
    const note = await creditDraft(api.ours, invoiceId);
    const keep = (version: number, price: string) =>
      api.as('office').call(keepInvoice, {
        params: { invoiceId: note.id },
        version,
        body: sampleContent('Herons', clientId, { lines: [sampleLine({ price }) as never], terms: 'Set off' }),
      });
    expect((await keep(1, '100.01')).status).toBe(200);
    expect((await issue(note.id, 2)).body).toMatchObject({ type: 'urn:problem:invoice-credit-over' });
    expect((await keep(2, '40.00')).status).toBe(200);
    expect((await issue(note.id, 3)).status).toBe(200);
    expect(await readBack(api.ours, invoiceId)).toMatchObject({ open_minor: 7_200, credited_minor: 4_800 });
  });
});

describe('invoices of a contract', () => {
  const account = async (jobId: string): Promise<ContractAccountAnswer> => {
    const response = await api.as('office').call(readContractAccount, { params: { jobId } });
    return (response.body as { contract: ContractAccountAnswer }).contract;
  };

  it('come to the contract to the cent, whatever was valued, credited and invoiced anew', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const work = (from_percent: string, to_percent: string): StageClaim => ({ of: 'work', from_percent, to_percent });
    const first = await stageInvoice(api.ours, { jobId, issueId }, work('0', '33.333'));
    await issued(api.ours, (await creditDraft(api.ours, first.id)).id);
    await stageInvoice(api.ours, { jobId, issueId }, work('0', '20'));
    for (let step = 0; step < 20; step += 1) {
      const [next] = (await account(jobId)).parts[0].next;
      if (!next) break;
      await stageInvoice(api.ours, { jobId, issueId }, next.claim);
    }
    const done = await account(jobId);
    expect(done.parts[0]).toMatchObject({ isComplete: true, left_minor: 0 });
    expect(done.invoiced_minor - done.credited_minor).toBe(done.gross_minor);
    expect(await contractFaults(api.app, api.platform.database)).toEqual([]);
  });

  it('that were a cent off would be seen by the law of the books', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const { database } = api.platform;
    const { account: read } = api.app.invoices.stages;
    const planted = { ...(await account(jobId)) };
    const [part] = planted.parts;
    api.app.invoices.stages.account = async (workshopId, asked) =>
      asked === jobId
        ? { ...planted, parts: [{ ...part, left_minor: part.left_minor - 1, next: [] }] }
        : read.call(api.app.invoices.stages, workshopId, asked);
    try {
      const faults = await contractFaults(api.app, database);
      expect(faults).toEqual([
        `of ${issueId} ${part.gross_minor} is left, not ${part.gross_minor - 1}`,
        `all of ${issueId} is invoiced, but for ${part.gross_minor}`,
        `${issueId} is not called complete`,
      ]);
    } finally {
      api.app.invoices.stages.account = read;
    }
    expect(await contractFaults(api.app, database)).toEqual([]);
  });

  it('whose plan would not come to the whole are seen as well', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const { contracts } = api.app.agreements;
    const read = contracts.contract.bind(contracts);
    contracts.contract = async (workshopId, asked) => {
      const contract = await read(workshopId, asked);
      if (!contract || asked !== jobId) return contract;
      const parts = contract.parts.map((part) => ({ ...part, plan: { ...part.plan, stages_percent: [40, 59] } }));
      return { ...contract, parts };
    };
    const faults = await contractFaults(api.app, api.platform.database).finally(() => (contracts.contract = read));
    expect(faults).toEqual([expect.stringMatching(new RegExp(`^the plan of ${issueId} comes to \\d+, not \\d+$`))]);
  });

  it('fall due as the review promised, and bear the reason why nothing is charged that was frozen with the issue', async () => {
    const sample = await sampleEstimate(api.ours);
    const { estimateId, jobId } = sample;
    const { settings } = (await api.app.estimates.drafts.whole(api.ours.id, estimateId)).estimate;
    const stages = { ...settings.stages, deposit_percent: 30, retention_percent: 5 };
    const content = { ...settings, stages, taxCategoryId: 'exempt' };
    const changes = [{ kind: 'settings', id: estimateId, version: 1, content }];
    expect(
      (await owner().visitor.call(changeEstimate, { params: { estimateId }, body: { changes } })).status,
    ).toBeLessThan(300);
    const issueId = await issueOf(api.ours, api, estimateId);
    const visitor = await clientOf(api.ours, api, issueId);
    const acceptance = await acceptanceOf(visitor, issueId);
    expect((await visitor.call(acceptIssue, acceptance)).status).toBeLessThan(300);
    const { gross_minor } = acceptance.body as { gross_minor: number };
    const promised = stagePayments(gross_minor, {
      ...{ deposit_percent: 30, retention_percent: 5 },
      stages_percent: stages.parts.length > 0 ? stages.parts.map(({ percent }) => percent) : [100],
    });
    const offered = (await account(jobId)).parts[0].next;
    const due = [];
    for (const { claim } of offered) {
      const invoice = await stageInvoice(api.ours, { jobId, issueId }, claim);
      expect(invoice.content.exemptions).toEqual([{ code: 'E', reasonCode: '', reason: 'Exempt from VAT' }]);
      due.push(invoice.due_minor);
    }
    expect(due).toEqual([promised.deposit_minor, ...promised.stages.map(({ paid_minor }) => paid_minor)]);
  });

  it('are claimed once by fifty who do so at the same moment', async () => {
    await sayWho(api.ours);
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const claim = { of: 'work', from_percent: '0', to_percent: '50' };
    const begin = () =>
      api.as('office').call(beginStageInvoice, { params: { jobId }, body: { invoiceId: newId(), issueId, claim } });
    const answers = await Promise.all(Array.from({ length: 50 }, begin));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    expect(answers.filter(({ status }) => status !== 200 && status !== 409)).toEqual([]);
  }, 120_000);

  it('keep their amounts; only words may be changed', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const invoiceId = newId();
    const claim = { of: 'work', from_percent: '0', to_percent: '50' };
    const begun = await api
      .as('office')
      .call(beginStageInvoice, { params: { jobId }, body: { invoiceId, issueId, claim } });
    const { content } = begun.body as { content: ReturnType<typeof sampleContent> };
    const keep = (version: number, line: object) =>
      api.as('office').call(keepInvoice, {
        params: { invoiceId },
        version,
        body: { ...content, lines: [{ ...content.lines[0], ...line }, ...content.lines.slice(1)] },
      });
    expect((await keep(1, { name: 'The first half' })).status).toBe(200);
    expect((await keep(2, { price: '1.00' })).body).toMatchObject({ type: 'urn:problem:invoice-stage-lines' });
  });
});

describe('numbers', () => {
  const inTransaction = <T>(work: () => Promise<T>) => api.platform.database.transaction(work);

  it('have neither gap nor double: fifty issued at once, a tenth of them undone', async () => {
    await sayWho(api.ours);
    const drafts = await Promise.all(Array.from({ length: 50 }, () => sampleDraft(api.ours)));
    const before = await api.platform.database.select<{ count: number }>(
      "SELECT COUNT(*) AS count FROM invoices WHERE kind = 'invoice' AND state = 'issued' AND workshop_id = :id",
      { id: api.ours.id },
    );
    const { issuing } = api.app.invoices;
    const issueIt = issuing.issue.bind(issuing);
    const undone = new Set(drafts.filter((_, at) => at % 10 === 3).map(({ invoiceId }) => invoiceId));
    issuing.issue = async (actor, invoiceId, version) => {
      const row = await issueIt(actor, invoiceId, version);
      if (undone.has(invoiceId)) throw new Error('undone');
      return row;
    };
    const answers = await Promise.all(drafts.map(({ invoiceId }) => issue(invoiceId)));
    issuing.issue = issueIt;
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(45);
    expect(answers.filter(({ status }) => status === 500)).toHaveLength(5);
    const rows = await api.platform.database.select<{ ordinal: number }>(
      "SELECT ordinal FROM invoices WHERE kind = 'invoice' AND state = 'issued' AND workshop_id = :id ORDER BY ordinal",
      { id: api.ours.id },
    );
    expect(rows).toHaveLength(Number(before[0].count) + 45);
    expect(rows.map(({ ordinal }) => ordinal)).toEqual(rows.map((_, place) => place + 1));
  }, 180_000);

  it('are taken once of fifty who issue one draft', async () => {
    const { invoiceId } = await sampleDraft(api.ours);
    const answers = await Promise.all(Array.from({ length: 50 }, () => issue(invoiceId)));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    expect(answers.filter(({ status }) => status !== 200 && status !== 409)).toEqual([]);
  }, 120_000);

  it('begin anew with the year of the workshop’s own zone, at midnight there', async () => {
    const at = async (instant: string) => {
      const { invoiceId } = await sampleDraft(api.theirs);
      const seconds = Math.round((Date.parse(instant) - api.clock.now().getTime()) / 1_000);
      api.clock.move({ seconds });
      const row = await inTransaction(() =>
        api.app.invoices.issuing.issue(api.theirs.people.owner.actor, invoiceId, 1),
      );
      api.clock.move({ seconds: -seconds });
      return [row.number, row.issuedOn];
    };
    // Europe/Vienna is an hour before UTC in winter.
    expect(await at('2031-12-31T22:59:58.500Z')).toEqual(['2031-0001', '2031-12-31']);
    expect(await at('2031-12-31T23:00:00.500Z')).toEqual(['2032-0001', '2032-01-01']);
    expect(await at('2031-12-31T22:59:57.500Z')).toEqual(['2031-0002', '2031-12-31']);
  });

  it('go on where a workshop was, in the year it began here', async () => {
    const year = new Date(api.clock.now()).getUTCFullYear();
    const theirs = api.theirs.people.owner.visitor;
    await sayWho(api.theirs);
    const { version } = await api.app.invoices.settings.read(api.theirs.id);
    const seller = { vatId: 'ATU87654321', taxNumber: '', companyNumber: 'FN 1' };
    const body = {
      ...startInvoiceSettings({ name: 'K', taxRegistration: '' }),
      seller,
      begins: { year, invoice: 118, creditNote: 7 },
    };
    expect((await theirs.call(keepInvoiceSettings, { version, body })).status).toBe(200);
    const { invoiceId } = await sampleInvoice(api.theirs);
    expect((await readBack(api.theirs, invoiceId)).number).toBe(`${year}-0118`);
  });
});

describe('issuing is all or nothing', () => {
  /** What the books hold of a draft and its number, whole. */
  const stateOf = async (invoiceId: string): Promise<string> => {
    const values = { invoiceId, id: api.ours.id };
    const parts = await Promise.all([
      api.platform.database.select('SELECT * FROM invoices WHERE id = :invoiceId', values),
      api.platform.database.select('SELECT * FROM counters WHERE workshop_id = :id ORDER BY series, year', values),
      api.platform.database.select('SELECT COUNT(*) AS files FROM files WHERE workshop_id = :id', values),
      api.platform.database.select('SELECT COUNT(*) AS entries FROM audit WHERE workshop_id = :id', values),
      api.platform.database.select(
        'SELECT SUM(open_minor) AS open, SUM(credited_minor) AS credited FROM invoices WHERE workshop_id = :id',
        values,
      ),
    ]);
    return JSON.stringify(parts);
  };

  it.each(['an invoice', 'a credit note'])(
    'whatever statement of issuing %s is the last one done',
    async (what) => {
      const draft =
        what === 'an invoice'
          ? (await sampleDraft(api.ours)).invoiceId
          : (await creditDraft(api.ours, (await sampleInvoice(api.ours)).invoiceId)).id;
      const { sequelize } = api.platform.database;
      const query = sequelize.query.bind(sequelize) as (...parts: unknown[]) => Promise<unknown>;
      const before = await stateOf(draft);
      let isDone = false;
      let last = 0;
      while (!isDone) {
        last += 1;
        let count = 0;
        sequelize.query = (async (...parts: unknown[]) => {
          const answer = await query(...parts);
          const isEnd = /^(COMMIT|ROLLBACK)/.test(String(parts[0]));
          if (!isEnd && ++count === last) throw new Error('a fault of the test');
          return answer;
        }) as typeof sequelize.query;
        const work = () =>
          api.platform.database.transaction(() => api.app.invoices.issuing.issue(owner().actor, draft, 1));
        isDone = await work().then(
          () => true,
          () => false,
        );
        sequelize.query = query as typeof sequelize.query;
        if (!isDone) expect(await stateOf(draft)).toBe(before);
      }
      expect(last).toBeGreaterThan(15);
      expect(await readBack(api.ours, draft)).toMatchObject({ state: 'issued' });
    },
    180_000,
  );
});

test('another workshop’s invoices are not in the list, nor found by their client', async () => {
  const { clientId } = await sampleInvoice(api.theirs);
  const response = await api.as('office').call(listInvoices, { query: { clientId } });
  expect(response.body).toMatchObject({ items: [], count: 0 });
});
