import { listInvoices } from '#shared/invoices/invoices-endpoints';
import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { Person, Walk } from './walk';

/** Who the workshop is on its invoices, entered by hand. */
export async function sayWhoWeAre({ address }: Walk, { page }: Person): Promise<void> {
  await page.goto(`${address}/accounts/settings`);
  await page.getByLabel('VAT number').fill('atu 87654321');
  await page.getByLabel('IBAN').fill('AT61 1904 3002 3457 3202');
  await page.getByRole('button', { name: 'Keep it like this' }).click();
  await page.getByText('This IBAN does not add up.').waitFor();
  await page.getByLabel('IBAN').fill('AT61 1904 3002 3457 3201');
  await page.getByRole('button', { name: 'Keep it like this' }).click();
  await page.getByText('How we invoice is kept.').waitFor();
}

/** Invoices and credit notes of a job as the server has them, the newest first. */
export async function papersOf({ api }: Walk, jobId: string): Promise<InvoiceSummary[]> {
  const answer = await api.as('office').call(listInvoices, { query: { jobId } });
  return (answer.body as { items: InvoiceSummary[] }).items;
}

/** The first thing that may be invoiced of a job, drafted and issued to an address. */
export async function issueFirst(
  walk: Walk,
  office: Person,
  { jobId, email }: { readonly jobId: string; readonly email: string },
): Promise<InvoiceSummary> {
  const { page } = office;
  await page.goto(`${walk.address}/jobs/${jobId}`);
  await page
    .getByRole('button', { name: /^Draft the invoice/ })
    .first()
    .click();
  await page.waitForURL(/accounts\/invoices/);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Note').fill('With thanks for the order.');
  await page.getByText(/^kept/).waitFor();
  await office.see('journey invoice draft');
  await page.getByRole('button', { name: 'Issue it' }).click();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /^Issue it over/ })
    .click();
  await page.getByRole('heading', { name: /^Invoice \d{4}-\d{4}/ }).waitFor();
  const [issued] = await papersOf(walk, jobId);
  expect([issued.state, issued.open_minor]).toEqual(['issued', issued.due_minor]);
  return issued;
}
