import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { stageClaimSchema } from '#shared/invoices/invoice-schema';

/** Something that can be invoiced of some job, or credited where it is below nothing. */
export const dueStageSchema = z.strictObject({
  jobId: z.uuid(),
  jobNumber: z.string(),
  jobTitle: z.string(),
  clientId: z.uuid(),
  clientName: z.string(),
  issueId: z.uuid(),
  kind: z.enum(['estimate', 'variation']),
  number: z.string(),
  title: z.string(),
  claim: stageClaimSchema,
  name: z.string(),
  /** The day it was reached on, else planned for, of a deposit the day of acceptance; null for what waits for its milestone or share of the work. */
  dueOn: z.string().nullable(),
  isReached: z.boolean(),
  currency: z.string(),
  net_minor: z.int(),
  gross_minor: z.int(),
});
export type DueStage = z.infer<typeof dueStageSchema>;

export const listDueStages = endpoint({
  name: 'listDueStages',
  summary:
    'What can be invoiced across all jobs, the earliest day first: deposits, stages, what was credited, what was held back',
  method: 'get',
  path: '/api/due-stages',
  callers: ['owner', 'estimator', 'office'],
  query: z.strictObject(pageQuery),
  answers: sameForPriced(pageOf(dueStageSchema)),
});
