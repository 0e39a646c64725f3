import { createHash, randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import { v7 as newId } from 'uuid';
import { beginVariation, readAcceptedPaper, readAgreement } from '#shared/agreements/agreement-endpoints';
import type { Contract } from '#shared/agreements/contract';
import {
  keepLetterTemplate,
  listGivenUpLetters,
  listLetterTemplates,
  previewLetter,
  resetLetterTemplate,
  sendLetterAgain,
} from '#shared/agreements/letters-endpoints';
import { acceptIssue, declineIssue, readClientIssue } from '#shared/client-page/client-issues-endpoints';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { markIssue } from '#shared/estimates/issues-endpoints';
import { listHistory } from '#shared/audit/history-endpoints';
import {
  acceptanceOf,
  acceptedIssue,
  clientOf,
  issueOf,
  sampleChoices,
  sampleIssue,
  type SampleIssue,
} from './sample-client-visit';
import { password, startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const titleOf = (response: Response): string => (response.body as { title: string }).title;
const typeOf = (response: Response): string => (response.body as { type: string }).type;
const today = () => api.app.rateCards.service.today(api.ours.id);
const accept = async (visitor: Visitor, issueId: string, choice: readonly string[] = []) =>
  visitor.call(acceptIssue, await acceptanceOf(visitor, issueId, choice));
const decline = (visitor: Visitor, issueId: string) =>
  visitor.call(declineIssue, { params: { issueId }, body: { reason: 'We wait a year.' } });
const pageOf = async (visitor: Visitor, issueId: string): Promise<ClientIssue> =>
  (await visitor.call(readClientIssue, { params: { issueId } })).body as ClientIssue;
const mark = async (issueId: string, state: string) =>
  api.as('office').call(markIssue, { params: { issueId }, body: { state, day: await today(), note: '' } });
const decisionsOf = (jobId: string) => api.app.agreements.contracts.decisions(api.ours.id, jobId);
const contractOf = (jobId: string) => api.app.agreements.contracts.contract(api.ours.id, jobId);
const stateOf = async ({ estimateId, issueId }: SampleIssue) =>
  (await api.app.estimates.issues.ofEstimate(api.ours.id, estimateId)).find(({ id }) => id === issueId)?.state;

describe('Accepting', () => {
  it('keeps the name, the time, the choice and the exact paper; the job follows; the paper goes to both sides', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId, [sample.crate, sample.oil]);
    const response = await visitor.call(acceptIssue, parts);
    const { gross_minor, pdfSha256 } = parts.body as { gross_minor: number; pdfSha256: string };
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({
      ...{ kind: 'accepted', typedName: 'Helena Marsh', gross_minor, pdfSha256 },
      choice: [sample.oil, sample.crate],
    });
    expect(await stateOf(sample)).toBe('accepted');
    const job = await api.app.jobs.job(api.ours.id, sample.jobId);
    expect(job.state).toBe('accepted');
    const [decision] = await decisionsOf(sample.jobId);
    const paper = await api.as('office').call(readAcceptedPaper, { params: { decisionId: decision.id } });
    expect(
      createHash('sha256')
        .update(paper.body as Buffer)
        .digest('hex'),
    ).toBe(pdfSha256);
    const { email } = await api.app.jobs.client(api.ours.id, job.clientId);
    const mails = (await api.mails()).filter(({ enclosures }) => enclosures.some((one) => one.sha256 === pdfSha256));
    const readers = mails.map(({ headers }) => /^To: .*<(.*)>/m.exec(headers)?.[1]).sort();
    expect(readers).toEqual([email, api.ours.people.owner.email].sort());
    expect((await pageOf(visitor, sample.issueId)).decision).toMatchObject({ kind: 'accepted', pdfSha256 });
    const { body } = await api.as('office').call(readAgreement, { params: { jobId: sample.jobId } });
    const [told] = (body as { decisions: { number: string; alternatives: string[] }[] }).decisions;
    expect(told.number).toMatch(/-1, issue A$/);
    expect(told.alternatives).toHaveLength(2);
  });

  it('shows in the history of the job by the client’s name and nobody’s account', async () => {
    const { jobId } = await acceptedIssue(api.ours, api);
    const response = await api.as('owner').call(listHistory, { query: { jobId, limit: 100 } });
    const { items } = response.body as { items: { code: string; name: string; accountId: string | null }[] };
    const { clientName } = await api.app.jobs.job(api.ours.id, jobId);
    const accepted = items.find(({ code }) => code === 'history-issue-accepted');
    expect(accepted).toMatchObject({ name: clientName, accountId: null });
  });

  it.each([
    ['another price', { gross_minor: 1 }, 409],
    ['another paper', { pdfSha256: 'a'.repeat(64) }, 409],
    ['no tick', { agrees: false }, 400],
    ['no name', { typedName: '  ' }, 400],
  ])('is refused with %s', async (_, changed, status) => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId);
    const response = await visitor.call(acceptIssue, { ...parts, body: { ...(parts.body as object), ...changed } });
    expect(response.status).toBe(status);
    expect(await decisionsOf(sample.jobId)).toEqual([]);
    expect(await stateOf(sample)).toBe('issued');
  });

  it('is refused with the price and paper of another choice', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId, [sample.oil]);
    const body = { ...(parts.body as object), choice: [sample.silver] };
    expect(typeOf(await visitor.call(acceptIssue, { ...parts, body }))).toContain('decision-changed');
  });

  it('of a double click is one decision with one answer; the same key with another body is refused', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId);
    const first = await visitor.call(acceptIssue, parts);
    const again = await visitor.call(acceptIssue, parts);
    expect([first.status, again.status]).toEqual([200, 200]);
    expect(again.body).toEqual(first.body);
    const body = { ...(parts.body as object), typedName: 'Somebody Else' };
    expect((await visitor.call(acceptIssue, { ...parts, body })).status).toBe(422);
    expect(await decisionsOf(sample.jobId)).toHaveLength(1);
  });

  it('of fifty at once is exactly one decision', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId, [sample.oil]);
    const responses = await Promise.all(
      Array.from({ length: 50 }, () => visitor.call(acceptIssue, { ...parts, key: randomUUID() })),
    );
    const statuses = responses.map(({ status }) => status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(1);
    expect(statuses.filter((status) => status === 409)).toHaveLength(49);
    expect(await decisionsOf(sample.jobId)).toHaveLength(1);
  }, 120_000);

  it('happens wholly or not at all, wherever it is cut off', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId);
    const { sequelize } = api.platform.database;
    const query = sequelize.query.bind(sequelize);
    const tasks = async () => (await api.platform.database.select('SELECT id FROM tasks')).length;
    await api.mails();
    let reached = 0;
    let isDone = false;
    for (let failing = 1; !isDone; failing++) {
      reached = 0;
      sequelize.query = ((...asked: Parameters<typeof query>) => {
        reached += 1;
        return reached === failing ? Promise.reject(new Error('cut off')) : query(...asked);
      }) as typeof sequelize.query;
      const response = await visitor.call(acceptIssue, { ...parts, key: randomUUID() });
      sequelize.query = query;
      isDone = response.status === 200;
      expect(await decisionsOf(sample.jobId)).toHaveLength(isDone ? 1 : 0);
      expect(await stateOf(sample)).toBe(isDone ? 'accepted' : 'issued');
      expect((await api.app.jobs.job(api.ours.id, sample.jobId)).state).toBe(isDone ? 'accepted' : 'open');
      expect(await tasks()).toBe(isDone ? 2 : 0);
    }
    expect(reached).toBeGreaterThan(15);
  }, 120_000);

  it('cannot be altered afterwards, not even in the database', async () => {
    const { jobId } = await acceptedIssue(api.ours, api);
    const [{ id }] = await decisionsOf(jobId);
    const { database } = api.platform;
    await expect(database.execute('UPDATE decisions SET gross_minor = 1 WHERE id = :id', { id })).rejects.toThrow(
      'stays as it was made',
    );
    await expect(database.execute('DELETE FROM decisions WHERE id = :id', { id })).rejects.toThrow('is kept');
  });
});

