import { v7 as newId } from 'uuid';
import type { Change } from '#shared/estimates/change-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { sampleEstimate, sampleMember, type SampleEstimate } from '../api/sample-estimate';
import { expectInTime } from './expect-in-time';
import { Walk } from './walk';

/** What is coated together is said on Dry, and takes effect there. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const placeOf = ({ jobId, estimateId }: SampleEstimate, place: string) =>
  `${walk.address}/jobs/${jobId}/estimates/${estimateId}/${place}`;

const kept = async ({ estimateId }: SampleEstimate) =>
  (await walk.api.app.estimates.drafts.whole(walk.api.ours.id, estimateId)).members.map(({ content }) => content.lot);

/** Two members of one piece, gilt alike. */
async function twoMembers(): Promise<SampleEstimate> {
  const sample = await sampleEstimate(walk.api.ours);
  const content = { ...sampleMember(sample.pieceId, 'Foot'), place: 2 };
  const changes: Change[] = [{ kind: 'member', id: newId(), version: 0, content }];
  const { visitor } = walk.api.ours.people.owner;
  const answer = await visitor.call(changeEstimate, { params: { estimateId: sample.estimateId }, body: { changes } });
  expect(answer.status).toBe(200);
  return sample;
}

it('coats a member on its own by the keyboard alone, names its lot, and undoes it', async () => {
  const sample = await twoMembers();
  const { page, complaints, see } = await walk.as('estimator');
  await page.goto(placeOf(sample, 'dry'));
  const foot = page.getByRole('combobox', { name: /^Foot/ });
  const lots = page.getByRole('grid', { name: 'Lots' });
  await foot.focus();
  await page.keyboard.press('o');
  await lots.getByRole('gridcell', { name: /^Foot: Water gilding, burnished/ }).waitFor();
  await lots.getByRole('gridcell', { name: /^Foot: Water gilding, burnished/ }).click();
  await page.getByLabel('Name of the lot').fill('Feet, assembled');
  await page.keyboard.press('Enter');
  await lots.getByRole('gridcell', { name: /^Feet, assembled: Water gilding/ }).waitFor();
  await page.getByText(/^kept/).waitFor();
  await see('journey lots');
  // It is sent a moment after the last key.
  await expectInTime(() => kept(sample), ['', 'Feet, assembled']);
  await page.getByRole('heading', { name: 'Coated together' }).click();
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  await page
    .getByRole('gridcell', { name: /Feet, assembled/ })
    .first()
    .waitFor({ state: 'detached' });
  await expectInTime(() => kept(sample), ['', '']);
  expect(complaints).toEqual([]);
}, 120_000);
