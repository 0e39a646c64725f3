import { Op } from 'sequelize';
import type { Database } from '../platform/database/database';
import { outsideTransaction } from '../platform/database/is-in-transaction';
import { WorkshopRows, type WorkshopRow } from '../platform/database/workshop-rows';
import { solutionTable, type SolutionRow } from './solution-model';

export type SolutionChange = Partial<Omit<SolutionRow, keyof WorkshopRow>>;

/** Planning on the server. */
export class SolutionRepository extends WorkshopRows<SolutionRow> {
  constructor(database: Database) {
    super(solutionTable(database));
  }

  /** What is waiting or being worked out of a programme. */
  async running(workshopId: string, programmeId: string): Promise<SolutionRow | undefined> {
    const where = { programmeId, state: { [Op.in]: ['waiting', 'working'] as const } };
    const [row] = await this.list(workshopId, { where, order: [['id', 'DESC']], limit: 1 });
    return row;
  }

  /** How many of a workshop are waiting or being worked out. */
  async runningOf(workshopId: string): Promise<number> {
    const where = { state: { [Op.in]: ['waiting', 'working'] as const } };
    return (await this.list(workshopId, { where, limit: 100 })).length;
  }

  /** Only the newest of a programme is kept: what is left of older ones is in the plan, if it was any good. */
  async forgetEnded(workshopId: string, programmeId: string): Promise<void> {
    await this.table.destroy({ where: { workshopId, programmeId, state: { [Op.notIn]: ['waiting', 'working'] } } });
  }

  /** Written at once, for whoever waits and looks: not only when the task's transaction has ended. */
  tell(workshopId: string, id: string, change: SolutionChange): Promise<void> {
    return outsideTransaction(() => this.write(workshopId, id, change));
  }

  /** As others have written it meanwhile. */
  asTold(workshopId: string, id: string): Promise<SolutionRow | undefined> {
    return outsideTransaction(() => this.find(workshopId, id));
  }
}
