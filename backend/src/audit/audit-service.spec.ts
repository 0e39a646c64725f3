import { randomUUID } from 'node:crypto';
import { startApi, type Api } from '../../../test/api/start-api';
import type { Doer } from './audit-service';

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const ours = (): Doer => api.ours.people.owner.actor;
const save = (by: Doer, id: string, after: object, jobId?: string) =>
  api.platform.database.transaction(() =>
    api.app.audit.service.record(by, {
      subject: { kind: 'member', id },
      code: 'history-workshop-changed',
      before: { text: 'before' },
      after,
      merges: true,
      ...(jobId === undefined ? {} : { jobId }),
    }),
  );
const about = async (id: string) =>
  (await api.app.audit.service.page(api.ours.id, { limit: 100 })).items
    .filter(({ subjectId }) => subjectId === id)
    .reverse();

test('history is written in the transaction of what it tells of', async () => {
  const deed = { subject: { kind: 'member', id: randomUUID() }, code: 'history-workshop-changed' } as const;
  await expect(api.app.audit.service.record(ours(), deed)).rejects.toThrow('in the transaction');
});

test('one person’s saves of one thing within ten minutes are one entry, from the first before to the last after', async () => {
  const id = randomUUID();
  for (const text of ['a', 'b', 'c']) {
    await save(ours(), id, { text });
    api.clock.move({ minutes: 3 });
  }
  expect(await about(id)).toMatchObject([{ before: { text: 'before' }, after: { text: 'c' } }]);
  api.clock.move({ minutes: 2 });
  await save(ours(), id, { text: 'd' });
  expect(await about(id)).toMatchObject([{ after: { text: 'c' } }, { after: { text: 'd' } }]);
});

test('another person’s save in between keeps them apart', async () => {
  const id = randomUUID();
  const other = api.ours.people.estimator.actor;
  await save(ours(), id, { text: 'a' });
  await save(other, id, { text: 'b' });
  await save(ours(), id, { text: 'c' });
  expect((await about(id)).map(({ after }) => after)).toEqual([{ text: 'a' }, { text: 'b' }, { text: 'c' }]);
});

test('the history of a job pages by cursor, newest first', async () => {
  const jobId = randomUUID();
  for (let at = 0; at < 5; at++) await save(ours(), randomUUID(), { at }, jobId);
  const first = await api.app.audit.service.page(api.ours.id, { limit: 3, jobId });
  const second = await api.app.audit.service.page(api.ours.id, { limit: 3, jobId, cursor: first.next ?? '' });
  expect([...first.items, ...second.items].map(({ after }) => after)).toEqual([4, 3, 2, 1, 0].map((at) => ({ at })));
  expect(second.next).toBeNull();
  expect(await api.app.audit.service.page(api.theirs.id, { limit: 3, jobId })).toMatchObject({ items: [], count: 0 });
});
