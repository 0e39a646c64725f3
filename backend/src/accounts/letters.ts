import type { Config } from '../platform/config/config';
import type { Letter } from '../platform/mail/mailbox';
import { words } from '../platform/http/words';

/** The pages that mailed links lead to; the secret stands in the fragment, which no server and no log ever sees. */
const pages = { reset: '/new-password', invitation: '/join', foundation: '/found' } as const;

export interface Link {
  readonly page: keyof typeof pages;
  readonly token: string;
}

const addressOf = (config: Config, { page, token }: Link): string => {
  const base = config.publicUrl?.origin ?? `http://127.0.0.1:${config.port}`;
  return `${base}${pages[page]}#${token}`;
};

export const resetLetter = (config: Config, to: Letter['to'], token: string): Letter => ({
  to,
  subject: words('mail-reset-subject'),
  text: words('mail-reset-text', { name: to.name, link: addressOf(config, { page: 'reset', token }) }),
});

export const foundationLetter = (
  config: Config,
  to: Letter['to'],
  details: { token: string; workshop: string; isKnown: boolean },
): Letter => ({
  to,
  subject: words('mail-foundation-subject', { workshop: details.workshop }),
  text: words(details.isKnown ? 'mail-foundation-known-text' : 'mail-foundation-text', {
    name: to.name,
    workshop: details.workshop,
    link: addressOf(config, { page: 'foundation', token: details.token }),
  }),
});

export const invitationLetter = (
  config: Config,
  to: Letter['to'],
  details: { token: string; workshop: string; by: string },
): Letter => ({
  to,
  subject: words('mail-invitation-subject', { workshop: details.workshop }),
  text: words('mail-invitation-text', {
    name: to.name,
    workshop: details.workshop,
    by: details.by,
    link: addressOf(config, { page: 'invitation', token: details.token }),
  }),
});
