import { sampleEstimate } from '../api/sample-estimate';
import { Walk } from './walk';

/** An owner changes a rate, reads what it does to the open estimates, and puts it in force. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

/** Asks again and again for half a minute. */
async function expectSoon(isSo: () => Promise<boolean>): Promise<void> {
  for (let tries = 0; tries < 60 && !(await isSo()); tries++) await new Promise((resolve) => setTimeout(resolve, 500));
  expect(await isSo()).toBe(true);
}

it('changes a rate, reads its effect and puts it in force', async () => {
  await sampleEstimate(walk.api.ours);
  const { page, complaints, see } = await walk.as('owner');
  await page.goto(`${walk.address}/rates`);
  await page.getByRole('button', { name: 'Change the rates' }).click();
  await page.getByRole('heading', { name: 'Labour' }).waitFor();
  await page.getByRole('gridcell', { name: '33.00' }).click();
  await page.keyboard.type('36');
  await page.keyboard.press('Enter');
  await page.getByRole('gridcell', { name: '36.00' }).waitFor();
  await see('journey rates draft');
  await page.getByText(/^kept/).waitFor();
  await page.getByRole('link', { name: 'What changes' }).first().click();
  await page.getByText('One difference against House values to start from').waitFor();
  await expectSoon(async () => {
    await walk.api.platform.tasks.runDue();
    return page.getByRole('button', { name: 'Put in force from today' }).isEnabled();
  });
  await see('journey rates changes');
  expect(await page.locator('main').innerText()).toMatch(/Herons estimate/);
  await page.getByRole('button', { name: 'Put in force from today' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Put in force', exact: true }).click();
  await expectSoon(
    async () => (await walk.api.app.rateCards.service.inForce(walk.api.ours.id)).name !== 'House values to start from',
  );
  const { content } = await walk.api.app.rateCards.service.inForce(walk.api.ours.id);
  expect(content.money.grades.find((grade) => grade.name === 'Gilder')?.costPerHour).toBe('36');
  expect(complaints).toEqual([]);
}, 120_000);
