import type { Locator, Page } from 'playwright-core';
import { v7 as newId } from 'uuid';
import type { Change } from '#shared/estimates/change-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { sampleEstimate, sampleMember, type SampleEstimate } from '../api/sample-estimate';
import { expectInTime } from './expect-in-time';
import { Walk } from './walk';

/** Pieces, members, zones and ornaments put in another order with a real pointer and by keys, and rows of a spreadsheet made members. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

/** Three members in two pieces; the first has two zones and two ornaments. */
async function crowded(): Promise<SampleEstimate> {
  const sample = await sampleEstimate(walk.api.ours);
  const [zone] = sample.member.zones;
  const [run] = sample.member.ornaments;
  const base = newId();
  const first = {
    ...sample.member,
    zones: [
      { ...zone, take: { way: 'share', share_percent: 60 } },
      { ...zone, id: newId(), name: 'Ground', take: { way: 'share', share_percent: 30 } },
    ],
    ornaments: [run, { ...run, id: newId(), ornamentId: 'bead-and-reel' }],
  } as const;
  const changes: Change[] = [
    { kind: 'member', id: sample.memberId, version: 1, content: first },
    { kind: 'member', id: newId(), version: 0, content: { ...sampleMember(sample.pieceId, 'Second'), place: 2 } },
    { kind: 'piece', id: base, version: 0, content: { name: 'Plinth', place: 2, note: '' } },
    { kind: 'member', id: newId(), version: 0, content: { ...sampleMember(base, 'Third'), place: 1 } },
  ];
  const { visitor } = walk.api.ours.people.owner;
  const kept = await visitor.call(changeEstimate, { params: { estimateId: sample.estimateId }, body: { changes } });
  expect(kept.status).toBe(200);
  return { ...sample, member: first };
}

