import { readFileSync } from 'node:fs';
import type { Result } from 'axe-core';
import type { Page } from 'playwright-core';

const axe = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');
const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** What is asked of a part of the page; in another theme only the contrast is another. */
interface Question {
  readonly within?: string;
  readonly contrastAlone?: boolean;
}

/** What axe finds wrong by WCAG 2.2 A and AA and by good practice. */
export async function violations(
  page: Page,
  { within = 'html', contrastAlone = false }: Question = {},
): Promise<string[]> {
  // Evaluated by the debugger, which no policy of the page stands against.
  if (await page.evaluate<boolean>("typeof axe === 'undefined'")) await page.evaluate(axe);
  const runOnly = contrastAlone ? ['color-contrast'] : rules;
  // What passed is neither gathered in full nor sent over here: it would take longer than the looking.
  const options = JSON.stringify({ runOnly, resultTypes: ['violations'] });
  const found = await page.evaluate<Result[]>(
    `axe.run(${JSON.stringify(within)}, ${options}).then(({ violations }) => violations)`,
  );
  return found.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`);
}

export const isTooWide = (page: Page): Promise<boolean> =>
  page.evaluate('document.documentElement.scrollWidth > document.documentElement.clientWidth');
