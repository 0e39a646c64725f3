import type { Order, WhereOptions } from 'sequelize';
import { Op } from 'sequelize';
import { Rejection } from '#shared/problems/rejection';
import type { Table } from './database';

/** What every row of a workshop has: it belongs to the workshop by its key, so that no query can forget whose it is. */
export interface WorkshopRow {
  readonly workshopId: string;
  readonly id: string;
}

/** A row that two people may change: the second of them is told. */
export interface VersionedRow extends WorkshopRow {
  readonly version: number;
}

/** Which part of a list is wanted: the query every list understands (`page-schema.ts`). */
export interface PageAsked {
  readonly cursor?: string | undefined;
  readonly limit: number;
}

export interface Page<R> {
  readonly items: R[];
  readonly next: string | null;
  readonly count: number;
  readonly countIsExact: boolean;
}

export const countLimit = 1_000;

interface Listing<R> {
  readonly where?: WhereOptions<R>;
  readonly order?: Order;
  readonly limit?: number;
}

/** The base of a repository: every method takes the workshop first. Ids are in order of time, so they serve as cursors. */
export class WorkshopRows<R extends WorkshopRow> {
  constructor(protected readonly table: Table<R>) {}

  async find(workshopId: string, id: string): Promise<R | undefined> {
    const [row] = await this.list(workshopId, { where: { id } as WhereOptions<R>, limit: 1 });
    return row;
  }

  /** The row, or a refusal as not found: another workshop's row is no more than a row that is not there. */
  async get(workshopId: string, id: string): Promise<R> {
    const row = await this.find(workshopId, id);
    if (!row) throw new Rejection('not-found', 'problem-not-found');
    return row;
  }

  /** The row if there is one, held against others until the transaction ends. */
  async hold(workshopId: string, id: string): Promise<R | undefined> {
    const where = { workshopId, id } as WhereOptions<R>;
    const row = await this.table.findOne({ where, raw: true, lock: true });
    return (row as unknown as R | null) ?? undefined;
  }

  /** The row, held against others until the transaction ends; refused as not found like `get`. */
  async lock(workshopId: string, id: string): Promise<R> {
    const row = await this.hold(workshopId, id);
    if (!row) throw new Rejection('not-found', 'problem-not-found');
    return row;
  }

  async list(workshopId: string, listing: Listing<R> = {}): Promise<R[]> {
    const { where = {}, order = [['id', 'ASC']], limit } = listing;
    const own = { [Op.and]: [{ workshopId }, where] } as WhereOptions<R>;
    const rows = await this.table.findAll({ where: own, order, raw: true, ...(limit === undefined ? {} : { limit }) });
    return rows as unknown as R[];
  }

  /** Newest first, from the cursor on; counting stops at 1,000. */
  async page(workshopId: string, asked: PageAsked, where: WhereOptions<R> = {}): Promise<Page<R>> {
    const older = asked.cursor === undefined ? {} : { id: { [Op.lt]: asked.cursor } };
    const all = { [Op.and]: [older, where] } as WhereOptions<R>;
    const rows = await this.list(workshopId, { where: all, order: [['id', 'DESC']], limit: asked.limit + 1 });
    const items = rows.slice(0, asked.limit);
    const next = rows.length > asked.limit ? (items.at(-1)?.id ?? null) : null;
    const count = await this.countTo(workshopId, where);
    return { items, next, count: Math.min(count, countLimit), countIsExact: count <= countLimit };
  }

  async insert(workshopId: string, row: Omit<R, 'workshopId'>): Promise<R> {
    const whole = { ...row, workshopId } as R;
    await this.table.create(whole as never);
    return whole;
  }

  /** Writes over what is there; for rows that carry a version use `change`. */
  async write(workshopId: string, id: string, change: Partial<Omit<R, keyof WorkshopRow>>): Promise<void> {
    await this.table.update(change as never, { where: { workshopId, id } as WhereOptions<R> });
  }

  /** Writes over whatever fits, for states that only lead one way. */
  async writeWhere(
    workshopId: string,
    where: WhereOptions<R>,
    change: Partial<Omit<R, keyof WorkshopRow>>,
  ): Promise<void> {
    const own = { [Op.and]: [{ workshopId }, where] } as WhereOptions<R>;
    await this.table.update(change as never, { where: own });
  }

  /** Changes the row if it still is at `version`, and raises it; else refuses as stale with the row as it stands now. */
  async change(
    workshopId: string,
    at: { id: string; version: number },
    change: Partial<Omit<R, 'id' | 'workshopId' | 'version'>>,
  ): Promise<R> {
    const next = { ...change, version: at.version + 1 };
    const [changed] = await this.table.update(next as never, {
      where: { workshopId, ...at } as unknown as WhereOptions<R>,
    });
    const current = await this.get(workshopId, at.id);
    if (changed === 0) throw new Rejection('stale', 'problem-stale', { detail: current });
    return current;
  }

  /** How many rows there are, counted to one more than 1,000. */
  protected async countTo(workshopId: string, where: WhereOptions<R>): Promise<number> {
    const own = { [Op.and]: [{ workshopId }, where] } as WhereOptions<R>;
    const rows = await this.table.findAll({ attributes: ['id'], where: own, limit: countLimit + 1, raw: true });
    return rows.length;
  }

  async remove(workshopId: string, id: string): Promise<boolean> {
    return (await this.table.destroy({ where: { workshopId, id } as WhereOptions<R> })) > 0;
  }
}
