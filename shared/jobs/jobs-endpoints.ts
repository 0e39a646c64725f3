import * as z from 'zod';
import { endpoint, sameForAll, sameForPriced } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { identifier } from '#shared/problems/entry-schema';
import { jobContentSchema, jobOrders, jobSchema, jobStates } from '#shared/jobs/job-schema';

const oneJob = z.strictObject({ jobId: identifier });

export const listJobs = endpoint({
  name: 'listJobs',
  summary: 'Jobs, found by the beginnings of words in title, number, client, reference and site.',
  method: 'get',
  path: '/api/jobs',
  callers: ['owner', 'estimator', 'office', 'bench'],
  query: z.strictObject({
    search: z.string().max(200).default(''),
    state: z.enum(jobStates).optional(),
    clientId: identifier.optional(),
    order: z.enum(jobOrders).default('changed'),
    ...pageQuery,
  }),
  answers: sameForAll(pageOf(jobSchema)),
});

export const readJob = endpoint({
  name: 'readJob',
  summary: 'One job with its client.',
  method: 'get',
  path: '/api/jobs/:jobId',
  callers: ['owner', 'estimator', 'office', 'bench'],
  params: oneJob,
  answers: sameForAll(jobSchema),
});

export const keepJob = endpoint({
  name: 'keepJob',
  summary: 'Open or change a job; the browser makes the id, a first entry carries version 0 and is given its number.',
  method: 'put',
  path: '/api/jobs/:jobId',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  body: jobContentSchema,
  versioned: true,
  answers: sameForPriced(jobSchema),
});

export const finishJob = endpoint({
  name: 'finishJob',
  summary: 'Put a job away as finished, or take it up again where its issues have brought it.',
  method: 'put',
  path: '/api/jobs/:jobId/finished',
  callers: ['owner', 'estimator', 'office'],
  params: oneJob,
  body: z.strictObject({ isFinished: z.boolean() }),
  versioned: true,
  answers: sameForPriced(jobSchema),
});

export const removeJob = endpoint({
  name: 'removeJob',
  summary: 'Remove a job of which nothing was issued.',
  method: 'delete',
  path: '/api/jobs/:jobId',
  callers: ['owner', 'estimator'],
  params: oneJob,
  versioned: true,
  answers: {},
});
