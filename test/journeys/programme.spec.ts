import { v7 as newId } from 'uuid';
import type { Change } from '#shared/estimates/change-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { keepProgramme } from '#shared/programme/programme-endpoints';
import { sampleEstimate, sampleMember, type SampleEstimate } from '../api/sample-estimate';
import { markedIssue, programmeOf, shopWith, wednesdayAfter } from '../api/sample-programme';
import { done } from './stage';
import { violations } from './violations';
import { Walk, type Person } from './walk';

/** Planning as a person does it: three build-ups, a window that breaks, work around another job, a calendar that follows. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
  await shopWith(walk.api.ours, walk.api.ours.people.bench);
}, 300_000);
afterAll(() => walk.end());

const placeOf = ({ jobId, estimateId }: SampleEstimate): string =>
  `${walk.address}/jobs/${jobId}/estimates/${estimateId}/dry?part=programme`;

/** A piece in three build-ups: water gilding burnished and matte, and paint. */
async function threeBuildUps(): Promise<SampleEstimate> {
  const sample = await sampleEstimate(walk.api.ours);
  const changes = ['water-matte', 'paint'].map((buildUpId, at): Change => {
    const member = sampleMember(sample.pieceId, `In ${buildUpId}`);
    const zones = member.zones.map((zone) => ({ ...zone, buildUpId, leafId: at === 0 ? zone.leafId : null }));
    return { kind: 'member', id: newId(), version: 0, content: { ...member, zones, place: at + 2 } };
  });
  await done(walk, changeEstimate, { params: { estimateId: sample.estimateId }, body: { changes } });
  return sample;
}

/** It begins on the morning of a Wednesday to come: so its work falls on the same hours whenever this is run. */
async function fromWednesday({ estimateId }: SampleEstimate): Promise<void> {
  const { inputs, version } = await programmeOf(walk.api.ours, estimateId);
  const day = wednesdayAfter(inputs.day);
  await done(walk, keepProgramme, { params: { estimateId }, version, body: { ...inputs, day } });
}

/** Plans in the browser and keeps what came of it. */
async function plan({ page }: Person, sample: SampleEstimate): Promise<void> {
  await page.goto(placeOf(sample));
  await page.getByRole('button', { name: 'Plan it', exact: true }).click();
  await page.getByRole('button', { name: 'Keep this plan' }).click();
  await page.getByRole('button', { name: 'Plan it', exact: true }).waitFor();
}

