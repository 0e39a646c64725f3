import type { RequestHandler } from 'express';
import type { CaughtMail, MailCatcher } from '../mail/mail-catcher';
import { escaped, plainPage } from './plain-page';

const shown = (mail: CaughtMail): string =>
  `<article><h2>${escaped(mail.at)}</h2><pre>${escaped(mail.headers)}\n\n${escaped(mail.text)}</pre></article>`;

/** The mails the catcher took in. Served only while it catches, and never where the server is reached from outside. */
export const caughtMails =
  (catcher: MailCatcher): RequestHandler =>
  async (_request, response) => {
    const mails = await catcher.mails();
    response
      .set('Cache-Control', 'no-store')
      .type('html')
      .send(plainPage('Mail', mails.map(shown).join('') || '<p>No mail yet.</p>'));
  };
