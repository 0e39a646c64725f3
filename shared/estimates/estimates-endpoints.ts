import * as z from 'zod';
import { endpoint, sameForAll, sameForPriced } from '#shared/actor/endpoint';
import { changesSchema } from '#shared/estimates/change-schema';
import {
  alternativeTotalSchema,
  costedEstimateSchema,
  estimateSummarySchema,
  keptChangesSchema,
  presenceSchema,
  pricedEstimateSchema,
  workedEstimateSchema,
} from '#shared/estimates/estimate-schema';
import { identifier, line } from '#shared/problems/entry-schema';

const oneEstimate = z.strictObject({ estimateId: identifier });
const oneJob = z.strictObject({ jobId: identifier });

export const listEstimates = endpoint({
  name: 'listEstimates',
  summary: 'The estimates of a job, the first one first',
  method: 'get',
  path: '/api/jobs/:jobId/estimates',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneJob,
  answers: sameForAll(z.strictObject({ items: z.array(estimateSummarySchema) })),
});

export const beginEstimate = endpoint({
  name: 'beginEstimate',
  summary:
    'Begin an estimate of a job on the rate card in force; the browser makes the id, a repeated call is harmless',
  method: 'put',
  path: '/api/jobs/:jobId/estimates/:estimateId',
  callers: ['owner', 'estimator'],
  params: z.strictObject({ jobId: identifier, estimateId: identifier }),
  body: z.strictObject({ title: line(120) }),
  answers: { cost: estimateSummarySchema },
});

export const readEstimate = endpoint({
  name: 'readEstimate',
  summary: 'An estimate with its pieces, members and figures, as far as the reader may see them',
  method: 'get',
  path: '/api/estimates/:estimateId',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneEstimate,
  answers: { cost: costedEstimateSchema, price: pricedEstimateSchema, bench: workedEstimateSchema },
});

export const changeEstimate = endpoint({
  name: 'changeEstimate',
  summary: 'Keep changes of pieces, members and settings together; each names the version it was made from',
  method: 'post',
  path: '/api/estimates/:estimateId/changes',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: changesSchema,
  atOnce: 6,
  answers: { cost: keptChangesSchema },
});

export const takeRateCard = endpoint({
  name: 'takeRateCard',
  summary: 'Work the estimate on another rate card from now on: the one in force, or one that was',
  method: 'post',
  path: '/api/estimates/:estimateId/rate-card',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: z.strictObject({ rateCardId: identifier }),
  versioned: true,
  answers: { cost: costedEstimateSchema },
});

export const readAlternatives = endpoint({
  name: 'readAlternatives',
  summary:
    'Each alternative of the draft by itself: its gross total, what it is more or less than the base, and the leaf, hours and days it takes',
  method: 'get',
  path: '/api/estimates/:estimateId/alternatives',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  atOnce: 4,
  answers: sameForPriced(z.strictObject({ items: z.array(alternativeTotalSchema) })),
});

export const tellPresence = endpoint({
  name: 'tellPresence',
  summary: 'Say that one is at work on an estimate, and hear who else is and whether it has changed',
  method: 'post',
  path: '/api/estimates/:estimateId/presence',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneEstimate,
  answers: sameForAll(presenceSchema),
});
