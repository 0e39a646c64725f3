import * as z from 'zod';
import { chosenPassword, enteredPassword } from '#shared/accounts/password-schema';
import { endpoint } from '#shared/actor/endpoint';
import { emailAddress } from '#shared/problems/entry-schema';

/** The secret part of a mailed link, carried in the fragment of its address. */
export const mailedToken = z
  .string()
  .min(40)
  .max(80)
  .regex(/^[A-Za-z0-9_-]+$/);

/** A password chosen by whoever was mailed a link. */
export const passwordByLinkSchema = z.strictObject({ token: mailedToken, password: chosenPassword });
export type PasswordByLink = z.infer<typeof passwordByLinkSchema>;

export const changePassword = endpoint({
  name: 'changePassword',
  summary: 'Sets a new password for somebody who knows the current one, and ends their other sessions.',
  method: 'put',
  path: '/api/password',
  callers: 'signed-in',
  body: z.strictObject({ current: enteredPassword, password: chosenPassword }),
  answers: {},
});

export const askForReset = endpoint({
  name: 'askForReset',
  summary: 'Mails a link to set a new password, if the address is known; the answer is the same if it is not.',
  method: 'post',
  path: '/api/password-resets',
  callers: 'anyone',
  body: z.strictObject({ email: emailAddress }),
  answers: {},
});

export const resetPassword = endpoint({
  name: 'resetPassword',
  summary: 'Sets a new password by a mailed link, once and within ten minutes, and ends all sessions of the person.',
  method: 'post',
  path: '/api/password-resets/completion',
  callers: 'anyone',
  body: passwordByLinkSchema,
  answers: {},
});
