import type { Page } from 'playwright-core';
import { giveAccess } from '#shared/agreements/accesses-endpoints';
import { addDays } from '#shared/calendar/add-days';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { markIssue } from '#shared/estimates/issues-endpoints';
import {
  acceptedIssue,
  issueOf,
  linkTo,
  sampleChoices,
  sampleIssue,
  type SampleIssue,
} from '../api/sample-client-visit';
import { sampleMember } from '../api/sample-estimate';
import { variationDraft } from '../api/sample-variation';
import { v7 as newId } from 'uuid';
import { clientAt, emailOf, hashAt, linkOf, mailTo, reviewAs, seenButton } from './client-journey';
import { Keyboard } from './keyboard';
import { screens, turnTo } from './screens';
import { done } from './stage';
import { isTooWide, violations } from './violations';
import { Walk, type Person } from './walk';

/** An estimate on its way to the client and back: sent, asked about, chosen of, accepted; varied, replaced, taken back. */
let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

const placeOf = ({ jobId, estimateId, issueId }: SampleIssue) =>
  `${walk.address}/jobs/${jobId}/estimates/${estimateId}/issue/${issueId}`;

/** Sends the open issue to its client; answers where the link of the letter leads. */
async function sendFrom(page: Page, email: string): Promise<string> {
  await page.getByRole('button', { name: 'Send it to the client' }).click();
  await page.getByText('The letter is on its way.').waitFor();
  return linkOf(walk, await mailTo(walk, email));
}

/** Issues an estimate on its page, and sends it; answers where the link of the letter leads. */
async function issuedBy({ page }: Person, estimate: SampleIssue): Promise<string> {
  await page.goto(`${walk.address}/jobs/${estimate.jobId}/estimates/${estimate.estimateId}/issue`);
  await page.getByRole('button', { name: 'Issue A' }).click();
  await page.getByText('Issue A is made, with its papers.').waitFor();
  const [issue] = await walk.api.app.estimates.issues.ofEstimate(walk.api.ours.id, estimate.estimateId);
  await page.goto(placeOf({ ...estimate, issueId: issue?.id ?? '' }));
  return sendFrom(page, await emailOf(walk, estimate));
}

/** The client's last press on a variation; the owner then finds both parts in the contract. */
async function agreeTo(client: Person, owner: Person, { jobId }: SampleIssue): Promise<void> {
  await client.page.getByRole('button', { name: 'Accept', exact: true }).tap();
  await client.page.getByText(/Accepted by Helena Marsh/).waitFor();
  await owner.page.goto(`${walk.address}/jobs/${jobId}`);
  await owner.page.getByRole('heading', { name: 'The contract', exact: true }).waitFor();
  expect(await owner.page.locator('app-job-agreement tbody tr').count()).toBe(2);
}

const read = async (page: Page): Promise<string> => (await page.locator('body').innerText()).replace(/\s+/g, ' ');
const sumOf = (page: Page) => page.locator('.bar .sum').innerText();

