import type { Page } from 'playwright-core';
import type { Endpoint } from '#shared/actor/endpoint';
import { readBenchSheet, readPaper } from '#shared/estimates/issues-endpoints';
import { endpoints } from '#shared/endpoints';
import { textOfPaper } from '../documents/paper-text';
import { freeTextsOf, hostileTexts, workedOut } from './planting';
import { openings } from './openings';
import { moveTo } from './move-to';
import { clientPages, memberPages } from './pages';
import { wordsOfAPlan, type PlantedBooks } from './planted-books';
import { PlantedWorkshop } from './planted-workshop';
import { setStage, type Scene } from './stage';
import { Walk, type Person } from './walk';

/**
 * Hostile texts stand in every entry that takes text; every page, dialog and menu then shows them as text and as nothing else
 * (ASVS 1.2.1, 1.2.2, 1.3.1, 1.3.7, 3.2.2). Each entry holds one of them in turn: which one makes no difference, since no page makes
 * markup of any text (lint refuses what could, and the browser does by the policy of trusted types).
 */
let walk: Walk;
let scene: Scene;
let client: Person;
let planted: Map<string, string>;
let books: PlantedBooks;
const alerts: string[] = [];
const faults: string[] = [];
const seen = new Set<string>();
beforeAll(async () => {
  walk = await Walk.begin();
  const stage = await setStage(walk);
  const workshop = new PlantedWorkshop(stage);
  await workshop.plant();
  scene = { ...stage, person: await walk.as('owner') };
  await workshop.plantAnotherWorkshop();
  planted = workshop.planting.texts;
  books = workshop.books;
  client = await walk.stranger();
  for (const { page } of [scene.person, client]) {
    page.on('dialog', (dialog) => {
      if (dialog.type() !== 'beforeunload') alerts.push(dialog.message());
      void dialog.accept();
    });
  }
}, 300_000);
afterAll(() => walk.end());

/** Text without a form of its own, which is refused or passed over all the same because another rule knows what it must be. */
const knownByARule =
  /\.(email|website|currency|locale|timeZone|password|token|current|vatId|iban|bic|reasonCode)$|^(markTask\.taskId|markAsPlanned\.taskIds\.\*|readWhatIf\.lots\.\*\.lotId|keepPlan\..*)$/;
/** The browser makes these to tell the elements of a profile apart, or names steps of a programme by them; nobody reads them. */
const shownNowhere = /\.(profile\.\*\.id|take\.parts\.\*|lotId|taskId|workId|approvalId)$/;

/** What no page of ours makes: had a text become markup, one of these would stand there. */
const marks =
  '[onerror], [onload], [onmouseover], iframe, object, embed, math, img[src="x"], [srcdoc], [href^="javascript:" i], [href^="data:" i], style[title], body b';

const look = `(() => {
  for (const one of document.querySelectorAll('details')) one.open = true;
  const entries = [...document.querySelectorAll('input, textarea')].map((entry) => entry.value);
  const spoken = [...document.querySelectorAll('[aria-label], [placeholder], optgroup')].flatMap((one) => [one.ariaLabel, one.placeholder, one.label]);
  const links = [...document.querySelectorAll('a[href]')].map((link) => link.protocol);
  const grown = [...document.querySelectorAll(${JSON.stringify(marks)})].map((one) => one.outerHTML.slice(0, 200));
  return { text: [document.body.innerText, document.title, ...entries, ...spoken].join('\\n'), links, grown };
})()`;

interface Sight {
  readonly text: string;
  readonly links: readonly string[];
  readonly grown: readonly string[];
}

const plain = (text: string): string => text.replace(/\s+/g, ' ');

function findIn(text: string): void {
  for (const one of planted.values()) if (plain(text).includes(plain(one))) seen.add(one);
}

async function lookAt(page: Page, where: string): Promise<void> {
  const { text, links, grown } = await page.evaluate<Sight>(look);
  findIn(text);
  if (text.includes(workedOut)) faults.push(`${where}: a template was worked out`);
  faults.push(...grown.map((html) => `${where}: grew ${html}`));
  faults.push(
    ...links.filter((one) => !/^(https?|mailto|tel|blob):$/.test(one)).map((one) => `${where}: links ${one}`),
  );
}

