import { createHash, randomUUID } from 'node:crypto';
import { answerQuestion, listQuestions } from '#shared/agreements/questions-endpoints';
import { giveAccess, listAccesses, revokeAccess } from '#shared/agreements/accesses-endpoints';
import { listHistory } from '#shared/audit/history-endpoints';
import { addDays } from '#shared/calendar/add-days';
import {
  acceptIssue,
  askClientQuestion,
  priceClientChoice,
  readClientIssue,
  readClientOverview,
  readClientPaper,
  reviewClientChoice,
} from '#shared/client-page/client-issues-endpoints';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import type { ClientPrice } from '#shared/client-page/client-price-schema';
import { askForClientSignIn, beginClientVisit } from '#shared/client-page/visits-endpoints';
import { endpoints } from '#shared/endpoints';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import { markIssue, readIssue } from '#shared/estimates/issues-endpoints';
import {
  acceptanceOf,
  clientOf,
  issueOf,
  linkTo,
  sampleChoices,
  sampleIssue,
  visitBy,
  type SampleIssue,
} from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

interface Opening {
  readonly papers: ClientOverview;
  readonly issue: ClientIssue | null;
}

const read = (visitor: Visitor, issueId: string) => visitor.call(readClientIssue, { params: { issueId } });
const pageOf = async (visitor: Visitor, issueId: string): Promise<ClientIssue> =>
  (await read(visitor, issueId)).body as ClientIssue;
const overviewOf = async (visitor: Visitor): Promise<ClientOverview> =>
  (await visitor.call(readClientOverview)).body as ClientOverview;
const open = async (token: string, from?: Record<string, string>) =>
  (await api.stranger(from)).call(beginClientVisit, { body: { token } });
const historyOf = async (jobId: string): Promise<{ code: string; name: string; accountId: string | null }[]> => {
  const response = await api.as('owner').call(listHistory, { query: { jobId, limit: 100 } });
  return (response.body as { items: { code: string; name: string; accountId: string | null }[] }).items;
};
const emailOf = async ({ jobId }: SampleIssue): Promise<string> => {
  const { clientId } = await api.app.jobs.job(api.ours.id, jobId);
  return (await api.app.jobs.client(api.ours.id, clientId)).email;
};

