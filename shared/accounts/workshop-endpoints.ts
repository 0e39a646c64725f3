import * as z from 'zod';
import { passwordByLinkSchema } from '#shared/accounts/password-endpoints';
import { sessionSchema } from '#shared/accounts/session-schema';
import { newWorkshopSchema, workshopSchema, workshopSettingsSchema } from '#shared/accounts/workshop-schema';
import { endpoint, sameForAll } from '#shared/actor/endpoint';
import { emailAddress, identifier, line } from '#shared/problems/entry-schema';

export const askToFound = endpoint({
  name: 'askToFound',
  summary: 'Mails a link with which a new workshop is founded; the answer never says whether the address is known.',
  method: 'post',
  path: '/api/foundations',
  callers: 'anyone',
  body: z.strictObject({ name: line(120), email: emailAddress, workshop: newWorkshopSchema }),
  answers: {},
});

export const foundByLink = endpoint({
  name: 'foundByLink',
  summary:
    'Founds the workshop by the mailed link, sets its owner’s password and signs them in. A person already known enters their own password.',
  method: 'post',
  path: '/api/foundations/completion',
  callers: 'anyone',
  body: passwordByLinkSchema,
  answers: { public: sessionSchema },
});

export const foundAnother = endpoint({
  name: 'foundAnother',
  summary: 'Founds another workshop, owned by the person signed in, and goes there.',
  method: 'post',
  path: '/api/workshops',
  callers: 'signed-in',
  body: newWorkshopSchema,
  answers: { public: sessionSchema },
});

export const readWorkshop = endpoint({
  name: 'readWorkshop',
  summary: 'The settings of the workshop.',
  method: 'get',
  path: '/api/workshop',
  callers: ['owner', 'estimator', 'bench', 'office'],
  answers: sameForAll(workshopSchema),
});

export const changeWorkshop = endpoint({
  name: 'changeWorkshop',
  summary: 'Writes the settings of the workshop.',
  method: 'put',
  path: '/api/workshop',
  callers: ['owner'],
  body: workshopSettingsSchema,
  answers: { cost: workshopSchema },
  versioned: true,
});

export const readLogo = endpoint({
  name: 'readLogo',
  summary: 'The picture of the letterhead.',
  method: 'get',
  path: '/api/workshop/logo',
  callers: ['owner', 'estimator', 'bench', 'office'],
  // Which picture it is changes nothing but the address, so that another one is fetched anew.
  query: z.strictObject({ file: identifier.optional() }),
  answers: {},
  media: 'image/png',
});

export const putLogo = endpoint({
  name: 'putLogo',
  summary: 'Puts a picture (PNG, JPEG or WebP) on the letterhead.',
  method: 'put',
  path: '/api/workshop/logo',
  callers: ['owner'],
  answers: { cost: workshopSchema },
  upload: 'logo',
  versioned: true,
});

export const removeLogo = endpoint({
  name: 'removeLogo',
  summary: 'Takes the picture off the letterhead.',
  method: 'delete',
  path: '/api/workshop/logo',
  callers: ['owner'],
  answers: { cost: workshopSchema },
  versioned: true,
});
