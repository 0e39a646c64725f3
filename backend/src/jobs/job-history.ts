import type { WordCode, WordValues } from '#shared/words/word-code';
import type { AuditService, Doer } from '../audit';
import type { JobRow } from './job-model';
import { jobNumber } from './job-number';

/** What was done to a job, and what was known of it before and after. */
export interface JobDeed {
  readonly code: WordCode;
  readonly values?: WordValues;
  readonly before?: unknown;
  readonly after?: unknown;
}

/** Writes down what was done to jobs. */
export class JobHistory {
  constructor(private readonly audit: AuditService) {}

  record(by: Doer, job: JobRow, { values, ...deed }: JobDeed): Promise<void> {
    const named = { number: jobNumber(job), title: job.title, ...values };
    return this.audit.record(by, { subject: { kind: 'job', id: job.id }, jobId: job.id, values: named, ...deed });
  }
}
