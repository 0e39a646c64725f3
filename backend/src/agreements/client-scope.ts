import type { ClientActor } from '#shared/actor/client-actor';
import { Rejection } from '#shared/problems/rejection';
import type { FrozenIssue, FrozenIssueService, IssueOfEstimate } from '../estimates';
import type { Jobs, NamedJobRow } from '../jobs';
import type { ClientAccessRepository } from './client-access-repository';

interface Parts {
  readonly jobs: Pick<Jobs, 'job' | 'service'>;
  readonly frozen: FrozenIssueService;
  readonly accesses: ClientAccessRepository;
}

/** An issue a client may read, with the job it belongs to. */
export interface ClientIssueRows extends FrozenIssue {
  readonly job: NamedJobRow;
}

const most = 100;

/** What a client may see: the job of their link, or all that is theirs; anything else is not there. */
export class ClientScope {
  constructor(private readonly parts: Parts) {}

  async jobs(client: ClientActor): Promise<NamedJobRow[]> {
    if (client.jobId !== null) return [await this.job(client, client.jobId)];
    const { workshopId, clientId } = client;
    const asked = { clientId, order: 'number', search: '', limit: most } as const;
    return (await this.parts.jobs.service.page(workshopId, asked)).items;
  }

  async job(client: ClientActor, jobId: string): Promise<NamedJobRow> {
    const job = await this.parts.jobs.job(client.workshopId, jobId);
    if (job.clientId !== client.clientId || (client.jobId !== null && client.jobId !== jobId))
      throw new Rejection('not-found', 'problem-not-found');
    return job;
  }

  /** All issues of a job, the newest first. */
  allOf(workshopId: string, jobId: string): Promise<IssueOfEstimate[]> {
    return this.parts.frozen.ofJob(workshopId, jobId);
  }

  /** Those a client is shown: sent or decided, or there when somebody gave them a link. */
  async shownOf(workshopId: string, jobId: string): Promise<IssueOfEstimate[]> {
    const issues = await this.allOf(workshopId, jobId);
    const accesses = await this.parts.accesses.ofJob(workshopId, jobId);
    const given = accesses.filter(({ purpose }) => purpose === 'link').map(({ createdAt }) => createdAt.getTime());
    return issues.filter(({ row }) => row.markedOn !== null || given.some((at) => at >= row.issuedAt.getTime()));
  }

  async issue(client: ClientActor, issueId: string): Promise<ClientIssueRows> {
    return this.withJob(client, await this.parts.frozen.read(client.workshopId, issueId));
  }

  /** The same, held until the transaction ends. */
  async hold(client: ClientActor, issueId: string): Promise<ClientIssueRows> {
    return this.withJob(client, await this.parts.frozen.hold(client.workshopId, issueId));
  }

  private async withJob(client: ClientActor, frozen: FrozenIssue): Promise<ClientIssueRows> {
    return { ...frozen, job: await this.job(client, frozen.estimate.jobId) };
  }
}
