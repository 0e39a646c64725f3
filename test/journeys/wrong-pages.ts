import type { Page } from 'playwright-core';
import { screens, turnTo } from './screens';
import { isTooWide, violations } from './violations';
import type { Person } from './walk';

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

/** What is wrong with pages by their paths: by axe (WCAG 2.2 A and AA, and good practice), in both themes, on a phone of 320 px and at a desk. */
export async function wrongPages(
  person: Person,
  address: string,
  paths: readonly string[],
): Promise<Record<string, string[]>> {
  const { page } = person;
  const found: Record<string, string[]> = {};
  for (const path of paths) {
    // Only a new page reads another secret behind the same address; any other is opened sooner where one of ours stands.
    if (path.includes('#')) await page.goto('about:blank');
    await page.goto(address + path);
    await page.getByRole('heading').first().waitFor();
    if (/^\/client[/#]/.test(path)) await readOn(page);
    await page.waitForTimeout(300);
    const wrong = await wrongOn(page, (screen) => person.see(`${pictureOf(path)} ${screen}`));
    if (wrong.length > 0) found[path] = wrong;
  }
  return found;
}
