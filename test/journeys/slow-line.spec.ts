import type { Page } from 'playwright-core';
import { sampleEstimate, type SampleEstimate } from '../api/sample-estimate';
import { Walk } from './walk';

/** Somebody at work on a line that takes its time: the tally does not wait for it, and nothing typed goes by the board. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

/** A gate before every save; what waits at it goes on when it is opened. */
async function slowed(page: Page): Promise<{ waiting: () => number; open: () => void }> {
  let waiting = 0;
  let open = (): void => undefined;
  const opened = new Promise<void>((resolve) => (open = resolve));
  await page.route('**/api/estimates/*/changes', async (route) => {
    waiting += 1;
    await opened;
    await route.continue();
  });
  return { waiting: () => waiting, open };
}

/** Waits for something to become so, ten seconds at most; whether it did is what is judged. */
async function inTime(isSo: () => Promise<boolean>): Promise<void> {
  for (let tries = 0; tries < 100 && !(await isSo()); tries++) await new Promise((resolve) => setTimeout(resolve, 100));
  expect(await isSo()).toBe(true);
}

async function measuring({ jobId, estimateId, memberId }: SampleEstimate) {
  const person = await walk.as('estimator');
  const { page } = person;
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/measure?member=${memberId}`);
  await page.getByLabel('Length', { exact: true }).first().waitFor();
  await page.waitForLoadState('networkidle');
  const tally = async () => (await page.locator('app-tally-bar').innerText()).replace(/\s+/g, ' ');
  return { ...person, tally, length: page.getByLabel('Length', { exact: true }).first() };
}

it('moves the tally while a figure is typed, to what the server then keeps', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, complaints, tally, length } = await measuring(sample);
  const before = await tally();
  const line = await slowed(page);
  await length.fill('2430');
  await inTime(async () => (await tally()) !== before);
  await inTime(() => Promise.resolve(line.waiting() === 1));
  const typed = await tally();
  line.open();
  await page.getByText(/^kept/).waitFor();
  expect(await tally()).toBe(typed);
  await page.reload();
  await page.locator('app-tally-bar').waitFor();
  await page.waitForLoadState('networkidle');
  expect(await tally()).toBe(typed);
  expect(complaints).toEqual([]);
}, 120_000);

it('asks before a page is left whose entries have not arrived, and stays when told', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, length } = await measuring(sample);
  const line = await slowed(page);
  const asked: string[] = [];
  page.on('dialog', (dialog) => {
    asked.push(dialog.type());
    void dialog.dismiss();
  });
  await length.fill('2430');
  await page.getByRole('link', { name: 'Clients' }).click();
  const dialog = page.getByRole('dialog').filter({ hasText: 'Leave before it is kept?' });
  await dialog.waitFor();
  await dialog.getByRole('button', { name: 'Leave it as it is' }).click();
  await dialog.waitFor({ state: 'detached' });
  await page.evaluate(() => window.location.reload()).catch(() => undefined);
  await page.waitForTimeout(300);
  expect([asked, new URL(page.url()).pathname.endsWith('/measure')]).toEqual([['beforeunload'], true]);
  line.open();
  await page.getByText(/^kept/).waitFor();
  expect(await length.inputValue()).toBe('2430');
}, 120_000);
