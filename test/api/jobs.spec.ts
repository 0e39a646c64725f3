import { v7 as newId } from 'uuid';
import { listHistory } from '#shared/audit/history-endpoints';
import { keepClient, listClients, readClient, removeClient } from '#shared/jobs/clients-endpoints';
import type { Client } from '#shared/jobs/client-schema';
import { finishJob, keepJob, listJobs, readJob, removeJob } from '#shared/jobs/jobs-endpoints';
import type { Job } from '#shared/jobs/job-schema';
import { jobNumber } from '../../backend/src/jobs';
import { clientNamed, enterClient, jobTitled, openJob } from './sample-job';
import { startApi, type Api } from './start-api';

/** Clients and jobs as people use them: kept once however often sent, never changed unseen, found by the beginnings of words. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

interface Listed<T> {
  readonly items: T[];
  readonly next: string | null;
  readonly count: number;
  readonly countIsExact: boolean;
}

const owner = () => api.as('owner');
const jobNow = async (jobId: string): Promise<Job> => (await owner().call(readJob, { params: { jobId } })).body as Job;
const clientNow = async (clientId: string): Promise<Client> =>
  (await owner().call(readClient, { params: { clientId } })).body as Client;
const jobsFound = async (query: Record<string, string | number>): Promise<Listed<Job>> =>
  (await owner().call(listJobs, { query })).body as Listed<Job>;
const titlesFound = async (search: string): Promise<string[]> =>
  (await jobsFound({ search, order: 'title' })).items.map(({ title }) => title);
const historyOf = async (jobId: string): Promise<{ code: string; values: object; before: unknown; after: unknown }[]> =>
  ((await owner().call(listHistory, { query: { jobId } })).body as Listed<never>).items;

describe('A job', () => {
  test('is given the next number of the year, and its client’s name', async () => {
    const clientId = await enterClient(owner(), clientNamed('Ashworth & Daughters'));
    const first = await jobNow(await openJob(owner(), jobTitled('Numbered first', clientId)));
    const second = await jobNow(await openJob(owner(), jobTitled('Numbered second', clientId)));
    expect(first).toMatchObject({ clientName: 'Ashworth & Daughters', state: 'open', version: 1 });
    expect(first.number).toMatch(/^20\d\d-\d{3}$/);
    expect(Number(second.number.slice(5)) - Number(first.number.slice(5))).toBe(1);
  });

  test('takes no number when it is refused', async () => {
    const clientId = await enterClient(owner(), clientNamed('Gapless'));
    const before = await jobNow(await openJob(owner(), jobTitled('Before the gap', clientId)));
    const refused = await owner().call(keepJob, {
      params: { jobId: newId() },
      version: 0,
      body: jobTitled('Of nobody', newId()),
    });
    expect(refused.status).toBe(404);
    expect(refused.body).toMatchObject({
      errors: [{ path: ['clientId'], message: 'Choose a client from the list.' }],
    });
    const after = await jobNow(await openJob(owner(), jobTitled('After the gap', clientId)));
    expect(Number(after.number.slice(5)) - Number(before.number.slice(5))).toBe(1);
  });

  test('sent twice is opened once, also at the same moment', async () => {
    const clientId = await enterClient(owner(), clientNamed('Twice'));
    const call = { params: { jobId: newId() }, version: 0, body: jobTitled('Sent twice', clientId) };
    const answers = await Promise.all([owner().call(keepJob, call), owner().call(keepJob, call)]);
    const again = await owner().call(keepJob, call);
    expect([...answers, again].map(({ status }) => status)).toEqual([200, 200, 200]);
    expect(new Set([...answers, again].map(({ body }) => (body as Job).number)).size).toBe(1);
    expect((await clientNow(clientId)).jobs).toBe(1);
    expect((await historyOf(call.params.jobId)).map(({ code }) => code)).toEqual(['history-job-opened']);
  });

  test('changed by two is changed by the first; the second is shown what stands', async () => {
    const clientId = await enterClient(owner(), clientNamed('Two hands'));
    const jobId = await openJob(owner(), jobTitled('As it was', clientId));
    const change = (title: string) => ({ params: { jobId }, version: 1, body: jobTitled(title, clientId) });
    const first = await owner().call(keepJob, change('As one wants it'));
    const second = await api.as('office').call(keepJob, change('As another wants it'));
    const repeated = await owner().call(keepJob, change('As one wants it'));
    expect([first.status, second.status, repeated.status]).toEqual([200, 412, 200]);
    expect(first.headers['etag']).toBe('"2"');
    expect(second.body).toMatchObject({ current: { title: 'As one wants it', clientName: 'Two hands', version: 2 } });
    expect((await jobNow(jobId)).version).toBe(2);
  });

  test('moved to another client is counted there', async () => {
    const [from, to] = [await enterClient(owner(), clientNamed('From')), await enterClient(owner(), clientNamed('To'))];
    const jobId = await openJob(owner(), jobTitled('Moving', from));
    await owner().call(keepJob, { params: { jobId }, version: 1, body: jobTitled('Moving', to) });
    expect([(await clientNow(from)).jobs, (await clientNow(to)).jobs]).toEqual([0, 1]);
    expect((await jobNow(jobId)).clientName).toBe('To');
  });

  test('is put away as finished and taken up again where its issues have brought it', async () => {
    const clientId = await enterClient(owner(), clientNamed('Finished'));
    const jobId = await openJob(owner(), jobTitled('To finish', clientId));
    const by = api.ours.people.owner.actor;
    await api.platform.database.transaction(() => api.app.jobs.markState(by, jobId, 'accepted'));
    const finished = await owner().call(finishJob, { params: { jobId }, version: 1, body: { isFinished: true } });
    const repeated = await owner().call(finishJob, { params: { jobId }, version: 1, body: { isFinished: true } });
    const stale = await owner().call(finishJob, { params: { jobId }, version: 1, body: { isFinished: false } });
    const again = await owner().call(finishJob, { params: { jobId }, version: 2, body: { isFinished: false } });
    expect([finished.status, repeated.status, stale.status, again.status]).toEqual([200, 200, 412, 200]);
    expect([finished.body, again.body]).toMatchObject([{ state: 'finished' }, { state: 'accepted', version: 3 }]);
    expect((await historyOf(jobId)).map(({ values }) => values)).toMatchObject([
      { state: 'accepted' },
      { state: 'finished' },
      { state: 'accepted' },
      {},
    ]);
  });

  test('that is finished goes on showing so while its issues move on', async () => {
    const clientId = await enterClient(owner(), clientNamed('Moving on'));
    const jobId = await openJob(owner(), jobTitled('Finished early', clientId));
    await owner().call(finishJob, { params: { jobId }, version: 1, body: { isFinished: true } });
    const by = api.ours.people.owner.actor;
    await api.platform.database.transaction(() => api.app.jobs.markState(by, jobId, 'declined'));
    expect(await jobNow(jobId)).toMatchObject({ state: 'finished', version: 2 });
    const again = await owner().call(finishJob, { params: { jobId }, version: 2, body: { isFinished: false } });
    expect(again.body).toMatchObject({ state: 'declined' });
  });

  test('leaves the list, the search and its client’s count when it is removed', async () => {
    const clientId = await enterClient(owner(), clientNamed('Leaving'));
    const jobId = await openJob(owner(), jobTitled('Quetzalcoatl pedestal', clientId));
    expect(await titlesFound('quetzalcoatl')).toEqual(['Quetzalcoatl pedestal']);
    expect((await owner().call(removeJob, { params: { jobId }, version: 1 })).status).toBe(204);
    expect(await titlesFound('quetzalcoatl')).toEqual([]);
    expect((await clientNow(clientId)).jobs).toBe(0);
    expect((await owner().call(readJob, { params: { jobId } })).status).toBe(404);
  });
});

describe('A client', () => {
  test('with a job stays; without one they go', async () => {
    const clientId = await enterClient(owner(), clientNamed('Staying'));
    const jobId = await openJob(owner(), jobTitled('A reason to stay', clientId));
    const refused = await owner().call(removeClient, { params: { clientId }, version: 1 });
    expect(refused.status).toBe(409);
    expect(refused.body).toMatchObject({ title: 'Staying has a job here, so the entry stays.' });
    await owner().call(removeJob, { params: { jobId }, version: 1 });
    expect((await owner().call(removeClient, { params: { clientId }, version: 1 })).status).toBe(204);
    expect((await owner().call(readClient, { params: { clientId } })).status).toBe(404);
  });

  test('renamed is found under the new name alone, and so are their jobs', async () => {
    const clientId = await enterClient(owner(), clientNamed('Wrenfield House'));
    const jobId = await openJob(owner(), jobTitled('Pier table of the renamed', clientId));
    const body = clientNamed('Larkfield House');
    await owner().call(keepClient, { params: { clientId }, version: 1, body });
    expect([await titlesFound('wrenfield'), await titlesFound('larkfield pier')]).toEqual([
      [],
      ['Pier table of the renamed'],
    ]);
    expect((await jobNow(jobId)).clientName).toBe('Larkfield House');
  });

  test('sent twice is entered once; another content under the same id is refused', async () => {
    const call = { params: { clientId: newId() }, version: 0, body: clientNamed('Once') };
    const [first, again] = await Promise.all([owner().call(keepClient, call), owner().call(keepClient, call)]);
    const other = await owner().call(keepClient, { ...call, body: clientNamed('Somebody else') });
    expect([first.status, again.status, other.status]).toEqual([200, 200, 412]);
    expect(other.body).toMatchObject({ current: { name: 'Once' } });
  });

  test('cannot have a web site that is not one', async () => {
    const refusals = await Promise.all(
      ['javascript:alert(1)', 'data:text/html,x', 'ftp://x.example'].map((website) =>
        owner().call(keepClient, { params: { clientId: newId() }, version: 0, body: clientNamed('Web', { website }) }),
      ),
    );
    expect(refusals.map(({ status }) => status)).toEqual([400, 400, 400]);
  });

  test('is listed by name and found by name, contact, e-mail and telephone', async () => {
    const more = { contact: 'Ottoline Marchbanks', email: 'desk@marchbanks.example', telephone: '0161 496 0123' };
    await enterClient(owner(), clientNamed('Marchbanks Trust', more));
    const found = async (search: string) =>
      ((await owner().call(listClients, { query: { search } })).body as Listed<Client>).items.map(({ name }) => name);
    const searches = ['march', 'ottol', 'desk', '4960 march', '496 march'];
    expect(await Promise.all(searches.map(found))).toEqual([
      ['Marchbanks Trust'],
      ['Marchbanks Trust'],
      ['Marchbanks Trust'],
      [],
      ['Marchbanks Trust'],
    ]);
  });
});

describe('The list of jobs', () => {
  test('finds the beginnings of words in any order, whatever their accents and capitals', async () => {
    const clientId = await enterClient(owner(), clientNamed('Łódź Muzeum'));
    const more = { reference: 'ÄB/77', site: 'Schloß Übersee' };
    const jobId = await openJob(owner(), jobTitled('Crédence of Saint-Cloud', clientId, more));
    const { number } = await jobNow(jobId);
    const searches = ['cred', 'CRÉDENCE cloud', 'lodz', 'uber schloss', 'ab 77', `${number} saint`, 'redence'];
    const found = await Promise.all(searches.map(titlesFound));
    expect(found.map((titles) => titles.length)).toEqual([1, 1, 1, 1, 1, 1, 0]);
  });

  test('takes whatever is typed for words, quickly', async () => {
    const searches = ['(a+)+$', '[', '%', '_', "' OR 1=1 --", '\\', ':word1', '?', '\u0000', '🦢', 'a '.repeat(100)];
    for (const search of searches) {
      const begin = performance.now();
      const response = await owner().call(listJobs, { query: { search } });
      expect({ search, status: response.status }).toEqual({ search, status: 200 });
      expect(performance.now() - begin).toBeLessThan(200);
    }
    const begin = performance.now();
    const long = await owner().call(listJobs, { query: { search: 'w'.repeat(10_000) } });
    expect(long.status).toBe(400);
    expect(performance.now() - begin).toBeLessThan(200);
  });

  test('finds nothing for a search without a letter or a figure', async () => {
    expect(await jobsFound({ search: '%' })).toMatchObject({ items: [], count: 0 });
  });

  test.each(['changed', 'number', 'title'])('in the order %s gives every job once, page by page', async (order) => {
    const clientId = await enterClient(owner(), clientNamed(`Paging by ${order}`));
    for (const title of ['e', "d':word1", 'C', 'b', 'a', 'a']) await openJob(owner(), jobTitled(title, clientId));
    const query = { clientId, order, limit: 2 };
    const first = await jobsFound(query);
    const second = await jobsFound({ ...query, cursor: first.next ?? '' });
    const third = await jobsFound({ ...query, cursor: second.next ?? '' });
    const pages = [first, second, third];
    expect(pages.map(({ count, countIsExact }) => [count, countIsExact])).toEqual(pages.map(() => [6, true]));
    expect(third.next).toBeNull();
    const titles = pages.flatMap(({ items }) => items.map(({ title }) => title));
    expect(titles).toEqual(['a', 'a', 'b', 'C', "d':word1", 'e']);
  });

  test('refuses a cursor it never gave', async () => {
    const cursors = ['x', Buffer.from('[1,2,3]').toString('base64url'), Buffer.from('{}').toString('base64url')];
    const answers = await Promise.all(cursors.map((cursor) => owner().call(listJobs, { query: { cursor } })));
    expect(answers.map(({ status }) => status)).toEqual([400, 400, 400]);
    expect(answers[0]?.body).toMatchObject({ errors: [{ path: ['query', 'cursor'] }] });
  });

  test('is narrowed to a state and to a client', async () => {
    const clientId = await enterClient(owner(), clientNamed('Narrow'));
    const jobId = await openJob(owner(), jobTitled('Narrow done', clientId));
    await openJob(owner(), jobTitled('Narrow open', clientId));
    await owner().call(finishJob, { params: { jobId }, version: 1, body: { isFinished: true } });
    const of = async (query: object) => (await jobsFound({ clientId, ...query })).items.map(({ title }) => title);
    expect([await of({ state: 'finished' }), await of({ state: 'open' }), await of({ search: 'narrow do' })]).toEqual([
      ['Narrow done'],
      ['Narrow open'],
      ['Narrow done'],
    ]);
  });

  test('asks the database as often for many jobs as for one', async () => {
    const clientId = await enterClient(owner(), clientNamed('Counted'));
    for (let made = 0; made < 12; made++) await openJob(owner(), jobTitled(`Counted ${made}`, clientId));
    const statements = async (limit: number): Promise<number> => {
      const before = api.platform.database.statements;
      const page = await api.app.jobs.service.page(api.ours.id, { clientId, limit, search: '', order: 'changed' });
      expect(page.items).toHaveLength(limit);
      return api.platform.database.statements - before;
    };
    expect([await statements(1), await statements(12)]).toEqual([3, 3]);
  });

  test('puts what was worked on first', async () => {
    const clientId = await enterClient(owner(), clientNamed('Touched'));
    const jobId = await openJob(owner(), jobTitled('Touched again', clientId));
    await openJob(owner(), jobTitled('Opened since', clientId));
    api.clock.move({ seconds: 1 });
    await api.app.jobs.touch(api.ours.id, jobId);
    expect((await jobsFound({ clientId })).items.map(({ title }) => title)).toEqual(['Touched again', 'Opened since']);
  });
});

test('The year of a number begins when it begins in the workshop’s own zone', async () => {
  const { actor } = api.ours.people.owner;
  const clientId = await enterClient(owner(), clientNamed('New Year'));
  const year = api.clock.now().getUTCFullYear();
  const halfPastMidnightInVienna = Date.UTC(year, 11, 31, 23, 30);
  api.clock.move({ minutes: Math.ceil((halfPastMidnightInVienna - api.clock.now().getTime()) / 60_000) });
  const content = jobTitled('The first of the year', clientId);
  const job = await api.platform.database.transaction(() =>
    api.app.jobs.service.keep(actor, { id: newId(), version: 0 }, content),
  );
  expect(jobNumber(job)).toBe(`${year + 1}-001`);
});
