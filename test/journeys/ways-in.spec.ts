import type { Page } from 'playwright-core';
import sharp from 'sharp';
import { v7 as newId } from 'uuid';
import { sampleEstimate } from '../api/sample-estimate';
import { password } from '../api/test-workshop';
import { Walk, type Person } from './walk';

/** The pages that mails lead to, and what a workshop shows of itself. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const chosen = 'nine slow otters swim home';

/** Opens the link of the newest mail to somebody. */
async function openMail(page: Page, email: string): Promise<void> {
  const mail = (await walk.api.mails()).find(({ headers }) => headers.includes(email));
  const link = new URL(/https?:\/\/\S+#\S+/.exec(mail?.text ?? '')?.[0] ?? 'about:blank');
  await page.goto(walk.address + link.pathname + link.hash);
}

async function signIn({ page }: Person, email: string, entered: string): Promise<void> {
  await page.goto(`${walk.address}/sign-in`);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('textbox', { name: 'Password' }).fill(entered);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

const submit = (page: Page): Promise<void> => page.locator('form button[type=submit]').click();

it('gives somebody who forgot their password a new one by a mailed link, once', async () => {
  const { email } = await walk.api.newcomer(walk.api.ours, 'estimator');
  const person = await walk.stranger();
  const { page, see, complaints } = person;
  await page.goto(`${walk.address}/forgotten-password`);
  await page.getByLabel('E-mail address').fill(email);
  await submit(page);
  await page
    .getByText(/on its way|sent/i)
    .first()
    .waitFor();
  await openMail(page, email);
  await page.getByRole('textbox', { name: 'New password' }).fill('too short');
  await submit(page);
  await page.getByRole('alert').first().waitFor();
  await page.getByRole('textbox', { name: 'New password' }).fill(chosen);
  await submit(page);
  await page.waitForURL(/sign-in/);
  await see('journey new password');
  await signIn(person, email, password);
  await page.getByRole('alert').first().waitFor();
  await signIn(person, email, chosen);
  await page.waitForURL(/\/jobs/);
  await page.goto('about:blank');
  await openMail(page, email);
  await page.getByRole('textbox', { name: 'New password' }).fill('ten quick otters dive deep');
  await submit(page);
  await page.getByRole('alert').first().waitFor();
  expect(complaints.filter((text) => !/status of (403|410)/.test(text))).toEqual([]);
}, 120_000);

it('lets somebody in who was invited, by the link they were mailed', async () => {
  const email = `${newId()}@guests.example`;
  const owner = await walk.as('owner');
  await owner.page.goto(`${walk.address}/people`);
  await owner.page.getByRole('button', { name: /^Invite/ }).click();
  await owner.page.getByLabel('Name', { exact: true }).fill('Ada Corfield');
  await owner.page.getByLabel('E-mail address').fill(email);
  await owner.page.getByRole('checkbox', { name: /estimat/i }).check();
  await owner.page.getByRole('button', { name: 'Send the invitation' }).click();
  await owner.page.getByText(/is invited/).waitFor();
  const { page, see, complaints } = await walk.stranger();
  await openMail(page, email);
  await page.getByRole('heading', { name: 'Join Herons Carvers' }).waitFor();
  await see('journey invited');
  await page.getByRole('textbox', { name: 'Choose a password' }).fill(chosen);
  await page.getByRole('button', { name: 'Join' }).click();
  await page.waitForURL(/\/jobs/);
  await owner.page.reload();
  await owner.page.getByText('Ada Corfield').first().waitFor();
  expect(await owner.page.locator('body').innerText()).not.toContain('Invited, not yet here');
  expect([...complaints, ...owner.complaints]).toEqual([]);
}, 120_000);

it('lets somebody of two workshops choose between them, and found a third', async () => {
  const { email, actor } = await walk.api.newcomer(walk.api.ours, 'estimator');
  const { accountId, name } = actor;
  await walk.api.app.accounts.workshops.join(walk.api.theirs.id, { accountId, name, roles: ['bench'] });
  const person = await walk.stranger();
  await signIn(person, email, password);
  await person.page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  await person.page.goto(`${walk.address}/choose-workshop`);
  await person.see('journey choose workshop');
  await person.page.getByRole('button', { name: 'Kanarienvogel Carvers' }).click();
  await person.page.waitForURL(/\/bench/);
  await person.page.locator('app-account-menu .opener').click();
  expect(await person.page.getByRole('menu').innerText()).toContain('Kanarienvogel Carvers');
  await person.page.goto(`${walk.address}/choose-workshop`);
  await person.page.getByLabel('Name of the workshop').fill('Third Weir Gilders');
  await person.page.getByRole('button', { name: 'Found it' }).click();
  await person.page.waitForURL(/\/jobs/);
  await person.page.getByRole('heading', { name: 'Open the first job' }).waitFor();
  expect(person.complaints).toEqual([]);
}, 120_000);

it('puts a picture on the letterhead, shows it on the paper, refuses what is none, and takes it off', async () => {
  const { jobId, estimateId } = await sampleEstimate(walk.api.ours);
  const { page, see, complaints } = await walk.as('owner');
  const picture = await sharp({ create: { width: 90, height: 40, channels: 3, background: '#8a2e22' } })
    .png()
    .toBuffer();
  await page.goto(`${walk.address}/workshop`);
  const entry = page.locator('input[type=file]');
  await entry.setInputFiles({ name: 'mark.png', mimeType: 'image/png', buffer: Buffer.from('MZ no picture') });
  await page.getByRole('alert').first().waitFor();
  await entry.setInputFiles({ name: 'mark.png', mimeType: 'image/png', buffer: picture });
  const shown = page.getByRole('img', { name: 'Picture on the letterhead' });
  await shown.waitFor();
  const width_px = (selector: string) =>
    page.evaluate<number>(
      `document.querySelector('${selector}').decode().then(() => document.querySelector('${selector}').naturalWidth)`,
    );
  expect(await width_px('app-logo-entry img')).toBe(90);
  await see('journey letterhead');
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/issue`);
  await page.locator('app-paper-preview header img').waitFor();
  expect(await width_px('app-paper-preview header img')).toBe(90);
  await page.goto(`${walk.address}/workshop`);
  await page.getByRole('button', { name: 'Take it off' }).click();
  await page.getByText('The picture is taken off.').waitFor();
  expect(await shown.count()).toBe(0);
  expect(complaints.filter((text) => !text.includes('status of 415'))).toEqual([]);
}, 120_000);
