import type { Page } from 'playwright-core';
import { sampleEstimate, type SampleEstimate } from '../api/sample-estimate';
import { password } from '../api/test-workshop';
import { Walk } from './walk';

/** A session that ends while somebody is at work costs nothing that was typed; one that is ended leaves nothing behind (ASVS 14.3.1, 14.3.3). */
let walk: Walk;
let passed_minutes = 0;

/** So long that every session has ended. */
function waitUntilTheSessionHasEnded(): void {
  passed_minutes = 31;
  walk.api.clock.move({ minutes: passed_minutes });
}

beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterEach(() => {
  walk.api.clock.move({ minutes: -passed_minutes });
  passed_minutes = 0;
});
afterAll(() => walk.end());

async function measuring(page: Page, { jobId, estimateId, memberId }: SampleEstimate): Promise<void> {
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/measure?member=${memberId}`);
  await page.getByLabel('How many').waitFor();
  // A request still on its way would count as use, and the session would go on.
  await page.waitForLoadState('networkidle');
}

async function contentOf({ estimateId }: SampleEstimate) {
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, estimateId);
  return members[0]?.content;
}

it('asks over the page for the password when the session has ended, and sends what was typed meanwhile', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, complaints, see } = await walk.as('estimator');
  await measuring(page, sample);
  const address = page.url();
  waitUntilTheSessionHasEnded();
  await page.getByLabel('How many').fill('9');
  await page.getByLabel('Length', { exact: true }).fill('2000');
  const dialog = page.getByRole('dialog').filter({ hasText: 'Please sign in again' });
  await dialog.waitFor();
  // Who it is stands fixed, so one begins at the password.
  await dialog.locator('app-password-field input:focus').waitFor();
  await see('journey session ended');
  expect(await contentOf(sample)).toMatchObject({ count: 2, shape: { length_mm: 1200 } });
  await dialog.getByRole('textbox', { name: 'Password' }).fill('not the right password');
  await dialog.getByRole('button', { name: 'Sign in' }).click();
  await dialog.getByRole('alert').first().waitFor();
  await dialog.getByRole('textbox', { name: 'Password' }).fill(password);
  await dialog.getByRole('button', { name: 'Sign in' }).click();
  await dialog.waitFor({ state: 'detached' });
  await page.getByText(/^kept/).waitFor();
  expect(await contentOf(sample)).toMatchObject({ count: 9, shape: { length_mm: 2000 } });
  expect(page.url()).toBe(address);
  expect(await page.getByLabel('How many').inputValue()).toBe('9');
  expect(complaints.filter((text) => !/status of (401|403)/.test(text))).toEqual([]);
}, 120_000);

it('keeps what was typed on the page for somebody who would rather sign in later', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page } = await walk.as('estimator');
  await measuring(page, sample);
  waitUntilTheSessionHasEnded();
  await page.getByLabel('How many').fill('7');
  const dialog = page.getByRole('dialog').filter({ hasText: 'Please sign in again' });
  await dialog.getByRole('button', { name: 'Not now' }).click();
  await dialog.waitFor({ state: 'detached' });
  expect(await page.getByLabel('How many').inputValue()).toBe('7');
  expect(await page.getByText(/^kept/).count()).toBe(0);
  expect(await contentOf(sample)).toMatchObject({ count: 2 });
}, 120_000);

it('leaves nothing in the browser after signing out, nor behind its Back button', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, context } = await walk.as('estimator');
  await measuring(page, sample);
  await page.locator('app-account-menu .opener').click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await page.getByRole('heading', { name: 'Sign in' }).waitFor();
  const kept = await page.evaluate<[string, number]>(
    '(async () => [JSON.stringify({ ...localStorage, ...sessionStorage }), (await caches.keys()).length + (await indexedDB.databases()).length])()',
  );
  expect(kept).toEqual(['{}', 0]);
  await page.goBack();
  await page.getByRole('heading', { name: 'Sign in' }).waitFor();
  expect(await page.locator('body').innerText()).not.toContain('Herons');
  const answer = await context.request.get(`${walk.address}/api/jobs`);
  expect(answer.status()).toBe(401);
}, 120_000);
