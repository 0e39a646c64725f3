import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { Walk } from './walk';

/** From founding a workshop to the papers of a first estimate, as somebody does it who was never here. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const password = 'seven slow herons waded home';

async function found(page: Page): Promise<void> {
  await page.goto(`${walk.address}/sign-in`);
  await page.getByRole('link', { name: 'Found one' }).click();
  await page.getByLabel('Your name').fill('Imre Halloway');
  await page.getByLabel('Your e-mail address').fill('imre@ochrelane.example');
  await page.getByLabel('Name of the workshop').fill('Ochre Lane Gilders');
  await page.locator('form button[type=submit]').click();
  await page.getByRole('heading', { name: /mail/i }).first().waitFor();
  const [mail] = await walk.api.mails();
  const link = /https?:\/\/\S+#\S+/.exec(mail?.text ?? '')?.[0] ?? '';
  await page.goto(`${walk.address}${new URL(link).pathname}${new URL(link).hash}`);
  await page.getByRole('textbox', { name: 'Password' }).fill(password);
  await page.locator('form button[type=submit]').click();
  await page.waitForURL(/\/jobs/);
}

async function openJob(page: Page): Promise<void> {
  await page.goto(`${walk.address}/jobs/new`);
  await page.getByLabel('Title').fill('Console base with a shell');
  await page.getByRole('combobox', { name: 'Client' }).fill('Merrow House');
  await page.getByRole('option', { name: /Enter “Merrow House”/ }).click();
  const dialog = page.getByRole('dialog');
  await dialog.locator('button[type=submit]').click();
  await dialog.waitFor({ state: 'detached' });
  await page.locator('form button[type=submit]').click();
  await page.getByRole('heading', { name: 'Console base with a shell' }).waitFor();
}

async function measure(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Add a member' }).first().click();
  await page.getByRole('dialog').getByRole('button', { name: 'rectangle', exact: false }).first().click();
  await page.getByLabel('Name', { exact: true }).first().fill('Frieze');
  await page.getByLabel('How many').fill('2');
  await page.getByLabel('Length', { exact: true }).fill('47 1/4 in');
  await page.getByLabel('Height', { exact: true }).fill('15 cm');
  await page.getByText('1.94 ft²').first().waitFor();
}

/** What stands on a sheet of paper, which is as narrow as a phone: the part that is open, not the list it was chosen from. */
async function printed(page: Page, heading: string): Promise<boolean> {
  const screen = page.viewportSize();
  await page.emulateMedia({ media: 'print' });
  await page.setViewportSize({ width: 718, height: 1000 });
  const [isThere, isListed] = await Promise.all([
    page.getByRole('heading', { name: heading, exact: true }).isVisible(),
    page.getByRole('navigation', { name: 'Parts of the price' }).isVisible(),
  ]);
  await page.emulateMedia({ media: 'screen' });
  if (screen) await page.setViewportSize(screen);
  return isThere && !isListed;
}

/** A paper as the browser saves it. */
async function saved(page: Page, name: string): Promise<Buffer> {
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name }).click();
  return readFile(await (await download).path());
}

it('founds a workshop, opens a job, costs a base and issues it with its papers', async () => {
  const { page, complaints, see } = await walk.stranger();
  await found(page);
  await openJob(page);
  await page.getByRole('button', { name: /Begin/ }).first().click();
  await page.waitForURL(/measure/);
  await measure(page);
  await see('journey measured');
  await page.getByRole('link', { name: /Gild/ }).click();
  await page.getByRole('button', { name: 'Add a zone' }).click();
  // 15 cm are less than two leaves, so it is laid in lays: 32 leaves net each, 64 × (1 + 0.05 + 0.12 × 0.95) ÷ 0.95 = 78.4 of 25 a booklet.
  await page.getByRole('link', { name: 'Gild 4 booklets' }).waitFor();
  await see('journey gild');
  await page.getByRole('link', { name: /^Price/ }).click();
  await page.getByRole('heading', { name: 'Lines' }).waitFor();
  await see('journey price');
  expect(await printed(page, 'Lines')).toBe(true);
  await page.getByRole('link', { name: 'Issue', exact: true }).first().click();
  await page.getByRole('button', { name: 'Issue A' }).click();
  await page.getByText('Issue A is made, with its papers.').waitFor();
  await see('journey issued');
  expect((await saved(page, 'Estimate, PDF')).subarray(0, 5).toString()).toBe('%PDF-');
  expect((await saved(page, 'Estimate, workbook')).subarray(0, 2).toString()).toBe('PK');
  expect(complaints).toEqual([]);
}, 240_000);