describe('An issue that stands otherwise', () => {
  const states: [string, (sample: SampleIssue, visitor: Visitor) => Promise<unknown>, string][] = [
    ['accepted', (sample, visitor) => accept(visitor, sample.issueId), 'decision-made'],
    ['accepted by hand', (sample) => mark(sample.issueId, 'accepted'), 'decision-made'],
    ['declined', (sample, visitor) => decline(visitor, sample.issueId), 'decision-made'],
    ['replaced by a later issue', (sample) => issueOf(api.ours, api, sample.estimateId), 'decision-replaced'],
  ];

  it.each(states)('%s can be neither accepted nor declined, and says why', async (_, bring, code) => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const parts = await acceptanceOf(visitor, sample.issueId);
    await bring(sample, visitor);
    const before = await decisionsOf(sample.jobId);
    for (const response of [
      await visitor.call(acceptIssue, { ...parts, key: randomUUID() }),
      await decline(visitor, sample.issueId),
    ]) {
      expect(response.status).toBe(409);
      expect(typeOf(response)).toContain(code);
      expect(titleOf(response).length).toBeGreaterThan(20);
    }
    expect(await decisionsOf(sample.jobId)).toEqual(before);
  });

  it('past its last day cannot be accepted, on the last day it can', async () => {
    const own = await startApi();
    try {
      const [last, past] = [await sampleIssue(own.ours, own), await sampleIssue(own.ours, own)];
      const ask = async (sample: SampleIssue) => {
        const visitor = await clientOf(own.ours, own, sample.issueId);
        return visitor.call(acceptIssue, await acceptanceOf(visitor, sample.issueId));
      };
      const [{ validUntil }] = await own.app.estimates.issues.ofEstimate(own.ours.id, last.estimateId);
      const noon = Date.parse(`${validUntil}T11:00:00Z`);
      own.clock.move({ minutes: Math.round((noon - own.clock.now().getTime()) / 60_000) });
      const again = async () => {
        const { visitor, email } = own.ours.people.owner;
        await visitor.arrive();
        await visitor.signIn(email, password);
      };
      await again();
      expect((await ask(last)).status).toBe(200);
      own.clock.move({ minutes: 24 * 60 });
      await again();
      const late = await ask(past);
      expect(late.status).toBe(409);
      expect(typeOf(late)).toContain('decision-past-validity');
    } finally {
      await own.stop();
    }
  }, 60_000);

  it('is not accepted beside another accepted issue of its estimate, by nobody', async () => {
    const sample = await acceptedIssue(api.ours, api);
    const later = await issueOf(api.ours, api, sample.estimateId);
    const response = await accept(sample.visitor, later);
    expect(typeOf(response)).toContain('decision-another-accepted');
    expect((await mark(later, 'accepted')).status).toBe(409);
    expect(await stateOf(sample)).toBe('accepted');
  });
});

