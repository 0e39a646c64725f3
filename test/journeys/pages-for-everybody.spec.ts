import type { Page } from 'playwright-core';
import { isTooWide, violations } from './violations';
import { clientPages, memberPages, pagesOfTheApplication, strangerPages } from './pages';
import { screens, turnTo } from './screens';
import { setStage, type Stage } from './stage';
import { Walk, type Person } from './walk';

/** Every page by axe (WCAG 2.2 A and AA, and good practice), in both themes, on a phone of 320 px and at a desk. */
let walk: Walk;
let stage: Stage;
beforeAll(async () => {
  walk = await Walk.begin();
  stage = await setStage(walk);
}, 300_000);
afterAll(() => walk.end());

const pictureOf = (path: string): string =>
  path
    .replace(/[0-9a-f-]{36}/g, 'one')
    .replace(/[#?]/g, '-')
    .replaceAll('/', '-')
    .slice(1);

/** What is wrong with the open page on each of the screens. */
async function wrongOn(page: Page, see: (screen: string) => Promise<void>): Promise<string[]> {
  const found: string[] = [];
  for (const [name, screen] of screens) {
    await turnTo(page, screen);
    await see(name);
    const wrong = [
      ...(await violations(page, { contrastAlone: screen.dark })),
      ...((await isTooWide(page)) ? ['wider than the screen'] : []),
    ];
    found.push(...wrong.map((text) => `${name}: ${text}`));
  }
  return found;
}

/** A client's page shows what stands further down to whoever reads on. */
async function readOn(page: Page): Promise<void> {
  await page.keyboard.press('Shift');
  await page.locator('app-skeleton').first().waitFor({ state: 'detached' });
}

async function wrongOf(paths: readonly string[], { page, see }: Person): Promise<Record<string, string[]>> {
  const found: Record<string, string[]> = {};
  for (const path of paths) {
    // Only a new page reads another secret behind the same address.
    await page.goto('about:blank');
    await page.goto(walk.address + path);
    await page.getByRole('heading').first().waitFor();
    if (/^\/client[/#]/.test(path)) await readOn(page);
    await page.waitForTimeout(300);
    const wrong = await wrongOn(page, (screen) => see(`${pictureOf(path)} ${screen}`));
    if (wrong.length > 0) found[path] = wrong;
  }
  return found;
}

test('every page of the application is among those looked at', () => {
  expect([...new Set(pagesOfTheApplication())].sort()).toEqual(
    [strangerPages, clientPages, memberPages].flatMap(Object.keys).sort(),
  );
});

test('a stranger reads every page that is open to them', async () => {
  const person = await walk.stranger();
  expect(await wrongOf(Object.values(strangerPages).flat(), person)).toEqual({});
  expect(person.complaints.filter((text) => !text.includes('404') && !text.includes('410'))).toEqual([]);
}, 300_000);

// In four parts, so that a slow machine has the time each of them takes.
test.each([0, 1, 2, 3])(
  'the owner reads every page of the workshop, part %i of them',
  async (part) => {
    const person = await walk.as('owner');
    const paths = Object.values(memberPages).flatMap((addresses) => addresses(stage));
    const ofPart = paths.filter((_, at) => at % 4 === part);
    expect(ofPart.length).toBeGreaterThan(5);
    expect(await wrongOf(ofPart, person)).toEqual({});
    expect(person.complaints).toEqual([]);
  },
  400_000,
);

test('a client reads what their link opens', async () => {
  const person = await walk.stranger();
  const paths = Object.values(clientPages).flatMap((addresses) => addresses(stage));
  expect(await wrongOf(paths, person)).toEqual({});
  expect(person.complaints).toEqual([]);
}, 300_000);
