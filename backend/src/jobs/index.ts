import type { ReachedState } from '#shared/jobs/job-schema';
import type { Accounts } from '../accounts';
import type { Audit, Doer } from '../audit';
import { Counters } from '../platform/database/counters';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import type { ClientRow } from './client-model';
import { ClientRepository } from './client-repository';
import { ClientService } from './client-service';
import { clientsRoutes } from './clients-routes';
import { JobHistory } from './job-history';
import type { NamedJobRow } from './job-model';
import { JobRepository } from './job-repository';
import { JobService, type JobEstimates } from './job-service';
import { JobStateService } from './job-state-service';
import { jobsRoutes } from './jobs-routes';
import { NamedJobs } from './named-jobs';

export type { ClientRow } from './client-model';
export type { ClientService } from './client-service';
export type { NamedJobRow } from './job-model';
export { jobNumber } from './job-number';
export type { JobEstimates, JobService } from './job-service';

/** What other features and the start data may ask of this one. */
export interface Jobs {
  readonly service: JobService;
  readonly clients: ClientService;
  /** A job with its client's name, refused as not found in any other workshop. */
  readonly job: (workshopId: string, jobId: string) => Promise<NamedJobRow>;
  /** Those of these jobs that are the workshop's, asked for all at once. */
  readonly several: (workshopId: string, jobIds: readonly string[]) => Promise<NamedJobRow[]>;
  readonly client: (workshopId: string, clientId: string) => Promise<ClientRow>;
  /** What clients are called, by their ids, asked for all at once. */
  readonly clientNames: (workshopId: string, clientIds: readonly string[]) => Promise<ReadonlyMap<string, string>>;
  /** Says where issues have brought a job; called in the transaction that brings it there. */
  readonly markState: (by: Doer, jobId: string, reached: ReachedState) => Promise<void>;
  /** Says that somebody worked on a job. */
  readonly touch: (workshopId: string, jobId: string) => Promise<void>;
  readonly routes: readonly Route[];
}

/** What this feature stands on, and what later ones tell it. */
export interface JobsParts {
  readonly audit: Audit;
  readonly accounts: Accounts;
  readonly estimates: JobEstimates;
}

/** Clients and their jobs. */
export function openJobs({ database, clock }: Platform, { audit, accounts, estimates }: JobsParts): Jobs {
  const clients = new ClientRepository(database);
  const jobs = new JobRepository(database);
  const base = { clients, jobs, clock, named: new NamedJobs(jobs, clients), history: new JobHistory(audit.service) };
  const counters = new Counters(database);
  const service = new JobService({ ...base, counters, workshops: accounts.workshops, estimates });
  const states = new JobStateService(base);
  const clientService = new ClientService({ ...base, audit: audit.service });
  return {
    service,
    clients: clientService,
    job: (workshopId, jobId) => service.get(workshopId, jobId),
    several: (workshopId, jobIds) => base.named.several(workshopId, jobIds),
    client: (workshopId, clientId) => clientService.get(workshopId, clientId),
    clientNames: (workshopId, clientIds) => clients.names(workshopId, clientIds),
    markState: (by, jobId, reached) => states.mark(by, jobId, reached),
    touch: (workshopId, jobId) => states.touch(workshopId, jobId),
    routes: [...clientsRoutes(clientService), ...jobsRoutes({ jobs: service, states })],
  };
}