describe('A link', () => {
  it('opens the papers of its job, and nothing of any other', async () => {
    const [sample, other] = [await sampleIssue(api.ours, api), await sampleIssue(api.ours, api)];
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const page = await pageOf(visitor, sample.issueId);
    expect(page.issue).toMatchObject({ id: sample.issueId, letter: 'A', state: 'open', kind: 'estimate' });
    expect(page.pieces[0]?.members.map(({ name }) => name)).toEqual([sample.member.name]);
    expect((await overviewOf(visitor)).jobs.map(({ id }) => id)).toEqual([sample.jobId]);
    expect((await read(visitor, other.issueId)).status).toBe(404);
  });

  it('brings with the visit what there is to read, the same as is read afterwards', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const visitor = await api.stranger();
    const { token } = await linkTo(api.ours, api, issueId);
    const begun = (await visitor.call(beginClientVisit, { body: { token } })).body as Opening;
    expect(begun.papers.jobs.flatMap(({ issues }) => issues.map(({ id }) => id))).toEqual([issueId]);
    expect(begun.papers).toEqual(await overviewOf(visitor));
    expect(begun.issue).toEqual(await pageOf(visitor, issueId));
  });

  it('begins even where the paper that is read first cannot be read, which is said where that is opened', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token } = await linkTo(api.ours, api, issueId);
    const reading = jest.spyOn(api.app.estimates.frozen, 'read').mockRejectedValueOnce(new Error('planted'));
    const visitor = await api.stranger();
    const begun = (await visitor.call(beginClientVisit, { body: { token } })).body as Opening;
    reading.mockRestore();
    expect(begun.issue).toBeNull();
    expect(begun.papers.jobs.flatMap(({ issues }) => issues.map(({ id }) => id))).toEqual([issueId]);
    expect((await read(visitor, issueId)).status).toBe(200);
  });

  it('is read by many and worked once; what is asked meanwhile stands there all the same', async () => {
    const { issueId } = await sampleChoices(api.ours, api);
    const working = jest.spyOn(api.app.estimates.frozen, 'chosen');
    const visitor = await clientOf(api.ours, api, issueId);
    const first = await pageOf(visitor, issueId);
    expect(working).toHaveBeenCalledTimes(first.alternatives.length);
    await visitor.call(askClientQuestion, { params: { issueId }, body: { text: 'May the edge stay plain?' } });
    const again = await pageOf(await clientOf(api.ours, api, issueId), issueId);
    expect(working).toHaveBeenCalledTimes(first.alternatives.length);
    expect(again.questions.map(({ text }) => text)).toEqual(['May the edge stay plain?']);
    expect({ ...again, questions: [] }).toEqual(first);
    working.mockRestore();
  });

  it('stands whole in the answer that gives it and nowhere else: not in the database, not in a log line, not in an address', async () => {
    const sample = await sampleIssue(api.ours, api);
    const endsOn = addDays(await api.app.rateCards.service.today(api.ours.id), 10);
    const body = { endsOn, send: true, note: 'As we said on Monday.' };
    const given = await api.as('office').call(giveAccess, { params: { issueId: sample.issueId }, body });
    const { link } = given.body as { link: string };
    const token = link.split('#')[1] ?? '';
    expect(token).toMatch(/^[\w-]{43}$/);
    const dump = async () => {
      const tables = await api.platform.database.select<{ name: string }>(
        'SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE()',
      );
      const rowsOf = ({ name }: { name: string }) =>
        // eslint-disable-next-line local/no-string-built-sql -- the names of the tables come from the database itself
        api.platform.database.select(`SELECT * FROM \`${name}\``);
      const rows = await Promise.all(tables.map(rowsOf));
      return JSON.stringify(rows);
    };
    expect(await dump()).not.toContain(token);
    const [mail] = await api.mails();
    expect(mail.text).toContain(link);
    expect(mail.html).toContain(link);
    await visitBy(api, token);
    expect(await dump()).not.toContain(token);
    expect(api.logLines.join('')).not.toContain(token);
    const listed = await api.as('office').call(listAccesses, { params: { jobId: sample.jobId } });
    expect(listed.text).not.toContain(token);
    expect(listed.text).not.toContain('tokenHash');
  });

  it('is mailed to the client in the workshop’s name, and the issue is marked sent', async () => {
    const sample = await sampleIssue(api.ours, api);
    const endsOn = addDays(await api.app.rateCards.service.today(api.ours.id), 10);
    await api.as('office').call(giveAccess, {
      params: { issueId: sample.issueId },
      body: { endsOn, send: true, note: 'Please <b>mind</b> {link} the oil gilding.' },
    });
    const [mail] = await api.mails();
    expect(mail.headers).toMatch(/^From: Herons Carvers </m);
    expect(mail.headers).toContain(await emailOf(sample));
    expect(mail.text).toContain('Please <b>mind</b> {link} the oil gilding.');
    expect(mail.html).toContain('Please &lt;b&gt;mind&lt;/b&gt; {link} the oil gilding.');
    expect((await historyOf(sample.jobId)).map(({ code }) => code)).toContain('history-issue-sent');
    const [issue] = await api.app.estimates.issues.ofEstimate(api.ours.id, sample.estimateId);
    expect(issue.state).toBe('sent');
  });

  it.each([
    ['a day that is past', -1],
    ['a day beyond two years', 731],
  ])('is not given until %s', async (_, days) => {
    const { issueId } = await sampleIssue(api.ours, api);
    const endsOn = addDays(await api.app.rateCards.service.today(api.ours.id), days);
    const body = { endsOn, send: false, note: '' };
    const response = await api.as('owner').call(giveAccess, { params: { issueId }, body });
    expect(response.status).toBe(400);
    expect((response.body as { errors: { path: unknown }[] }).errors[0]?.path).toEqual(['endsOn']);
  });

  it('ends with its visit when it is taken back, at once', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token, accessId } = await linkTo(api.ours, api, issueId);
    const visitor = await visitBy(api, token);
    expect((await read(visitor, issueId)).status).toBe(200);
    expect((await api.as('office').call(revokeAccess, { params: { accessId } })).status).toBe(204);
    expect((await read(visitor, issueId)).status).toBe(401);
    expect((await open(token)).status).toBe(410);
  });

  it('holds to the end of its last day where the workshop is, and not a moment longer', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const today = await api.app.rateCards.service.today(api.ours.id);
    const given = await api
      .as('owner')
      .call(giveAccess, { params: { issueId }, body: { endsOn: '2027-03-28', send: false, note: '' } });
    const { access } = given.body as { access: { endsAt: string } };
    expect(today < '2027-03-28').toBe(true);
    // Vienna goes over to summer time that night: midnight is 22:00 UTC.
    expect(access.endsAt).toBe('2027-03-28T22:00:00.000Z');
  });

  it('opens nothing after its last day, and a visit through it ends with it', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token, accessId } = await linkTo(api.ours, api, issueId);
    const visitor = await visitBy(api, token);
    const endAt = (instant: Date) =>
      api.platform.database.execute('UPDATE client_accesses SET ends_at = :instant WHERE id = :accessId', {
        ...{ instant, accessId },
      });
    await endAt(new Date(api.clock.now().getTime() + 60_000));
    expect((await read(visitor, issueId)).status).toBe(200);
    await endAt(new Date(api.clock.now().getTime() - 1));
    expect((await read(visitor, issueId)).status).toBe(401);
    expect((await open(token)).status).toBe(410);
  });

  it('says the same of a link that ended, was taken back, or never was', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token, accessId } = await linkTo(api.ours, api, issueId);
    await api.as('owner').call(revokeAccess, { params: { accessId } });
    const taken = await open(token);
    const never = await open('x'.repeat(43));
    const told = ({ status, body }: typeof taken) => [status, (body as { title: string }).title];
    expect(told(taken)).toEqual(told(never));
    expect(taken.status).toBe(410);
  });

  it('shows in the history of the job that it was opened, by the client’s name and nobody’s account', async () => {
    const sample = await sampleIssue(api.ours, api);
    await clientOf(api.ours, api, sample.issueId);
    const opened = (await historyOf(sample.jobId)).find(({ code }) => code === 'history-access-opened');
    const { clientName } = await api.app.jobs.job(api.ours.id, sample.jobId);
    expect(opened).toMatchObject({ name: clientName, accountId: null });
  });

  it('opens nothing any more when the job goes to another client', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const other = await sampleIssue(api.ours, api);
    const { clientId } = await api.app.jobs.job(api.ours.id, other.jobId);
    await api.platform.database.execute('UPDATE jobs SET client_id = :clientId WHERE id = :jobId', {
      clientId,
      jobId: sample.jobId,
    });
    expect((await read(visitor, sample.issueId)).status).toBe(404);
  });
});

