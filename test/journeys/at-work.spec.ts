import type { Page } from 'playwright-core';
import { sampleEstimate, type SampleEstimate } from '../api/sample-estimate';
import { phone } from './screens';
import { Walk } from './walk';

/** Wrong input, two people, the keyboard alone, and what the bench sees. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const placeOf = ({ jobId, estimateId }: SampleEstimate, place: string) =>
  `${walk.address}/jobs/${jobId}/estimates/${estimateId}/${place}`;

async function measuring(page: Page, sample: SampleEstimate): Promise<void> {
  await page.goto(`${placeOf(sample, 'measure')}?member=${sample.memberId}`);
  await page.getByLabel('Length', { exact: true }).waitFor();
}

it('explains wrong input beside the field, keeps the last good figures, and takes the right one', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, complaints, see } = await walk.as('estimator');
  await measuring(page, sample);
  const length = page.getByLabel('Length', { exact: true });
  await length.fill('twelve');
  await length.blur();
  await page.getByRole('alert').first().waitFor();
  await see('journey wrong length');
  await length.fill('-5');
  await page.getByRole('alert').first().waitFor();
  await length.fill('2000');
  await page.getByText('3,000 cm²').first().waitFor();
  await page.getByText(/^kept/).waitFor();
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, sample.estimateId);
  expect(members[0]?.content.shape).toMatchObject({ length_mm: 2000 });
  expect(complaints).toEqual([]);
}, 120_000);

it('undoes with the keyboard what was typed', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page } = await walk.as('estimator');
  await measuring(page, sample);
  await page.getByLabel('Length', { exact: true }).fill('2000');
  await page.getByText('3,000 cm²').first().waitFor();
  await page.getByText(/^kept/).waitFor();
  await page.getByRole('heading', { name: sample.member.name }).first().click();
  await page.keyboard.press('Control+z');
  await page.getByText('1,800 cm²').first().waitFor();
  expect(await page.getByLabel('Length', { exact: true }).inputValue()).toBe('1200');
}, 120_000);

it('tells two people of each other, and the second of them of a stale member', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const [first, second] = [await walk.as('estimator'), await walk.as('owner')];
  await measuring(first.page, sample);
  await measuring(second.page, sample);
  await first.page.getByLabel('How many').fill('5');
  await first.page.getByText(/^kept/).waitFor();
  await second.page.getByLabel('How many').fill('7');
  const dialog = second.page.getByRole('dialog');
  await dialog.waitFor();
  await second.see('journey two people');
  expect(await dialog.textContent()).toMatch(/5/);
  expect(await dialog.textContent()).toMatch(/7/);
}, 120_000);

it('shows the bench what to do and never a price', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page, see, complaints } = await walk.as('bench', phone);
  const bodies: string[] = [];
  page.on('response', async (response) => {
    if (response.url().includes('/api/')) bodies.push(await response.text().catch(() => ''));
  });
  for (const place of ['measure', 'carve', 'gild', 'dry']) {
    await page.goto(placeOf(sample, place));
    await page.getByRole('heading').first().waitFor();
    await page.waitForTimeout(800);
    await see(`journey bench ${place}`);
    expect(await page.locator('body').innerText()).not.toMatch(/€|\bmargin\b|\boverhead\b/i);
  }
  expect(bodies.length).toBeGreaterThan(0);
  expect(bodies.join('\n')).not.toMatch(/_minor|costPerHour|"profit"|"margin/);
  expect(complaints).toEqual([]);
}, 120_000);

it('is worked by the keyboard alone from signing in to a changed member', async () => {
  const sample = await sampleEstimate(walk.api.ours);
  const { page } = await walk.as('estimator');
  await measuring(page, sample);
  await page.keyboard.press('Tab');
  const reached: string[] = [];
  for (let press = 0; press < 40 && !reached.includes('How many'); press++) {
    await page.keyboard.press('Tab');
    reached.push(await page.evaluate("document.activeElement?.labels?.[0]?.innerText?.trim() ?? ''"));
  }
  expect(reached).toContain('How many');
  await page.keyboard.press('Control+a');
  await page.keyboard.type('4');
  await page.getByText(/^kept/).waitFor();
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, sample.estimateId);
  expect(members[0]?.content.count).toBe(4);
}, 120_000);
