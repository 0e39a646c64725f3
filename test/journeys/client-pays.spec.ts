import { linkTo, sampleIssue } from '../api/sample-client-visit';
import { clientAt, emailOf, mailTo, reviewAs } from './client-journey';
import { issueFirst, papersOf, sayWhoWeAre } from './office-journey';
import { Walk, type Person } from './walk';

/** From the client's acceptance to their money in the accounts, the card paid at what stands in for the payment service. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const phone = { width: 360, height: 740, touch: true } as const;

const atTheStandIn = ({ page }: Person) =>
  page.getByRole('heading', { name: 'Standing in for the payment page' }).waitFor();

it('accepts, pays the deposit, gets the receipt, and it stands in the accounts', async () => {
  const sample = await sampleIssue(walk.api.ours, walk.api);
  const { jobId, issueId } = sample;
  const email = await emailOf(walk, sample);
  const { token } = await linkTo(walk.api.ours, walk.api, issueId);
  const client = await clientAt(walk, `${walk.address}/client#${token}`, phone);
  const { page } = client;
  await reviewAs(page, 'Helena Marsh');
  await page.getByRole('button', { name: 'Accept', exact: true }).tap();
  await page.getByText(/Accepted by Helena Marsh/).waitFor();

  const office = await walk.as('office');
  await sayWhoWeAre(walk, office);
  const deposit = await issueFirst(walk, office, { jobId, email });
  const number = deposit.number ?? 'no number';
  const contract = await walk.api.app.agreements.contracts.contract(walk.api.ours.id, jobId);
  // The sample's terms ask for 30 % with the order.
  expect(deposit.due_minor).toBe(Math.round((contract?.gross_minor ?? 0) * 0.3));

  await page.goto(`${walk.address}/client/papers`);
  await page.getByRole('link', { name: new RegExp(`Invoice ${number}`) }).tap();
  await page.getByRole('button', { name: /^Pay .* by card$/ }).tap();
  await atTheStandIn(client);
  expect(await page.locator('main').innerText()).toContain(`${deposit.due_minor} `);
  await page.getByRole('button', { name: 'Leave without paying' }).tap();
  await page.getByRole('heading', { name: 'Not paid yet' }).waitFor();
  await client.see('journey client not paid yet');
  expect((await papersOf(walk, jobId))[0].open_minor).toBe(deposit.due_minor);

  await page.getByRole('link', { name: 'Go on paying' }).tap();
  await atTheStandIn(client);
  await page.getByRole('button', { name: 'Pay', exact: true }).tap();
  await page.getByRole('heading', { name: 'Paid. Thank you.' }).waitFor();
  await page.getByText(`for invoice ${number}. A receipt is on its way`).waitFor();
  await client.see('journey client paid');

  const receipt = await mailTo(walk, email);
  expect(receipt.headers).toContain('thank you for your payment');
  expect(receipt.text).toContain(number);

  await page.getByRole('link', { name: 'To the invoice', exact: true }).tap();
  await page.getByText('Nothing is open on this invoice. Thank you.').waitFor();
  expect(await page.getByRole('button', { name: /^Pay/ }).count()).toBe(0);

  await office.page.goto(`${walk.address}/accounts/payments`);
  expect(await office.page.getByRole('listitem').filter({ hasText: number }).innerText()).toContain('by card');
  await office.see('journey payment in the accounts');
  await office.page.getByRole('link', { name: number }).click();
  await office.page.getByRole('heading', { name: 'Paid on it' }).waitFor();
  const [paid] = await papersOf(walk, jobId);
  expect([paid.open_minor, paid.state]).toEqual([0, 'issued']);
  expect([...office.complaints, ...client.complaints]).toEqual([]);
}, 240_000);
