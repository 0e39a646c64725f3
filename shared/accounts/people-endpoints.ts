import * as z from 'zod';
import { mailedToken } from '#shared/accounts/password-endpoints';
import { chosenPassword } from '#shared/accounts/password-schema';
import {
  colleagueSchema,
  invitationReadingSchema,
  invitationSchema,
  newInvitationSchema,
  personSchema,
} from '#shared/accounts/people-schema';
import { sessionSchema } from '#shared/accounts/session-schema';
import { endpoint } from '#shared/actor/endpoint';
import { rolesSchema } from '#shared/actor/role-schema';
import { identifier, line } from '#shared/problems/entry-schema';

const byId = z.strictObject({ id: identifier });
const colleagues = z.strictObject({ items: z.array(colleagueSchema) });

export const listPeople = endpoint({
  name: 'listPeople',
  summary: 'Everybody who belongs to the workshop.',
  method: 'get',
  path: '/api/people',
  callers: ['owner', 'estimator', 'bench', 'office'],
  answers: { cost: z.strictObject({ items: z.array(personSchema) }), price: colleagues, bench: colleagues },
});

export const changeRoles = endpoint({
  name: 'changeRoles',
  summary: 'Gives a person other roles; the last owner keeps theirs.',
  method: 'put',
  path: '/api/people/:id/roles',
  callers: ['owner'],
  params: byId,
  body: z.strictObject({ roles: rolesSchema }),
  answers: { cost: personSchema },
  versioned: true,
});

export const changeAccess = endpoint({
  name: 'changeAccess',
  summary: 'Ends or restores a person’s access to this workshop; ending it ends their sessions here.',
  method: 'put',
  path: '/api/people/:id/access',
  callers: ['owner'],
  params: byId,
  body: z.strictObject({ isDisabled: z.boolean() }),
  answers: { cost: personSchema },
  versioned: true,
});

export const changeOwnName = endpoint({
  name: 'changeOwnName',
  summary: 'Changes how one’s own name is written.',
  method: 'put',
  path: '/api/person/name',
  callers: 'signed-in',
  body: z.strictObject({ name: line(120) }),
  answers: { public: sessionSchema },
});

export const listInvitations = endpoint({
  name: 'listInvitations',
  summary: 'Invitations that have been sent and not yet answered.',
  method: 'get',
  path: '/api/invitations',
  callers: ['owner'],
  answers: { cost: z.strictObject({ items: z.array(invitationSchema) }) },
});

export const invite = endpoint({
  name: 'invite',
  summary: 'Invites a person into the workshop by mail; the link lasts three days.',
  method: 'post',
  path: '/api/invitations',
  callers: ['owner'],
  body: newInvitationSchema,
  answers: { cost: invitationSchema },
  idempotent: true,
});

export const withdrawInvitation = endpoint({
  name: 'withdrawInvitation',
  summary: 'Takes an invitation back; its link stops working.',
  method: 'delete',
  path: '/api/invitations/:id',
  callers: ['owner'],
  params: byId,
  answers: {},
});

export const readInvitation = endpoint({
  name: 'readInvitation',
  summary: 'What an invitation’s link leads to.',
  method: 'post',
  path: '/api/invitations/reading',
  callers: 'anyone',
  body: z.strictObject({ token: mailedToken }),
  answers: { public: invitationReadingSchema },
});

export const acceptInvitation = endpoint({
  name: 'acceptInvitation',
  summary:
    'Joins the workshop by the mailed link and signs in. A new person chooses a password, a known one enters theirs.',
  method: 'post',
  path: '/api/invitations/acceptance',
  callers: 'anyone',
  body: z.strictObject({ token: mailedToken, name: line(120), password: chosenPassword }),
  answers: { public: sessionSchema },
});
