import { Injectable, computed, inject, resource, signal } from '@angular/core';
import type { Job } from '#shared/jobs/job-schema';
import { JobCalls } from './job-calls';

/** The job whose page is open. */
@Injectable()
export class JobStore {
  private readonly calls = inject(JobCalls);
  private readonly jobId = signal<string | undefined>(undefined);
  private readonly kept = resource({
    params: () => this.jobId(),
    loader: ({ params, abortSignal }) => this.calls.read(params, abortSignal),
  });

  readonly job = computed(() => (this.kept.hasValue() ? this.kept.value() : undefined));
  readonly problem = computed(() => this.kept.error()?.message ?? '');

  open(jobId: string): void {
    this.jobId.set(jobId);
  }

  reload(): void {
    this.kept.reload();
  }

  /** The job as it was kept just now. */
  put(job: Job): void {
    this.kept.set(job);
  }

  async finish(job: Job, isFinished: boolean): Promise<void> {
    this.kept.set(await this.calls.finish(job, isFinished));
  }

  remove(job: Job): Promise<void> {
    return this.calls.remove(job);
  }
}