it('is sent, asked about and answered, chosen of, and accepted once', async () => {
  const sample = await sampleChoices(walk.api.ours, walk.api);
  const email = await emailOf(walk, sample);
  const office = await walk.as('office');
  await office.page.goto(placeOf(sample));
  const link = await sendFrom(office.page, email);
  await office.see('journey client sent');

  const client = await clientAt(walk, link);
  const { page } = client;
  expect(page.url()).toMatch(new RegExp(`/client/issues/${sample.issueId}$`));
  await client.see('journey client opened');
  await page.getByLabel('Your question').fill('Will the frieze be burnished?');
  await page.getByRole('button', { name: 'Ask', exact: true }).tap();
  await page.locator('app-client-thread li').getByText('Will the frieze be burnished?').waitFor();

  await office.page.goto(`${walk.address}/jobs/${sample.jobId}`);
  await office.page.locator('app-job-thread').getByText('Will the frieze be burnished?').waitFor();
  await office.page.getByLabel('Your answer').fill('Its high parts will.');
  await office.page.getByRole('button', { name: 'Answer', exact: true }).click();
  await office.page.locator('app-job-thread li').getByText('Its high parts will.').waitFor();
  expect((await mailTo(walk, email)).text).toContain('Its high parts will.');
  await page.reload();
  await page.getByText('Its high parts will.').waitFor();

  const base = await sumOf(page);
  await page.getByRole('radio', { name: /^Oil gilding/ }).check();
  await page.locator('.bar .sum:not(.pending)', { hasNotText: base }).waitFor();
  const chosen = await sumOf(page);
  await client.see('journey client chosen');

  const elsewhere = await clientAt(walk, link);
  await reviewAs(elsewhere.page, 'Helena Marsh');
  await reviewAs(page, 'Helena Marsh');
  expect(await read(page)).toContain(chosen);
  await page.getByText('How both sides can prove').click();
  const hash = await page.locator('.hash').innerText();
  const paper = await page.getByRole('link', { name: /Read the paper/ }).getAttribute('href');
  expect(await hashAt(client, walk.address + (paper ?? ''))).toBe(hash);
  await client.see('journey client review');
  await page.getByRole('button', { name: 'Accept', exact: true }).dblclick();
  await page.getByText(/Accepted by Helena Marsh/).waitFor();
  await client.see('journey client accepted');
  expect(
    await hashAt(client, walk.address + ((await page.locator('.papers a').first().getAttribute('href')) ?? '')),
  ).toBe(hash);

  await elsewhere.page.getByRole('button', { name: 'Accept', exact: true }).tap();
  await elsewhere.page.getByText('This estimate has been accepted already.').waitFor();

  const withPaper = (await walk.api.mails()).filter(({ enclosures }) =>
    enclosures.some(({ sha256 }) => sha256 === hash),
  );
  expect(withPaper.map(({ headers }) => new RegExp(`^To: .*${email}`, 'm').test(headers)).sort()).toEqual([
    false,
    true,
  ]);

  await office.page.goto(`${walk.address}/jobs/${sample.jobId}`);
  await office.page.getByRole('heading', { name: 'The contract', exact: true }).waitFor();
  await office.page.locator('app-job-history li').first().waitFor();
  const told = await read(office.page);
  for (const text of ['opened the papers of the job', 'asked about issue A', 'Accepted by Helena Marsh', chosen])
    expect(told).toContain(text);
  await office.see('journey client contract');
  expect((await walk.api.app.jobs.job(walk.api.ours.id, sample.jobId)).state).toBe('accepted');
  expect([...office.complaints, ...client.complaints]).toEqual([]);
}, 180_000);

it('says so where the link was taken back, to whoever reads by it and to whoever opens it', async () => {
  const sample = await sampleIssue(walk.api.ours, walk.api);
  const { token } = await linkTo(walk.api.ours, walk.api, sample.issueId);
  const link = `${walk.address}/client#${token}`;
  const { page, see } = await clientAt(walk, link);
  const office = await walk.as('office');
  await office.page.goto(placeOf(sample));
  await office.page.getByRole('button', { name: 'Take it back' }).click();
  await office.page.getByRole('dialog').getByRole('button', { name: 'Take it back' }).click();
  await office.page.getByText(/taken back on/).waitFor();
  await page.reload();
  await page.getByRole('heading', { name: 'This paper cannot be shown' }).waitFor();
  await page.goto('about:blank');
  await page.goto(link);
  await page.getByRole('heading', { name: 'This link is closed' }).waitFor();
  expect(await violations(page)).toEqual([]);
  await see('journey client link taken back');
  await page.getByRole('link', { name: 'Send me a new link' }).tap();
  await page.getByLabel('E-mail address').fill(await emailOf(walk, sample));
  await page.getByRole('button', { name: 'Send the link' }).tap();
  await page.getByText(/a letter with a link is on its way there/).waitFor();
  await page.goto(linkOf(walk, await mailTo(walk, await emailOf(walk, sample))));
  await page.waitForURL(/\/client\/(issues|papers)/);
}, 120_000);

