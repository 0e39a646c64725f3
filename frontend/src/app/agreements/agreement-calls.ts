import { Injectable, inject } from '@angular/core';
import type { AccessRequest } from '#shared/agreements/access-schema';
import { giveAccess, listAccesses, revokeAccess } from '#shared/agreements/accesses-endpoints';
import { beginVariation, readAgreement } from '#shared/agreements/agreement-endpoints';
import { answerQuestion, listQuestions } from '#shared/agreements/questions-endpoints';
import { listEstimates } from '#shared/estimates/estimates-endpoints';
import { Api } from '../core/api/api';

/** The calls about what a workshop and a client settle on a job. */
@Injectable({ providedIn: 'root' })
export class AgreementCalls {
  private readonly api = inject(Api);

  giveAccess(issueId: string, body: AccessRequest) {
    return this.api.call(giveAccess, { params: { issueId }, body });
  }

  async accesses(jobId: string, signal: AbortSignal) {
    return (await this.api.call(listAccesses, { params: { jobId }, signal })).items;
  }

  revoke(accessId: string) {
    return this.api.call(revokeAccess, { params: { accessId } });
  }

  agreement(jobId: string, signal: AbortSignal) {
    return this.api.call(readAgreement, { params: { jobId }, signal });
  }

  /** How many variations were begun, whatever became of them. */
  async variationsBegun(jobId: string): Promise<number> {
    const { items } = await this.api.call(listEstimates, { params: { jobId } });
    return items.filter(({ kind }) => kind === 'variation').length;
  }

  beginVariation(jobId: string, body: { id: string; title: string }) {
    return this.api.call(beginVariation, { params: { jobId }, body });
  }

  async questions(jobId: string, signal: AbortSignal) {
    return (await this.api.call(listQuestions, { params: { jobId }, signal })).items;
  }

  answer(jobId: string, body: { issueId: string; text: string }) {
    return this.api.call(answerQuestion, { params: { jobId }, body });
  }
}
