import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { identifier } from '#shared/problems/entry-schema';
import { clientContentSchema, clientSchema } from '#shared/jobs/client-schema';

const oneClient = z.strictObject({ clientId: identifier });
const answers = sameForPriced(clientSchema);

export const listClients = endpoint({
  name: 'listClients',
  summary: 'Clients by name; search goes by the beginnings of words.',
  method: 'get',
  path: '/api/clients',
  callers: ['owner', 'estimator', 'office'],
  query: z.strictObject({ search: z.string().max(200).default(''), ...pageQuery }),
  answers: sameForPriced(pageOf(clientSchema)),
});

export const readClient = endpoint({
  name: 'readClient',
  summary: 'One client.',
  method: 'get',
  path: '/api/clients/:clientId',
  callers: ['owner', 'estimator', 'office'],
  params: oneClient,
  answers,
});

export const keepClient = endpoint({
  name: 'keepClient',
  summary: 'Enter or change a client; the browser makes the id, a first entry carries version 0.',
  method: 'put',
  path: '/api/clients/:clientId',
  callers: ['owner', 'estimator', 'office'],
  params: oneClient,
  body: clientContentSchema,
  versioned: true,
  answers,
});

export const removeClient = endpoint({
  name: 'removeClient',
  summary: 'Remove a client who has no job.',
  method: 'delete',
  path: '/api/clients/:clientId',
  callers: ['owner', 'estimator', 'office'],
  params: oneClient,
  versioned: true,
  answers: {},
});