describe('Guessing links', () => {
  it('is held off after ten wrong ones from one address, and nobody else waits', async () => {
    const from = (address: string) => ({
      ...{ 'x-forwarded-for': address, 'x-forwarded-proto': 'https', host: 'work.example' },
    });
    const proxied = await startApi({ PUBLIC_URL: 'https://work.example' }, from('203.0.113.6'));
    const tried = async (address: string, token: string) =>
      (await proxied.stranger(from(address))).call(beginClientVisit, { body: { token } });
    try {
      const { issueId } = await sampleIssue(proxied.ours, proxied);
      const { token } = await linkTo(proxied.ours, proxied, issueId);
      for (let guess = 0; guess < 10; guess++) expect((await tried('203.0.113.7', randomUUID())).status).toBe(410);
      const refused = await tried('203.0.113.7', token);
      expect(refused.status).toBe(429);
      expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
      expect((await tried('203.0.113.8', token)).status).toBe(200);
      proxied.clock.move({ minutes: 2 });
      expect((await tried('203.0.113.7', token)).status).toBe(200);
    } finally {
      await proxied.stop();
    }
  }, 60_000);

  it('does not count against somebody who opens their own link often', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token } = await linkTo(api.ours, api, issueId);
    for (let opened = 0; opened < 15; opened++) expect((await open(token)).status).toBe(200);
  });
});

