import { readFileSync } from 'node:fs';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';
import { sampleEstimate } from '../api/sample-estimate';
import { Walk, type Screen } from './walk';

/** Every page by axe (WCAG 2.2 A and AA, and good practice), in both themes, on a phone of 320 px and at a desk. */
const axe = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');
const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

let walk: Walk;
beforeAll(async () => {
  walk = await Walk.begin();
}, 300_000);
afterAll(() => walk.end());

async function violations(page: Page): Promise<string[]> {
  // Evaluated by the debugger, which no policy of the page stands against.
  await page.evaluate(axe);
  const results = await page.evaluate<AxeResults>(`axe.run({ runOnly: ${JSON.stringify(rules)} })`);
  return results.violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`);
}

const isTooWide = (page: Page): Promise<boolean> =>
  page.evaluate('document.documentElement.scrollWidth > document.documentElement.clientWidth');

const screens: readonly (readonly [string, Screen])[] = [
  ['at a desk by day', { width: 1280, height: 800 }],
  ['at a desk by night', { width: 1280, height: 800, dark: true }],
  ['on a small phone by day', { width: 320, height: 640 }],
  ['on a small phone by night', { width: 320, height: 640, dark: true }],
];

describe.each(screens)('%s', (name, screen) => {
  it.each(['/sign-in', '/forgotten-password', '/new-workshop'])('a stranger reads %s', async (path) => {
    const { page, complaints } = await walk.stranger(screen);
    await page.goto(walk.address + path);
    await page.getByRole('heading').first().waitFor();
    expect(await violations(page)).toEqual([]);
    expect(await isTooWide(page)).toBe(false);
    expect(complaints).toEqual([]);
    await page.context().close();
  });

  it('the owner reads every page of the workshop', async () => {
    const { jobId, estimateId } = await sampleEstimate(walk.api.ours);
    const { page, complaints, see } = await walk.as('owner', screen);
    const places = ['measure', 'carve', 'gild', 'dry', 'price', 'issue'];
    const estimate = `/jobs/${jobId}/estimates/${estimateId}`;
    const paths = [
      '/jobs',
      '/jobs/new',
      `/jobs/${jobId}`,
      '/clients',
      '/clients/new',
      '/rates',
      '/people',
      '/workshop',
      '/profile',
      '/people/nowhere',
    ];
    const found: Record<string, readonly string[]> = {};
    for (const path of [...paths, ...places.map((place) => `${estimate}/${place}`)]) {
      await page.goto(walk.address + path);
      await page.getByRole('heading').first().waitFor();
      await page.waitForTimeout(400);
      await see(
        `${path
          .replace(/[0-9a-f-]{36}/g, 'one')
          .replaceAll('/', '-')
          .slice(1)} ${name}`,
      );
      const wrong = [...(await violations(page)), ...((await isTooWide(page)) ? ['wider than the screen'] : [])];
      if (wrong.length > 0) found[path] = wrong;
    }
    expect(found).toEqual({});
    expect(complaints).toEqual([]);
    await page.context().close();
  }, 300_000);
});
