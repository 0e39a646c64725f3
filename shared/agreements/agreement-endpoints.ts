import * as z from 'zod';
import { contractSchema } from '#shared/agreements/contract-schema';
import { decisionSchema } from '#shared/agreements/decision-schema';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { estimateSummarySchema } from '#shared/estimates/estimate-schema';
import { identifier, line } from '#shared/problems/entry-schema';

const oneJob = z.strictObject({ jobId: identifier });

export const readAgreement = endpoint({
  name: 'readAgreement',
  summary: 'What was agreed on a job: what its client decided, and the contract that follows from it',
  method: 'get',
  path: '/api/jobs/:jobId/agreement',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  answers: sameForPriced(z.strictObject({ contract: contractSchema.nullable(), decisions: z.array(decisionSchema) })),
});

export const readAcceptedPaper = endpoint({
  name: 'readAcceptedPaper',
  summary: 'The very paper a client accepted',
  method: 'get',
  path: '/api/decisions/:decisionId/estimate.pdf',
  callers: ['owner', 'estimator', 'office'],
  params: z.strictObject({ decisionId: identifier }),
  media: 'application/pdf',
  answers: sameForPriced(z.unknown()),
});

export const beginVariation = endpoint({
  name: 'beginVariation',
  summary:
    'Begin a variation of what was agreed on a job, as a small estimate of its own; the browser makes the id, a repeated call is harmless',
  method: 'post',
  path: '/api/jobs/:jobId/variations',
  callers: ['owner', 'estimator'],
  params: oneJob,
  body: z.strictObject({ id: identifier, title: line(120) }),
  answers: { cost: estimateSummarySchema },
});