describe('The page of an issue', () => {
  it('shows alternatives with what they add, and what their strips are', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const { alternatives, price } = await pageOf(visitor, sample.issueId);
    expect(alternatives.map(({ id }) => id)).toEqual([sample.oil, sample.silver, sample.crate]);
    const [oil, , crate] = alternatives;
    expect(oil.before.map(({ buildUp }) => buildUp)).toEqual(['Water gilding, burnished']);
    expect(oil.after.length).toBe(1);
    expect(oil.after[0]?.buildUp).not.toBe('Water gilding, burnished');
    expect(oil.gross_minor).toBe(price.gross_minor + oil.difference_minor);
    // 180.00 and 20 % tax.
    expect(crate.difference_minor).toBe(21_600);
    const { body } = await api.as('office').call(readIssue, { params: { issueId: sample.issueId } });
    const [kept] = (body as { alternatives: AlternativeTotal[] }).alternatives;
    const names = (sections: readonly { buildUp: string }[] = []) => sections.map(({ buildUp }) => buildUp);
    expect(names(kept.sections?.before)).toEqual(names(oil.before));
    expect(names(kept.sections?.after)).toEqual(names(oil.after));
    expect(kept.sections?.after.every(({ timber, leaf }) => timber !== '' && leaf.length === 1)).toBe(true);
  });

  it('prices every combination there is with lines and totals that add up, one alternative alone as it is offered', async () => {
    const sample = await sampleChoices(api.ours, api);
    const { oil, silver, crate } = sample;
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const priced = async (choice: string[]) =>
      (await visitor.call(priceClientChoice, { params: { issueId: sample.issueId }, body: { choice } }))
        .body as ClientPrice;
    const { alternatives, price: base } = await pageOf(visitor, sample.issueId);
    const grossOf = new Map<string, number>();
    for (const choice of [[], [oil], [silver], [crate], [crate, oil], [crate, silver]]) {
      const price = await priced(choice);
      const inOrder = [oil, silver, crate].filter((id) => choice.includes(id));
      expect(price.choice).toEqual(inOrder);
      expect(await priced(inOrder)).toEqual(price);
      const lines = price.lines.reduce((sum, { price_minor }) => sum + price_minor, 0);
      expect(lines - price.discount_minor).toBe(price.net_minor);
      expect(price.net_minor + price.tax_minor).toBe(price.gross_minor);
      expect(price.payments.reduce((sum, { paid_minor }) => sum + paid_minor, 0)).toBe(price.gross_minor);
      grossOf.set(inOrder.join(' '), price.gross_minor);
    }
    expect(grossOf.get('')).toBe(base.gross_minor);
    for (const { id, gross_minor } of alternatives) expect(grossOf.get(id)).toBe(gross_minor);
    for (const gilding of [oil, silver])
      expect((grossOf.get(`${gilding} ${crate}`) ?? 0) - (grossOf.get(gilding) ?? 0)).toBe(21_600);
  });

  it.each([
    ['two of one group', (sample: { oil: string; silver: string }) => [sample.oil, sample.silver]],
    ['the same twice', (sample: { oil: string }) => [sample.oil, sample.oil]],
    ['something not offered', () => ['019a0000-0000-7000-8000-000000000009']],
  ])('refuses %s, with a word at its place', async (_, pick) => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const body = { choice: pick(sample) };
    const response = await visitor.call(priceClientChoice, { params: { issueId: sample.issueId }, body });
    expect(response.status).toBe(400);
    expect((response.body as { errors: { path: unknown[] }[] }).errors[0]?.path[0]).toBe('choice');
  });

  it('has one paper for one choice: equal bytes however often, and as reviewed', async () => {
    const sample = await sampleChoices(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const params = { issueId: sample.issueId };
    const review = async (choice: string[]) =>
      ((await visitor.call(reviewClientChoice, { params, body: { choice } })).body as { pdfSha256: string }).pdfSha256;
    const paper = await visitor.call(readClientPaper, { params, query: { choice: `${sample.crate},${sample.oil}` } });
    expect(paper.status).toBe(200);
    expect(paper.headers['content-disposition']).toMatch(/^attachment/);
    const sha256 = createHash('sha256')
      .update(paper.body as Buffer)
      .digest('hex');
    expect(await review([sample.oil, sample.crate])).toBe(sha256);
    expect(await review([sample.crate, sample.oil])).toBe(sha256);
    expect(await review([])).not.toBe(sha256);
  });

  it('says of an issue that another took its place, and which one once that was sent', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const later = await issueOf(api.ours, api, sample.estimateId);
    expect(await pageOf(visitor, sample.issueId)).toMatchObject({ issue: { state: 'replaced' }, replacedBy: null });
    const body = { state: 'sent', day: await api.app.rateCards.service.today(api.ours.id), note: '' };
    await api.as('office').call(markIssue, { params: { issueId: later }, body });
    expect(await pageOf(visitor, sample.issueId)).toMatchObject({ issue: { state: 'replaced' }, replacedBy: later });
    expect((await pageOf(visitor, later)).issue).toMatchObject({ state: 'open', letter: 'B' });
  });
});

