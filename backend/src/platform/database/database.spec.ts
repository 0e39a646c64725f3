import { randomUUID } from 'node:crypto';
import { Rejection } from '#shared/problems/rejection';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { column } from './columns';
import { Database, type Table } from './database';
import { unsafeSettings } from './unsafe-settings';
import { failureOf } from './failure';
import { WorkshopRows, type VersionedRow } from './workshop-rows';

interface NoteRow extends VersionedRow {
  readonly text: string;
  readonly price_minor: number;
  readonly rate: string;
  readonly content: unknown;
  readonly day: string;
  readonly at: Date;
}

let database: Database;
let notes: WorkshopRows<NoteRow>;
let table: Table<NoteRow>;
const [ours, theirs] = [randomUUID(), randomUUID()];

const note = (text: string) => ({
  ...{ id: randomUUID(), text, price_minor: 9_007_199_254_740_991, rate: '123456789012.34567800' },
  ...{
    content: { list: [1, 'zwei', null], nested: { deep: true } },
    day: '2026-03-29',
    at: new Date('2026-03-29T01:30:00.123Z'),
    version: 1,
  },
});

beforeAll(async () => {
  database = new Database(await freshDatabase(), 20);
  await database.execute(
    `CREATE TABLE notes (workshop_id CHAR(36), id CHAR(36), text VARCHAR(200), price_minor BIGINT, rate DECIMAL(24,8), content JSON, day DATE,
     at DATETIME(3), version INT, PRIMARY KEY (workshop_id, id))`,
  );
  table = database.table<NoteRow>('notes', {
    ...{
      workshopId: column.workshopId,
      id: column.id,
      text: column.word,
      price_minor: column.minor,
      rate: column.decimal,
    },
    ...{ content: column.json, day: column.day, at: column.instant, version: column.whole },
  });
  notes = new WorkshopRows(table);
}, 60_000);
afterAll(() => database.close());

describe('a row', () => {
  test('comes back as it went in: minor units whole, rates as text, JSON as it was, instants in UTC', async () => {
    const written = await notes.insert(ours, note('Ångström 🦦'));
    expect(await notes.get(ours, written.id)).toEqual(written);
  });

  test('with a whole number past 2^53 is an error, never a rounded number', async () => {
    const { id } = await notes.insert(ours, note('large'));
    await database.execute('UPDATE notes SET price_minor = 9007199254740993 WHERE id = :id', { id });
    await expect(notes.get(ours, id)).rejects.toThrow();
    await notes.remove(ours, id);
  });

  test('of another workshop is not there: not to read, not to change, not to remove', async () => {
    const { id } = await notes.insert(theirs, note('theirs'));
    await expect(notes.get(ours, id)).rejects.toMatchObject({ kind: 'not-found' });
    await expect(notes.lock(ours, id)).rejects.toMatchObject({ kind: 'not-found' });
    await expect(notes.change(ours, { id, version: 1 }, { text: 'ours now' })).rejects.toMatchObject({
      kind: 'not-found',
    });
    await notes.write(ours, id, { text: 'ours now' });
    expect(await notes.remove(ours, id)).toBe(false);
    expect(await notes.get(theirs, id)).toMatchObject({ text: 'theirs', version: 1 });
  });

  test('cannot be asked for with a condition that names another workshop', async () => {
    const { id } = await notes.insert(theirs, note('theirs'));
    expect(await notes.list(ours, { where: { workshopId: theirs, id } })).toEqual([]);
  });

  test('changed from an older version is refused with what stands there now', async () => {
    const { id } = await notes.insert(ours, note('first'));
    expect(await notes.change(ours, { id, version: 1 }, { text: 'second' })).toMatchObject({
      text: 'second',
      version: 2,
    });
    const refusal = await notes.change(ours, { id, version: 1 }, { text: 'third' }).catch((error: unknown) => error);
    expect(refusal).toBeInstanceOf(Rejection);
    expect(refusal).toMatchObject({ kind: 'stale', more: { detail: { text: 'second', version: 2 } } });
  });
});

