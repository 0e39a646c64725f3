import { Op, type WhereOptions } from 'sequelize';
import type { JobOrder, JobState } from '#shared/jobs/job-schema';
import type { Database } from '../platform/database/database';
import { ListedRows } from '../platform/database/listed-rows';
import { SearchWords } from '../platform/database/search-words';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import { jobListOrders } from './job-list-order';
import { jobTable, type JobRow } from './job-model';
import { jobNumber } from './job-number';

/** Which jobs are asked for, in which order. */
export interface JobsAsked extends PageAsked {
  readonly search: string;
  readonly order: JobOrder;
  readonly state?: JobState | undefined;
  readonly clientId?: string | undefined;
}

const textOf = (job: JobRow, clientName: string): string =>
  [jobNumber(job), job.ordinal, job.title, job.reference, job.site, clientName].join(' ');

export class JobRepository extends ListedRows<JobRow> {
  constructor(database: Database) {
    super(jobTable(database), new SearchWords(database, 'job'));
  }

  pageOf(workshopId: string, { state, clientId, order, ...asked }: JobsAsked): Promise<Page<JobRow>> {
    const filter: WhereOptions<JobRow> = { ...(state ? { state } : {}), ...(clientId ? { clientId } : {}) };
    const where = state || clientId ? { where: filter } : {};
    return this.pageInOrder(workshopId, { ...asked, ...where, order: jobListOrders[order] });
  }

  several(workshopId: string, ids: readonly string[]): Promise<JobRow[]> {
    return this.list(workshopId, { where: { id: { [Op.in]: [...ids] } } });
  }

  /** Writes down the words by which the job is found, those of its client's name among them. */
  writeWords(workshopId: string, job: JobRow, clientName: string): Promise<void> {
    return this.words.write(workshopId, [{ id: job.id, text: textOf(job, clientName) }]);
  }

  /** Writes the words of all jobs of a client anew, whose name is another now. */
  async writeWordsOfClient(workshopId: string, clientId: string, clientName: string): Promise<void> {
    const jobs = await this.list(workshopId, { where: { clientId } });
    await this.words.write(
      workshopId,
      jobs.map((job) => ({ id: job.id, text: textOf(job, clientName) })),
    );
  }

  removeWords(workshopId: string, id: string): Promise<void> {
    return this.words.remove(workshopId, [id]);
  }
}
