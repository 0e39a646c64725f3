import type { RequestHandler } from 'express';
import { Rejection } from '#shared/problems/rejection';
import type { CaughtMail, MailCatcher } from '../mail/mail-catcher';
import { escaped, sendPlainPage } from './plain-page';

/** Enclosed files by their names alone, and HTML as it is written: nothing that came in a mail is run here. */
function shown({ at, headers, text, html, enclosures }: CaughtMail): string {
  const files = enclosures.map(
    ({ name, media, size_bytes }) => `<li>${escaped(`${name}, ${media}, ${size_bytes} bytes`)}</li>`,
  );
  return [
    `<article><h2>${escaped(at)}</h2><pre>${escaped(headers)}\n\n${escaped(text)}</pre>`,
    files.length > 0 ? `<h3>Enclosed</h3><ul>${files.join('')}</ul>` : '',
    html === '' ? '' : `<details><summary>HTML</summary><pre>${escaped(html)}</pre></details>`,
    '</article>',
  ].join('');
}

/** Any name of the web can be made to lead to this machine; a page of such a name says so in its Host. */
const loopback = ['127.0.0.1', '[::1]', 'localhost'];

/** The mails the catcher took in. Served only while it catches, and never where the server is reached from outside or by another name. */
export const caughtMails =
  (catcher: MailCatcher): RequestHandler =>
  async (request, response) => {
    const name = (request.get('host') ?? '').replace(/:\d+$/, '').toLowerCase();
    if (!loopback.includes(name)) throw new Rejection('not-found', 'problem-not-found');
    const mails = await catcher.mails();
    response.set('Cache-Control', 'no-store');
    sendPlainPage(response, 'Mail', mails.map(shown).join('') || '<p>No mail yet.</p>');
  };
