import { Injectable, inject } from '@angular/core';
import type { Workshop } from '#shared/accounts/workshop-schema';
import { readLogo, readWorkshop } from '#shared/accounts/workshop-endpoints';
import type { AnswerOf } from '#shared/actor/endpoint';
import type { issueMarkSchema, issueRequestSchema, Paper, PricedIssueSummary } from '#shared/estimates/issue-schema';
import {
  issueEstimate,
  markIssue,
  readBenchSheet,
  readDifferences,
  readIssue,
  readPaper,
} from '#shared/estimates/issues-endpoints';
import type { Client } from '#shared/jobs/client-schema';
import { readClient } from '#shared/jobs/clients-endpoints';
import type * as z from 'zod';
import { addressOf } from '../../core/api/address-of';
import { Api } from '../../core/api/api';

export type IssueRequest = z.input<typeof issueRequestSchema>;
export type IssueMark = z.input<typeof issueMarkSchema>;
export type ReadIssue = AnswerOf<typeof readIssue>;
export type Differences = AnswerOf<typeof readDifferences>;

/** The calls about issues and their papers. */
@Injectable({ providedIn: 'root' })
export class IssueClient {
  private readonly api = inject(Api);

  issue(estimateId: string, body: IssueRequest, idempotencyKey: string): Promise<PricedIssueSummary> {
    return this.api.call(issueEstimate, { params: { estimateId }, body, idempotencyKey });
  }

  differences(estimateId: string, signal: AbortSignal): Promise<Differences> {
    return this.api.call(readDifferences, { params: { estimateId }, signal });
  }

  read(issueId: string, signal: AbortSignal): Promise<ReadIssue> {
    return this.api.call(readIssue, { params: { issueId }, signal });
  }

  mark(issueId: string, body: IssueMark): Promise<PricedIssueSummary> {
    return this.api.call(markIssue, { params: { issueId }, body });
  }

  workshop(signal: AbortSignal): Promise<Workshop> {
    return this.api.call(readWorkshop, { signal });
  }

  client(clientId: string, signal: AbortSignal): Promise<Client> {
    return this.api.call(readClient, { params: { clientId }, signal });
  }

  logoAddress(): string {
    return addressOf(readLogo);
  }

  paperAddress(issueId: string, paper: Paper): string {
    return addressOf(readPaper, { params: { issueId, paper } });
  }

  benchSheetAddress(estimateId: string, pieceId: string): string {
    return addressOf(readBenchSheet, { params: { estimateId, pieceId } });
  }
}