test('every entry of every request that asks for free text holds a hostile one', () => {
  const asked = endpoints.flatMap((endpoint: Endpoint) => freeTextsOf(endpoint));
  expect(asked.length).toBeGreaterThan(60);
  expect(asked.filter((field) => !planted.has(field) && !knownByARule.test(field))).toEqual([]);
});

test('each of the hostile texts stands in several entries', () => {
  const entriesWith = (text: string) => [...planted.values()].filter((one) => one.endsWith(` ${text}`)).length;
  expect(hostileTexts.map((text) => [text, entriesWith(text) > 2])).toEqual(hostileTexts.map((text) => [text, true]));
});

const paths = (pages: typeof memberPages): string[] => Object.values(pages).flatMap((addresses) => addresses(scene));

async function lookAtAll(
  { page }: Person,
  pages: typeof memberPages,
  go: (page: Page, path: string) => Promise<unknown>,
): Promise<void> {
  for (const path of paths(pages)) {
    await go(page, path);
    await page.getByRole('heading').first().waitFor();
    await page.waitForTimeout(300);
    await lookAt(page, path);
  }
}

/** Only a new page reads another secret behind the same address. */
async function openAnew(page: Page, path: string): Promise<void> {
  await page.goto('about:blank');
  await page.goto(walk.address + path);
}

test('every page shows them as text', async () => {
  await scene.person.page.goto(walk.address);
  await scene.person.page.getByRole('heading').first().waitFor();
  await lookAtAll(scene.person, memberPages, moveTo);
  expect(faults).toEqual([]);
}, 500_000);

test('every further line that is opened shows them as text', async () => {
  const { page } = scene.person;
  const { jobId, estimateId } = scene.sample;
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/price?part=extras`);
  const lines = page
    .getByRole('grid')
    .getByRole('row')
    .filter({ has: page.getByRole('gridcell') });
  await lines.first().waitFor();
  for (const line of await lines.all()) {
    await line.getByRole('gridcell').first().click();
    await lookAt(page, 'a further line');
  }
  expect(faults).toEqual([]);
}, 60_000);

test('every page of a client shows them as text', async () => {
  await lookAtAll(client, clientPages, openAnew);
  expect(faults).toEqual([]);
}, 60_000);

test('every dialog and menu shows them as text', async () => {
  const { page } = scene.person;
  for (const [name, open] of Object.entries(openings)) {
    const putRight = await open(scene);
    await page.locator('.cdk-overlay-pane').first().waitFor();
    await page.waitForTimeout(150);
    await lookAt(page, name);
    await putRight?.();
  }
  expect(faults).toEqual([]);
}, 300_000);

test('no script of theirs ran, and the browser refused nothing, because nothing tried', () => {
  expect(alerts).toEqual([]);
  expect(
    [...client.complaints, ...scene.person.complaints].filter((text) => !/status of (401|412)/.test(text)),
  ).toEqual([]);
});

test('papers and mails work out no template', async () => {
  const owner = walk.api.as('owner');
  const { issueId, estimateId, pieceId } = scene.issued;
  const calls = [
    owner.call(readPaper, { params: { issueId, paper: 'estimate.pdf' } }),
    owner.call(readPaper, { params: { issueId, paper: 'leaf-order.pdf' } }),
    owner.call(readBenchSheet, { params: { estimateId, pieceId } }),
  ];
  const papers = await Promise.all(
    calls.map(async (call) => textOfPaper((await call.responseType('blob')).body as Buffer)),
  );
  const mails = (await walk.api.mails()).map(({ text, headers }) => headers + text);
  const all = [...papers, ...mails].join('\n');
  findIn(all);
  expect(all.match(/998\*9973/g)?.length).toBeGreaterThan(5);
  expect(all).not.toContain(workedOut);
});

test('invoices, payments and programmes leave with their texts to the letter, and work out no template', async () => {
  const { texts, papers } = await books.answers();
  const all = [...texts, ...papers.map(textOfPaper)].join('\n');
  findIn(all);
  expect(all).not.toContain(workedOut);
  expect(all).not.toContain(wordsOfAPlan);
});

test('each of them was seen somewhere, to the letter', () => {
  const unseen = [...planted].filter(([field, text]) => !seen.has(text) && !shownNowhere.test(field));
  expect(unseen).toEqual([]);
});
