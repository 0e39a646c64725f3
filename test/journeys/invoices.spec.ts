import type { Journal } from '#shared/invoices/payment-schema';
import { acceptedIssue } from '../api/sample-client-visit';
import { issueFirst, papersOf, sayWhoWeAre } from './office-journey';
import { Walk } from './walk';

/** From a contract to money in the books, as the office does it. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const twoMonths_minutes = 60 * 24 * 60;

it('drafts from the contract, issues, mails, takes part of the money, reminds, credits, and the journal agrees', async () => {
  const { jobId } = await acceptedIssue(walk.api.ours, walk.api);
  const office = await walk.as('office');
  await sayWhoWeAre(walk, office);
  const issued = await issueFirst(walk, office, { jobId, email: 'accounts@museum.example' });
  const { page } = office;

  await page.getByRole('button', { name: 'Mail it' }).click();
  await page.getByLabel('A few words of your own').fill('We begin on Monday.');
  await page.getByRole('button', { name: 'Mail it now' }).click();
  await page.getByText('The letter is on its way.').waitFor();
  const letter = (await walk.api.mails()).find(({ headers }) => headers.includes('accounts@museum.example'));
  expect(letter?.text).toContain('We begin on Monday.');
  await page.getByRole('heading', { name: 'Letters about it' }).waitFor();
  await page.getByText('Mailed to accounts@museum.example').waitFor();

  await page.getByRole('link', { name: 'Enter a payment' }).click();
  await page.getByLabel('Amount that arrived').fill('10');
  await page.getByLabel(`For invoice ${issued.number ?? ''}`).waitFor();
  await office.see('journey payment');
  await page.getByRole('button', { name: 'Enter the payment' }).click();
  await page.getByRole('heading', { name: 'Paid on it' }).waitFor();
  expect((await papersOf(walk, jobId))[0].open_minor).toBe(issued.due_minor - 10_00);
  expect(office.complaints).toEqual([]);

  walk.api.clock.move({ minutes: twoMonths_minutes });
  const later = await walk.as('office');
  await later.page.goto(`${walk.address}/accounts/invoices/${issued.id}`);
  await later.page.getByRole('button', { name: 'Remind them' }).click();
  await later.page.getByRole('button', { name: 'Send the reminder' }).click();
  await later.page.getByText('The letter is on its way.').waitFor();
  const reminder = (await walk.api.mails()).find(({ headers }) => headers.includes('still open'));
  expect(reminder?.text).toContain(issued.number ?? 'a number');
  await later.page.getByText('Reminder to accounts@museum.example').waitFor();
  await later.see('journey reminded');

  await later.page.getByRole('button', { name: 'Begin a credit note' }).click();
  await later.page.getByRole('button', { name: 'Issue it' }).click();
  await later.page
    .getByRole('dialog')
    .getByRole('button', { name: /^Issue it over/ })
    .click();
  await later.page.getByRole('heading', { name: /^Credit note C\d{4}-0001/ }).waitFor();
  await later.see('journey credit note');

  await later.page.goto(`${walk.address}/accounts/journal?from=2000-01-01&to=2199-12-31`);
  await later.page.getByRole('rowheader', { name: 'Credit notes' }).waitFor();
  await later.see('journey journal');
  const answer = await later.page.request.get(`${walk.address}/api/journal?from=2000-01-01&to=2199-12-31`);
  const [{ totals }] = ((await answer.json()) as Journal).currencies;
  expect(totals.filter(({ count }) => count > 0).map(({ kind, amount_minor }) => [kind, amount_minor])).toEqual([
    ['invoice', issued.due_minor],
    ['credit-note', -issued.due_minor],
    ['payment', -10_00],
  ]);
  const sums = later.page.getByRole('table', { name: 'Sums by kind' }).getByRole('row');
  await expect(sums.last().textContent()).resolves.toMatch(/−10\.00\s*$/);
  expect(later.complaints).toEqual([]);
}, 240_000);
