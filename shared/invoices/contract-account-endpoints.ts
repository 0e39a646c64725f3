import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { invoiceSchema, stageClaimSchema } from '#shared/invoices/invoice-schema';
import { day, identifier } from '#shared/problems/entry-schema';

const oneJob = z.strictObject({ jobId: identifier });
const sums = { invoiced_minor: z.int(), credited_minor: z.int(), left_minor: z.int() };

const nextClaimSchema = z.strictObject({
  claim: stageClaimSchema,
  name: z.string(),
  /** The day it is planned for and the one it was reached on, where they were named. */
  plannedOn: z.string().nullable(),
  reachedOn: z.string().nullable(),
  net_minor: z.int(),
  gross_minor: z.int(),
});

/** Where the contract of a job stands: nothing where nothing was accepted. */
export const contractAccountSchema = z.strictObject({
  currency: z.string(),
  gross_minor: z.int(),
  ...sums,
  parts: z.array(
    z.strictObject({
      issueId: z.uuid(),
      kind: z.enum(['estimate', 'variation']),
      number: z.string(),
      title: z.string(),
      acceptedOn: z.string(),
      net_minor: z.int(),
      gross_minor: z.int(),
      ...sums,
      isComplete: z.boolean(),
      next: z.array(nextClaimSchema),
    }),
  ),
});
export type ContractAccountAnswer = z.infer<typeof contractAccountSchema>;

export const readContractAccount = endpoint({
  name: 'readContractAccount',
  summary: 'What of a contract is invoiced, credited and left, and what may be invoiced next',
  method: 'get',
  path: '/api/jobs/:jobId/contract-account',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  answers: sameForPriced(z.strictObject({ contract: contractAccountSchema.nullable() })),
});

export const beginStageInvoice = endpoint({
  name: 'beginStageInvoice',
  summary: 'Draft the invoice of a deposit, of work done or of a release of what was held back',
  method: 'post',
  path: '/api/jobs/:jobId/stage-invoices',
  callers: ['owner', 'office'],
  params: oneJob,
  body: z.strictObject({ invoiceId: identifier, issueId: identifier, claim: stageClaimSchema }),
  answers: sameForPriced(invoiceSchema),
});

export const nameStageDay = endpoint({
  name: 'nameStageDay',
  summary: 'Name the day a stage of a contract is planned for, or the one it was reached on; or none',
  method: 'put',
  path: '/api/jobs/:jobId/stage-days',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  body: z.strictObject({
    issueId: identifier,
    claim: stageClaimSchema,
    of: z.enum(['planned', 'reached']),
    day: day.nullable(),
  }),
  answers: {},
});