async function open(page: Page, { jobId, estimateId, memberId }: SampleEstimate, place: string): Promise<void> {
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/${place}?member=${memberId}`);
  await page.locator('app-member-list .name').first().waitFor();
  // Nothing is taken hold of while figures and letters still come in and move what is below them.
  await page.waitForLoadState('networkidle');
  await page.waitForTimeout(300);
}

/** Takes one thing by its grip and lets it go over another, as a hand does: in steps. */
async function drag(page: Page, grip: Locator, over: Locator, beyond_px = 8): Promise<void> {
  await over.scrollIntoViewIfNeeded();
  await grip.hover({ force: true });
  const [from, to] = [await grip.boundingBox(), await over.boundingBox()];
  if (!from || !to) throw new Error('what is dragged cannot be seen');
  const start = { x: from.x + from.width / 2, y: from.y + from.height / 2 };
  await page.mouse.move(start.x, start.y);
  await page.mouse.down();
  await page.mouse.move(start.x, start.y + 9, { steps: 3 });
  await page.mouse.move(to.x + to.width / 2, to.y + to.height / 2 + beyond_px, { steps: 15 });
  await page.waitForTimeout(100);
  await page.mouse.move(to.x + to.width / 2, to.y + to.height / 2 + beyond_px + 2, { steps: 2 });
  await page.mouse.up();
}

const keptMembers = async ({ estimateId }: SampleEstimate) => {
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, estimateId);
  return members.map(({ id, content }) => ({ id, ...content })).sort((one, other) => one.place - other.place);
};
const namesOn = (page: Page) => page.locator('app-member-list .name').allTextContents();
const zonesOn = async (page: Page) => {
  const zones = await page.locator('app-zone-list .item').all();
  return Promise.all(zones.map((zone) => zone.getAttribute('aria-label')));
};

it('drags a member past another and into another piece, and undo brings it back', async () => {
  const sample = await crowded();
  const { page, complaints, see } = await walk.as('estimator');
  const name = sample.member.name;
  const inSamplePiece = async () => {
    const kept = await keptMembers(sample);
    return kept.filter(({ pieceId }) => pieceId === sample.pieceId).map((member) => member.name);
  };
  await open(page, sample, 'measure');
  expect(await namesOn(page)).toEqual([name, 'Second', 'Third']);
  const [grips, rows] = [page.locator('app-member-list li .grip'), page.locator('app-member-list li')];
  await drag(page, grips.nth(0), rows.nth(1));
  await expectInTime(() => namesOn(page), ['Second', name, 'Third']);
  await expectInTime(inSamplePiece, ['Second', name]);
  await drag(page, grips.nth(1), rows.nth(2));
  await expectInTime(inSamplePiece, ['Second']);
  await see('journey member dragged');
  await page.getByRole('button', { name: 'Undo' }).first().click();
  await expectInTime(inSamplePiece, ['Second', name]);
  await page.getByRole('button', { name: 'Undo' }).first().click();
  await expectInTime(inSamplePiece, [name, 'Second']);
  expect(complaints).toEqual([]);
}, 120_000);

it('drags a piece with its members past another, moves it back by keys, and undoes that', async () => {
  const sample = await crowded();
  const { page, complaints, see } = await walk.as('estimator');
  const name = sample.member.name;
  const kept = async () => {
    const { pieces } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, sample.estimateId);
    return pieces.toSorted((one, other) => one.content.place - other.content.place).map(({ content }) => content.name);
  };
  const [own, plinth] = await kept();
  await open(page, sample, 'measure');
  const heads = page.locator('app-member-list .piece-head');
  await drag(page, heads.nth(1).locator('.grip'), heads.nth(0), -8);
  await expectInTime(kept, [plinth, own]);
  expect(await namesOn(page)).toEqual(['Third', name, 'Second']);
  await see('journey piece dragged');
  // What follows within two seconds on one piece is one step of undo.
  await page.waitForTimeout(2_500);
  await heads.nth(0).getByRole('button').focus();
  await page.keyboard.press('Alt+ArrowDown');
  await expectInTime(kept, [own, plinth]);
  await page.getByRole('button', { name: 'Undo' }).first().click();
  await expectInTime(kept, [plinth, own]);
  expect(complaints).toEqual([]);
}, 120_000);

it('drags a zone, moves it back by keys, and the history tells what became of it', async () => {
  const sample = await crowded();
  const { page, complaints, see } = await walk.as('estimator');
  const kept = async () =>
    (await keptMembers(sample)).find(({ id }) => id === sample.memberId)?.zones.map(({ name }) => name);
  await open(page, sample, 'measure');
  await expectInTime(() => zonesOn(page), ['Face', 'Ground']);
  await drag(page, page.locator('app-zone-list .grip').first(), page.locator('app-zone-list .item').nth(1), 30);
  await expectInTime(() => zonesOn(page), ['Ground', 'Face']);
  await expectInTime(kept, ['Ground', 'Face']);
  await page.locator('app-zone-list .item').nth(1).getByLabel('Name', { exact: true }).focus();
  await page.keyboard.press('Alt+ArrowUp');
  await expectInTime(kept, ['Face', 'Ground']);
  // One stays at the entry one was at.
  await page.keyboard.press('Control+a');
  await page.keyboard.type('Front');
  await expectInTime(kept, ['Front', 'Ground']);
  await page.goto(`${walk.address}/jobs/${sample.jobId}`);
  await page.getByText('Zone “Front”, name').first().waitFor();
  await see('journey history of fields');
  expect(complaints).toEqual([]);
}, 120_000);

it('drags an ornament, moves it back by keys, and undoes that', async () => {
  const sample = await crowded();
  const { page, complaints } = await walk.as('estimator');
  const kept = async () =>
    (await keptMembers(sample)).find(({ id }) => id === sample.memberId)?.ornaments.map(({ ornamentId }) => ornamentId);
  await open(page, sample, 'carve');
  const rows = page.locator('app-member-carving [role=grid]').first().locator('tbody tr');
  await drag(page, rows.nth(0).locator('.grip'), rows.nth(1));
  await expectInTime(kept, ['bead-and-reel', 'egg-and-dart']);
  // What follows within two seconds on one member is one step of undo.
  await page.waitForTimeout(2_500);
  await rows.nth(1).locator('td').first().click();
  await page.keyboard.press('Alt+ArrowUp');
  await expectInTime(kept, ['egg-and-dart', 'bead-and-reel']);
  await page.getByRole('button', { name: 'Undo' }).first().click();
  await expectInTime(kept, ['bead-and-reel', 'egg-and-dart']);
  expect(complaints).toEqual([]);
}, 120_000);

it('makes members of pasted rows once every bad cell is put right', async () => {
  const sample = await crowded();
  const { page, complaints, see } = await walk.as('estimator');
  await open(page, sample, 'measure');
  await page.getByRole('button', { name: 'More for the list' }).click();
  await page.getByRole('menuitem', { name: 'Paste rows of a spreadsheet' }).click();
  const dialog = page.getByRole('dialog');
  const rows = dialog.getByLabel('Rows', { exact: true });
  const six = ['A', 'B', 'C', 'D', 'E', 'F'].map((name) => `${name}\t1\t400\t40`).join('\n');
  await rows.fill(six.replace('C\t1\t400', 'C\t1.5\ta hand'));
  const bad = dialog.locator('td.wrong');
  expect((await bad.allInnerTexts()).map((text) => text.replace(/\s+/g, ' '))).toEqual([
    expect.stringContaining('Whole numbers only.'),
    expect.stringContaining('Please write a length'),
  ]);
  await see('journey pasted rows');
  expect(await dialog.getByRole('button', { name: /^Add / }).isDisabled()).toBe(true);
  await rows.fill(six);
  await dialog.getByRole('button', { name: 'Add 6 members' }).click();
  await expectInTime(async () => (await keptMembers(sample)).length, 9);
  expect(complaints).toEqual([]);
}, 120_000);

it('gives the bench no grip at all', async () => {
  const sample = await crowded();
  const { page } = await walk.as('bench');
  for (const place of ['measure', 'carve']) {
    await open(page, sample, place);
    expect(await page.locator('.grip').count()).toBe(0);
  }
}, 120_000);