it('leads from a replaced issue to the later one', async () => {
  const sample = await sampleIssue(walk.api.ours, walk.api);
  const { token } = await linkTo(walk.api.ours, walk.api, sample.issueId);
  const later = await issueOf(walk.api.ours, walk.api, sample.estimateId);
  const day = await walk.api.app.rateCards.service.today(walk.api.ours.id);
  await done(walk, markIssue, { params: { issueId: later }, body: { state: 'sent', day, note: '' } });
  const { page, see } = await clientAt(walk, `${walk.address}/client#${token}`);
  expect(page.url()).toContain(later);
  await page.goto(`${walk.address}/client/issues/${sample.issueId}`);
  await page.getByText(/A later issue stands in its place/).waitFor();
  await see('journey client replaced');
  expect(await page.getByRole('button', { name: 'Review' }).count()).toBe(0);
  await page.getByRole('link', { name: 'Read the later issue' }).tap();
  await page.waitForURL(new RegExp(later));
  await page.getByText(/Issue B, for you until/).waitFor();
}, 120_000);

it('is varied: a small estimate of its own, accepted the same way, and the contract holds both', async () => {
  const sample = await acceptedIssue(walk.api.ours, walk.api);
  const owner = await walk.as('owner');
  await owner.page.goto(`${walk.address}/jobs/${sample.jobId}`);
  await owner.page.getByRole('button', { name: 'Begin a variation' }).click();
  await owner.page.waitForURL(/\/measure/);
  const estimateId = /estimates\/([^/]+)/.exec(owner.page.url())?.[1] ?? '';
  expect(estimateId).not.toBe(sample.estimateId);
  const pieceId = newId();
  const changes = [
    { kind: 'piece', id: pieceId, version: 0, content: { name: 'Crest', place: 1, note: '' } },
    { kind: 'member', id: newId(), version: 0, content: sampleMember(pieceId, 'Crest rail') },
  ];
  await done(walk, changeEstimate, { params: { estimateId }, body: { changes } });
  const client = await clientAt(walk, await issuedBy(owner, { ...sample, estimateId }));
  await client.see('journey client variation');
  await reviewAs(client.page, 'Helena Marsh');
  await agreeTo(client, owner, sample);
  await owner.see('journey client varied contract');
  const contract = await walk.api.app.agreements.contracts.contract(walk.api.ours.id, sample.jobId);
  expect(contract?.parts.map(({ kind }) => kind)).toEqual(['estimate', 'variation']);
}, 180_000);

it('is varied by less: what is taken off is said before it is accepted, and the contract is smaller by it', async () => {
  const sample = await acceptedIssue(walk.api.ours, walk.api);
  const contract = () => walk.api.app.agreements.contracts.contract(walk.api.ours.id, sample.jobId);
  const before = (await contract())?.gross_minor ?? 0;
  const estimateId = await variationDraft(walk.api.ours, walk.api, { jobId: sample.jobId, price: '-200' });
  const owner = await walk.as('owner');
  const client = await clientAt(walk, await issuedBy(owner, { ...sample, estimateId }));
  const said = client.page.getByText(/is taken off what was agreed/);
  await said.scrollIntoViewIfNeeded();
  expect(await violations(client.page)).toEqual([]);
  await client.see('journey client variation by less');
  await reviewAs(client.page, 'Helena Marsh');
  await said.waitFor();
  await client.see('journey client variation by less, last look');
  await agreeTo(client, owner, sample);
  await owner.see('journey client contract by less');
  const [, variation] = (await contract())?.parts ?? [];
  expect(variation?.net_minor).toBe(-20_000);
  expect((await contract())?.gross_minor).toBe(before + (variation?.gross_minor ?? 0));
  expect([...owner.complaints, ...client.complaints]).toEqual([]);
}, 180_000);

