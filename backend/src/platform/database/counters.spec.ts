import { v7 as newId } from 'uuid';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { Counters } from './counters';
import { Database } from './database';

let database: Database;
let counters: Counters;
const workshopId = newId();

beforeAll(async () => {
  database = new Database(await freshDatabase());
  counters = new Counters(database);
  await database.execute(
    `INSERT INTO workshops (id, name, currency, locale, length_unit, time_zone, paper_size, country, address_lines, telephone, email,
       tax_registration, default_tax_category, version, created_at)
     VALUES (:workshopId, 'Herons', 'EUR', 'en-GB', 'mm', 'Europe/Vienna', 'A4', 'AT', '[]', '', '', '', 'S', 1, NOW(3))`,
    { workshopId },
  );
}, 60_000);
afterAll(() => database.close());

const next = (series: string, year: number): Promise<number> =>
  database.transaction(() => counters.next(workshopId, series, year));

describe('A counter', () => {
  it('begins at 1 in every series and every year', async () => {
    expect([
      await next('job', 2026),
      await next('job', 2026),
      await next('job', 2027),
      await next('invoice', 2026),
    ]).toEqual([1, 2, 1, 1]);
  });

  it('gives each number once, however many ask at the same time', async () => {
    const numbers = await Promise.all(Array.from({ length: 20 }, () => next('crowd', 2026)));
    expect(numbers.sort((one, other) => one - other)).toEqual(Array.from({ length: 20 }, (_, index) => index + 1));
  });

  it('takes a number back when what bears it is not kept', async () => {
    const failing = database.transaction(async () => {
      await counters.next(workshopId, 'undone', 2026);
      throw new Error('not kept');
    });
    await expect(failing).rejects.toThrow('not kept');
    expect(await next('undone', 2026)).toBe(1);
  });

  it('gives no number outside a transaction', async () => {
    await expect(counters.next(workshopId, 'job', 2026)).rejects.toThrow('in the transaction');
  });
});