it('plans a job of three build-ups, is told what breaks a window, and keeps nothing that is impossible', async () => {
  const sample = await threeBuildUps();
  await fromWednesday(sample);
  const person = await walk.as('estimator');
  const { page, complaints, see } = person;
  await plan(person, sample);
  await page.getByRole('heading', { name: /^Ready on / }).waitFor();
  const kept = await programmeOf(walk.api.ours, sample.estimateId);
  expect([kept.isCurrent, new Set(kept.items.map(({ lotId }) => lotId)).size >= 3]).toEqual([true, true]);
  await see('journey programme');
  expect(await violations(page)).toEqual([]);

  // The keyboard comes from the drawing straight to a task, and hears its story; the arrows lead on.
  await page.locator('app-dated-ribbon .scroll').focus();
  await page.keyboard.press('Tab');
  const task = page.locator('app-dated-ribbon [data-task]:focus');
  const [first, story] = [await task.getAttribute('data-task'), page.locator('app-dated-ribbon .story')];
  await story.waitFor();
  await see('journey programme by the keyboard');
  await page.keyboard.press('ArrowRight');
  await page.locator(`app-dated-ribbon [data-task]:focus:not([data-task="${first}"])`).waitFor();
  await story.waitFor();

  // Burnishing waits for the leaf and not for long: some days later its window has closed.
  await page.getByRole('button', { name: 'All of it' }).click();
  const burnish = page.getByRole('button', { name: /^Burnish/ }).first();
  const share = await burnish.evaluate((task) => {
    const sheet = task.closest('svg')?.getBoundingClientRect() ?? new DOMRect(0, 0, 1, 1);
    return (task.getBoundingClientRect().x - sheet.x) / sheet.width;
  });
  await page.getByRole('button', { name: 'Day', exact: true }).click();
  await page.waitForTimeout(300);
  // As large that no other task lies over it, with room to the right.
  await page.locator('app-dated-ribbon .scroll').evaluate((scroller, at) => {
    scroller.scrollLeft = (scroller.querySelector('svg')?.clientWidth ?? 0) * at - 200;
  }, share);
  await page.waitForTimeout(300);
  await burnish.evaluate((task) => task.scrollIntoView({ block: 'center' }));
  await page.waitForTimeout(300);
  const box = await burnish.boundingBox();
  if (!box) throw new Error('nothing is burnished in this plan');
  await page.mouse.move(box.x + 3, box.y + box.height / 2);
  await page.mouse.down();
  // Along the day, to where it would stand in working hours and the window alone is against it.
  const broken = page.getByText(/the window has closed/);
  for (let by = 20; by < 700 && (await broken.count()) === 0; by += 6)
    await page.mouse.move(box.x + by, box.y + box.height / 2);
  await broken.first().waitFor();
  await page.keyboard.press('Escape');
  await page.getByText('Here it cannot stand:').waitFor({ state: 'detached' });
  await page.mouse.up();

  // A time at which nobody works is refused in words.
  await burnish.focus();
  await page.keyboard.press('Enter');
  const typed = page.getByLabel('Start at');
  await typed.fill(`${(await typed.inputValue()).slice(0, 10)}T03:00`);
  await page.getByRole('button', { name: 'Pin to this time' }).click();
  await page.getByText('There is no such plan. Nothing was changed.').waitFor();
  const after = await programmeOf(walk.api.ours, sample.estimateId);
  expect([after.version, after.inputs.pins]).toEqual([kept.version, []]);
  expect(complaints).toEqual([]);
}, 240_000);

it('plans around a second job, which stands on the board, and a calendar follows', async () => {
  const first = await sampleEstimate(walk.api.ours);
  const second = await sampleEstimate(walk.api.ours);
  const person = await walk.as('owner');
  const { page, context, complaints, see } = person;
  await plan(person, first);
  await markedIssue(walk.api.ours, walk.api, { estimateId: first.estimateId, state: 'accepted' });
  await plan(person, second);
  await page.getByText(/Planned around one other job/).waitFor();
  const [before, around] = await Promise.all(
    [first, second].map(({ estimateId }) => programmeOf(walk.api.ours, estimateId)),
  );
  expect(Date.parse(around.dates?.finishesOn ?? '')).toBeGreaterThan(Date.parse(before.dates?.finishesOn ?? ''));

  await page.goto(`${walk.address}/programme`);
  await page.getByRole('heading', { name: 'Load by grade and week' }).waitFor();
  expect(await page.locator(`a[href="/jobs/${first.jobId}"]`).count()).toBe(1);
  await see('journey board');
  expect(await violations(page)).toEqual([]);

  await page.getByRole('link', { name: 'Calendars' }).click();
  await page.getByLabel('Name').fill('Kitchen wall');
  await page.getByRole('button', { name: 'Make the calendar' }).click();
  const address = new URL(await page.getByLabel('Secret address').inputValue());
  const feed = `${walk.address}${address.pathname}${address.search}`;
  const read = await context.request.get(feed);
  expect([read.status(), (await read.text()).includes('BEGIN:VEVENT')]).toEqual([200, true]);
  await page.getByRole('button', { name: 'Done' }).click();
  expect(await violations(page)).toEqual([]);
  await page.getByRole('button', { name: 'Take it back' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Take it back' }).click();
  await page.getByText('No calendar is read by another program yet.').waitFor();
  expect((await context.request.get(feed)).status()).toBe(404);
  expect(complaints).toEqual([]);
}, 240_000);