test('a list pages by cursor, newest first, and counts', async () => {
  const workshop = randomUUID();
  const ids = Array.from({ length: 7 }, (_, at) => `00000000-0000-7000-8000-00000000000${at}`);
  for (const id of ids) await notes.insert(workshop, { ...note('paged'), id });
  const first = await notes.page(workshop, { limit: 3 });
  const second = await notes.page(workshop, { limit: 3, cursor: first.next ?? '' });
  const third = await notes.page(workshop, { limit: 3, cursor: second.next ?? '' });
  expect([first, second, third].flatMap(({ items }) => items.map(({ id }) => id))).toEqual([...ids].reverse());
  expect([first.next, third.next]).toEqual([ids[4], null]);
  expect(third).toMatchObject({ count: 7, countIsExact: true });
});

describe('a transaction', () => {
  test('is all or nothing, and repositories join it without being handed it', async () => {
    const kept = note('kept');
    await expect(
      database.transaction(async () => {
        await notes.insert(ours, kept);
        await database.transaction(() => notes.insert(ours, note('inner')));
        throw new Error('changed my mind');
      }),
    ).rejects.toThrow('changed my mind');
    expect(await notes.find(ours, kept.id)).toBeUndefined();
    expect(await notes.list(ours, { where: { text: 'inner' } })).toEqual([]);
  });

  test('that lost a deadlock is repeated until it succeeds', async () => {
    const [first, second] = [await notes.insert(ours, note('a')), await notes.insert(ours, note('b'))];
    let attempts = 0;
    const cross = (one: string, other: string) =>
      database.transaction(async () => {
        attempts += 1;
        const { price_minor } = await notes.lock(ours, one);
        await new Promise((resolve) => setTimeout(resolve, 50));
        await notes.lock(ours, other);
        await notes.write(ours, one, { price_minor: price_minor - 1 });
      });
    await Promise.all([cross(first.id, second.id), cross(second.id, first.id)]);
    expect(attempts).toBeGreaterThan(2);
    expect(await notes.get(ours, first.id)).toMatchObject({ price_minor: first.price_minor - 1 });
  });

  test('fifty at once on one locked row lose nothing', async () => {
    const { id } = await notes.insert(ours, { ...note('balance'), price_minor: 0 });
    const add = () =>
      database.transaction(async () => {
        const { price_minor } = await notes.lock(ours, id);
        await notes.write(ours, id, { price_minor: price_minor + 1 });
      });
    await Promise.all(Array.from({ length: 50 }, add));
    expect(await notes.get(ours, id)).toMatchObject({ price_minor: 50 });
  });

  test('fifty at once from one version: one succeeds, the others are told', async () => {
    const { id } = await notes.insert(ours, note('contended'));
    const all = await Promise.allSettled(
      Array.from({ length: 50 }, (_, at) => notes.change(ours, { id, version: 1 }, { text: `by ${at}` })),
    );
    expect(all.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });
});

test('values are handed over, never written into the statement', async () => {
  const nasty = "x'); DROP TABLE notes; -- \\' \u0000";
  const { id } = await notes.insert(ours, note(nasty));
  expect(await notes.list(ours, { where: { text: nasty } })).toMatchObject([{ id }]);
  expect(await database.select('SELECT id FROM notes WHERE text = :nasty', { nasty })).toEqual([{ id }]);
});

test('errors are told apart: taken, unreachable, and faults of our own', async () => {
  const row = note('twice');
  await notes.insert(ours, row);
  expect(failureOf(await notes.insert(ours, row).catch((error: unknown) => error))).toBe('taken');
  const nowhere = new Database('mariadb://nobody@127.0.0.1:1/none', 1);
  expect(failureOf(await nowhere.select('SELECT 1').catch((error: unknown) => error))).toBe('unreachable');
  await nowhere.close();
  expect(failureOf(new TypeError('our own'))).toBeUndefined();
});

test('settings under which a commit could be lost are named', async () => {
  expect(await unsafeSettings(database)).toEqual(
    expect.arrayContaining(['innodb_flush_log_at_trx_commit=0 (must be 1)', 'innodb_doublewrite=OFF (must be ON)']),
  );
});
