import * as z from 'zod';
import { accessRequestSchema, accessSchema } from '#shared/agreements/access-schema';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';

export const giveAccess = endpoint({
  name: 'giveAccess',
  summary:
    'Give the client of an issue a private link to the papers of its job; the whole link is in this answer alone. With `send` it goes out by mail, and the issue is marked sent',
  method: 'post',
  path: '/api/issues/:issueId/accesses',
  callers: ['owner', 'estimator', 'office'],
  params: z.strictObject({ issueId: identifier }),
  body: accessRequestSchema,
  answers: sameForPriced(z.strictObject({ access: accessSchema, link: z.string() })),
});

export const listAccesses = endpoint({
  name: 'listAccesses',
  summary: 'The links a client was given to the papers of a job, the newest first',
  method: 'get',
  path: '/api/jobs/:jobId/accesses',
  callers: ['owner', 'estimator', 'office'],
  params: z.strictObject({ jobId: identifier }),
  answers: sameForPriced(z.strictObject({ items: z.array(accessSchema) })),
});

export const revokeAccess = endpoint({
  name: 'revokeAccess',
  summary: 'Take a link back: it opens nothing from now on, and a visit through it ends',
  method: 'delete',
  path: '/api/accesses/:accessId',
  callers: ['owner', 'estimator', 'office'],
  params: z.strictObject({ accessId: identifier }),
  answers: {},
});
