import * as z from 'zod';
import { readSessionCall } from '#shared/accounts/session-call';
import { ownSessionSchema, sessionSchema, signInSchema } from '#shared/accounts/session-schema';
import { endpoint } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';

/** The same for everybody: a session says nothing of the workshop's money. */
const session = { public: sessionSchema } as const;

export const readSession = endpoint({ ...readSessionCall, answers: session });

export const signIn = endpoint({
  name: 'signIn',
  summary: 'Signs in with e-mail address and password, under a new session.',
  method: 'post',
  path: '/api/session',
  callers: 'anyone',
  body: signInSchema,
  answers: session,
});

export const signOut = endpoint({
  name: 'signOut',
  summary: 'Ends this session.',
  method: 'delete',
  path: '/api/session',
  callers: 'signed-in',
  answers: {},
});

export const enterWorkshop = endpoint({
  name: 'enterWorkshop',
  summary: 'Goes over to another workshop the same person belongs to, under a new session.',
  method: 'put',
  path: '/api/session/membership',
  callers: 'signed-in',
  body: z.strictObject({ membershipId: identifier }),
  answers: session,
});

export const listOwnSessions = endpoint({
  name: 'listOwnSessions',
  summary: 'Where else the same person is signed in.',
  method: 'get',
  path: '/api/sessions',
  callers: 'signed-in',
  answers: { public: z.strictObject({ items: z.array(ownSessionSchema) }) },
});

export const endOwnSession = endpoint({
  name: 'endOwnSession',
  summary: 'Ends one of the person’s own sessions.',
  method: 'delete',
  path: '/api/sessions/:id',
  callers: 'signed-in',
  params: z.strictObject({ id: z.uuid() }),
  answers: {},
});

export const endOtherSessions = endpoint({
  name: 'endOtherSessions',
  summary: 'Ends every session of the person but this one.',
  method: 'delete',
  path: '/api/sessions',
  callers: 'signed-in',
  answers: {},
});