it('is accepted by the keyboard alone', async () => {
  const sample = await sampleChoices(walk.api.ours, walk.api);
  const { token } = await linkTo(walk.api.ours, walk.api, sample.issueId);
  const { page, complaints } = await walk.stranger({ width: 1280, height: 800 });
  await page.goto(`${walk.address}/client#${token}`);
  await page.getByRole('heading', { name: 'What is included' }).waitFor();
  const keys = new Keyboard(page);
  await keys.to(/^Water gilding, burnished included$/);
  await page.keyboard.press('ArrowDown');
  await page.getByRole('radio', { name: /^Oil gilding/, checked: true }).waitFor();
  await page.locator('.sum-box .sum:not(.pending)').waitFor();
  await keys.follow(/^Review$/);
  await page.getByLabel('Your name').waitFor();
  await keys.enter(/^Your name/, 'Helena Marsh');
  await keys.to(/^I accept/);
  await page.keyboard.press('Space');
  await keys.follow(/^Accept$/);
  await page.getByText(/Accepted by Helena Marsh/).waitFor();
  expect([...new Set(keys.unseen)]).toEqual([]);
  expect(complaints).toEqual([]);
}, 120_000);

describe('In every state, on every screen', () => {
  const wrong = async (page: Page, see: (name: string) => Promise<void>, state: string): Promise<string[]> => {
    const found: string[] = [];
    for (const [name, screen] of screens) {
      await turnTo(page, screen);
      await see(`client ${state} ${name}`);
      found.push(
        ...(await violations(page, { contrastAlone: screen.dark })).map((text) => `${state} ${name}: ${text}`),
      );
      if (await isTooWide(page)) found.push(`${state} ${name}: wider than the screen`);
    }
    return found;
  };

  const opened = async () => {
    const sample = await sampleChoices(walk.api.ours, walk.api);
    const { token } = await linkTo(walk.api.ours, walk.api, sample.issueId);
    const person = await walk.stranger({ width: 1280, height: 800 });
    await person.page.goto(`${walk.address}/client#${token}`);
    await person.page.getByRole('heading', { name: 'What is included' }).waitFor();
    return { sample, ...person };
  };

  it('open, with every section unfolded, and in review, with what is missing said', async () => {
    const { page, see } = await opened();
    for (const summary of await page.locator('main summary').all()) await summary.click();
    expect(await wrong(page, see, 'open')).toEqual([]);
    await seenButton(page, 'Review').click();
    await page.getByRole('button', { name: 'Accept', exact: true }).click();
    await page.getByText('Please tick that you accept.').waitFor();
    expect(await wrong(page, see, 'review')).toEqual([]);
  }, 120_000);

  it('accepted', async () => {
    const { page, see } = await opened();
    await reviewAs(page, 'Helena Marsh');
    await page.getByRole('button', { name: 'Accept', exact: true }).click();
    await page.getByText(/Accepted by/).waitFor();
    expect(await wrong(page, see, 'accepted')).toEqual([]);
  }, 120_000);

  it('declining, and declined', async () => {
    const { page, see } = await opened();
    await page.getByRole('button', { name: 'Decline this estimate' }).click();
    await page.getByLabel(/Why it does not suit/).fill('The time does not suit.');
    expect(await wrong(page, see, 'declining')).toEqual([]);
    await page.getByRole('button', { name: 'Decline it' }).click();
    await page.getByText(/It was declined/).waitFor();
    expect(await wrong(page, see, 'declined')).toEqual([]);
  }, 120_000);

  it('replaced', async () => {
    const { page, see, sample } = await opened();
    await issueOf(walk.api.ours, walk.api, sample.estimateId);
    await page.reload();
    await page.getByText(/A later issue stands/).waitFor();
    expect(await wrong(page, see, 'replaced')).toEqual([]);
  }, 120_000);

  it('past its validity', async () => {
    const { ours, app, clock } = walk.api;
    const { issueId } = await sampleIssue(ours, walk.api);
    const endsOn = addDays(await app.rateCards.service.today(ours.id), 300);
    const given = await done(walk, giveAccess, { params: { issueId }, body: { endsOn, send: false, note: '' } });
    clock.move({ minutes: 90 * 24 * 60 });
    const { page, see } = await walk.stranger({ width: 1280, height: 800 });
    await page.goto(`${walk.address}/client#${(given.body as { link: string }).link.split('#')[1] ?? ''}`);
    await page.getByText(/It held until/).waitFor();
    expect(await page.getByRole('button', { name: 'Review' }).count()).toBe(0);
    expect(await wrong(page, see, 'past its validity')).toEqual([]);
  }, 120_000);
});
