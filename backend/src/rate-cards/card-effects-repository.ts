import type { WhereOptions } from 'sequelize';
import type { Database } from '../platform/database/database';
import { outsideTransaction } from '../platform/database/is-in-transaction';
import { WorkshopRows, type VersionedRow, type WorkshopRow } from '../platform/database/workshop-rows';
import { cardEffectsTable, type CardEffectsRow } from './card-effects-model';

type Change = Partial<Omit<CardEffectsRow, keyof WorkshopRow | 'runId'>>;

/** One asking for the effects of a card. */
export interface EffectsRun {
  readonly rateCardId: string;
  readonly runId: string;
}

export class CardEffectsRepository extends WorkshopRows<CardEffectsRow> {
  constructor(database: Database) {
    super(cardEffectsTable(database));
  }

  /** Puts a new asking in place of whatever was known. */
  async begin(workshopId: string, row: Omit<CardEffectsRow, 'workshopId'>): Promise<CardEffectsRow> {
    const whole = { ...row, workshopId };
    await this.table.upsert(whole);
    return whole;
  }

  /** The card has another version, but its content is what the effects were worked out from. */
  async follow(workshopId: string, before: VersionedRow, version: number): Promise<void> {
    const where = { workshopId, id: before.id, cardVersion: before.version };
    await this.table.update({ cardVersion: version }, { where });
  }

  /** Writes what one asking has come to, unless another came after it. */
  async writeRun(workshopId: string, { rateCardId, runId }: EffectsRun, change: Change): Promise<boolean> {
    const where = { workshopId, id: rateCardId, runId } as WhereOptions<CardEffectsRow>;
    const [changed] = await this.table.update(change, { where });
    return changed > 0;
  }

  /** The same at once, for whoever waits and looks: not only when the task's transaction has ended. */
  tellRun(workshopId: string, run: EffectsRun, change: Change): Promise<boolean> {
    return outsideTransaction(() => this.writeRun(workshopId, run, change));
  }
}
