import type { Actor } from '#shared/actor/actor';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { JobContent } from '#shared/jobs/job-schema';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { Clock } from '../platform/clock/clock';
import type { Counters } from '../platform/database/counters';
import { atOf, keepingOf, refuseStale, type Seen } from '../platform/database/keeping';
import type { Page } from '../platform/database/workshop-rows';
import type { ClientRow } from './client-model';
import type { ClientRepository } from './client-repository';
import type { JobHistory } from './job-history';
import type { JobRow, NamedJobRow } from './job-model';
import { presentJobContent } from './job-presenter';
import type { JobRepository, JobsAsked } from './job-repository';
import type { NamedJobs } from './named-jobs';

/** What jobs ask of the estimates, which stand after them. */
export interface JobEstimates {
  /** Whether anything of the job was issued. */
  readonly hasIssues: (workshopId: string, jobId: string) => Promise<boolean>;
  /** Removes the drafts of a job of which nothing was issued. */
  readonly dropDrafts: (workshopId: string, jobId: string) => Promise<void>;
}

interface Parts {
  readonly jobs: JobRepository;
  readonly named: NamedJobs;
  readonly clients: ClientRepository;
  readonly counters: Counters;
  readonly workshops: Pick<WorkshopService, 'get'>;
  readonly history: JobHistory;
  readonly clock: Clock;
  readonly estimates: JobEstimates;
}

/** The jobs of a workshop: found, opened, changed and removed. */
export class JobService {
  constructor(private readonly parts: Parts) {}

  page(workshopId: string, asked: JobsAsked): Promise<Page<NamedJobRow>> {
    return this.parts.named.page(workshopId, asked);
  }

  get(workshopId: string, jobId: string): Promise<NamedJobRow> {
    return this.parts.named.get(workshopId, jobId);
  }

  /** Opens a job or changes what is known of it; what was sent twice is kept once. */
  async keep(actor: Actor, seen: Seen, content: JobContent): Promise<NamedJobRow> {
    const client = await this.clientOf(actor.workshopId, content.clientId);
    const row = await this.parts.named.hold(actor.workshopId, seen.id);
    const keeping = keepingOf(row, seen.version, content);
    if (keeping.is === 'repeat') return keeping.row;
    const kept = await (keeping.is === 'entry'
      ? this.open(actor, seen.id, content)
      : this.change(actor, keeping.from, content));
    await this.parts.jobs.writeWords(actor.workshopId, kept, client.name);
    return { ...kept, clientName: client.name };
  }

  /** Removes a job of which nothing was issued. */
  async remove(actor: Actor, { id, version }: Seen): Promise<void> {
    const { jobs, named, clients, history, estimates } = this.parts;
    const job = await named.lock(actor.workshopId, id);
    refuseStale(job, version);
    if (await estimates.hasIssues(actor.workshopId, id)) throw new Rejection('conflict', 'job-has-issues');
    await estimates.dropDrafts(actor.workshopId, id);
    await jobs.removeWords(actor.workshopId, id);
    await jobs.remove(actor.workshopId, id);
    await clients.countJobs(actor.workshopId, job.clientId, -1);
    await history.record(actor, job, { code: 'history-job-removed', before: presentJobContent(job) });
  }

  /** The client, held until the job is kept: nobody removes them meanwhile, and a job sent twice at once is opened once. */
  private async clientOf(workshopId: string, clientId: string): Promise<ClientRow> {
    const client = await this.parts.clients.hold(workshopId, clientId);
    if (client) return client;
    const complaint = { path: ['clientId'], code: 'client-unknown', values: {} } as const;
    throw new Rejection('not-found', 'client-unknown', { complaints: [complaint] });
  }

  private async open(actor: Actor, id: string, content: JobContent): Promise<JobRow> {
    const { jobs, clients, counters, history, clock } = this.parts;
    const { workshopId } = actor;
    const now = clock.now();
    const year = await this.yearOf(workshopId, now);
    const ordinal = await counters.next(workshopId, 'job', year);
    const start = { id, year, ordinal, state: 'open', reached: 'open', version: 1 } as const;
    const job = await jobs.insert(workshopId, { ...content, ...start, changedAt: now, createdAt: now });
    await clients.countJobs(workshopId, content.clientId, 1);
    await history.record(actor, job, { code: 'history-job-opened', after: content });
    return job;
  }

  private async change(actor: Actor, before: NamedJobRow, content: JobContent): Promise<JobRow> {
    const { jobs, clients, history, clock } = this.parts;
    const { workshopId } = actor;
    const after = await jobs.change(workshopId, atOf(before), { ...content, changedAt: clock.now() });
    if (before.clientId !== content.clientId) {
      await clients.countJobs(workshopId, before.clientId, -1);
      await clients.countJobs(workshopId, content.clientId, 1);
    }
    const change = { before: presentJobContent(before), after: content };
    await history.record(actor, after, { code: 'history-job-changed', ...change });
    return after;
  }

  private async yearOf(workshopId: string, now: Date): Promise<number> {
    const { timeZone } = await this.parts.workshops.get(workshopId);
    return Number(dayOfInstant(now.getTime(), timeZone).slice(0, 4));
  }
}
