import { Injectable, inject } from '@angular/core';
import type { AnswerOf, BodyOf } from '#shared/actor/endpoint';
import type { Change } from '#shared/estimates/change-schema';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { CostedEstimate, KeptChanges } from '#shared/estimates/estimate-schema';
import {
  changeEstimate,
  readAlternatives,
  readEstimate,
  takeRateCard,
  tellPresence,
} from '#shared/estimates/estimates-endpoints';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { listIssues } from '#shared/estimates/issues-endpoints';
import type { Job } from '#shared/jobs/job-schema';
import { readJob } from '#shared/jobs/jobs-endpoints';
import { readRateCard, type WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { Api } from '../core/api/api';
import type { ReadEstimate } from './draft/read-estimate';

/** A card an estimate is worked on, and the one it was copied from: none for the card a workshop was founded with. */
export type KnownCard = Pick<WholeRateCard, 'content' | 'basedOnId'>;

/** The calls the workspace of an estimate makes. */
@Injectable({ providedIn: 'root' })
export class EstimateClient {
  private readonly api = inject(Api);

  read(estimateId: string): Promise<ReadEstimate> {
    return this.api.call(readEstimate, { params: { estimateId } });
  }

  job(jobId: string, signal: AbortSignal): Promise<Job> {
    return this.api.call(readJob, { params: { jobId }, signal });
  }

  card(rateCardId: string, signal: AbortSignal): Promise<KnownCard> {
    return this.api.call(readRateCard, { params: { rateCardId }, signal });
  }

  async issues(estimateId: string, signal: AbortSignal): Promise<readonly PricedIssueSummary[]> {
    return (await this.api.call(listIssues, { params: { estimateId }, signal })).items;
  }

  change(estimateId: string, changes: readonly Change[]): Promise<KeptChanges> {
    const body = { changes } as BodyOf<typeof changeEstimate>;
    return this.api.call(changeEstimate, { params: { estimateId }, body });
  }

  takeCard(seen: { id: string; version: number }, rateCardId: string): Promise<CostedEstimate> {
    const { id: estimateId, version } = seen;
    return this.api.call(takeRateCard, { params: { estimateId }, body: { rateCardId }, version });
  }

  async alternatives(estimateId: string, signal: AbortSignal): Promise<readonly AlternativeTotal[]> {
    return (await this.api.call(readAlternatives, { params: { estimateId }, signal })).items;
  }

  /** Nobody's hand makes this call: it keeps no session alive. */
  presence(estimateId: string): Promise<AnswerOf<typeof tellPresence>> {
    return this.api.call(tellPresence, { params: { estimateId }, unattended: true });
  }
}