describe('Declining', () => {
  it('keeps why, tells the workshop, and the job follows', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    expect((await decline(visitor, sample.issueId)).body).toMatchObject({
      kind: 'declined',
      reason: 'We wait a year.',
    });
    expect((await api.app.jobs.job(api.ours.id, sample.jobId)).state).toBe('declined');
    const [mail] = await api.mails();
    expect(mail.text).toContain('We wait a year.');
    expect(await contractOf(sample.jobId)).toBeUndefined();
  });
});

describe('The contract', () => {
  it('is the accepted issue as it was chosen, and the accepted variations after it', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    expect(await contractOf(sample.jobId)).toBeUndefined();
    const parts = await acceptanceOf(visitor, sample.issueId, [sample.crate]);
    await visitor.call(acceptIssue, parts);
    const { gross_minor } = parts.body as { gross_minor: number };
    const variationId = newId();
    const body = { id: variationId, title: 'Two more feet' };
    const begun = await api.as('estimator').call(beginVariation, { params: { jobId: sample.jobId }, body });
    expect(begun.body).toMatchObject({ kind: 'variation', title: 'Two more feet' });
    expect((await api.as('estimator').call(beginVariation, { params: { jobId: sample.jobId }, body })).status).toBe(
      200,
    );
    const { settings } = (await api.app.estimates.drafts.whole(api.ours.id, variationId)).estimate;
    const extra = {
      ...{ id: newId(), name: 'Two feet', taxCategoryId: settings.taxCategoryId, memberId: null, alternativeId: null },
      ...{ kind: 'price', price: '100.00' },
    };
    const changes = [{ kind: 'settings', id: variationId, version: 1, content: { ...settings, extras: [extra] } }];
    await api.as('estimator').call(changeEstimate, { params: { estimateId: variationId }, body: { changes } });
    const issueId = await issueOf(api.ours, api, variationId);
    expect((await pageOf(visitor, issueId)).issue).toMatchObject({ kind: 'variation', state: 'open' });
    expect((await accept(visitor, issueId)).status).toBe(200);
    const answer = await api.as('office').call(readAgreement, { params: { jobId: sample.jobId } });
    const { contract } = answer.body as { contract: Contract };
    expect(contract.parts.map(({ kind, gross_minor: gross }) => [kind, gross])).toEqual([
      ['estimate', gross_minor],
      // 100.00 and 20 % tax.
      ['variation', 12_000],
    ]);
    expect(contract.gross_minor).toBe(gross_minor + 12_000);
    expect(contract.parts[0]?.choice).toEqual([sample.crate]);
    for (const part of contract.parts) {
      expect(part.taxes.reduce((sum, { net_minor }) => sum + net_minor, 0)).toBe(part.net_minor);
      expect(part.taxes.reduce((sum, { tax_minor }) => sum + tax_minor, 0)).toBe(part.tax_minor);
      expect(part.plan.stages_percent.reduce<number>((sum, share) => sum + Number(share), 0)).toBe(100);
      expect(part.stageNames).toHaveLength(part.plan.stages_percent.length);
    }
    expect((await api.app.jobs.job(api.ours.id, sample.jobId)).state).toBe('accepted');
  });

  it('follows from the office’s own mark too: the base, as it was issued', async () => {
    const sample = await sampleChoices(api.ours, api);
    await mark(sample.issueId, 'accepted');
    const [issue] = await api.app.estimates.issues.ofEstimate(api.ours.id, sample.estimateId);
    const contract = await contractOf(sample.jobId);
    expect(contract?.parts).toHaveLength(1);
    expect(contract?.parts[0]).toMatchObject({ choice: [], gross_minor: issue.grossMinor, acceptedOn: await today() });
  });

  it('is not varied before there is one, and a variation that is sent or declined leaves the job accepted', async () => {
    const open = await sampleIssue(api.ours, api);
    const body = () => ({ id: newId(), title: 'Too early' });
    const early = await api.as('owner').call(beginVariation, { params: { jobId: open.jobId }, body: body() });
    expect(typeOf(early)).toContain('variation-no-contract');
    const sample = await acceptedIssue(api.ours, api);
    const variation = body();
    await api.as('owner').call(beginVariation, { params: { jobId: sample.jobId }, body: variation });
    const { settings } = (await api.app.estimates.drafts.whole(api.ours.id, variation.id)).estimate;
    const extra = {
      ...{ id: newId(), name: 'Two feet', taxCategoryId: settings.taxCategoryId, memberId: null, alternativeId: null },
      ...{ kind: 'price', price: '100.00' },
    };
    const changes = [{ kind: 'settings', id: variation.id, version: 1, content: { ...settings, extras: [extra] } }];
    await api.as('owner').call(changeEstimate, { params: { estimateId: variation.id }, body: { changes } });
    const issueId = await issueOf(api.ours, api, variation.id);
    await mark(issueId, 'sent');
    await decline(sample.visitor, issueId);
    expect((await api.app.jobs.job(api.ours.id, sample.jobId)).state).toBe('accepted');
    expect((await contractOf(sample.jobId))?.parts).toHaveLength(1);
  });
});

