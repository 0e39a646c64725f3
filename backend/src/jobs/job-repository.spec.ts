import { v7 as newId } from 'uuid';
import { freshDatabase } from '../../../test/database/fresh-database';
import { Database } from '../platform/database/database';
import { ClientRepository } from './client-repository';
import type { JobRow } from './job-model';
import { JobRepository, type JobsAsked } from './job-repository';

/** A workshop with more jobs than are counted, so that its common words are looked for row by row. */
const many = 1_100;
const now = new Date('2026-05-04T08:00:00.000Z');
const [workshopId, otherId] = [newId(), newId()];
let database: Database;
let jobs: JobRepository;

async function openWorkshop(id: string): Promise<string> {
  await database.execute(
    `INSERT INTO workshops (id, name, currency, locale, length_unit, time_zone, paper_size, country, address_lines, telephone, email,
       tax_registration, default_tax_category, version, created_at)
     VALUES (:id, 'Herons', 'EUR', 'en-GB', 'mm', 'Europe/Vienna', 'A4', 'AT', '[]', '', '', '', 'S', 1, NOW(3))`,
    { id },
  );
  const client = { name: 'Ashworth', kind: 'firm', contact: '', email: '', telephone: '', address: '' } as const;
  const rest = { website: '', taxRegistration: '', note: '', jobs: 0, version: 1, createdAt: now };
  return (await new ClientRepository(database).insert(id, { id: newId(), ...client, ...rest })).id;
}

const jobAt = (clientId: string, ordinal: number): Omit<JobRow, 'workshopId'> => ({
  ...{ id: newId(), clientId, year: 2026, ordinal, kind: 'new', reference: '', site: 'Great Hall', note: '' },
  title: `Console with ${ordinal % 2 === 0 ? 'herons' : 'dolphins'}${ordinal === 700 ? ' and one zebra' : ''}`,
  state: ordinal % 11 === 0 ? 'finished' : 'open',
  reached: 'open',
  version: 1,
  changedAt: new Date(now.getTime() + ordinal * 60_000),
  createdAt: now,
});

async function openMany(id: string, count: number): Promise<void> {
  const clientId = await openWorkshop(id);
  await database.transaction(async () => {
    for (let ordinal = 1; ordinal <= count; ordinal++) {
      await jobs.writeWords(id, await jobs.insert(id, jobAt(clientId, ordinal)), 'Ashworth');
    }
  });
}

beforeAll(async () => {
  database = new Database(await freshDatabase());
  jobs = new JobRepository(database);
  await openMany(workshopId, many);
  await openMany(otherId, 2);
}, 60_000);
afterAll(() => database.close());

const found = (asked: Partial<JobsAsked>) =>
  jobs.pageOf(workshopId, { search: '', order: 'number', limit: 3, ...asked });

describe('A search among many jobs', () => {
  it.each([
    ['by a word of all', 'cons', [1100, 1099, 1098], 1000, false],
    ['by three words of all', 'hall cons ash', [1100, 1099, 1098], 1000, false],
    ['by more words of all than are joined', 'hall cons ash great with', [1100, 1099, 1098], 1000, false],
    ['by a word of half of them', 'heron', [1100, 1098, 1096], 550, true],
    ['by a word of all and one of half', 'dolphins console', [1099, 1097, 1095], 550, true],
    ['by common words and a rare one', 'cons hall zeb', [700], 1, true],
    ['by words that never meet', 'zebra dolphins', [], 0, true],
    ['by a word of none', 'unicorn', [], 0, true],
    ['by a number', '2026-0700', [], 0, true],
    ['by its number', '2026-700', [700], 1, true],
    ['by a number without its noughts', '7', [799, 798, 797], 111, true],
  ])('%s', async (_sentence, search, ordinals, count, countIsExact) => {
    const page = await found({ search });
    expect(page.items.map(({ ordinal }) => ordinal)).toEqual(ordinals);
    expect({ count: page.count, isExact: page.countIsExact }).toEqual({ count, isExact: countIsExact });
  });

  it('is narrowed by a state as well', async () => {
    const page = await found({ search: 'cons hall', state: 'finished' });
    expect(page.items.map(({ ordinal }) => ordinal)).toEqual([1100, 1089, 1078]);
    expect([page.count, page.countIsExact]).toEqual([100, true]);
  });

  it('goes on where the page ended', async () => {
    const first = await found({ search: 'cons', order: 'changed' });
    const second = await found({ search: 'cons', order: 'changed', cursor: first.next ?? '' });
    expect(second.items.map(({ ordinal }) => ordinal)).toEqual([1097, 1096, 1095]);
  });

  it('never meets another workshop’s', async () => {
    const page = await jobs.pageOf(otherId, { search: 'cons hall', order: 'number', limit: 10 });
    expect([page.items.map(({ ordinal }) => ordinal), page.count]).toEqual([[2, 1], 2]);
  });
});
