import { createHash } from 'node:crypto';
import type { Page } from 'playwright-core';
import type { CaughtMail } from '../../backend/src/platform/mail/mail-catcher';
import type { SampleIssue } from '../api/sample-client-visit';
import type { Screen } from './screens';
import type { Person, Walk } from './walk';

/** The phone a client reads on. */
export const pocket = { width: 390, height: 844, touch: true } as const;

/** The newest mail to an address. */
export async function mailTo({ api }: Walk, email: string): Promise<CaughtMail> {
  const mail = (await api.mails()).find(({ headers }) => new RegExp(`^To: .*${email}`, 'm').test(headers));
  if (!mail) throw new Error(`no mail went to ${email}`);
  return mail;
}

/** The address kept of the client of an issue. */
export async function emailOf({ api }: Walk, { jobId }: SampleIssue): Promise<string> {
  const { clientId } = await api.app.jobs.job(api.ours.id, jobId);
  return (await api.app.jobs.client(api.ours.id, clientId)).email;
}

/** Where the link of a mail leads, on the server of this walk. */
export function linkOf({ address }: Walk, { text }: CaughtMail): string {
  const link = new URL(/https?:\/\/\S+#\S+/.exec(text)?.[0] ?? 'about:blank');
  return address + link.pathname + link.hash;
}

/** Somebody who opens the link of a letter on their own phone, and where it led them. */
export async function clientAt(walk: Walk, link: string, screen: Screen = pocket): Promise<Person> {
  const person = await walk.stranger(screen);
  await person.page.goto(link);
  await person.page.waitForURL(/\/client\/issues\//);
  await person.page.getByRole('heading', { name: 'What is included' }).waitFor();
  return person;
}

/** The button of that name that can be seen; a phone and a desk have theirs in different places. */
export const seenButton = (page: Page, name: string) =>
  page.getByRole('button', { name, exact: true }).locator('visible=true').first();

/** Goes to the last look, names the client and ticks, and leaves the last press to the caller. */
export async function reviewAs(page: Page, name: string): Promise<void> {
  await seenButton(page, 'Review').click();
  await page.getByLabel('Your name').fill(name);
  await page.getByRole('checkbox', { name: /^I accept/ }).check();
}

/** The SHA-256 of what stands at an address, as the person gets it. */
export async function hashAt({ context }: Person, address: string): Promise<string> {
  const response = await context.request.get(address);
  if (response.status() !== 200) throw new Error(`${address} answered ${response.status()}`);
  return createHash('sha256')
    .update(await response.body())
    .digest('hex');
}
