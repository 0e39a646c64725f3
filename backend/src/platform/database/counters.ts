import type { Database } from './database';
import { isInTransaction } from './is-in-transaction';

/** Running numbers of a workshop: each series begins at 1 every year, and has no gaps. */
export class Counters {
  constructor(private readonly database: Database) {}

  /** The next number of a series; it is taken only if the transaction it is raised in is kept, and others wait until then. */
  async next(workshopId: string, series: string, year: number): Promise<number> {
    if (!isInTransaction()) throw new Error('a number is taken in the transaction of what bears it');
    await this.database.execute(
      `INSERT INTO counters (workshop_id, series, year, last) VALUES (:workshopId, :series, :year, 1)
       ON DUPLICATE KEY UPDATE last = last + 1`,
      { workshopId, series, year },
    );
    const [counter] = await this.database.select<{ last: number }>(
      'SELECT last FROM counters WHERE workshop_id = :workshopId AND series = :series AND year = :year',
      { workshopId, series, year },
    );
    if (!counter) throw new Error(`the counter of ${series} was not raised`);
    return counter.last;
  }
}