describe('A question', () => {
  it('stands in the thread of both sides, and is mailed both ways', async () => {
    const sample = await sampleIssue(api.ours, api);
    const visitor = await clientOf(api.ours, api, sample.issueId);
    const params = { issueId: sample.issueId };
    const text = 'May the top edge stay plain?\n<script>alert(1)</script> {client}';
    await visitor.call(askClientQuestion, { params, body: { text } });
    const [asked] = await api.mails();
    expect(asked.headers).toContain(api.ours.people.owner.email);
    expect(asked.headers).toMatch(new RegExp(`^Reply-To: ${await emailOf(sample)}`, 'm'));
    expect(asked.text).toContain('May the top edge stay plain?');
    const answer = { issueId: sample.issueId, text: 'Yes, gladly. {text}' };
    await api.as('office').call(answerQuestion, { params: { jobId: sample.jobId }, body: answer });
    const [answered] = await api.mails();
    expect(answered.headers).toContain(await emailOf(sample));
    expect(answered.text).toContain('Yes, gladly. {text}');
    const { questions } = await pageOf(visitor, sample.issueId);
    expect(questions.map((one) => [one.author, one.text])).toEqual([
      ['client', text],
      ['workshop', answer.text],
    ]);
    const listed = await api.as('estimator').call(listQuestions, { params: { jobId: sample.jobId } });
    expect((listed.body as { items: unknown[] }).items).toEqual(questions);
    expect((await historyOf(sample.jobId)).map(({ code }) => code)).toEqual(
      expect.arrayContaining(['history-question-asked', 'history-question-answered']),
    );
  });

  it('is not answered about an issue of another job', async () => {
    const [sample, other] = [await sampleIssue(api.ours, api), await sampleIssue(api.ours, api)];
    const body = { issueId: other.issueId, text: 'Wrong job' };
    const response = await api.as('office').call(answerQuestion, { params: { jobId: sample.jobId }, body });
    expect(response.status).toBe(404);
  });
});

describe('Signing in by mail', () => {
  const ask = async (email: string) => (await api.stranger()).call(askForClientSignIn, { body: { email } });

  it('opens all jobs of a client for an hour', async () => {
    const sample = await sampleIssue(api.ours, api);
    const email = await emailOf(sample);
    const second = await sampleEstimate(api.ours);
    const { clientId } = await api.app.jobs.job(api.ours.id, sample.jobId);
    await api.platform.database.execute('UPDATE jobs SET client_id = :clientId WHERE id = :jobId', {
      clientId,
      jobId: second.jobId,
    });
    expect((await ask(email)).status).toBe(204);
    await api.mails();
    const [mail] = await api.mails();
    const visitor = await visitBy(api, /#([\w-]{43})/.exec(mail.text)?.[1] ?? '');
    const { jobs } = await overviewOf(visitor);
    expect(jobs.map(({ id }) => id).sort()).toEqual([sample.jobId, second.jobId].sort());
    expect((await read(visitor, sample.issueId)).status).toBe(200);
  });

  it('answers the same for an address nobody knows, and mails nothing', async () => {
    const known = await ask(await emailOf(await sampleIssue(api.ours, api)));
    await api.mails();
    const before = (await api.mails()).length;
    const unknown = await ask('nobody@elsewhere.example');
    expect([unknown.status, unknown.text]).toEqual([known.status, known.text]);
    expect((await api.mails()).length).toBe(before);
  });

  it('sends no more than three letters in a quarter of an hour', async () => {
    const email = await emailOf(await sampleIssue(api.ours, api));
    for (let asked = 0; asked < 5; asked++) await ask(email);
    await api.mails();
    const mails = (await api.mails()).filter(({ headers }) => headers.includes(email));
    expect(mails).toHaveLength(3);
  });
});

describe('Both sides in one browser', () => {
  it('do not mix: a member of the workshop who opens a link stays signed in, and neither gains the other’s rights', async () => {
    const { issueId } = await sampleIssue(api.ours, api);
    const { token } = await linkTo(api.ours, api, issueId);
    const { visitor } = await api.newcomer(api.ours, 'bench');
    await visitor.call(beginClientVisit, { body: { token } });
    expect((await read(visitor, issueId)).status).toBe(200);
    const office = endpoints.find(({ name }) => name === 'listLetterTemplates')!;
    expect((await visitor.call(office)).status).toBe(403);
    const accepted = await visitor.call(acceptIssue, await acceptanceOf(visitor, issueId));
    expect(accepted.status).toBe(200);
  });
});
