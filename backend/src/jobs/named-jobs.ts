import type { Page } from '../platform/database/workshop-rows';
import { Rejection } from '#shared/problems/rejection';
import type { ClientRepository } from './client-repository';
import type { JobRow, NamedJobRow } from './job-model';
import type { JobRepository, JobsAsked } from './job-repository';

/** Jobs as everybody reads them: with what their clients are called, asked for all at once. */
export class NamedJobs {
  constructor(
    private readonly jobs: JobRepository,
    private readonly clients: ClientRepository,
  ) {}

  async page(workshopId: string, asked: JobsAsked): Promise<Page<NamedJobRow>> {
    const page = await this.jobs.pageOf(workshopId, asked);
    return { ...page, items: await this.named(workshopId, page.items) };
  }

  async several(workshopId: string, jobIds: readonly string[]): Promise<NamedJobRow[]> {
    return this.named(workshopId, await this.jobs.several(workshopId, jobIds));
  }

  async get(workshopId: string, jobId: string): Promise<NamedJobRow> {
    return this.found(workshopId, await this.jobs.find(workshopId, jobId));
  }

  /** The job, held until the transaction ends. */
  async lock(workshopId: string, jobId: string): Promise<NamedJobRow> {
    return this.found(workshopId, await this.jobs.hold(workshopId, jobId));
  }

  /** The job if there is one, held until the transaction ends. */
  async hold(workshopId: string, jobId: string): Promise<NamedJobRow | undefined> {
    const job = await this.jobs.hold(workshopId, jobId);
    return job && this.found(workshopId, job);
  }

  private async found(workshopId: string, job: JobRow | undefined): Promise<NamedJobRow> {
    const [named] = await this.named(workshopId, job ? [job] : []);
    if (!named) throw new Rejection('not-found', 'problem-not-found');
    return named;
  }

  private async named(workshopId: string, jobs: readonly JobRow[]): Promise<NamedJobRow[]> {
    if (jobs.length === 0) return [];
    const ids = jobs.map(({ clientId }) => clientId);
    const names = await this.clients.names(workshopId, ids);
    return jobs.map((job) => ({ ...job, clientName: names.get(job.clientId) ?? '' }));
  }
}
