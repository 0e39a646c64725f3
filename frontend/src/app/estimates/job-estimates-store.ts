import { Injectable, computed, inject, resource, signal } from '@angular/core';
import type { EstimateSummary } from '#shared/estimates/estimate-schema';
import { beginEstimate, listEstimates } from '#shared/estimates/estimates-endpoints';
import { Api } from '../core/api/api';
import { newId } from '../core/new-id';

/** The estimates of one job: the first, later its variations. */
@Injectable()
export class JobEstimatesStore {
  private readonly api = inject(Api);
  private readonly jobId = signal<string | undefined>(undefined);
  private readonly listed = resource({
    params: () => this.jobId(),
    loader: ({ params: jobId, abortSignal }) =>
      this.api.call(listEstimates, { params: { jobId }, signal: abortSignal }),
  });
  private nextId = newId();

  readonly estimates = computed<readonly EstimateSummary[] | undefined>(() =>
    this.listed.hasValue() ? this.listed.value().items : undefined,
  );
  readonly problem = computed(() => this.listed.error()?.message ?? '');

  open(jobId: string): void {
    this.jobId.set(jobId);
  }

  reload(): void {
    this.listed.reload();
  }

  /** Begins an estimate; a second press before the answer begins the same one. */
  async begin(title: string): Promise<EstimateSummary> {
    const params = { jobId: this.jobId() ?? '', estimateId: this.nextId };
    const begun = await this.api.call(beginEstimate, { params, body: { title } });
    this.nextId = newId();
    return begun;
  }
}
