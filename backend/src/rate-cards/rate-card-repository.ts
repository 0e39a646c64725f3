import { Op, type WhereOptions } from 'sequelize';
import type { Database } from '../platform/database/database';
import { countLimit, WorkshopRows, type Page, type PageAsked } from '../platform/database/workshop-rows';
import { rateCardTable, type RateCardHead, type RateCardRow } from './rate-card-model';

/** A content is large: a list goes without. */
const headColumns: (keyof RateCardHead)[] = [
  'workshopId',
  'id',
  'version',
  'name',
  'inForceFrom',
  'basedOnId',
  'changedAt',
];

/** The rate cards of each workshop; a card with a day is never changed again. */
export class RateCardRepository extends WorkshopRows<RateCardRow> {
  constructor(database: Database) {
    super(rateCardTable(database));
  }

  /** The card in force on a day: the latest of those that began by then. */
  inForce(workshopId: string, day: string): Promise<RateCardRow | undefined> {
    return this.latest(workshopId, { inForceFrom: { [Op.lte]: day } });
  }

  /** The card in force until the day another begins. */
  before(workshopId: string, day: string): Promise<RateCardRow | undefined> {
    return this.latest(workshopId, { inForceFrom: { [Op.lt]: day } });
  }

  /** The card in force on a day, without its content. */
  async headInForce(workshopId: string, day: string): Promise<RateCardHead | undefined> {
    const where = { inForceFrom: { [Op.lte]: day } };
    const [head] = await this.heads(workshopId, where, { order: [['inForceFrom', 'DESC']], limit: 1 });
    return head;
  }

  /** The card that begins on a day. */
  async headFrom(workshopId: string, day: string): Promise<RateCardHead | undefined> {
    const [head] = await this.heads(workshopId, { inForceFrom: day }, { order: [], limit: 1 });
    return head;
  }

  /** A draft that was copied from a card. */
  async headBasedOn(workshopId: string, id: string): Promise<RateCardHead | undefined> {
    const [head] = await this.heads(workshopId, { basedOnId: id }, { order: [], limit: 1 });
    return head;
  }

  /** A page of cards without their contents, the newest first; counting stops at 1,000. */
  async pageOfHeads(workshopId: string, { cursor, limit }: PageAsked): Promise<Page<RateCardHead>> {
    const older = cursor === undefined ? {} : { id: { [Op.lt]: cursor } };
    const rows = await this.heads(workshopId, older, { order: [['id', 'DESC']], limit: limit + 1 });
    const items = rows.slice(0, limit);
    const next = rows.length > limit ? (items.at(-1)?.id ?? null) : null;
    const count = await this.countTo(workshopId, {});
    return { items, next, count: Math.min(count, countLimit), countIsExact: count <= countLimit };
  }

  /** Changes a card that still is as it was read; its content takes no part in finding it. */
  changeHead(
    workshopId: string,
    { id, version }: RateCardHead,
    change: Partial<Pick<RateCardRow, 'name' | 'content' | 'inForceFrom' | 'changedAt'>>,
  ): Promise<RateCardRow> {
    return this.change(workshopId, { id, version }, change);
  }

  private async latest(workshopId: string, where: WhereOptions<RateCardRow>): Promise<RateCardRow | undefined> {
    const [row] = await this.list(workshopId, { where, order: [['inForceFrom', 'DESC']], limit: 1 });
    return row;
  }

  private async heads(
    workshopId: string,
    where: WhereOptions<RateCardRow>,
    { order, limit }: { order: [string, 'ASC' | 'DESC'][]; limit: number },
  ): Promise<RateCardHead[]> {
    const own = { [Op.and]: [{ workshopId }, where] } as WhereOptions<RateCardRow>;
    const rows = await this.table.findAll({ attributes: headColumns, where: own, order, limit, raw: true });
    return rows as unknown as RateCardHead[];
  }
}
