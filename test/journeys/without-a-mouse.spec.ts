import { sampleEstimate } from '../api/sample-estimate';
import { password } from '../api/test-workshop';
import { expectInTime } from './expect-in-time';
import { Keyboard } from './keyboard';
import { isTooWide } from './violations';
import { Walk } from './walk';

/** From signing in to an issue: once by the keyboard alone, once by a thumb on a phone of 360 px. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const issuesOf = (estimateId: string) => walk.api.app.estimates.issues.ofEstimate(walk.api.ours.id, estimateId);

/** How many there are of the first member, and how long it is. */
async function measuresOf(estimateId: string): Promise<unknown> {
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, estimateId);
  const { count, shape } = members[0]?.content ?? {};
  return [count, shape && 'length_mm' in shape ? shape.length_mm : undefined];
}

it('by the keyboard alone', async () => {
  const { estimateId } = await sampleEstimate(walk.api.ours);
  const { page, complaints, see } = await walk.stranger();
  const keys = new Keyboard(page);
  await page.goto(`${walk.address}/sign-in`);
  await page.getByRole('heading', { name: 'Sign in' }).waitFor();
  await keys.enter(/^E-mail address/, walk.api.ours.people.estimator.email);
  await keys.enter(/^Password/, password);
  await page.keyboard.press('Enter');
  await page.waitForURL(/\/jobs$/);
  await page.getByRole('link', { name: 'Herons base' }).waitFor();
  await keys.follow(/^Herons base$/);
  await page.getByRole('heading', { name: 'Estimates' }).waitFor();
  await keys.follow(/^Herons estimate/);
  await page.getByLabel('How many').first().waitFor();
  await keys.enter(/^How many/, '4');
  await keys.enter(/^Length/, '2000');
  await page.getByText(/^kept/).waitFor();
  await expectInTime(() => measuresOf(estimateId), [4, 2000]);
  await see('journey keyboard measured');
  await keys.follow(/^Issue$/);
  await page.getByRole('button', { name: 'Issue A' }).waitFor();
  await keys.follow(/^Issue A$/);
  await page.getByText('Issue A is made, with its papers.').waitFor();
  expect(await issuesOf(estimateId)).toHaveLength(1);
  expect([...new Set(keys.unseen)]).toEqual([]);
  expect(complaints).toEqual([]);
}, 120_000);

it('by a thumb on a phone', async () => {
  const { estimateId, member } = await sampleEstimate(walk.api.ours);
  const { page, complaints, see } = await walk.stranger({ width: 360, height: 740, touch: true });
  const isNarrowEnough = async () => expect(await isTooWide(page)).toBe(false);
  await page.goto(`${walk.address}/sign-in`);
  await page.getByLabel('E-mail address').fill(walk.api.ours.people.estimator.email);
  await page.getByRole('textbox', { name: 'Password' }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).tap();
  await page.waitForURL(/\/jobs$/);
  await page.getByRole('link', { name: 'Herons base' }).first().tap();
  await page.getByRole('link', { name: /^Herons estimate/ }).tap();
  await isNarrowEnough();
  await page.getByRole('button', { name: new RegExp(`^${member.name}`) }).tap();
  await page.getByLabel('Length', { exact: true }).fill('2000');
  await page.getByLabel('How many').fill('3');
  await page.getByText('3,000 cm²').first().waitFor();
  await page.getByText(/^kept/).waitFor();
  await see('journey phone measured');
  await isNarrowEnough();
  await expectInTime(() => measuresOf(estimateId), [3, 2000]);
  await page.getByRole('link', { name: /^Gild .*booklet/ }).tap();
  await page.getByRole('button', { name: 'Add a zone' }).waitFor();
  await isNarrowEnough();
  await page.getByRole('link', { name: /^Price .*€/ }).tap();
  await page.getByRole('link', { name: /^Lines/ }).waitFor();
  await see('journey phone price');
  await isNarrowEnough();
  await page.getByRole('link', { name: 'Issue', exact: true }).first().tap();
  await page.getByRole('link', { name: /^Issue A/ }).tap();
  await page.getByRole('button', { name: 'Issue A' }).tap();
  await page.getByText('Issue A is made, with its papers.').waitFor();
  await see('journey phone issued');
  await isNarrowEnough();
  expect(await issuesOf(estimateId)).toHaveLength(1);
  expect(complaints).toEqual([]);
}, 120_000);