describe('The words of letters', () => {
  const keep = (words: { subject: string; text: string }, version: number) =>
    api.as('office').call(keepLetterTemplate, { version, body: { kind: 'accepted', ...words } });
  const own = { subject: 'Thanks, {client}', text: 'Dear {client},\n\n{number} for {job} it is: {total}.\n' };

  it('are the usual ones until the workshop writes its own, and again when it goes back to them', async () => {
    const listed = await api.as('owner').call(listLetterTemplates);
    const { items } = listed.body as { items: { kind: string; version: number; text: string }[] };
    const usual = items.find(({ kind }) => kind === 'accepted');
    expect(usual).toMatchObject({ version: 0, text: expect.stringContaining('{number} for {job}') as string });
    expect((await keep(own, 0)).body).toMatchObject({ version: 1, ...own });
    expect((await keep({ ...own, subject: 'Later' }, 0)).status).toBe(412);
    await acceptedIssue(api.ours, api);
    const mail = (await api.mails()).find(({ headers }) => headers.includes('Subject: Thanks, '));
    expect(mail?.text).toMatch(/^Dear Herons client \d+,\n\n.*issue A for Herons base it is: €[\d.,]+ with tax\.\n$/);
    const reset = await api.as('office').call(resetLetterTemplate, { body: { kind: 'accepted' } });
    expect(reset.body).toMatchObject({ version: 0, text: usual?.text });
  });

  it.each([
    ['an unknown placeholder', 'Dear {cleint}', '{cleint}'],
    ['a sum in braces', 'It is {{7*7}}', '7*7'],
    ['a sum in braces after a dollar', 'It is ${7*7}', '7*7'],
    ['a brace that stands alone', 'Dear {client', ''],
  ])('are refused with %s', async (_, text, named) => {
    const response = await keep({ subject: 'Subject', text }, 0);
    expect(response.status).toBe(400);
    const { errors } = response.body as { errors: { path: string[]; message: string }[] };
    expect(errors.every(({ path }) => path[0] === 'text')).toBe(true);
    expect(errors.map(({ message }) => message).join()).toContain(named.replace(/[{}]/g, ''));
  });

  it('are shown before they are kept, as text and as HTML in which nothing they say is markup', async () => {
    const text = 'Dear {client},\n\n<img src=x onerror=alert(1)> <%= 7*7 %> & {text}\nSecond line\n\nThird';
    const body = { kind: 'answer', subject: 'A\u2028 <b>subject</b>', text };
    expect((await api.as('office').call(previewLetter, { body })).status).toBe(400);
    const shown = await api.as('office').call(previewLetter, { body: { ...body, subject: '<b>subject</b>' } });
    const preview = shown.body as { subject: string; text: string; html: string };
    expect(preview.subject).toBe('<b>subject</b>');
    expect(preview.text).toContain('<img src=x onerror=alert(1)> <%= 7*7 %> &');
    expect(preview.html).toContain('&lt;img src=x onerror=alert(1)&gt; &lt;%= 7*7 %&gt; &amp;');
    expect(preview.html).not.toMatch(/<img|<script|49/);
    expect(preview.html).toContain('<p>Third</p>');
  });
});

describe('A letter that was given up', () => {
  it('is shown to those who may, and leaves when it is sent again', async () => {
    const { database, mailbox, tasks } = api.platform;
    await api.mails();
    const letter = { to: { name: 'Ada', email: 'ada@guests.example' }, subject: 'Given up', text: 'x' };
    await database.transaction(() => mailbox.post(api.ours.id, letter));
    await database.execute("UPDATE tasks SET failed_at = NOW(3), attempts = 12, last_error = '550 no such box'");
    const listed = await api.as('owner').call(listGivenUpLetters);
    const { items } = listed.body as { items: { id: string }[] };
    expect(items).toMatchObject([{ to: 'ada@guests.example', subject: 'Given up', lastError: '550 no such box' }]);
    const again = await api.as('owner').call(sendLetterAgain, { params: { letterId: items[0].id } });
    expect(again.status).toBe(204);
    await tasks.runDue();
    expect((await api.mails())[0]?.headers).toContain('Subject: Given up');
  });
});
