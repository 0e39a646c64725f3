import { listInvoices } from '#shared/invoices/invoices-endpoints';
import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { Journal } from '#shared/invoices/payment-schema';
import { acceptedIssue } from '../api/sample-client-visit';
import { Walk, type Person } from './walk';

/** From a contract to money in the books, as the office does it. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const twoMonths_minutes = 60 * 24 * 60;

/** Who the workshop is on its invoices, entered by hand. */
async function sayWhoWeAre({ page }: Person): Promise<void> {
  await page.goto(`${walk.address}/accounts/settings`);
  await page.getByLabel('VAT number').fill('atu 87654321');
  await page.getByLabel('IBAN').fill('AT61 1904 3002 3457 3202');
  await page.getByRole('button', { name: 'Keep it like this' }).click();
  await page.getByText('This IBAN does not add up.').waitFor();
  await page.getByLabel('IBAN').fill('AT61 1904 3002 3457 3201');
  await page.getByRole('button', { name: 'Keep it like this' }).click();
  await page.getByText('How we invoice is kept.').waitFor();
}

const papersOf = async (jobId: string): Promise<InvoiceSummary[]> => {
  const answer = await walk.api.as('office').call(listInvoices, { query: { jobId } });
  return (answer.body as { items: InvoiceSummary[] }).items;
};

/** The first thing that may be invoiced of a job, drafted and issued. */
async function issueFirst({ page, see }: Person, jobId: string): Promise<InvoiceSummary> {
  await page.goto(`${walk.address}/jobs/${jobId}`);
  await page
    .getByRole('button', { name: /^Draft the invoice/ })
    .first()
    .click();
  await page.waitForURL(/accounts\/invoices/);
  await page.getByLabel('E-mail address').fill('accounts@museum.example');
  await page.getByLabel('Note').fill('With thanks for the order.');
  await page.getByText(/^kept/).waitFor();
  await see('journey invoice draft');
  await page.getByRole('button', { name: 'Issue it' }).click();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /^Issue it over/ })
    .click();
  await page.getByRole('heading', { name: /^Invoice \d{4}-\d{4}/ }).waitFor();
  const [issued] = await papersOf(jobId);
  expect([issued.state, issued.open_minor]).toEqual(['issued', issued.due_minor]);
  return issued;
}

it('drafts from the contract, issues, mails, takes part of the money, reminds, credits, and the journal agrees', async () => {
  const { jobId } = await acceptedIssue(walk.api.ours, walk.api);
  const office = await walk.as('office');
  await sayWhoWeAre(office);
  const issued = await issueFirst(office, jobId);
  const { page } = office;

  await page.getByRole('button', { name: 'Mail it' }).click();
  await page.getByLabel('A few words of your own').fill('We begin on Monday.');
  await page.getByRole('button', { name: 'Mail it now' }).click();
  await page.getByText('The letter is on its way.').waitFor();
  const letter = (await walk.api.mails()).find(({ headers }) => headers.includes('accounts@museum.example'));
  expect(letter?.text).toContain('We begin on Monday.');

  await page.getByRole('link', { name: 'Enter a payment' }).click();
  await page.getByLabel('Amount that arrived').fill('10');
  await page.getByLabel(`For invoice ${issued.number ?? ''}`).waitFor();
  await office.see('journey payment');
  await page.getByRole('button', { name: 'Enter the payment' }).click();
  await page.getByRole('heading', { name: 'Paid on it' }).waitFor();
  expect((await papersOf(jobId))[0].open_minor).toBe(issued.due_minor - 10_00);
  expect(office.complaints).toEqual([]);

  walk.api.clock.move({ minutes: twoMonths_minutes });
  const later = await walk.as('office');
  await later.page.goto(`${walk.address}/accounts/invoices/${issued.id}`);
  await later.page.getByRole('button', { name: 'Remind them' }).click();
  await later.page.getByRole('button', { name: 'Send the reminder' }).click();
  await later.page.getByText('The letter is on its way.').waitFor();
  const reminder = (await walk.api.mails()).find(({ headers }) => headers.includes('still open'));
  expect(reminder?.text).toContain(issued.number ?? 'a number');

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
  await expect(sums.last().textContent()).resolves.toMatch(/-10\.00\s*$/);
  expect(later.complaints).toEqual([]);
}, 240_000);
