import { Injectable, inject } from '@angular/core';
import type { HistoryEntry } from '#shared/audit/history-schema';
import { listHistory } from '#shared/audit/history-endpoints';
import type { Job, JobContent, JobOrder, JobState } from '#shared/jobs/job-schema';
import { finishJob, keepJob, listJobs, readJob, removeJob } from '#shared/jobs/jobs-endpoints';
import { Api } from '../core/api/api';
import type { ListPage } from '../core/lists/paged-list';

/** Which jobs, in which order. */
export interface JobsAsked {
  readonly search: string;
  readonly state?: JobState | undefined;
  readonly clientId?: string | undefined;
  readonly order: JobOrder;
}

/** One entry of a job’s history, as everybody who may read it sees it. */
export type HistoryLine = Omit<HistoryEntry, 'before' | 'after'>;

interface Seen {
  readonly id: string;
  readonly version: number;
}

/** The calls about jobs. */
@Injectable({ providedIn: 'root' })
export class JobCalls {
  private readonly api = inject(Api);

  list(asked: JobsAsked, cursor: string | undefined, signal: AbortSignal): Promise<ListPage<Job>> {
    return this.api.call(listJobs, { query: { ...asked, cursor }, signal });
  }

  read(jobId: string, signal: AbortSignal): Promise<Job> {
    return this.api.call(readJob, { params: { jobId }, signal });
  }

  keep({ id, version }: Seen, body: JobContent): Promise<Job> {
    return this.api.call(keepJob, { params: { jobId: id }, version, body });
  }

  finish({ id, version }: Seen, isFinished: boolean): Promise<Job> {
    return this.api.call(finishJob, { params: { jobId: id }, version, body: { isFinished } });
  }

  async remove({ id, version }: Seen): Promise<void> {
    await this.api.call(removeJob, { params: { jobId: id }, version });
  }

  history(jobId: string, cursor: string | undefined, signal: AbortSignal): Promise<ListPage<HistoryLine>> {
    return this.api.call(listHistory, { query: { jobId, cursor, limit: 20 }, signal });
  }
}
